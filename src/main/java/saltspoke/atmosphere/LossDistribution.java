package saltspoke.atmosphere;

import java.util.EnumMap;
import java.util.Map;
import saltspoke.values.Quantiles;

/**
 * The distribution of a metal's first-year loss: the inputs' spreads carried through the
 * dose–response function, Pd and Sd (log-normal) by Gauss–Hermite quadrature with five nodes each,
 * T and RH (normal) by half the change of ln r over two deviations at each node; every node is
 * widened by the standard's own log-normal spread. No random numbers: the same inputs give the same
 * bits.
 */
final class LossDistribution {
  /**
   * ISO 9223:2012 annex A: errors are log-normal and stated as one standard deviation s of ln r,
   * the interval being e^−s … e^s (published; s = 0.7 stands for −50…+100 % there). The sizes
   * −33…+50 % for steel, zinc and copper and −50…+100 % for aluminium are from memory.
   */
  static double ownLnSpread(Metal metal) {
    return metal == Metal.ALUMINIUM ? 0.693 : 0.405;
  }

  private static final double[] NODE5 = hermiteNodes5();
  private static final double[] WEIGHT5 = hermiteWeights5();
  private static final int NEWTON_STEPS = 60;

  private final Metal metal;
  private final double[] lnUm;
  private final double[] weight;
  private final double[] lnSpread;

  /**
   * @param x exposure with its floors raised
   * @param extraLnSpread added in quadrature to the standard's own
   */
  LossDistribution(Metal metal, Exposure x, InputSpread spread, double extraLnSpread) {
    this.metal = metal;
    double own = Math.hypot(ownLnSpread(metal), extraLnSpread);
    DoseResponse law = DoseResponse.of(metal);
    double t = x.temperatureC();
    double rh = x.relativeHumidityPct();
    double[][] unit = {
      parts(law, t, rh),
      parts(law, t - spread.temperatureK(), rh),
      parts(law, t + spread.temperatureK(), rh),
      parts(law, t, Math.max(0, rh - spread.relativeHumidityPct())),
      parts(law, t, Math.min(100, rh + spread.relativeHumidityPct()))
    };
    int n = NODE5.length * NODE5.length;
    lnUm = new double[n];
    weight = new double[n];
    lnSpread = new double[n];
    double[] at = new double[unit.length];
    for (int k = 0; k < n; k++) {
      int p = k / NODE5.length;
      int s = k % NODE5.length;
      double pd =
          Math.max(
              FittedRange.PD_MIN_MG_PER_M2_DAY,
              x.so2MgPerM2Day() * Math.exp(NODE5[p] * spread.so2Ln()));
      double sd =
          Math.max(
              FittedRange.SD_MIN_MG_PER_M2_DAY,
              x.chlorideMgPerM2Day() * Math.exp(NODE5[s] * spread.chlorideLn()));
      double sulfur = Math.pow(pd, law.b());
      double chloride = Math.pow(sd, law.e());
      for (int i = 0; i < unit.length; i++) {
        at[i] = Math.log(unit[i][0] * sulfur + unit[i][1] * chloride);
      }
      lnUm[k] = at[0];
      lnSpread[k] = Math.hypot(own, Math.hypot((at[2] - at[1]) / 2, (at[4] - at[3]) / 2));
      weight[k] = WEIGHT5[p] * WEIGHT5[s];
    }
  }

  /** The two terms for Pd = Sd = 1. */
  private static double[] parts(DoseResponse law, double temperatureC, double humidityPct) {
    Exposure one = new Exposure(temperatureC, humidityPct, 1, 1);
    return new double[] {law.sulfurPartUm(one), law.chloridePartUm(one)};
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
    return new Quantiles(quantileUm(0.1), medianUm(), quantileUm(0.9));
  }

  double medianUm() {
    return quantileUm(0.5);
  }

  private double quantileUm(double p) {
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    double mean = 0;
    for (int i = 0; i < lnUm.length; i++) {
      low = Math.min(low, lnUm[i] - 6 * lnSpread[i]);
      high = Math.max(high, lnUm[i] + 6 * lnSpread[i]);
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
      sum += weight[i] * Normal.below((lnLoss - lnUm[i]) / lnSpread[i]);
    }
    return Math.min(1, sum);
  }

  private double density(double lnLoss) {
    double sum = 0;
    for (int i = 0; i < lnUm.length; i++) {
      double z = (lnLoss - lnUm[i]) / lnSpread[i];
      sum += weight[i] / lnSpread[i] * Math.exp(-z * z / 2);
    }
    return sum / Math.sqrt(2 * Math.PI);
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
