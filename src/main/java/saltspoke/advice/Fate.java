package saltspoke.advice;

import java.util.List;
import saltspoke.wheel.damage.Site;

/** What becomes of a wheel with one set of sites; pairings with the same sites share it. */
final class Fate {
  private static final double[] QUANTILES = {0.1, 0.5, 0.9};

  private final WheelRisk risk;
  private final LookKind look;
  private final History history;
  private final Interval interval;
  private final StateTimes[] times = new StateTimes[State.values().length];

  Fate(List<SiteRisk> sites, WorstOf worst, Repeats repeats, AdviceRequest request) {
    risk = new WheelRisk(sites, worst, false);
    SiteRisk leader = risk.leader(State.SEIZED);
    look =
        LookKind.of(
            request.build().hiddenNipples(), leader == null ? "nipple" : leader.site().part());
    history =
        request.ageMonths() <= 0
            ? History.NEW
            : new History(request.ageMonths(), request.lastFinding(), look.finds(State.ATTACKED));
    interval =
        Interval.of(
            risk,
            risk.atMeanPace(),
            repeats.months(sites, look),
            history,
            RiskLimits.of(request.risk()),
            request.practiceLimits());
  }

  LookKind look() {
    return look;
  }

  Interval interval() {
    return interval;
  }

  /** Whether no draw explains what the last look found. */
  boolean surprising() {
    return risk.surprisedBy(history);
  }

  /** The site that brings a state about first; null when none can. */
  Site leader(State state) {
    SiteRisk first = risk.leader(state);
    return first == null ? null : first.site();
  }

  /** Shares of new wheels in each state after some months. */
  StateShares shares(double months) {
    double attacked = risk.chance(State.ATTACKED, months);
    double seized = Math.min(attacked, risk.chance(State.SEIZED, months));
    double lost = Math.min(seized, risk.chance(State.LOST, months));
    return new StateShares(1 - attacked, attacked - seized, seized - lost, lost);
  }

  /** Quantiles of the time to a state. */
  StateTimes times(State state) {
    int s = state.ordinal();
    if (times[s] == null) {
      times[s] = workOut(state);
    }
    return times[s];
  }

  private StateTimes workOut(State state) {
    Site leader = leader(state);
    if (leader == null) {
      return new StateTimes("nipple", null, null, null, false, true);
    }
    if (history.finding() == Finding.ONE_STIFF && state != State.LOST) {
      return new StateTimes(leader.part(), 0.0, 0.0, 0.0, false, false);
    }
    Double[] months = new Double[QUANTILES.length];
    boolean beyond = false;
    for (int i = 0; i < months.length && !beyond; i++) {
      double at = risk.monthsTo(state, QUANTILES[i], history, RiskLimits.HORIZON_MONTHS);
      beyond = !Double.isFinite(at);
      months[i] = beyond ? null : Double.valueOf(Answer.rounded(at));
    }
    return new StateTimes(leader.part(), months[0], months[1], months[2], beyond, false);
  }
}
