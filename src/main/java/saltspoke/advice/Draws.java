package saltspoke.advice;

import java.util.Map;
import java.util.SplittableRandom;
import java.util.concurrent.ConcurrentHashMap;
import saltspoke.wheel.damage.Assumption;

/**
 * Fates drawn evenly from what is uncertain: one row per draw, one column per {@link Assumption}
 * and for the limits, in standard deviations. The points are a Kronecker sequence on the powers of
 * the generalised golden ratio (the root of x^(d+1) = x + 1), shifted by a seed, each with its
 * mirror image, the columns made uncorrelated and of variance one. Same seed, same rows.
 */
final class Draws {
  /** Draws in all; half of them are mirror images. */
  static final int COUNT = 64;

  /** The seed of every answer. */
  static final long SEED = 20_240_229L;

  private final double[][] z;
  private final double[] worst;
  private final Map<Integer, WorstOf> worstOf;

  private Draws(double[][] z, double[] worst, Map<Integer, WorstOf> worstOf) {
    this.z = z;
    this.worst = worst;
    this.worstOf = worstOf;
  }

  /** The draws of a seed. */
  static Draws of(long seed) {
    int columns = Assumption.values().length;
    double[][] half = new double[columns][COUNT / 2];
    double[] place = new double[COUNT / 2];
    double ratio = ratio(columns + 1);
    SplittableRandom random = new SplittableRandom(seed);
    for (int k = 0; k <= columns; k++) {
      double step = Math.pow(ratio, -(k + 1));
      double shift = random.nextDouble();
      for (int n = 0; n < COUNT / 2; n++) {
        double u = Math.min(Math.max((shift + (n + 1) * step) % 1, 1e-6), 1 - 1e-6);
        if (k == columns) {
          place[n] = u;
        } else {
          half[k][n] = Normal.quantile(u);
        }
      }
    }
    evenOut(half);
    double[][] z = new double[COUNT][columns];
    double[] worst = new double[COUNT];
    for (int n = 0; n < COUNT / 2; n++) {
      worst[2 * n] = place[n];
      worst[2 * n + 1] = 1 - place[n];
      for (int k = 0; k < columns; k++) {
        z[2 * n][k] = half[k][n];
        z[2 * n + 1][k] = -half[k][n];
      }
    }
    return new Draws(z, worst, new ConcurrentHashMap<>());
  }

  /** The root above 1 of x^(d+1) = x + 1. */
  private static double ratio(int dimensions) {
    double ratio = 2;
    for (int i = 0; i < 60; i++) {
      ratio = Math.pow(1 + ratio, 1.0 / (dimensions + 1));
    }
    return ratio;
  }

  /** Makes the columns uncorrelated and of variance one (Gram and Schmidt), as the law asks. */
  private static void evenOut(double[][] columns) {
    for (int k = 0; k < columns.length; k++) {
      for (int j = 0; j < k; j++) {
        double along = dot(columns[k], columns[j]) / dot(columns[j], columns[j]);
        for (int n = 0; n < columns[k].length; n++) {
          columns[k][n] -= along * columns[j][n];
        }
      }
      double size = Math.sqrt(dot(columns[k], columns[k]) / columns[k].length);
      for (int n = 0; n < columns[k].length; n++) {
        columns[k][n] /= size;
      }
    }
  }

  private static double dot(double[] a, double[] b) {
    double sum = 0;
    for (int n = 0; n < a.length; n++) {
      sum += a[n] * b[n];
    }
    return sum;
  }

  /** The same draws with one assumption held at so many standard deviations. */
  Draws holding(Assumption assumption, double deviations) {
    double[][] held = new double[COUNT][];
    for (int n = 0; n < COUNT; n++) {
      held[n] = z[n].clone();
      held[n][assumption.ordinal()] = deviations;
    }
    return new Draws(held, worst, worstOf);
  }

  /** Standard deviations of all assumptions in draw n. */
  double[] row(int n) {
    return z[n];
  }

  /** The worst of so many nipples under these draws; made once for each number of spokes. */
  WorstOf worstOf(int nipples) {
    return worstOf.computeIfAbsent(nipples, n -> new WorstOf(n, this));
  }

  /** Where, between 0 and 1, the wheel's worst nipple stands among such wheels in draw n. */
  double worst(int n) {
    return worst[n];
  }
}
