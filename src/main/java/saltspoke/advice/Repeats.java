package saltspoke.advice;

import java.util.EnumMap;
import java.util.IdentityHashMap;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;

/**
 * How far apart looks may lie once the first has come (delay-time rule), worked out for each site
 * alone: the first look comes at the dose at which the accepted chance of a seized nipple or a lost
 * head is reached; the next at the dose at which the same chance is passed once more by wheels that
 * the first look found clean, of all wheels looked at. Powder that is seen is acted upon.
 *
 * <p>Both doses hang on the limits and their spreads alone, and a loss whose rate does not rise
 * covers the way between them no slower when its rate is higher: a harsher year never lengthens
 * what this gives. Serves one thread.
 */
final class Repeats {
  private static final int HALVINGS = 40;

  private final RiskLimits limits;
  private final WorstOf worst;
  private final Map<LookKind, Map<SiteRisk, Double>> known = new EnumMap<>(LookKind.class);

  /**
   * @param limits accepted chances
   * @param worst of the wheel's nipples
   */
  Repeats(RiskLimits limits, WorstOf worst) {
    this.limits = limits;
    this.worst = worst;
  }

  /** The shortest of the sites, months; infinite beyond the horizon. */
  double months(Iterable<SiteRisk> sites, LookKind look) {
    Map<SiteRisk, Double> ofLook = known.computeIfAbsent(look, l -> new IdentityHashMap<>());
    double least = Double.POSITIVE_INFINITY;
    for (SiteRisk site : sites) {
      least = Math.min(least, ofLook.computeIfAbsent(site, s -> workOut(s, look)));
    }
    return least;
  }

  private double workOut(SiteRisk site, LookKind look) {
    SiteTable table = site.table(true);
    double first =
        Math.min(
            reaching(table, limits.seized(), dose -> chance(site, State.SEIZED, dose)),
            reaching(table, limits.lost(), dose -> chance(site, State.LOST, dose)));
    if (first == Double.POSITIVE_INFINITY) {
      return first;
    }
    Evidence clean = new Evidence(new History(1, Finding.CLEAN, look.finds(State.ATTACKED)), worst);
    double next =
        Math.min(
            reaching(
                table, limits.seized(), dose -> unseen(site, clean, State.SEIZED, first, dose)),
            reaching(table, limits.lost(), dose -> unseen(site, clean, State.LOST, first, dose)));
    return table.monthsAt(next) - table.monthsAt(first);
  }

  /** Dose, as the table has it, at which a rising chance reaches a level; infinite beyond it. */
  private static double reaching(SiteTable table, double level, DoubleUnaryOperator chance) {
    double low = table.least();
    double high = table.most();
    if (chance.applyAsDouble(high) < level) {
      return Double.POSITIVE_INFINITY;
    }
    for (int i = 0; i < HALVINGS && high - low > 1e-6; i++) {
      double middle = (low + high) / 2;
      if (chance.applyAsDouble(middle) < level) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return high;
  }

  private double chance(SiteRisk site, State state, double dose) {
    double free = 0;
    for (double threshold : site.thresholds(state)) {
      free += worst.none(threshold - dose);
    }
    return 1 - free / Draws.COUNT;
  }

  /** Chance that a wheel was found clean at one dose and has reached the state at another. */
  private static double unseen(
      SiteRisk site, Evidence clean, State state, double then, double dose) {
    double[] attacked = site.thresholds(State.ATTACKED);
    double[] seized = site.thresholds(State.SEIZED);
    double[] lost = site.thresholds(State.LOST);
    double[] threshold = site.thresholds(state);
    double reached = 0;
    for (int n = 0; n < Draws.COUNT; n++) {
      double a = attacked[n] - then;
      double s = seized[n] - then;
      double l = lost[n] - then;
      reached += clean.weight(a, s, l) - clean.free(state, threshold[n] - dose, a, s, l);
    }
    return reached / Draws.COUNT;
  }
}
