package saltspoke.advice;

/**
 * Wheels with one site that a look at one dose found clean. What does not hang on the later dose is
 * worked out once: the same as {@link Evidence} of a clean look says, at a quarter of the work.
 */
final class FoundClean {
  private final SiteRisk site;
  private final WorstOf worst;
  private final double[] noneAttacked = new double[Draws.COUNT];
  private final double[] noneSeized = new double[Draws.COUNT];
  private final double missed;

  /**
   * @param chanceToSee that the look finds an attack which is there, 0..1
   * @param then dose at the look, as the site's table has it
   */
  FoundClean(SiteRisk site, WorstOf worst, double chanceToSee, double then) {
    this.site = site;
    this.worst = worst;
    this.missed = 1 - chanceToSee;
    double[] attacked = site.thresholds(State.ATTACKED);
    double[] seized = site.thresholds(State.SEIZED);
    for (int n = 0; n < Draws.COUNT; n++) {
      noneAttacked[n] = worst.none(attacked[n] - then);
      noneSeized[n] = worst.none(seized[n] - then);
    }
  }

  /** Chance, of all wheels looked at, to be found clean and to reach a state by a later dose. */
  double chance(State state, double dose) {
    double[] threshold = site.thresholds(state);
    double reached = 0;
    for (int n = 0; n < Draws.COUNT; n++) {
      double free = worst.none(threshold[n] - dose);
      // None passes the lesser of two thresholds with the lesser of two chances.
      reached +=
          (1 - missed) * Math.max(0, noneAttacked[n] - free)
              + missed * Math.max(0, noneSeized[n] - free);
    }
    return reached / Draws.COUNT;
  }
}
