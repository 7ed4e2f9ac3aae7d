package saltspoke.faces.json;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.function.Function;
import saltspoke.faces.Parameters;
import saltspoke.values.Refusal;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Rinsing;
import saltspoke.wheel.SaltedRoads;
import saltspoke.wheel.Sealant;
import saltspoke.wheel.Storage;
import saltspoke.wheel.ThreadCompound;

/** A riding profile as JSON, both ways. A field left out takes the default named here. */
public final class ProfileJson {
  private static final Set<String> FIELDS =
      Set.of(
          "name",
          "title",
          "months",
          "hoursPerWeek",
          "wetRideShare",
          "saltedRoads",
          "seaRideShare",
          "trainerHoursPerWeek",
          "storage",
          "rinsing",
          "driedAfterWet",
          "drainHoles",
          "threadCompound",
          "sealant");

  private ProfileJson() {}

  public static ObjectNode of(RidingProfile profile) {
    ObjectNode node = Json.object();
    node.put("name", profile.name());
    node.put("title", profile.title());
    ArrayNode months = node.putArray("months");
    profile.months().forEach(months::add);
    Json.number(node, "hoursPerWeek", profile.hoursPerWeek());
    Json.number(node, "wetRideShare", profile.wetRideShare());
    node.put("saltedRoads", profile.saltedRoads().id());
    Json.number(node, "seaRideShare", profile.seaRideShare());
    Json.number(node, "trainerHoursPerWeek", profile.trainerHoursPerWeek());
    node.put("storage", profile.storage().id());
    node.put("rinsing", profile.rinsing().id());
    node.put("driedAfterWet", profile.driedAfterWet());
    node.put("drainHoles", profile.drainHoles());
    node.put("threadCompound", profile.threadCompound().id());
    node.put("sealant", profile.sealant().id());
    return node;
  }

  /** Reads a profile of one's own; refuses unknown fields and values out of range. */
  public static RidingProfile read(JsonNode node) {
    if (!node.isObject()) {
      throw Refusal.wrongUse(
          "not-an-object", "profile", Parameters.shortened(node.toString()), "a JSON object");
    }
    node.fieldNames()
        .forEachRemaining(
            name -> {
              if (!FIELDS.contains(name)) {
                throw Refusal.wrongUse(
                    "unknown-field",
                    "profile",
                    Parameters.shortened(name),
                    String.join(", ", new TreeSet<>(FIELDS)));
              }
            });
    return new RidingProfile(
        text(node, "name", "own"),
        text(node, "title", "Own profile"),
        months(node),
        number(node, "hoursPerWeek", 5),
        number(node, "wetRideShare", -1),
        choice(node, "saltedRoads", SaltedRoads.BY_CLIMATE, SaltedRoads.values(), SaltedRoads::id),
        number(node, "seaRideShare", 0),
        number(node, "trainerHoursPerWeek", 0),
        choice(node, "storage", Storage.UNHEATED_SHED, Storage.values(), Storage::id),
        choice(node, "rinsing", Rinsing.NEVER, Rinsing.values(), Rinsing::id),
        flag(node, "driedAfterWet", false),
        flag(node, "drainHoles", false),
        choice(
            node,
            "threadCompound",
            ThreadCompound.OIL,
            ThreadCompound.values(),
            ThreadCompound::id),
        choice(node, "sealant", Sealant.NONE, Sealant.values(), Sealant::id));
  }

  private static SortedSet<Integer> months(JsonNode node) {
    SortedSet<Integer> months = new TreeSet<>();
    JsonNode list = node.get("months");
    if (list == null) {
      for (int month = 1; month <= 12; month++) {
        months.add(month);
      }
      return months;
    }
    String allowed = "a list of whole numbers 1..12";
    if (!list.isArray()) {
      throw Refusal.wrongUse(
          "not-a-list", "months", Parameters.shortened(list.toString()), allowed);
    }
    for (JsonNode entry : list) {
      if (!entry.isInt()) {
        throw Refusal.wrongUse(
            "not-a-month", "months", Parameters.shortened(entry.toString()), allowed);
      }
      if (entry.intValue() < 1 || entry.intValue() > 12) {
        throw Refusal.outOfRange("months", entry.intValue(), allowed);
      }
      months.add(entry.intValue());
    }
    return months;
  }

  private static String text(JsonNode node, String name, String otherwise) {
    JsonNode value = node.get(name);
    if (value == null) {
      return otherwise;
    }
    if (!value.isTextual() || value.textValue().isBlank() || value.textValue().length() > 80) {
      throw Refusal.wrongUse(
          "not-a-text", name, Parameters.shortened(value.toString()), "a text of 1..80 characters");
    }
    return value.textValue();
  }

  private static double number(JsonNode node, String name, double otherwise) {
    JsonNode value = node.get(name);
    if (value == null) {
      return otherwise;
    }
    if (!value.isNumber() || !Double.isFinite(value.doubleValue())) {
      throw Refusal.wrongUse(
          "not-a-number", name, Parameters.shortened(value.toString()), "a number");
    }
    return value.doubleValue();
  }

  private static boolean flag(JsonNode node, String name, boolean otherwise) {
    JsonNode value = node.get(name);
    if (value == null) {
      return otherwise;
    }
    if (!value.isBoolean()) {
      throw Refusal.wrongUse(
          "not-a-choice", name, Parameters.shortened(value.toString()), "true or false");
    }
    return value.booleanValue();
  }

  private static <E extends Enum<E>> E choice(
      JsonNode node, String name, E otherwise, E[] choices, Function<E, String> idOf) {
    JsonNode value = node.get(name);
    return value == null ? otherwise : Parameters.choose(name, value.asText(), choices, idOf);
  }
}
