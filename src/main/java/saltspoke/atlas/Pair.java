package saltspoke.atlas;

import saltspoke.values.Quantiles;

/**
 * A measured value beside the program's estimate of it.
 *
 * @param station name, or file and line
 * @param measured as the file has it
 * @param estimated median
 * @param p10 10 % quantile of the estimate, NaN when it carries no band
 * @param p90 90 % quantile likewise
 */
public record Pair(String station, double measured, double estimated, double p10, double p90) {
  /** A pair whose estimate carries no band. */
  public static Pair of(String station, double measured, double estimated) {
    return new Pair(station, measured, estimated, Double.NaN, Double.NaN);
  }

  /** A pair whose estimate carries its band. */
  static Pair of(String station, double measured, Quantiles estimate) {
    return new Pair(station, measured, estimate.median(), estimate.p10(), estimate.p90());
  }

  public boolean hasBand() {
    return !Double.isNaN(p10);
  }

  public double error() {
    return estimated - measured;
  }
}
