package saltspoke.atlas;

import java.util.Arrays;
import java.util.List;

/**
 * How well estimates of one quantity meet measurements. A number that makes no sense for the
 * quantity, or has too few pairs, is null.
 *
 * @param quantity name with its unit
 * @param n number of pairs
 * @param bias mean of estimate less measurement
 * @param mae mean absolute error
 * @param rmse root mean square error
 * @param lnRmse root mean square of ln(estimate/measurement), over pairs where both are above 0
 * @param withinFactor2Pct share of those pairs within a factor 2, %
 * @param withinFactor3Pct share within a factor 3, %
 * @param bandCoveragePct share of measurements inside the estimate's 10–90 % band, %
 * @param medianAbsErrorPct median of |estimate − measurement| over measurement, %
 * @param correlation Pearson's
 */
public record Judgement(
    String quantity,
    int n,
    double bias,
    double mae,
    double rmse,
    Double lnRmse,
    Double withinFactor2Pct,
    Double withinFactor3Pct,
    Double bandCoveragePct,
    Double medianAbsErrorPct,
    Double correlation) {

  /**
   * Judges pairs.
   *
   * @param ratioScale whether the quantity has a true zero, so that ratios mean something
   * @param pairs at least one
   */
  public static Judgement of(String quantity, boolean ratioScale, List<Pair> pairs) {
    if (pairs.isEmpty()) {
      throw new IllegalArgumentException("nothing to judge for " + quantity);
    }
    int n = pairs.size();
    double sum = 0;
    double absolute = 0;
    double square = 0;
    int banded = 0;
    int inside = 0;
    for (Pair pair : pairs) {
      sum += pair.error();
      absolute += Math.abs(pair.error());
      square += pair.error() * pair.error();
      if (pair.hasBand()) {
        banded++;
        inside += pair.measured() >= pair.p10() && pair.measured() <= pair.p90() ? 1 : 0;
      }
    }
    List<Pair> ratios =
        ratioScale
            ? pairs.stream().filter(p -> p.measured() > 0 && p.estimated() > 0).toList()
            : List.of();
    return new Judgement(
        quantity,
        n,
        sum / n,
        absolute / n,
        Math.sqrt(square / n),
        ratios.isEmpty() ? null : lnRmse(ratios),
        ratios.isEmpty() ? null : withinPct(ratios, 2),
        ratios.isEmpty() ? null : withinPct(ratios, 3),
        banded == 0 ? null : 100.0 * inside / banded,
        ratios.isEmpty() ? null : medianAbsErrorPct(ratios),
        correlation(pairs));
  }

  private static double lnRmse(List<Pair> ratios) {
    double square = 0;
    for (Pair pair : ratios) {
      double ln = Math.log(pair.estimated() / pair.measured());
      square += ln * ln;
    }
    return Math.sqrt(square / ratios.size());
  }

  private static double withinPct(List<Pair> ratios, double factor) {
    long within =
        ratios.stream()
            .filter(
                p -> Math.abs(Math.log(p.estimated() / p.measured())) <= Math.log(factor) + 1e-12)
            .count();
    return 100.0 * within / ratios.size();
  }

  private static double medianAbsErrorPct(List<Pair> ratios) {
    double[] sorted =
        ratios.stream().mapToDouble(p -> 100 * Math.abs(p.error()) / p.measured()).toArray();
    Arrays.sort(sorted);
    int middle = sorted.length / 2;
    return sorted.length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
  }

  private static Double correlation(List<Pair> pairs) {
    double meanX = pairs.stream().mapToDouble(Pair::measured).average().orElseThrow();
    double meanY = pairs.stream().mapToDouble(Pair::estimated).average().orElseThrow();
    double xy = 0;
    double xx = 0;
    double yy = 0;
    for (Pair pair : pairs) {
      double x = pair.measured() - meanX;
      double y = pair.estimated() - meanY;
      xy += x * y;
      xx += x * x;
      yy += y * y;
    }
    return xx > 0 && yy > 0 ? xy / Math.sqrt(xx * yy) : null;
  }
}
