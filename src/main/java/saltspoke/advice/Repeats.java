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
  /** Error of a dose, as the table has it: a millionth of the scatter. */
  private static final double DOSE_ERROR = 1e-6;

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
    FoundClean clean = new FoundClean(site, worst, look.finds(State.ATTACKED), first);
    double next =
        Math.min(
            reaching(table, limits.seized(), dose -> clean.chance(State.SEIZED, dose)),
            reaching(table, limits.lost(), dose -> clean.chance(State.LOST, dose)));
    return table.monthsAt(next) - table.monthsAt(first);
  }

  /** Dose, as the table has it, at which a rising chance reaches a level; infinite beyond it. */
  private static double reaching(SiteTable table, double level, DoubleUnaryOperator chance) {
    if (chance.applyAsDouble(table.most()) < level) {
      return Double.POSITIVE_INFINITY;
    }
    return Root.ofRising(
        dose -> chance.applyAsDouble(dose) - level, table.least(), table.most(), DOSE_ERROR);
  }

  private double chance(SiteRisk site, State state, double dose) {
    double free = 0;
    for (double threshold : site.thresholds(state)) {
      free += worst.none(threshold - dose);
    }
    return 1 - free / Draws.COUNT;
  }
}
