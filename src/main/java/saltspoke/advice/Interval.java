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
   * seized), and no farther than until the same chances are passed once more by wheels that look
   * found clean, of all wheels looked at (delay-time rule): powder that is seen is acted upon. For
   * a wheel of which the last look found something else, the chances are those given that finding.
   *
   * @param risk with seasons, for the first look and the replacement
   * @param steady at the year's mean pace, for the repeats
   */
  static Interval of(
      WheelRisk risk,
      WheelRisk steady,
      History history,
      RiskLimits limits,
      LookKind look,
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
    double paced =
        Math.min(
            steady.monthsTo(State.SEIZED, limits.seized(), history, horizon),
            steady.monthsTo(State.LOST, limits.lost(), history, horizon));
    if (paced < horizon) {
      boolean plan = history.finding() == Finding.NOT_LOOKED;
      History then =
          new History(
              Math.max(history.ageMonths() + paced, SiteTable.FIRST_MONTHS),
              plan ? Finding.CLEAN : history.finding(),
              look.finds(State.ATTACKED));
      // A plan counts all wheels: those found clean are few when attack comes early.
      double found = plan ? Math.max(steady.chanceOf(then), 0.01) : 1;
      double again =
          Math.min(
              steady.monthsTo(State.SEIZED, level(limits.seized() / found), then, horizon),
              steady.monthsTo(State.LOST, level(limits.lost() / found), then, horizon));
      if (again < every) {
        every = again;
        everyBy = "repeat-risk";
      }
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

  private static double level(double chance) {
    return Math.min(chance, 0.99);
  }

  private static double hold(double months) {
    return Math.min(
        Math.max(months, RiskLimits.PRACTICE_LEAST_MONTHS), RiskLimits.PRACTICE_MOST_MONTHS);
  }

  private static String bound(double free, double held, String otherwise) {
    return held < free ? "practice-upper" : held > free ? "practice-lower" : otherwise;
  }
}
