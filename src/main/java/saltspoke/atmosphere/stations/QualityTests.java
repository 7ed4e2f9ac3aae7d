package saltspoke.atmosphere.stations;

import saltspoke.sources.hourly.HourlyQuantity;

/**
 * The tests that a year's values go through; what fails is struck out. The range test stands in
 * {@link HourlyQuantity}, that of duplicates in {@link YearHours}, that of gaps in {@link
 * Coverage}.
 */
final class QualityTests {
  /**
   * ASSUMPTION: a value this far from the reports on both sides, to the same side, is a slip, K (8
   * to 20). Fronts and foehn change more in an hour, but do not come back in the next.
   */
  private static final double SPIKE_K = 12;

  /** Reports farther apart than this are no neighbours, hours. */
  private static final int NEIGHBOUR_HOURS = 3;

  /**
   * Equal values in a row from which a sensor is held to be stuck: temperature 24 reports, 40 where
   * it is given in whole degrees; dew point twice as many. The limits of temperature are those of
   * HadISD (Dunn et al. 2012, Climate of the Past 8, 1649), from memory; the rest is ASSUMPTION
   * (half to twice as many).
   */
  private static final int STUCK_FINE = 24;

  private static final int STUCK_WHOLE = 40;
  private static final int DEW_POINT_FACTOR = 2;

  /** Share of whole numbers from which a sensor is read in whole degrees. */
  private static final double MOSTLY = 0.9;

  /** Air can stay saturated in fog for days: humidity from here is not held to be stuck, %. */
  private static final double SATURATED_PCT = 99;

  /** Dew point above temperature by more than rounding, K. */
  private static final double ABOVE_K = 1.1;

  private QualityTests() {}

  /** Strikes out what fails and counts it. */
  static Struck run(YearHours year) {
    long spikes = 0;
    long stuck = 0;
    double[] temperature = year.of(HourlyQuantity.TEMPERATURE);
    double[] dewPoint = year.of(HourlyQuantity.DEW_POINT);
    double[] humidity = year.of(HourlyQuantity.RELATIVE_HUMIDITY);
    int n = year.slots();
    if (!year.isDaily()) {
      spikes += spikes(temperature, n) + spikes(dewPoint, n);
      stuck += stuck(temperature, n, STUCK_FINE, STUCK_WHOLE, Double.POSITIVE_INFINITY);
      stuck +=
          stuck(
              dewPoint,
              n,
              DEW_POINT_FACTOR * STUCK_FINE,
              DEW_POINT_FACTOR * STUCK_WHOLE,
              Double.POSITIVE_INFINITY);
      stuck +=
          stuck(
              humidity,
              n,
              DEW_POINT_FACTOR * STUCK_WHOLE,
              DEW_POINT_FACTOR * STUCK_WHOLE,
              SATURATED_PCT);
    }
    long above = 0;
    for (int i = 0; i < n; i++) {
      if (dewPoint[i] - temperature[i] > ABOVE_K) {
        dewPoint[i] = Double.NaN;
        above++;
      }
    }
    return new Struck(spikes, stuck, above);
  }

  /**
   * Values struck out.
   *
   * @param dewPointAbove dew points above the temperature
   */
  record Struck(long spikes, long stuck, long dewPointAbove) {}

  private static long spikes(double[] values, int n) {
    long struck = 0;
    int before = -1;
    int at = next(values, 0, n);
    while (at < n) {
      int after = next(values, at + 1, n);
      if (before >= 0
          && after < n
          && at - before <= NEIGHBOUR_HOURS
          && after - at <= NEIGHBOUR_HOURS) {
        double up = values[at] - values[before];
        double down = values[at] - values[after];
        if (Math.min(Math.abs(up), Math.abs(down)) > SPIKE_K && up * down > 0) {
          values[at] = Double.NaN;
          struck++;
          at = after;
          continue;
        }
      }
      before = at;
      at = after;
    }
    return struck;
  }

  private static int next(double[] values, int from, int n) {
    int at = from;
    while (at < n && Double.isNaN(values[at])) {
      at++;
    }
    return at;
  }

  private static long stuck(double[] values, int n, int fine, int whole, double free) {
    int most = fine == whole || !isWhole(values, n) ? fine : whole;
    long struck = 0;
    int at = next(values, 0, n);
    while (at < n) {
      double value = values[at];
      int count = 0;
      int end = at;
      while (end < n && (Double.isNaN(values[end]) || values[end] == value)) {
        count += values[end] == value ? 1 : 0;
        end++;
      }
      if (count >= most && value < free) {
        for (int i = at; i < end; i++) {
          values[i] = Double.NaN;
        }
        struck += count;
      }
      at = end;
    }
    return struck;
  }

  private static boolean isWhole(double[] values, int n) {
    int whole = 0;
    int all = 0;
    for (int i = 0; i < n; i++) {
      double value = values[i];
      // No value is neither equal to itself nor to a whole number.
      all += value == value ? 1 : 0;
      whole += value == (int) value ? 1 : 0;
    }
    return whole > MOSTLY * all;
  }
}
