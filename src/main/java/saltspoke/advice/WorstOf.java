package saltspoke.advice;

/**
 * The worst of N nipples of one wheel: their own scatters are independent standard normal, so none
 * passes z with chance Φ(z)^N. Tabulated.
 */
final class WorstOf {
  private static final double LEAST = -8;
  private static final double MOST = 8;
  private static final int PER_UNIT = 64;

  private final int nipples;
  private final double[] none = new double[(int) (MOST - LEAST) * PER_UNIT + 2];
  private final double[] worst = new double[Draws.COUNT];

  WorstOf(int nipples, Draws draws) {
    this.nipples = nipples;
    for (int i = 0; i < none.length; i++) {
      none[i] = Math.exp(nipples * Normal.lnCdf(LEAST + (double) i / PER_UNIT));
    }
    for (int n = 0; n < Draws.COUNT; n++) {
      worst[n] = Normal.quantile(Math.pow(draws.worst(n), 1.0 / nipples));
    }
  }

  /** Chance that none passes z. */
  double none(double z) {
    if (!(z < MOST)) {
      return 1;
    }
    if (z <= LEAST) {
      return none[0];
    }
    double at = (z - LEAST) * PER_UNIT;
    int i = (int) at;
    return none[i] + (at - i) * (none[i + 1] - none[i]);
  }

  /** Chance that none of all but one passes z. */
  double noneOfOthers(double z) {
    return Math.exp((nipples - 1) * Normal.lnCdf(z));
  }

  /** Scatter of the worst nipple in draw n. */
  double worst(int n) {
    return worst[n];
  }
}
