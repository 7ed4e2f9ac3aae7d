package saltspoke.advice;

import java.util.List;
import saltspoke.wheel.damage.Assumption;
import saltspoke.wheel.damage.Site;

/**
 * The chance that a wheel has reached a state, its worst nipple deciding.
 *
 * <p>In each draw all nipples share the drawn assumptions (that is their correlation) and each has
 * a scatter of its own: nipple j loses exp(σ·z_j) times the median. A nipple is then in a state
 * from the time on at which z_j passes a threshold ζ = min over sites of (ln limit − ln dose)/σ,
 * and a wheel of N nipples is still free of it with chance Φ(ζ)^N. Chances are means over the
 * draws. With the scatter below and a common spread of ln 2 to ln 3 the correlation of ln life
 * between two nipples of a wheel is 0.7 to 0.85.
 */
final class WheelRisk {
  /**
   * Scatter of ln rate between the nipples of one wheel: seat pressure, scratches, where water
   * pools. ASSUMPTION 0.4, spread 0.3..0.55.
   */
  static final double NIPPLE_SCATTER = 0.4;

  private static final State[] STATES = State.values();

  private final int nipples;
  private final double scatter;
  private final SiteTable[] dose;
  private final boolean[] possible = new boolean[STATES.length];
  private final Draws draws;

  /** threshold[state][site][draw]: (ln limit − shift)/σ, infinite where the site cannot do it. */
  private final double[][][] threshold;

  /** Sites that can bring each state about. */
  private final int[][] actors = new int[STATES.length][];

  /**
   * @param sites of one nipple hole
   * @param nipples in the wheel
   * @param draws of the assumptions
   * @param scatter of ln rate between nipples
   * @param steady whether to leave seasons out
   */
  WheelRisk(List<Site> sites, int nipples, Draws draws, double scatter, boolean steady) {
    this(sites, nipples, draws, scatter, tables(sites, steady), null);
  }

  private WheelRisk(
      List<Site> sites,
      int nipples,
      Draws draws,
      double scatter,
      SiteTable[] dose,
      double[][][] known) {
    this.nipples = nipples;
    this.scatter = scatter;
    this.draws = draws;
    this.dose = dose;
    for (int s = 0; s < STATES.length; s++) {
      int state = s;
      actors[s] =
          java.util.stream.IntStream.range(0, sites.size())
              .filter(i -> Double.isFinite(limit(sites.get(i), STATES[state])))
              .toArray();
      possible[s] = actors[s].length > 0;
    }
    threshold = known != null ? known : thresholds(sites);
  }

  /** The same risk at the year's mean pace. */
  WheelRisk steady(List<Site> sites) {
    return new WheelRisk(sites, nipples, draws, scatter, tables(sites, true), threshold);
  }

  private static SiteTable[] tables(List<Site> sites, boolean steady) {
    return sites.stream().map(site -> SiteTable.of(site, steady)).toArray(SiteTable[]::new);
  }

  private double[][][] thresholds(List<Site> sites) {
    double[][][] found = new double[STATES.length][sites.size()][Draws.COUNT];
    for (int i = 0; i < sites.size(); i++) {
      double[] shift = sites.get(i).lnShift();
      for (int n = 0; n < Draws.COUNT; n++) {
        double[] z = draws.row(n);
        double moved = 0;
        for (int k = 0; k < shift.length; k++) {
          moved += shift[k] * z[k];
        }
        for (State state : STATES) {
          double limit = limit(sites.get(i), state);
          found[state.ordinal()][i][n] =
              Double.isFinite(limit)
                  ? (Math.log(limit) + limitShift(sites.get(i), state, z) - moved) / scatter
                  : Double.POSITIVE_INFINITY;
        }
      }
    }
    return found;
  }

  private static double limit(Site site, State state) {
    return switch (state) {
      case ATTACKED -> site.visibleUm();
      case SEIZED -> site.seizedUm();
      case LOST -> site.lostUm();
    };
  }

  /** What shows at a thread is part of what seizes it, so both limits move together there. */
  private static double limitShift(Site site, State state, double[] z) {
    double gap = z[Assumption.SEIZING_GAP.ordinal()] * Assumption.SEIZING_GAP.lnSpread();
    double visible = z[Assumption.VISIBLE_DEPTH.ordinal()] * Assumption.VISIBLE_DEPTH.lnSpread();
    return switch (state) {
      case ATTACKED -> site.cause().equals("thread") ? gap + visible / 2 : visible;
      case SEIZED -> gap;
      case LOST -> z[Assumption.HEAD_MARGIN.ordinal()] * Assumption.HEAD_MARGIN.lnSpread();
    };
  }

  /** Whether any site can bring the state about. */
  boolean possible(State state) {
    return possible[state.ordinal()];
  }

  /** The site whose median nipple gets there first; −1 for none. */
  int leader(State state) {
    int s = state.ordinal();
    int first = -1;
    double least = Double.POSITIVE_INFINITY;
    for (int i : actors[s]) {
      double mean = 0;
      for (int n = 0; n < Draws.COUNT; n++) {
        mean += threshold[s][i][n] / Draws.COUNT;
      }
      double place = dose[i].placeOf(mean * scatter);
      if (first < 0 || place < least) {
        least = place;
        first = i;
      }
    }
    return first;
  }

  /** ζ of a state in draw n at ln doses already looked up; worse states count as this one too. */
  private double zeta(int s, int n, double[] lnUm) {
    double least = Double.POSITIVE_INFINITY;
    for (int t = s; t < STATES.length; t++) {
      for (int i : actors[t]) {
        least = Math.min(least, threshold[t][i][n] - lnUm[i] / scatter);
      }
    }
    return least;
  }

  private double[] lnUm(double months) {
    double place = SiteTable.place(months);
    double[] found = new double[dose.length];
    for (int i = 0; i < found.length; i++) {
      found[i] = dose[i].lnUmAt(place);
    }
    return found;
  }

  /** Chance that a wheel has reached the state after some months in service. */
  double chance(State state, double months) {
    double[] at = lnUm(months);
    double free = 0;
    for (int n = 0; n < Draws.COUNT; n++) {
      free += Math.exp(nipples * Normal.lnCdf(zeta(state.ordinal(), n, at)));
    }
    return 1 - free / Draws.COUNT;
  }

  /** Chance of it some months from now, for a wheel of which the last look found something. */
  double chance(State state, double months, History history) {
    if (history.isNew()) {
      return chance(state, months);
    }
    double[] then = lnUm(history.ageMonths());
    double[] at = lnUm(history.ageMonths() + months);
    double[] lnWeight = new double[Draws.COUNT];
    double[] free = new double[Draws.COUNT];
    double most = Double.NEGATIVE_INFINITY;
    for (int n = 0; n < Draws.COUNT; n++) {
      double[] zetas = {zeta(0, n, then), zeta(1, n, then), zeta(2, n, then)};
      Evidence evidence = Evidence.of(history, zetas, nipples);
      lnWeight[n] = evidence.lnWeight();
      free[n] = evidence.freeShare(state, zeta(state.ordinal(), n, at));
      most = Math.max(most, lnWeight[n]);
    }
    double weights = 0;
    double sum = 0;
    for (int n = 0; n < Draws.COUNT; n++) {
      double weight = Math.exp(lnWeight[n] - most);
      weights += weight;
      sum += weight * free[n];
    }
    return 1 - sum / weights;
  }

  /** Months from now at which the chance reaches a level; infinite beyond the horizon. */
  double monthsTo(State state, double level, History history, double horizonMonths) {
    if (!possibleOrWorse(state)) {
      return Double.POSITIVE_INFINITY;
    }
    double low = 0;
    double high = SiteTable.place(horizonMonths);
    if (chance(state, horizonMonths, history) < level) {
      return Double.POSITIVE_INFINITY;
    }
    if (chance(state, SiteTable.FIRST_MONTHS, history) >= level) {
      return history.isNew() ? SiteTable.FIRST_MONTHS : 0;
    }
    for (int i = 0; i < 13; i++) {
      double middle = (low + high) / 2;
      if (chance(state, SiteTable.months(middle), history) >= level) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return SiteTable.months(high);
  }

  private boolean possibleOrWorse(State state) {
    for (int s = state.ordinal(); s < STATES.length; s++) {
      if (possible[s]) {
        return true;
      }
    }
    return false;
  }

  /**
   * The 10 % quantile of the time from first attack to seized, months; infinite when none seizes.
   */
  double shortWarningMonths() {
    double[] gaps = new double[Draws.COUNT];
    for (int n = 0; n < Draws.COUNT; n++) {
      double worst = Normal.quantile(Math.pow(draws.worst(n), 1.0 / nipples));
      double attacked = SiteTable.months(place(State.ATTACKED, n, worst));
      double place = place(State.SEIZED, n, worst);
      gaps[n] =
          place >= SiteTable.POINTS - 1
              ? Double.POSITIVE_INFINITY
              : SiteTable.months(place) - attacked;
    }
    java.util.Arrays.sort(gaps);
    return gaps[Draws.COUNT / 10];
  }

  private double place(State state, int n, double worst) {
    double first = SiteTable.POINTS - 1;
    for (int t = state.ordinal(); t < STATES.length; t++) {
      for (int i : actors[t]) {
        first = Math.min(first, dose[i].placeOf((threshold[t][i][n] - worst) * scatter));
      }
    }
    return first;
  }
}
