package saltspoke.wheel;

/**
 * One Tafel branch, i = i0 · 10^((E − E0)/β).
 *
 * @param referenceV potential E0 at which the current is i0
 * @param atReference current density i0 there, in the unit of the result
 * @param slopeV β in V per decade: positive for an anodic branch, negative for a cathodic one
 */
public record Tafel(double referenceV, double atReference, double slopeV) {
  /** Current density at a potential, in the unit of i0. */
  public double at(double potentialV) {
    return atReference * Math.exp((potentialV - referenceV) * perVolt());
  }

  /** Exponent per volt, ln 10/β. */
  double perVolt() {
    return Math.log(10) / slopeV;
  }
}
