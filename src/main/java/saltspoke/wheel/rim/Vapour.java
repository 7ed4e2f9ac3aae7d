package saltspoke.wheel.rim;

/** Water vapour in air. */
public final class Vapour {
  /** Specific gas constant of water vapour, J/(kg K), from memory. */
  private static final double GAS_CONSTANT = 461.5;

  private static final double KELVIN = 273.15;

  private Vapour() {}

  /**
   * Saturation over liquid water, also below 0 °C: 6.112 exp(17.62 T/(243.12 + T)), hPa, T in °C.
   * Magnus form with the coefficients of WMO-No. 8, from memory; −45..60 °C.
   */
  public static double saturationHpa(double temperatureC) {
    return 6.112 * Math.exp(17.62 * temperatureC / (243.12 + temperatureC));
  }

  /**
   * Saturation over ice: 6.112 exp(22.46 T/(272.62 + T)), hPa. Magnus form with the coefficients of
   * WMO-No. 8, from memory; −65..0 °C.
   */
  public static double saturationOverIceHpa(double temperatureC) {
    return 6.112 * Math.exp(22.46 * temperatureC / (272.62 + temperatureC));
  }

  /**
   * Humidity over liquid water at which air is saturated over ice, % (100 above 0 °C). Brine and
   * ice lie side by side at just this humidity, so it caps the humidity that a brine can feel.
   */
  public static double iceCapPct(double temperatureC) {
    return temperatureC >= 0
        ? 100
        : 100 * saturationOverIceHpa(temperatureC) / saturationHpa(temperatureC);
  }

  /** Density of vapour, g/m³, at a vapour pressure in hPa. */
  public static double densityGPerM3(double pressureHpa, double temperatureC) {
    return 1e5 * pressureHpa / (GAS_CONSTANT * (temperatureC + KELVIN));
  }
}
