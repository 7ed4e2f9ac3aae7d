package saltspoke.atmosphere;

/**
 * Standard deviation of the daily mean temperature within a month. Linear in latitude, seasonal
 * range and how much colder than the year the month is; fitted on 16 hourly typical years, mean
 * absolute error 0.7 K. Held between 0.8 and 8 K.
 */
public final class DaySpread {
  private static final double BASE_K = 0.4914;
  private static final double PER_DEGREE_OF_LATITUDE = 0.013395;
  private static final double PER_SEASONAL_K = 0.12205;
  private static final double PER_COLDER_K = 0.10555;
  private static final double LEAST_K = 0.8;
  private static final double MOST_K = 8;

  private DaySpread() {}

  /**
   * @param latitudeDeg of the place
   * @param temperatureC of the month
   * @param annualMeanC mean of the twelve months
   * @param seasonalRangeK warmest less coldest month
   * @return K
   */
  public static double of(
      double latitudeDeg, double temperatureC, double annualMeanC, double seasonalRangeK) {
    double spread =
        BASE_K
            + PER_DEGREE_OF_LATITUDE * Math.abs(latitudeDeg)
            + PER_SEASONAL_K * seasonalRangeK
            + PER_COLDER_K * (annualMeanC - temperatureC);
    return Math.max(LEAST_K, Math.min(MOST_K, spread));
  }
}
