package saltspoke.wheel;

import java.util.SortedSet;
import java.util.TreeSet;

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
  public RidingProfile {
    months = java.util.Collections.unmodifiableSortedSet(new TreeSet<>(months));
  }
}
