package saltspoke.advice;

/**
 * When to look, before and after the limits of practice.
 *
 * @param freeFirstMonths first look with the limits off
 * @param freeEveryMonths repeats with the limits off
 * @param firstMonths first look as given
 * @param everyMonths repeats as given
 * @param replaceByMonths infinite beyond the horizon
 * @param limitedBy what sets the first look
 * @param everyLimitedBy what sets the repeats
 */
record Interval(
    double freeFirstMonths,
    double freeEveryMonths,
    double firstMonths,
    double everyMonths,
    double replaceByMonths,
    String limitedBy,
    String everyLimitedBy) {

  /**
   * The rule. First look: when the chance of seized, or of a lost head, passes what is accepted.
   * Repeats: no farther apart than half the short warning (10 % quantile of first attack to
   * seized), and no farther than {@link Repeats} allows. A wheel of which the last look found
   * something is looked at again no later than the accepted chances given that finding.
   *
   * @param risk with seasons, for the first look and the replacement
   * @param steady at the year's mean pace, for the repeats
   * @param repeatMonths what {@link Repeats} allows
   */
  static Interval of(
      WheelRisk risk,
      WheelRisk steady,
      double repeatMonths,
      History history,
      RiskLimits limits,
      boolean practiceLimits) {
    double horizon = RiskLimits.HORIZON_MONTHS;
    double seized = risk.monthsTo(State.SEIZED, limits.seized(), history, horizon);
    double lost = risk.monthsTo(State.LOST, limits.lost(), history, horizon);
    double replace = risk.monthsTo(State.LOST, limits.replace(), history, horizon);
    double first = Math.min(Math.min(seized, lost), horizon);
    String limitedBy =
        first >= horizon ? "horizon" : seized <= lost ? "seized-risk" : "head-loss-risk";

    double every = horizon;
    String everyBy = "horizon";
    double halfWarning = steady.shortWarningMonths() / 2;
    if (halfWarning < every) {
      every = halfWarning;
      everyBy = "warning-time";
    }
    double again = repeatMonths;
    if (history.finding() == Finding.POWDER || history.finding() == Finding.ONE_STIFF) {
      again = Math.min(again, first);
    }
    if (again < every) {
      every = again;
      everyBy = "repeat-risk";
    }
    every = Math.max(every, SiteTable.FIRST_MONTHS);
    if (!practiceLimits) {
      return new Interval(first, every, first, every, replace, limitedBy, everyBy);
    }
    double heldFirst = hold(first);
    double heldEvery = hold(every);
    return new Interval(
        first,
        every,
        heldFirst,
        heldEvery,
        replace,
        bound(first, heldFirst, limitedBy),
        bound(every, heldEvery, everyBy));
  }

  private static double hold(double months) {
    return Math.min(
        Math.max(months, RiskLimits.PRACTICE_LEAST_MONTHS), RiskLimits.PRACTICE_MOST_MONTHS);
  }

  private static String bound(double free, double held, String otherwise) {
    return held < free ? "practice-upper" : held > free ? "practice-lower" : otherwise;
  }
}
