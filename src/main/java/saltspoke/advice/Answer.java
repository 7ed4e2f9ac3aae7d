package saltspoke.advice;

import saltspoke.wheel.damage.Site;

/** Turns a worked-out pairing into what a person reads. */
final class Answer {
  private Answer() {}

  static PairingAdvice of(Case worked, AdviceRequest request) {
    Interval interval = worked.interval();
    Site limiting = worked.limiting();
    return new PairingAdvice(
        worked.pairing(),
        worked.fate().times(State.ATTACKED),
        worked.fate().times(State.SEIZED),
        worked.fate().times(State.LOST),
        rounded(interval.firstMonths()),
        rounded(interval.everyMonths()),
        finite(interval.replaceByMonths()),
        worked.look().id(),
        worked.look().minutes(),
        interval.limitedBy(),
        limiting == null ? 0 : rounded(limiting.dose().um(12)),
        Reasons.of(worked, request));
  }

  private static Double finite(double months) {
    return Double.isFinite(months) ? rounded(months) : null;
  }

  /** Three significant digits: more would be false. */
  static double rounded(double value) {
    if (value == 0) {
      return 0;
    }
    double unit = Math.pow(10, Math.floor(Math.log10(Math.abs(value))) - 2);
    double steps = Math.rint(value / unit);
    return unit >= 1 ? steps * unit : steps / Math.rint(1 / unit);
  }
}
