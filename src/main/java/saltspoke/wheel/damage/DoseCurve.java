package saltspoke.wheel.damage;

/** Metal lost over months of service, µm; 0 at the start and never falling. */
@FunctionalInterface
public interface DoseCurve {
  /** Loss in µm after a time in service, months ≥ 0. */
  double um(double months);

  /** The same loss at the year's mean pace: without seasons and without a harder start. */
  default DoseCurve steady() {
    return this;
  }

  /** The loss of two causes together. */
  default DoseCurve plus(DoseCurve other) {
    DoseCurve one = this;
    return new DoseCurve() {
      @Override
      public double um(double months) {
        return one.um(months) + other.um(months);
      }

      @Override
      public DoseCurve steady() {
        return one.steady().plus(other.steady());
      }
    };
  }

  /** The same loss from a delay in months onwards, with the seasons where they were. */
  default DoseCurve after(double delayMonths) {
    if (delayMonths == 0) {
      return this;
    }
    DoseCurve one = this;
    return new DoseCurve() {
      @Override
      public double um(double months) {
        return months <= delayMonths ? 0 : one.um(months) - one.um(delayMonths);
      }

      @Override
      public DoseCurve steady() {
        return one.steady().after(delayMonths);
      }
    };
  }
}
