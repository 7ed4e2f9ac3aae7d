package saltspoke.advice;

import saltspoke.wheel.damage.Site;

/** Turns a worked-out pairing into what a person reads. */
final class Answer {
  private Answer() {}

  static PairingAdvice of(Case worked, AdviceRequest request) {
    History history = history(worked, request);
    Interval interval = worked.interval();
    Site limiting = worked.limiting();
    return new PairingAdvice(
        worked.pairing(),
        times(worked, State.ATTACKED, history),
        times(worked, State.SEIZED, history),
        times(worked, State.LOST, history),
        rounded(interval.firstMonths()),
        rounded(interval.everyMonths()),
        finite(interval.replaceByMonths()),
        worked.look().id(),
        worked.look().minutes(),
        interval.limitedBy(),
        limiting == null ? 0 : rounded(limiting.dose().um(12)),
        Reasons.of(worked, request));
  }

  static History history(Case worked, AdviceRequest request) {
    return request.ageMonths() <= 0
        ? History.NEW
        : new History(
            request.ageMonths(), request.lastFinding(), worked.look().finds(State.ATTACKED));
  }

  private static StateTimes times(Case worked, State state, History history) {
    Site leader = worked.leader(state);
    if (leader == null) {
      return new StateTimes("nipple", null, null, null, false, true);
    }
    if (history.finding() == Finding.ONE_STIFF && state != State.LOST) {
      return new StateTimes(leader.part(), 0.0, 0.0, 0.0, false, false);
    }
    WheelRisk risk = worked.risk();
    double horizon = RiskLimits.HORIZON_MONTHS;
    Double p10 = finite(risk.monthsTo(state, 0.1, history, horizon));
    Double median = p10 == null ? null : finite(risk.monthsTo(state, 0.5, history, horizon));
    Double p90 = median == null ? null : finite(risk.monthsTo(state, 0.9, history, horizon));
    return new StateTimes(leader.part(), p10, median, p90, p90 == null, false);
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
