package saltspoke.wheel.damage;

/** The model's one global calibration constant. */
public final class Calibration {
  /**
   * Factor on every film-driven loss, the same for all parts, places and profiles. Set on two trade
   * cases (salted commuter on carbon with aluminium and with nickel-plated brass). The other two
   * are no independent test: several assumptions were chosen with all four in view. It stands for
   * what the cell's steady film leaves out: films cover only part of the seat, and salt crusts and
   * product choke them.
   */
  public static final double RATE = 0.42;

  private Calibration() {}
}
