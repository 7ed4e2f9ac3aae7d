package saltspoke.values;

/**
 * The 10 %, 50 % and 90 % quantiles of an uncertain quantity, all in the unit that the name of the
 * holder gives. Finite and in ascending order.
 */
public record Quantiles(double p10, double median, double p90) {
  public Quantiles {
    if (!(Double.isFinite(p10) && Double.isFinite(median) && Double.isFinite(p90))) {
      throw new IllegalArgumentException("quantiles must be finite");
    }
    if (p10 > median || median > p90) {
      throw new IllegalArgumentException(
          "quantiles must ascend: " + p10 + ", " + median + ", " + p90);
    }
  }
}
