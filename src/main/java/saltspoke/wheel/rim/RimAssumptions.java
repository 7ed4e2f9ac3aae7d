package saltspoke.wheel.rim;

import java.util.Arrays;

/** One set of values for every {@link RimAssumption}. Immutable. */
public final class RimAssumptions {
  /** All at their median. */
  public static final RimAssumptions MEDIAN = median();

  private final double[] values;

  private RimAssumptions(double[] values) {
    this.values = values;
  }

  private static RimAssumptions median() {
    return new RimAssumptions(
        Arrays.stream(RimAssumption.values()).mapToDouble(RimAssumption::median).toArray());
  }

  /** The value, in the assumption's unit. */
  public double get(RimAssumption assumption) {
    return values[assumption.ordinal()];
  }

  /** The same set with one value replaced. */
  public RimAssumptions with(RimAssumption assumption, double value) {
    if (!(value > 0 && Double.isFinite(value))) {
      throw new IllegalArgumentException(assumption.id() + " is a number above 0");
    }
    double[] copy = values.clone();
    copy[assumption.ordinal()] = value;
    return new RimAssumptions(copy);
  }

  /** The same set with one value moved to a standard normal deviate of its spread. */
  public RimAssumptions shifted(RimAssumption assumption, double z) {
    return with(assumption, assumption.at(z));
  }
}
