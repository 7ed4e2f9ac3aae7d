package saltspoke.atmosphere;

/**
 * Shares of a month's days with frost, or near freezing, from its mean temperature, its daily range
 * and the spread between days. Daily minimum and maximum are taken as normal about their means.
 */
public final class FrostDays {
  /** A frost day has its minimum below this. */
  public static final double FROST_C = 0;

  /** Roads are salted when the minimum is below this and … (common practice). */
  public static final double SALTING_MINIMUM_C = 1;

  /** … the maximum above this: colder roads are too cold for salt (common practice). */
  public static final double SALTING_MAXIMUM_C = -5;

  /**
   * How far the mean minimum lies below the mean, over the daily range: fitted on frost days of
   * CRU CL 2.0 (New et al. 2002), ±0.01.
   */
  private static final double MINIMUM_BELOW_MEAN = 0.5033;

  /** Spread of the daily minimum within a month, pooled over the years, K; fitted likewise. */
  private static final double MINIMUM_SPREAD_K = 6.195;

  /** Its growth per K of seasonal range (warmest less coldest month); fitted likewise. */
  private static final double MINIMUM_SPREAD_PER_SEASONAL_K = 0.0047782;

  /** Its growth per K by which the month is colder than the year; fitted likewise. */
  private static final double MINIMUM_SPREAD_PER_COLDER_K = 0.013271;

  private FrostDays() {}

  /** Share of days, 0..1, with minimum below 0 °C. */
  public static double frostShare(
      double temperatureC, double diurnalRangeC, double annualMeanC, double seasonalRangeK) {
    double minimum = temperatureC - MINIMUM_BELOW_MEAN * diurnalRangeC;
    return Normal.below((FROST_C - minimum) / spread(temperatureC, annualMeanC, seasonalRangeK));
  }

  /** Share of days, 0..1, with minimum below +1 °C and maximum above −5 °C. */
  public static double nearFreezingShare(
      double temperatureC, double diurnalRangeC, double annualMeanC, double seasonalRangeK) {
    double spread = spread(temperatureC, annualMeanC, seasonalRangeK);
    double minimum = temperatureC - MINIMUM_BELOW_MEAN * diurnalRangeC;
    double maximum = minimum + diurnalRangeC;
    double share =
        Normal.below((SALTING_MINIMUM_C - minimum) / spread)
            - Normal.below((SALTING_MAXIMUM_C - maximum) / spread);
    return Math.max(0, share);
  }

  private static double spread(double temperatureC, double annualMeanC, double seasonalRangeK) {
    return MINIMUM_SPREAD_K
        + MINIMUM_SPREAD_PER_SEASONAL_K * seasonalRangeK
        + MINIMUM_SPREAD_PER_COLDER_K * (annualMeanC - temperatureC);
  }
}
