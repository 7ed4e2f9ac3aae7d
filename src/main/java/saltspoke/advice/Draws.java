package saltspoke.advice;

import saltspoke.wheel.damage.Assumption;

/**
 * Fates drawn evenly from what is uncertain: one row per draw, one column per {@link Assumption}
 * and for the limits, in standard deviations. The points are a Kronecker sequence on the powers of
 * the generalised golden ratio (the root of x^(d+1) = x + 1), shifted by a seed, each with its
 * mirror image so that every column's mean is zero. Same seed, same rows.
 */
final class Draws {
  /** Draws in all; half of them are mirror images. */
  static final int COUNT = 64;

  /** The seed of every answer. */
  static final long SEED = 20_240_229L;

  private final double[][] z;
  private final double[] worst;

  private Draws(double[][] z, double[] worst) {
    this.z = z;
    this.worst = worst;
  }

  /** The draws of a seed. */
  static Draws of(long seed) {
    int columns = Assumption.values().length;
    int dimensions = columns + 1;
    double ratio = 2;
    for (int i = 0; i < 60; i++) {
      ratio = Math.pow(1 + ratio, 1.0 / (dimensions + 1));
    }
    double[][] z = new double[COUNT][columns];
    double[] worst = new double[COUNT];
    java.util.SplittableRandom random = new java.util.SplittableRandom(seed);
    for (int k = 0; k < dimensions; k++) {
      double step = Math.pow(ratio, -(k + 1));
      double shift = random.nextDouble();
      for (int n = 0; n < COUNT / 2; n++) {
        double u = (shift + (n + 1) * step) % 1;
        u = Math.min(Math.max(u, 1e-6), 1 - 1e-6);
        if (k == columns) {
          worst[2 * n] = u;
          worst[2 * n + 1] = 1 - u;
        } else {
          z[2 * n][k] = Normal.quantile(u);
          z[2 * n + 1][k] = -z[2 * n][k];
        }
      }
    }
    return new Draws(z, worst);
  }

  /** The same draws with one assumption held at so many standard deviations. */
  Draws holding(Assumption assumption, double deviations) {
    double[][] held = new double[COUNT][];
    for (int n = 0; n < COUNT; n++) {
      held[n] = z[n].clone();
      held[n][assumption.ordinal()] = deviations;
    }
    return new Draws(held, worst);
  }

  /** Standard deviations of all assumptions in draw n. */
  double[] row(int n) {
    return z[n];
  }

  /** Where, between 0 and 1, the wheel's worst nipple stands among such wheels in draw n. */
  double worst(int n) {
    return worst[n];
  }
}
