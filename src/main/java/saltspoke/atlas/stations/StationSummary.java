package saltspoke.atlas.stations;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import saltspoke.atmosphere.stations.MonthNormal;
import saltspoke.atmosphere.stations.MonthSums;
import saltspoke.atmosphere.stations.YearStatistics;
import saltspoke.sources.hourly.HourlyStation;

/**
 * A station over all its years and files.
 *
 * @param station as its last year describes it
 * @param years what each year came to, in order
 * @param normals calendar months that have enough years
 */
record StationSummary(HourlyStation station, List<Year> years, List<MonthNormal> normals) {
  private static final int MONTHS = 12;

  /**
   * A year of it.
   *
   * @param kept months that count and that no earlier file had
   * @param elsewhere months that count, but stood in an earlier file
   */
  record Year(String file, YearStatistics year, int kept, int elsewhere) {}

  /** A year with the file that it stands in. */
  record Told(String file, StationYearRecord entry) {}

  /**
   * Adds up years; of a month that two files have, the first file's counts.
   *
   * @param told by year, then in the order of the files
   * @param leastYears years that a calendar month needs; a typical year stands for many
   */
  static StationSummary of(List<Told> told, int leastYears) {
    MonthSums[] sums = new MonthSums[MONTHS];
    List<Year> years = new ArrayList<>();
    boolean[] had = new boolean[MONTHS];
    int yearBefore = -1;
    for (Told one : told) {
      YearStatistics year = one.entry().year();
      if (year.year() != yearBefore) {
        Arrays.fill(had, false);
        yearBefore = year.year();
      }
      int kept = 0;
      int elsewhere = 0;
      for (int m = 0; m < MONTHS; m++) {
        Optional<MonthSums> month = year.months().get(m);
        if (month.isPresent() && had[m]) {
          elsewhere++;
        } else if (month.isPresent()) {
          kept++;
          had[m] = true;
          sums[m] = sums[m] == null ? month.get() : sums[m].plus(month.get());
        }
      }
      years.add(new Year(one.file(), year, kept, elsewhere));
    }
    HourlyStation last = told.get(told.size() - 1).entry().station();
    boolean typical = last.kind() == HourlyStation.Kind.TYPICAL;
    List<MonthNormal> normals = new ArrayList<>();
    for (int m = 0; m < MONTHS; m++) {
      if (sums[m] != null && (typical || sums[m].get(MonthSums.Sum.YEARS) >= leastYears)) {
        normals.add(new MonthNormal(m + 1, sums[m]));
      }
    }
    return new StationSummary(last, years, normals);
  }
}
