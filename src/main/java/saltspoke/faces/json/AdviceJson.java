package saltspoke.faces.json;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import saltspoke.advice.Advice;
import saltspoke.advice.AdviceRequest;
import saltspoke.advice.Change;
import saltspoke.advice.PairingAdvice;
import saltspoke.advice.StateTimes;
import saltspoke.advice.YearPlan;
import saltspoke.faces.Texts;

/** The JSON form of an answer about wheels. */
public final class AdviceJson {
  private AdviceJson() {}

  public static ObjectNode of(Advice advice, Texts texts) {
    ObjectNode node = Json.object();
    node.set("place", AirJson.place(advice.air().place(), texts));
    node.set("air", AirJson.of(advice.air(), texts));
    node.set("profile", ProfileJson.of(advice.request().profile()));
    node.set("build", build(advice.request()));
    ArrayNode pairings = node.putArray("pairings");
    advice.pairings().forEach(pairing -> pairings.add(pairing(pairing, texts)));
    node.set("year", year(advice.year()));
    ArrayNode changes = node.putArray("changes");
    advice.changes().forEach(change -> changes.add(change(change, texts)));
    node.set("look", Json.notes(advice.look(), texts));
    node.set("stopSigns", Json.notes(advice.stopSigns(), texts));
    node.set("cautions", Json.notes(advice.cautions(), texts));
    node.set("flags", Json.notes(advice.flags(), texts));
    return node;
  }

  private static ObjectNode build(AdviceRequest request) {
    ObjectNode node = Json.object();
    node.put("spokes", request.build().spokeCount());
    Json.number(node, "tensionN", request.build().tensionN());
    node.put("tapeSound", request.build().tapeSound());
    node.put("hiddenNipples", request.build().hiddenNipples());
    node.put("risk", request.risk().id());
    node.put("buildMonth", request.buildMonth());
    Json.number(node, "ageMonths", request.ageMonths());
    node.put("lastFinding", request.lastFinding().id());
    node.put("practiceLimits", request.practiceLimits());
    return node;
  }

  private static ObjectNode pairing(PairingAdvice advice, Texts texts) {
    ObjectNode node = Json.object();
    node.put("rim", advice.pairing().rim());
    node.put("nipple", advice.pairing().nipple());
    node.put("interface", advice.pairing().between());
    node.put("spoke", advice.pairing().spoke());
    node.set("firstAttackMonths", times(advice.firstAttackMonths()));
    node.set("seizedMonths", times(advice.seizedMonths()));
    node.set("headLossMonths", times(advice.headLossMonths()));
    Json.number(node, "firstLookMonths", advice.firstLookMonths());
    Json.number(node, "everyMonths", advice.everyMonths());
    Json.numberOrNull(node, "replaceByMonths", advice.replaceByMonths());
    node.put("lookKind", advice.lookKind());
    node.put("lookMinutes", advice.lookMinutes());
    node.put("limitedBy", advice.limitedBy());
    Json.number(node, "meanPenetrationUmPerYear", advice.meanPenetrationUmPerYear());
    node.set("reasons", Json.notes(advice.reasons(), texts));
    return node;
  }

  private static ObjectNode times(StateTimes times) {
    ObjectNode node = Json.object();
    node.put("part", times.part());
    Json.numberOrNull(node, "p10", times.p10());
    Json.numberOrNull(node, "median", times.median());
    Json.numberOrNull(node, "p90", times.p90());
    if (times.beyondHorizon()) {
      node.put("beyondHorizon", true);
    }
    if (times.notApplicable()) {
      node.put("notApplicable", true);
    }
    return node;
  }

  private static ObjectNode change(Change change, Texts texts) {
    ObjectNode node = Json.object();
    node.set("what", Json.note(change.what(), texts));
    node.put("field", change.field());
    node.put("value", change.value());
    Json.number(node, "firstLookMonths", change.firstLookMonths());
    Json.number(node, "everyMonths", change.everyMonths());
    Json.number(node, "factor", change.factor());
    node.put("cost", change.cost());
    return node;
  }

  private static ObjectNode year(YearPlan year) {
    ObjectNode node = Json.object();
    ArrayNode months = node.putArray("months");
    for (YearPlan.Month month : year.months()) {
      ObjectNode entry = months.addObject();
      entry.put("month", month.month());
      Json.number(entry, "rimWetHours", month.rimWetHours());
      Json.number(entry, "chlorideInRimMgPerM2", month.chlorideInRimMgPerM2());
      Json.number(entry, "damageShare", month.damageShare());
    }
    ArrayNode looks = node.putArray("lookMonths");
    year.lookMonths().forEach(looks::add);
    ArrayNode builds = node.putArray("bestBuildMonths");
    year.bestBuildMonths().forEach(builds::add);
    return node;
  }
}
