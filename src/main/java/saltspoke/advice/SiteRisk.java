package saltspoke.advice;

import saltspoke.wheel.damage.Assumption;
import saltspoke.wheel.damage.Site;

/**
 * A site ready for drawing fates: its dose over time with and without seasons, and for every draw
 * the standing z above which a nipple's own scatter brings each state about. Shared by all pairings
 * that have the site.
 */
final class SiteRisk {
  private static final State[] STATES = State.values();

  private final Site site;
  private final SiteTable seasons;
  private final SiteTable steady;
  private final double scatter;

  /** threshold[state][draw], in units of scatter: this state or a worse one. */
  private final double[][] threshold = new double[STATES.length][Draws.COUNT];

  SiteRisk(Site site, Draws draws, double scatter) {
    this.site = site;
    this.scatter = scatter;
    seasons = new SiteTable(site.dose(), scatter);
    steady = new SiteTable(site.dose().steady(), scatter);
    double[] lnLimit = new double[STATES.length];
    for (State state : STATES) {
      lnLimit[state.ordinal()] = Math.log(limit(state));
    }
    for (int n = 0; n < Draws.COUNT; n++) {
      double[] z = draws.row(n);
      double moved = 0;
      for (int k = 0; k < z.length; k++) {
        moved += site.lnShift()[k] * z[k];
      }
      double worse = Double.POSITIVE_INFINITY;
      for (int s = STATES.length - 1; s >= 0; s--) {
        double own = (lnLimit[s] + limitShift(STATES[s], z) - moved) / scatter;
        worse = Math.min(worse, own);
        threshold[s][n] = worse;
      }
    }
  }

  Site site() {
    return site;
  }

  SiteTable table(boolean withoutSeasons) {
    return withoutSeasons ? steady : seasons;
  }

  double[] thresholds(State state) {
    return threshold[state.ordinal()];
  }

  /** Whether this site can bring the state about; a worse one counts. */
  boolean canCause(State state) {
    return threshold[state.ordinal()][0] < Double.POSITIVE_INFINITY;
  }

  /** Whether this site has a limit of its own for the state. */
  boolean has(State state) {
    return Double.isFinite(limit(state));
  }

  /**
   * Whether it seizes after showing, from the first month on and not only after a shield is gone.
   */
  boolean warns() {
    return has(State.SEIZED) && has(State.ATTACKED) && site.dose().um(1) > 0;
  }

  /** Place in time at which the median nipple of the median wheel gets there. */
  double medianPlace(State state) {
    return seasons.placeOf(Math.log(limit(state)) / scatter);
  }

  private double limit(State state) {
    return switch (state) {
      case ATTACKED -> site.visibleUm();
      case SEIZED -> site.seizedUm();
      case LOST -> site.lostUm();
    };
  }

  /** What shows at a thread is part of what seizes it, so both limits move together there. */
  private double limitShift(State state, double[] z) {
    double gap = z[Assumption.SEIZING_GAP.ordinal()] * Assumption.SEIZING_GAP.lnSpread();
    double visible = z[Assumption.VISIBLE_DEPTH.ordinal()] * Assumption.VISIBLE_DEPTH.lnSpread();
    return switch (state) {
      case ATTACKED ->
          site.cause().equals("thread") || site.cause().equals("wear")
              ? gap + visible / 2
              : visible;
      case SEIZED -> gap;
      case LOST -> z[Assumption.HEAD_MARGIN.ordinal()] * Assumption.HEAD_MARGIN.lnSpread();
    };
  }
}
