package saltspoke.atmosphere;

/**
 * Shares of a month's days with frost, or near freezing, from its mean temperature, its daily range
 * and the spread between days. Daily minimum and maximum are taken as normal about their means.
 *
 * <p>These are frosts of the air in the screen. The frost days of CRU CL 2.0 (New et al. 2002) are
 * ground frosts and more numerous by about 9 a year on average and far more in mild places; the two
 * go together closely (correlation 0.98).
 */
public final class FrostDays {
  /** A frost day has its minimum below this. */
  public static final double FROST_C = 0;

  /** Roads are salted when the minimum is below this and … (common practice). */
  public static final double SALTING_MINIMUM_C = 1;

  /** … the maximum above this: colder roads are too cold for salt (common practice). */
  public static final double SALTING_MAXIMUM_C = -5;

  /**
   * How far the mean minimum lies below the mean, over the daily range; fitted on frost and
   * near-freezing days of 16 hourly typical years, ±0.02.
   */
  private static final double MINIMUM_BELOW_MEAN = 0.4355;

  /** Spread of the daily minimum over that of the daily mean; fitted likewise, ±0.1. */
  private static final double SPREAD_FACTOR = 0.9354;

  /** Spread of the daily minimum where daily means do not differ, K; fitted likewise, ±0.4. */
  private static final double SPREAD_BASE_K = 1.2866;

  private FrostDays() {}

  /**
   * Share of days, 0..1, with minimum below 0 °C.
   *
   * @param temperatureC monthly mean
   * @param diurnalRangeC mean daily range
   * @param daySpreadC standard deviation of daily means within the month
   */
  public static double frostShare(double temperatureC, double diurnalRangeC, double daySpreadC) {
    double minimum = temperatureC - MINIMUM_BELOW_MEAN * diurnalRangeC;
    return Normal.below((FROST_C - minimum) / spread(daySpreadC));
  }

  /** Share of days, 0..1, with minimum below +1 °C and maximum above −5 °C. */
  public static double nearFreezingShare(
      double temperatureC, double diurnalRangeC, double daySpreadC) {
    double spread = spread(daySpreadC);
    double minimum = temperatureC - MINIMUM_BELOW_MEAN * diurnalRangeC;
    double maximum = minimum + diurnalRangeC;
    double share =
        Normal.below((SALTING_MINIMUM_C - minimum) / spread)
            - Normal.below((SALTING_MAXIMUM_C - maximum) / spread);
    return Math.max(0, share);
  }

  private static double spread(double daySpreadC) {
    return SPREAD_FACTOR * daySpreadC + SPREAD_BASE_K;
  }
}
