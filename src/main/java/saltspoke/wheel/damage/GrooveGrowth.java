package saltspoke.wheel.damage;

/**
 * How a bare ring deepens and widens while it is eaten.
 *
 * <p>The couple's current is set by the cathode and by the film, so the metal goes at a steady
 * volume per hour while the groove grows: its flanks retreat as fast as its floor, as in a round
 * pit (ASSUMPTION; half as fast would lower the dose of a deep groove by a third), width w = w0 +
 * 2d, and the volume per length of ring is w0·d + d². Written as a dose X, the volume over the
 * first ring area, that is X = d + d²/w0: depth grows with time at first and with its square root
 * later, between straight line and the textbook t^(1/3) of pits, which is disputed (Melchers 2015).
 * Attack that needs no cathode works on all of the grown surface and keeps its speed; leaving it
 * inside the same dose makes deep grooves of that kind slower than they are by at most the factor
 * w0/(w0 + 2d).
 */
public final class GrooveGrowth {
  private GrooveGrowth() {}

  /** Dose in µm (volume over the first ring area) that makes a groove of this depth, µm. */
  public static double doseUm(double depthUm, double ringWidthUm) {
    return depthUm + depthUm * depthUm / ringWidthUm;
  }

  /** Depth in µm of the groove that a dose in µm makes; the inverse of {@link #doseUm}. */
  public static double depthUm(double doseUm, double ringWidthUm) {
    return ringWidthUm / 2 * (Math.sqrt(1 + 4 * doseUm / ringWidthUm) - 1);
  }
}
