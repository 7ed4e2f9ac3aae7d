package saltspoke.advice;

import java.util.Arrays;
import java.util.List;

/**
 * The chance that a wheel has reached a state, its worst nipple deciding.
 *
 * <p>In each draw all nipples share the drawn assumptions (that is their correlation) and each has
 * a scatter of its own: nipple j loses exp(σ·z_j) times the median. A nipple is then in a state
 * from the time on at which z_j passes a threshold ζ = min over sites of (ln limit − ln dose)/σ,
 * and a wheel of N nipples is still free of it with chance Φ(ζ)^N. Chances are means over the
 * draws. With the scatter below and a common spread of ln 1.8 to ln 2.5 the correlation of ln life
 * between two nipples of a wheel is 0.7 to 0.85. Serves one thread.
 */
final class WheelRisk {
  /**
   * Scatter of ln rate between the nipples of one wheel: seat pressure, scratches, where water
   * pools. ASSUMPTION 0.4, spread 0.3..0.55.
   */
  static final double NIPPLE_SCATTER = 0.4;

  private final SiteRisk[] sites;
  private final WorstOf worst;
  private final boolean steady;
  private final double[] zeta = new double[Draws.COUNT];

  /** Chances already worked out, by state and step of time; −1 for none yet. */
  private final double[][] known = new double[State.values().length][];

  private Belief belief;

  /**
   * @param sites of one nipple hole
   * @param worst of the wheel's nipples
   * @param steady whether to leave seasons out
   */
  WheelRisk(List<SiteRisk> sites, WorstOf worst, boolean steady) {
    this.sites = sites.toArray(SiteRisk[]::new);
    this.worst = worst;
    this.steady = steady;
  }

  /** The same risk at the year's mean pace. */
  WheelRisk atMeanPace() {
    return new WheelRisk(List.of(sites), worst, true);
  }

  /** The site whose median nipple gets to the state first; null when none has a limit for it. */
  SiteRisk leader(State state) {
    SiteRisk first = null;
    double least = Double.POSITIVE_INFINITY;
    for (SiteRisk site : sites) {
      if (site.has(state)) {
        double place = site.medianPlace(state);
        if (first == null || place < least) {
          least = place;
          first = site;
        }
      }
    }
    return first;
  }

  /** Fills in the thresholds ζ of a state at a place in time, one per draw. */
  private double[] zetas(State state, double place, double[] zeta) {
    boolean first = true;
    for (SiteRisk site : sites) {
      if (site.canCause(state)) {
        double done = site.table(steady).at(place);
        double[] threshold = site.thresholds(state);
        for (int n = 0; n < zeta.length; n++) {
          double z = threshold[n] - done;
          zeta[n] = first || z < zeta[n] ? z : zeta[n];
        }
        first = false;
      }
    }
    if (first) {
      Arrays.fill(zeta, Double.POSITIVE_INFINITY);
    }
    return zeta;
  }

  private double chanceAt(State state, double place) {
    double free = 0;
    for (double z : zetas(state, place, zeta)) {
      free += worst.none(z);
    }
    return 1 - free / zeta.length;
  }

  /** Chance that a new wheel has reached the state after some months in service. */
  double chance(State state, double months) {
    return chanceAt(state, SiteTable.place(months));
  }

  /** Chance of it some months from now, for a wheel of which the last look found something. */
  double chance(State state, double months, History history) {
    return history.isNew() ? chance(state, months) : believing(history).chance(state, months);
  }

  private Belief believing(History history) {
    if (belief == null || !belief.history.equals(history)) {
      belief = new Belief(history);
    }
    return belief;
  }

  /** Months from now at which the chance reaches a level; infinite beyond the horizon. */
  double monthsTo(State state, double level, History history, double horizonMonths) {
    if (Arrays.stream(sites).noneMatch(site -> site.canCause(state))) {
      return Double.POSITIVE_INFINITY;
    }
    Belief given = history.isNew() ? null : believing(history);
    int low = 0;
    int high = (int) Math.ceil(SiteTable.place(horizonMonths));
    double atHigh = chanceAtStep(state, high, given);
    if (atHigh < level) {
      return Double.POSITIVE_INFINITY;
    }
    double atLow = chanceAtStep(state, low, given);
    if (atLow >= level) {
      return history.isNew() ? SiteTable.FIRST_MONTHS : 0;
    }
    while (high - low > 1) {
      int middle = (low + high) >>> 1;
      double at = chanceAtStep(state, middle, given);
      if (at >= level) {
        high = middle;
        atHigh = at;
      } else {
        low = middle;
        atLow = at;
      }
    }
    double months = SiteTable.months(low + (level - atLow) / (atHigh - atLow));
    return months > horizonMonths ? Double.POSITIVE_INFINITY : months;
  }

  /** Whether no draw explains the finding, so that the look is to be trusted over the model. */
  boolean surprisedBy(History history) {
    return !history.isNew() && believing(history).surprising;
  }

  private double chanceAtStep(State state, int step, Belief given) {
    if (given != null) {
      return given.chance(state, SiteTable.months(step));
    }
    double[] chances = known[state.ordinal()];
    if (chances == null) {
      chances = new double[SiteTable.POINTS];
      Arrays.fill(chances, -1);
      known[state.ordinal()] = chances;
    }
    if (chances[step] < 0) {
      chances[step] = chanceAt(state, step);
    }
    return chances[step];
  }

  /**
   * The 10 % quantile of the time from first attack to seized at the place that gives the shortest
   * warning, months; infinite when fewer than that seize with a warning. What shows elsewhere first
   * is not counted on, so that a rate that rises never lengthens it; a spoke under zinc is left
   * out, since the zinc's own white rust comes long before.
   */
  double shortWarningMonths() {
    double[] gaps = new double[Draws.COUNT];
    Arrays.fill(gaps, Double.POSITIVE_INFINITY);
    for (SiteRisk site : sites) {
      if (site.warns()) {
        for (int n = 0; n < gaps.length; n++) {
          gaps[n] = Math.min(gaps[n], warningMonths(site, n));
        }
      }
    }
    Arrays.sort(gaps);
    return gaps[gaps.length / 10];
  }

  private double warningMonths(SiteRisk site, int n) {
    SiteTable table = site.table(steady);
    double seized = table.placeOf(site.thresholds(State.SEIZED)[n] - worst.worst(n));
    if (seized >= SiteTable.POINTS - 1) {
      return Double.POSITIVE_INFINITY;
    }
    double attacked = table.placeOf(site.thresholds(State.ATTACKED)[n] - worst.worst(n));
    return SiteTable.months(seized) - SiteTable.months(attacked);
  }

  /**
   * What a finding at an age leaves of each draw. A finding that no draw can explain (a clean wheel
   * where all say it should be eaten) leaves the half of the draws that come nearest: those in
   * which the worst nipple is slowest.
   */
  private final class Belief {
    private final History history;
    private final Evidence evidence;
    private final double[] attacked;
    private final double[] seized;
    private final double[] lost;
    private final boolean surprising;
    private double weights;

    Belief(History history) {
      this.history = history;
      evidence = new Evidence(history, worst);
      double place = SiteTable.place(history.ageMonths());
      attacked = zetas(State.ATTACKED, place, new double[Draws.COUNT]);
      seized = zetas(State.SEIZED, place, new double[Draws.COUNT]);
      lost = zetas(State.LOST, place, new double[Draws.COUNT]);
      for (int n = 0; n < attacked.length; n++) {
        weights += evidence.weight(attacked[n], seized[n], lost[n]);
      }
      surprising = weights < 1e-9;
    }

    double chance(State state, double months) {
      double[] zeta =
          zetas(state, SiteTable.place(history.ageMonths() + months), WheelRisk.this.zeta);
      if (surprising) {
        return surprised(zeta);
      }
      double free = 0;
      for (int n = 0; n < zeta.length; n++) {
        free += evidence.free(state, zeta[n], attacked[n], seized[n], lost[n]);
      }
      return Math.max(0, 1 - free / weights);
    }

    private double surprised(double[] zeta) {
      double[] sorted = zeta.clone();
      Arrays.sort(sorted);
      int half = sorted.length / 2;
      int from = history.finding() == Finding.CLEAN ? half : 0;
      double free = 0;
      for (int n = from; n < from + half; n++) {
        free += worst.none(sorted[n]);
      }
      return 1 - free / half;
    }
  }
}
