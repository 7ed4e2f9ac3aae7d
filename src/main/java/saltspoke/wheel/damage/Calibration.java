package saltspoke.wheel.damage;

/** The model's one global calibration constant. */
public final class Calibration {
  /**
   * Factor on every film-driven loss, the same for all parts, places and profiles. Fitted on two
   * trade cases (salted commuter with aluminium on carbon; dry indoor aluminium on aluminium) and
   * judged on the other two. It stands for what the cell's steady film leaves out: a new wheel's
   * films cover only part of the seat, and salt crusts choke them.
   */
  public static final double RATE = 0.38;

  private Calibration() {}
}
