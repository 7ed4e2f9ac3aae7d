package saltspoke.advice;

import java.util.List;

/**
 * The year of the pairing in focus.
 *
 * @param months January to December
 * @param lookMonths calendar months 1..12 in which looks of the next twelve months fall due
 * @param bestBuildMonths calendar months in which a new build meets the mildest first season
 */
public record YearPlan(
    List<Month> months, List<Integer> lookMonths, List<Integer> bestBuildMonths) {
  public YearPlan {
    months = List.copyOf(months);
    lookMonths = List.copyOf(lookMonths);
    bestBuildMonths = List.copyOf(bestBuildMonths);
  }

  /**
   * @param month 1..12
   * @param rimWetHours hours in the month in which the film in the rim is wet
   * @param chlorideInRimMgPerM2 mean chloride on the rim bed
   * @param damageShare share of the year's penetration that falls in this month, 0..1
   */
  public record Month(
      int month, double rimWetHours, double chlorideInRimMgPerM2, double damageShare) {}
}
