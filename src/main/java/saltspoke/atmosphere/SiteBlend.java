package saltspoke.atmosphere;

import java.util.List;

/**
 * Weights by which departures at sites are carried to a spot: the linear estimate of least error
 * variance, given how alike errors are ({@link CorrectionReach}) and how unsure each site is (Gauss
 * and Markov's best linear estimate, in geostatistics "simple kriging"). Near, unsheltered by a
 * neighbour and sure sites weigh most; with none near all weights are 0.
 *
 * @param weights per site
 * @param varianceLeft share of the model's own variance that remains at the spot, 0..1
 */
record SiteBlend(double[] weights, double varianceLeft) {
  /** Relative noise under which sites at one spot could not be told apart, share of variance. */
  private static final double LEAST_NOISE = 1e-9;

  /**
   * @param noise per site, variance of the measurement over the model's
   * @param doubt the part of that noise by which weights are lessened, 0..1
   */
  static SiteBlend of(
      CorrectionReach reach,
      List<CorrectionSpot> sites,
      double[] noise,
      double doubt,
      CorrectionSpot spot) {
    int n = sites.size();
    double[][] alike = new double[n][n];
    double[][] factor = new double[n][n];
    double[] towards = new double[n];
    for (int i = 0; i < n; i++) {
      towards[i] = reach.closeness(sites.get(i), spot);
      for (int j = 0; j <= i; j++) {
        alike[i][j] = reach.closeness(sites.get(i), sites.get(j));
        factor[i][j] = alike[i][j];
      }
      factor[i][i] += Math.max(LEAST_NOISE, doubt * noise[i]);
    }
    cholesky(factor);
    double[] weights = solve(factor, towards);
    double left = 1;
    for (int i = 0; i < n; i++) {
      left += weights[i] * (weights[i] * (1 + noise[i]) - 2 * towards[i]);
      for (int j = 0; j < i; j++) {
        left += 2 * weights[i] * weights[j] * alike[i][j];
      }
    }
    return new SiteBlend(weights, Site.hold(left, 0, 1));
  }

  double of(double[] departures) {
    return Site.dot(weights, departures);
  }

  /** Replaces the lower triangle of a positive definite matrix by its Cholesky factor. */
  private static void cholesky(double[][] a) {
    for (int i = 0; i < a.length; i++) {
      for (int j = 0; j <= i; j++) {
        double sum = a[i][j];
        for (int k = 0; k < j; k++) {
          sum -= a[i][k] * a[j][k];
        }
        a[i][j] = i == j ? Math.sqrt(Math.max(LEAST_NOISE / 2, sum)) : sum / a[j][j];
      }
    }
  }

  private static double[] solve(double[][] factor, double[] right) {
    double[] x = right.clone();
    for (int i = 0; i < x.length; i++) {
      for (int k = 0; k < i; k++) {
        x[i] -= factor[i][k] * x[k];
      }
      x[i] /= factor[i][i];
    }
    for (int i = x.length - 1; i >= 0; i--) {
      for (int k = i + 1; k < x.length; k++) {
        x[i] -= factor[k][i] * x[k];
      }
      x[i] /= factor[i][i];
    }
    return x;
  }
}
