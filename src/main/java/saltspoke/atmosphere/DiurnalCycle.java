package saltspoke.atmosphere;

/**
 * The day–night cycle of temperature. Its form is a cosine with a second harmonic, so that the
 * night is longer than the warm afternoon; it peaks at 15 h and is lowest at 6 h local time (common
 * practice for land), falling for 15 hours and rising for 9. The second harmonic is fitted on
 * hourly years (see {@link DayTypes}).
 */
public final class DiurnalCycle {
  /** Second harmonic over the first, dimensionless; fitted on 16 hourly years, ±0.08. */
  static final double SECOND_HARMONIC = 0.2091;

  private static final double WARMEST_HOUR = 15;
  private static final double FALL_HOURS = 15;
  private static final double RISE_HOURS = 9;

  /**
   * The cycle at equal shares of the day, from warmest to coldest, as departure from the mean over
   * the range. Falling and rising branch hold the same values.
   */
  private static final double[] DEPARTURES = departures(12);

  private DiurnalCycle() {}

  /**
   * Temperature at an hour of the day.
   *
   * @param meanC mean over 24 hours
   * @param rangeC maximum less minimum, at least 0
   * @param hour local solar time, 0..24
   */
  public static double temperatureC(double meanC, double rangeC, double hour) {
    double after = ((hour - WARMEST_HOUR) % 24 + 24) % 24;
    double phase =
        after <= FALL_HOURS
            ? Math.PI * after / FALL_HOURS
            : Math.PI * (1 + (after - FALL_HOURS) / RISE_HOURS);
    return meanC + rangeC * departure(phase);
  }

  /** Number of equal shares of the day in {@link #departure(int)}. */
  static int steps() {
    return DEPARTURES.length;
  }

  /** Departure from the mean over the range in the middle of an equal share of the day. */
  static double departure(int step) {
    return DEPARTURES[step];
  }

  /** How far the day's minimum lies below its mean, over the range. */
  static double minimumBelowMean() {
    return -departure(Math.PI);
  }

  private static double departure(double phase) {
    return (Math.cos(phase) + SECOND_HARMONIC * Math.cos(2 * phase)) / 2;
  }

  private static double[] departures(int steps) {
    double[] values = new double[steps];
    for (int i = 0; i < steps; i++) {
      values[i] = departure(Math.PI * (i + 0.5) / steps);
    }
    return values;
  }
}
