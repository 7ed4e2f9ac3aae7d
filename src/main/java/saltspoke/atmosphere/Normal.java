package saltspoke.atmosphere;

/** The standard normal distribution. */
final class Normal {
  private Normal() {}

  /** Probability of a value below x; Abramowitz & Stegun 1964, 26.2.17, error below 7.5e-8. */
  static double below(double x) {
    double t = 1 / (1 + 0.2316419 * Math.abs(x));
    double tail =
        Math.exp(-x * x / 2)
            / Math.sqrt(2 * Math.PI)
            * t
            * (0.319381530
                + t * (-0.356563782 + t * (1.781477937 + t * (-1.821255978 + t * 1.330274429))));
    return x >= 0 ? 1 - tail : tail;
  }
}
