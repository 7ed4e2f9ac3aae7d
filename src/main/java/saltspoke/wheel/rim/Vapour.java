package saltspoke.wheel.rim;

/** Water vapour in air. */
final class Vapour {
  /** Specific gas constant of water vapour, J/(kg K), from memory. */
  private static final double GAS_CONSTANT = 461.5;

  private static final double KELVIN = 273.15;

  private Vapour() {}

  /** Density of vapour, g/m³, at a vapour pressure in hPa. */
  static double densityGPerM3(double pressureHpa, double temperatureC) {
    return 1e5 * pressureHpa / (GAS_CONSTANT * (temperatureC + KELVIN));
  }
}
