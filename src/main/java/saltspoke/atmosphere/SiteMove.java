package saltspoke.atmosphere;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import saltspoke.values.Note;

/**
 * How far the sites of a correction file move one quantity at a spot.
 *
 * @param departure per month, to add (its logarithm for a factor)
 * @param varianceLeft per month, share of the model's own variance that remains, 0..1
 * @param movers the sites that count, heaviest first; empty when none is near
 */
record SiteMove(double[] departure, double[] varianceLeft, List<Mover> movers) {
  private static final int MOST_NAMED = 3;

  /** A site with its distance, km, and its weight in the first month that it counts in. */
  record Mover(String site, double km, double weight) {}

  boolean isNone() {
    return movers.isEmpty();
  }

  double meanDeparture() {
    return mean(departure);
  }

  /** Factor on the model's spread of the annual mean, 0..1. */
  double spreadFactor() {
    return Math.sqrt(mean(varianceLeft));
  }

  /** What to tell: how much moved on the year's mean, by which sites, how far away. */
  Note note(CorrectedQuantity quantity) {
    double mean = meanDeparture();
    String named =
        movers.stream()
            .limit(MOST_NAMED)
            .map(m -> String.format(Locale.ROOT, "%s (%.0f km)", m.site(), m.km()))
            .collect(Collectors.joining(", "));
    double moved =
        quantity.isFactor()
            ? Math.round(100 * Math.exp(mean)) / 100.0
            : Math.round(10 * mean) / 10.0;
    return new Note(
        "air-corrected-" + quantity.id(),
        Map.of("moved", moved, "count", movers.size(), "sites", named));
  }

  private static double mean(double[] months) {
    double sum = 0;
    for (double month : months) {
      sum += month / months.length;
    }
    return sum;
  }
}
