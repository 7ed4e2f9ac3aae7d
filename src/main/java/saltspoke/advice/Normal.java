package saltspoke.advice;

/** The standard normal law, exact enough and fast enough to draw fates from. */
final class Normal {
  private static final double LEAST = -12;
  private static final double MOST = 8;
  private static final int PER_UNIT = 64;
  private static final double[] LN_CDF = new double[(int) ((MOST - LEAST) * PER_UNIT) + 2];

  static {
    for (int i = 0; i < LN_CDF.length; i++) {
      LN_CDF[i] = Math.log(cdf(LEAST + (double) i / PER_UNIT));
    }
  }

  private Normal() {}

  /** ln Φ(z), from a table with linear steps of 1/64; flat beyond −12 and 8. Error below 4e-5. */
  static double lnCdf(double z) {
    if (z >= MOST) {
      return 0;
    }
    double at = (Math.max(z, LEAST) - LEAST) * PER_UNIT;
    int i = (int) at;
    return LN_CDF[i] + (at - i) * (LN_CDF[i + 1] - LN_CDF[i]);
  }

  /** Φ(z) from the same table. */
  static double table(double z) {
    return Math.exp(lnCdf(z));
  }

  /**
   * Φ(z) by its continued fraction in the tails and its power series in the middle (Abramowitz and
   * Stegun 26.2.11 and 26.2.14).
   */
  static double cdf(double z) {
    double x = Math.abs(z);
    double density = Math.exp(-x * x / 2) / Math.sqrt(2 * Math.PI);
    if (x > 4) {
      double fraction = x;
      for (int k = 40; k >= 1; k--) {
        fraction = x + k / fraction;
      }
      double tail = density / fraction;
      return z < 0 ? tail : 1 - tail;
    }
    double term = x;
    double sum = x;
    for (int k = 1; k < 80; k++) {
      term *= x * x / (2 * k + 1);
      sum += term;
    }
    return z < 0 ? 0.5 - density * sum : 0.5 + density * sum;
  }

  /**
   * z with Φ(z) = p, 0 < p < 1: the rational start of Abramowitz and Stegun 26.2.23 (error 4.5e-4),
   * made exact by three Newton steps.
   */
  static double quantile(double p) {
    double q = Math.min(p, 1 - p);
    double t = Math.sqrt(-2 * Math.log(q));
    double start =
        t
            - (2.515517 + t * (0.802853 + t * 0.010328))
                / (1 + t * (1.432788 + t * (0.189269 + t * 0.001308)));
    double z = p < 0.5 ? -start : start;
    for (int i = 0; i < 3; i++) {
      double density = Math.exp(-z * z / 2) / Math.sqrt(2 * Math.PI);
      z -= (cdf(z) - p) / density;
    }
    return z;
  }
}
