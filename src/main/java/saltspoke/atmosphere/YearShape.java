package saltspoke.atmosphere;

/**
 * The year's course of temperature and rain, in the forms that the fitted relations use.
 *
 * @param temperatureC monthly means
 * @param rainMm monthly totals
 * @param annualMeanC mean of the months
 * @param seasonalRangeK warmest less coldest month
 * @param annualRainMm sum of the months
 */
record YearShape(
    double[] temperatureC,
    double[] rainMm,
    double annualMeanC,
    double seasonalRangeK,
    double annualRainMm) {
  static YearShape of(double[] temperatureC, double[] rainMm) {
    double sum = 0;
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    double rain = 0;
    for (int m = 0; m < temperatureC.length; m++) {
      sum += temperatureC[m];
      low = Math.min(low, temperatureC[m]);
      high = Math.max(high, temperatureC[m]);
      rain += rainMm[m];
    }
    return new YearShape(temperatureC, rainMm, sum / temperatureC.length, high - low, rain);
  }

  /** Temperature over 20, held to −30..35 °C. */
  double warmth(int month) {
    return Site.hold(temperatureC[month], -30, 35) / 20;
  }

  double anomalyK(int month) {
    return temperatureC[month] - annualMeanC;
  }

  /** ln(1 + rain / 10 mm). */
  double rain(int month) {
    return Math.log1p(rainMm[month] / 10);
  }

  /** ln(annual rain + 30 mm) − 6. */
  double yearRain() {
    return Math.log(annualRainMm + 30) - 6;
  }

  /** Rain against a rough evaporation of 5 mm per °C and month, from −1 (dry) to 1. */
  double wetness(int month) {
    double evaporation = Math.max(0, temperatureC[month]) * 5 + 5;
    return Math.tanh(Math.log((rainMm[month] + 5) / evaporation));
  }
}
