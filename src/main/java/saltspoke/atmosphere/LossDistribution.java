package saltspoke.atmosphere;

import java.util.EnumMap;
import java.util.Map;
import saltspoke.values.Quantiles;

/**
 * The distribution of a metal's first-year loss: the inputs' spreads carried through the
 * dose–response function by Gauss–Hermite quadrature (Pd and Sd log-normal, five nodes; T and RH
 * normal, three), each node widened by the standard's own log-normal spread. No random numbers: the
 * same inputs give the same bits.
 */
final class LossDistribution {
  /**
   * ISO 9223 states −33…+50 % (aluminium −50…+100 %; from memory) for a loss that is log-normal
   * (published). ASSUMPTION: taken as one standard deviation of ln r, since no coverage is stated.
   */
  static double ownLnSpread(Metal metal) {
    return metal == Metal.ALUMINIUM ? 0.693 : 0.405;
  }

  private static final double[] NODE3 = {-Math.sqrt(3), 0, Math.sqrt(3)};
  private static final double[] WEIGHT3 = {1 / 6.0, 2 / 3.0, 1 / 6.0};
  private static final double[] NODE5 = hermiteNodes5();
  private static final double[] WEIGHT5 = hermiteWeights5();
  private static final int NEWTON_STEPS = 60;

  private final Metal metal;
  private final double[] lnUm;
  private final double[] weight;
  private final double lnSpread;

  /**
   * @param x exposure with its floors raised
   * @param extraLnSpread added in quadrature to the standard's own
   */
  LossDistribution(Metal metal, Exposure x, InputSpread spread, double extraLnSpread) {
    this.metal = metal;
    this.lnSpread = Math.hypot(ownLnSpread(metal), extraLnSpread);
    DoseResponse law = DoseResponse.of(metal);
    int n = 3 * 3 * 5 * 5;
    lnUm = new double[n];
    weight = new double[n];
    int k = 0;
    for (int t = 0; t < 3; t++) {
      double tC = bounded(x.temperatureC() + NODE3[t] * spread.temperatureK(), -90, 60);
      for (int h = 0; h < 3; h++) {
        double rh =
            bounded(x.relativeHumidityPct() + NODE3[h] * spread.relativeHumidityPct(), 0, 100);
        double sulfur1 = law.sulfurPartUm(new Exposure(tC, rh, 1, 1));
        double chloride1 = law.chloridePartUm(new Exposure(tC, rh, 1, 1));
        for (int p = 0; p < 5; p++) {
          double pd =
              Math.max(
                  FittedRange.PD_MIN_MG_PER_M2_DAY,
                  x.so2MgPerM2Day() * Math.exp(NODE5[p] * spread.so2Ln()));
          double sulfur = sulfur1 * Math.pow(pd, law.b());
          for (int s = 0; s < 5; s++) {
            double sd =
                Math.max(
                    FittedRange.SD_MIN_MG_PER_M2_DAY,
                    x.chlorideMgPerM2Day() * Math.exp(NODE5[s] * spread.chlorideLn()));
            lnUm[k] = Math.log(sulfur + chloride1 * Math.pow(sd, law.e()));
            weight[k++] = WEIGHT3[t] * WEIGHT3[h] * WEIGHT5[p] * WEIGHT5[s];
          }
        }
      }
    }
  }

  /** Probability that the loss is at most {@code um}. */
  double probabilityUpTo(double um) {
    return um == Double.POSITIVE_INFINITY ? 1 : cdf(Math.log(um));
  }

  /** Probability of each category; they add to 1. */
  Map<Category, Double> categoryProbability() {
    Map<Category, Double> probability = new EnumMap<>(Category.class);
    double below = 0;
    for (Category category : Category.values()) {
      double upTo =
          category == Category.CX ? 1 : probabilityUpTo(CategoryLimits.upperUm(metal, category));
      probability.put(category, Math.max(0, upTo - below));
      below = Math.max(below, upTo);
    }
    return probability;
  }

  Quantiles quantilesUm() {
    return new Quantiles(quantileUm(0.1), quantileUm(0.5), quantileUm(0.9));
  }

  private double quantileUm(double p) {
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    double mean = 0;
    for (int i = 0; i < lnUm.length; i++) {
      low = Math.min(low, lnUm[i] - 6 * lnSpread);
      high = Math.max(high, lnUm[i] + 6 * lnSpread);
      mean += weight[i] * lnUm[i];
    }
    double x = mean;
    for (int step = 0; step < NEWTON_STEPS; step++) {
      double f = cdf(x) - p;
      if (f > 0) {
        high = x;
      } else {
        low = x;
      }
      double next = x - f / density(x);
      if (!(next > low && next < high)) {
        next = (low + high) / 2;
      }
      if (Math.abs(next - x) < 1e-9) {
        return Math.exp(next);
      }
      x = next;
    }
    return Math.exp(x);
  }

  private double cdf(double lnLoss) {
    double sum = 0;
    for (int i = 0; i < lnUm.length; i++) {
      sum += weight[i] * Normal.below((lnLoss - lnUm[i]) / lnSpread);
    }
    return Math.min(1, sum);
  }

  private double density(double lnLoss) {
    double sum = 0;
    for (int i = 0; i < lnUm.length; i++) {
      double z = (lnLoss - lnUm[i]) / lnSpread;
      sum += weight[i] * Math.exp(-z * z / 2);
    }
    return sum / (lnSpread * Math.sqrt(2 * Math.PI));
  }

  private static double bounded(double value, double low, double high) {
    return Math.max(low, Math.min(high, value));
  }

  /** Zeros of the fifth Hermite polynomial for weight exp(−z²/2): 0, ±√(5 ∓ √10). */
  private static double[] hermiteNodes5() {
    double inner = Math.sqrt(5 - Math.sqrt(10));
    double outer = Math.sqrt(5 + Math.sqrt(10));
    return new double[] {-outer, -inner, 0, inner, outer};
  }

  /** Weights to those zeros: 8/15 at 0, (7 ± 2√10)/60 at the others. */
  private static double[] hermiteWeights5() {
    double inner = (7 + 2 * Math.sqrt(10)) / 60;
    double outer = (7 - 2 * Math.sqrt(10)) / 60;
    return new double[] {outer, inner, 8 / 15.0, inner, outer};
  }
}
