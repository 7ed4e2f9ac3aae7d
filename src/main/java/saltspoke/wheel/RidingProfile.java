package saltspoke.wheel;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.SortedSet;
import java.util.TreeSet;
import saltspoke.values.Refusal;

/**
 * How a bicycle is ridden, washed and kept.
 *
 * @param name identifier, lower-case words joined by hyphens
 * @param title short human title
 * @param months calendar months ridden outdoors, 1..12; may be empty (trainer only)
 * @param hoursPerWeek outdoor riding in those months, 0..60
 * @param wetRideShare share of riding hours in rain or on wet roads, 0..1; a negative value means
 *     "from the climate"
 * @param saltedRoads whether winter roads are salted
 * @param seaRideShare share of riding hours within sight of the sea, 0..1
 * @param trainerHoursPerWeek indoor riding in the months not ridden outdoors, 0..30 (sweat)
 * @param storage where the bicycle is kept
 * @param rinsing how often it is rinsed
 * @param driedAfterWet whether it is dried after wet rides and rinses
 * @param drainHoles whether the rim has drain holes
 * @param threadCompound what is on the threads
 * @param sealant sealant in the rim
 */
public record RidingProfile(
    String name,
    String title,
    SortedSet<Integer> months,
    double hoursPerWeek,
    double wetRideShare,
    SaltedRoads saltedRoads,
    double seaRideShare,
    double trainerHoursPerWeek,
    Storage storage,
    Rinsing rinsing,
    boolean driedAfterWet,
    boolean drainHoles,
    ThreadCompound threadCompound,
    Sealant sealant) {
  /** Share of wet rides that stands for "from the climate". */
  public static final double FROM_CLIMATE = -1;

  public RidingProfile {
    Map<String, Object> given = new LinkedHashMap<>();
    given.put("name", name);
    given.put("title", title);
    given.put("months", months);
    given.put("saltedRoads", saltedRoads);
    given.put("storage", storage);
    given.put("rinsing", rinsing);
    given.put("threadCompound", threadCompound);
    given.put("sealant", sealant);
    given.forEach(
        (field, value) -> {
          if (value == null) {
            throw Refusal.wrongUse("missing-field", field, "", "a value; see any ready profile");
          }
        });
    if (!name.matches("[a-z0-9]+(-[a-z0-9]+)*") || name.length() > 60) {
      throw Refusal.wrongUse(
          "bad-name", "name", name, "up to 60 lower-case letters, digits and single hyphens");
    }
    if (title.isBlank() || title.length() > 120) {
      throw Refusal.wrongUse("bad-title", "title", title, "1 to 120 characters");
    }
    for (Integer month : months) {
      Choice.within("months", month == null ? Double.NaN : month, 1, 12, "");
    }
    Choice.within("hoursPerWeek", hoursPerWeek, 0, 60, " h");
    if (wetRideShare < 0) {
      wetRideShare = FROM_CLIMATE;
    }
    Choice.within("wetRideShare", wetRideShare, -1, 1, ", negative for \"from the climate\"");
    Choice.within("seaRideShare", seaRideShare, 0, 1, "");
    Choice.within("trainerHoursPerWeek", trainerHoursPerWeek, 0, 30, " h");
    months = Collections.unmodifiableSortedSet(new TreeSet<>(months));
  }
}
