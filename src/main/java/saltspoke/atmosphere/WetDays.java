package saltspoke.atmosphere;

/**
 * Days of a month with at least 1 mm of rain, from its total: days = N·(1 − exp(−a·P^0.75/N)), with
 * a smaller where the month is warm, since warm rain comes in heavier falls.
 *
 * <p>ASSUMPTION, form and numbers: set by hand to normals recalled from memory of eight towns
 * (London, Seattle, Bergen, Phoenix, Miami, Mumbai, Singapore, in months of 25 to 840 mm), which it
 * meets within about 20 %.
 */
public final class WetDays {
  private static final double POWER = 0.75;
  private static final double COLD_FACTOR = 0.65;
  private static final double WARM_FACTOR = 0.42;
  private static final double COLD_C = 5;
  private static final double WARM_C = 27;

  private WetDays() {}

  /**
   * @param rainMm monthly total, at least 0
   * @param temperatureC monthly mean
   * @param days days in the month
   */
  public static double of(double rainMm, double temperatureC, double days) {
    double warm = Math.max(0, Math.min(1, (temperatureC - COLD_C) / (WARM_C - COLD_C)));
    double factor = COLD_FACTOR + (WARM_FACTOR - COLD_FACTOR) * warm;
    return days * (1 - Math.exp(-factor * Math.pow(rainMm, POWER) / days));
  }
}
