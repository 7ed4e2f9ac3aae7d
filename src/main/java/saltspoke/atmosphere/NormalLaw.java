package saltspoke.atmosphere;

/** The complementary error function, with small relative error also far out in its tail. */
final class NormalLaw {
  /** Standard normal quantile of 90 %. */
  static final double Z90 = 1.2815515655446004;

  private NormalLaw() {}

  /**
   * Complementary error function; relative error below 1.2e-7 everywhere (Press et al., Numerical
   * Recipes 1992, Chebyshev fit; coefficients from memory, held by a test against known values).
   */
  static double erfc(double x) {
    double z = Math.abs(x);
    double t = 1 / (1 + 0.5 * z);
    double poly =
        -z * z
            - 1.26551223
            + t
                * (1.00002368
                    + t
                        * (0.37409196
                            + t
                                * (0.09678418
                                    + t
                                        * (-0.18628806
                                            + t
                                                * (0.27886807
                                                    + t
                                                        * (-1.13520398
                                                            + t
                                                                * (1.48851587
                                                                    + t
                                                                        * (-0.82215223
                                                                            + t
                                                                                * 0.17087277))))))));
    double value = t * Math.exp(poly);
    return x >= 0 ? value : 2 - value;
  }
}
