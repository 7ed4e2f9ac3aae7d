package saltspoke.faces.json;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import saltspoke.atlas.PairingOutlook;
import saltspoke.atlas.RegionOutlook;
import saltspoke.faces.Texts;

/** The JSON form of the outlook of a region. */
public final class RegionJson {
  private RegionJson() {}

  public static ObjectNode of(RegionOutlook outlook, Texts texts) {
    ObjectNode node = Json.object();
    node.put("region", outlook.area().name());
    node.put("country", outlook.area().countryCode());
    node.put("towns", outlook.towns());
    node.put("people", outlook.people());
    node.put("sampledTowns", outlook.sampled());
    ObjectNode classes = node.putObject("classShare");
    outlook
        .classShare()
        .forEach(
            (metal, shares) -> {
              ObjectNode of = classes.putObject(metal.id());
              shares.forEach((category, share) -> Json.number(of, category.name(), share));
            });
    node.set("chlorideMgPerM2Day", Json.quantiles(outlook.chlorideMgPerM2Day()));
    node.set("wetHours", Json.quantiles(outlook.wetHours()));
    node.set("nearFreezingDays", Json.quantiles(outlook.nearFreezingDays()));
    ArrayNode pairings = node.putArray("pairings");
    outlook.pairings().forEach(pairing -> pairings.add(pairing(pairing)));
    node.set("flags", Json.notes(outlook.flags(), texts));
    return node;
  }

  private static ObjectNode pairing(PairingOutlook outlook) {
    ObjectNode node = Json.object();
    node.put("rim", outlook.pairing().rim());
    node.put("nipple", outlook.pairing().nipple());
    node.put("interface", outlook.pairing().between());
    node.put("spoke", outlook.pairing().spoke());
    node.set("firstLookMonths", Json.quantiles(outlook.firstLookMonths()));
    node.set("everyMonths", Json.quantiles(outlook.everyMonths()));
    node.set("replaceByMonths", Json.quantiles(outlook.replaceByMonths()));
    return node;
  }
}
