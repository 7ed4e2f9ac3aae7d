package saltspoke.atmosphere.stations;

import java.util.List;
import java.util.Optional;

/**
 * What a year of a station came to.
 *
 * @param year 0 for a typical year
 * @param quality what was struck out and dropped
 * @param months January to December, empty where the month does not count
 */
public record YearStatistics(int year, Quality quality, List<Optional<MonthSums>> months) {
  public YearStatistics {
    months = List.copyOf(months);
  }

  /**
   * What a station year lost.
   *
   * @param rows rows read
   * @param impossible values outside all weather
   * @param spikes values that leap and come back
   * @param stuck values of a stuck sensor
   * @param dewPointAbove dew points above the temperature
   * @param duplicates reports for an hour that has a nearer one
   * @param reports hours (of daily records days) with temperature and humidity
   * @param gaps those without
   * @param rhythm hours from one report to the next
   * @param tooFew months with reports, but under 80 % of those expected
   * @param longGap months with five days or more missing in a row
   */
  public record Quality(
      long rows,
      long impossible,
      long spikes,
      long stuck,
      long dewPointAbove,
      long duplicates,
      long reports,
      long gaps,
      int rhythm,
      int tooFew,
      int longGap) {}
}
