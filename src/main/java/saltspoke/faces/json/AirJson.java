package saltspoke.faces.json;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.AnnualAir;
import saltspoke.atmosphere.Category;
import saltspoke.atmosphere.LongTermLoss;
import saltspoke.atmosphere.MetalCorrosivity;
import saltspoke.atmosphere.MonthAir;
import saltspoke.atmosphere.RoadSalt;
import saltspoke.faces.Texts;
import saltspoke.places.Place;
import saltspoke.values.Note;

/** The JSON form of an answer about the outside air. */
public final class AirJson {
  private AirJson() {}

  public static ObjectNode of(AirClimate air, Texts texts) {
    ObjectNode node = Json.object();
    node.set("place", place(air.place(), texts));
    ArrayNode months = node.putArray("months");
    air.months().forEach(month -> months.add(month(month)));
    node.set("annual", annual(air.annual()));
    node.set("chlorideDepositionMgPerM2Day", Json.quantiles(air.chlorideDepositionMgPerM2Day()));
    node.set("so2DepositionMgPerM2Day", Json.quantiles(air.so2DepositionMgPerM2Day()));
    node.put("setting", air.setting().id());
    node.put("settingGiven", air.settingGiven());
    node.put("wetnessClass", air.wetnessClass());
    node.put("salinityClass", air.salinityClass());
    node.put("sulfurClass", air.sulfurClass());
    ArrayNode corrosivity = node.putArray("corrosivity");
    air.corrosivity().forEach(metal -> corrosivity.add(corrosivity(metal)));
    node.set("roadSalt", roadSalt(air.roadSalt()));
    node.set("summary", Json.note(air.summary(), texts));
    List<Note> flags = new ArrayList<>(air.place().flags());
    flags.addAll(air.flags());
    node.set("flags", Json.notes(flags, texts));
    return node;
  }

  /** A place as every answer shows it. */
  public static ObjectNode place(Place place, Texts texts) {
    ObjectNode node = Json.object();
    node.put("name", place.name());
    node.put("regionName", place.regionName());
    node.put("countryCode", place.countryCode());
    Json.number(node, "latitudeDeg", place.latitudeDeg());
    Json.number(node, "longitudeDeg", place.longitudeDeg());
    Json.number(node, "elevationM", place.elevationM());
    Json.number(node, "seaDistanceKm", place.sea().distanceKm());
    node.set("flags", Json.notes(place.flags(), texts));
    return node;
  }

  private static ObjectNode month(MonthAir month) {
    ObjectNode node = Json.object();
    node.put("month", month.month());
    Json.number(node, "temperatureC", month.temperatureC());
    Json.number(node, "relativeHumidityPct", month.relativeHumidityPct());
    Json.number(node, "vapourPressureHpa", month.vapourPressureHpa());
    Json.number(node, "diurnalRangeC", month.diurnalRangeC());
    Json.number(node, "wetHours", month.wetHours());
    Json.number(node, "hoursAbove33Pct", month.hoursAbove33Pct());
    Json.number(node, "hoursAbove75Pct", month.hoursAbove75Pct());
    Json.number(node, "hoursBelow0C", month.hoursBelow0C());
    Json.number(node, "rainMm", month.rainMm());
    Json.number(node, "wetDays", month.wetDays());
    Json.number(node, "windMPerS", month.windMPerS());
    Json.number(node, "nearFreezingDays", month.nearFreezingDays());
    Json.number(node, "frostDays", month.frostDays());
    Json.number(node, "chlorideDepositionMgPerM2Day", month.chlorideDepositionMgPerM2Day());
    return node;
  }

  private static ObjectNode annual(AnnualAir annual) {
    ObjectNode node = Json.object();
    Json.number(node, "temperatureC", annual.temperatureC());
    Json.number(node, "relativeHumidityPct", annual.relativeHumidityPct());
    Json.number(node, "wetHours", annual.wetHours());
    Json.number(node, "rainMm", annual.rainMm());
    Json.number(node, "frostDays", annual.frostDays());
    Json.number(node, "nearFreezingDays", annual.nearFreezingDays());
    return node;
  }

  private static ObjectNode corrosivity(MetalCorrosivity metal) {
    ObjectNode node = Json.object();
    node.put("metal", metal.metal().id());
    node.set("firstYearLossUm", Json.quantiles(metal.firstYearLossUm()));
    node.put("category", metal.category().name());
    ObjectNode probability = node.putObject("categoryProbability");
    for (Category category : Category.values()) {
      Json.number(
          probability, category.name(), metal.categoryProbability().getOrDefault(category, 0.0));
    }
    ArrayNode longTerm = node.putArray("longTermLoss");
    for (LongTermLoss loss : metal.longTerm()) {
      ObjectNode entry = longTerm.addObject();
      entry.put("years", loss.years());
      entry.set("um", Json.quantiles(loss.um()));
    }
    return node;
  }

  private static ObjectNode roadSalt(RoadSalt salt) {
    ObjectNode node = Json.object();
    node.put("practice", salt.practice());
    node.put("practiceConfidence", salt.practiceConfidence());
    node.set("treatmentsPerWinter", Json.quantiles(salt.treatmentsPerWinter()));
    Json.number(node, "magnesiumShare", salt.magnesiumShare());
    ArrayNode months = node.putArray("months");
    for (RoadSalt.Month month : salt.months()) {
      ObjectNode entry = months.addObject();
      entry.put("month", month.month());
      Json.number(entry, "treatments", month.treatments());
      Json.number(entry, "saltOnRoadGPerM2", month.saltOnRoadGPerM2());
    }
    return node;
  }
}
