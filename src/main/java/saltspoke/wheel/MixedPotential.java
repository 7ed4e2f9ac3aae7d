package saltspoke.wheel;

import java.util.function.DoubleUnaryOperator;

/** Mixed-potential theory (Wagner and Traud 1938): the potential at which currents balance. */
public final class MixedPotential {
  private static final int BISECTIONS = 60;

  private MixedPotential() {}

  /**
   * Root of a current that rises with potential and changes sign between two bounds, V; to the last
   * bit by bisection. When the sign does not change the bound nearer to it is returned.
   */
  public static double solve(DoubleUnaryOperator netAnodic, double lowV, double highV) {
    double low = lowV;
    double high = highV;
    for (int i = 0; i < BISECTIONS; i++) {
      double middle = 0.5 * (low + high);
      if (netAnodic.applyAsDouble(middle) < 0) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return 0.5 * (low + high);
  }

  /**
   * Potential of an anode of area 1 joined without resistance to a cathode of the given area, V.
   */
  public static double of(Tafel anodic, Tafel cathodic, double cathodeAreaRatio) {
    return solve(e -> anodic.at(e) - cathodeAreaRatio * cathodic.at(e), -3, 3);
  }
}
