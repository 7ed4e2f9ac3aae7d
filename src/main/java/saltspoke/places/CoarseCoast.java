package saltspoke.places;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/**
 * The coarse coast of the world, put in order for each square of two degrees that is asked about:
 * neighbours share what can be seen from them, so that a map does not look at every bin anew.
 */
final class CoarseCoast {
  /**
   * Squares whose order is kept; then the keeping starts over, which costs a map next to nothing.
   */
  private static final int MOST_KEPT = 2048;

  /**
   * Bins from near to far.
   *
   * @param leastM ascending; no point of the square is nearer to anything in the bin, m of chord
   */
  record Order(CoastBin[] bins, double[] leastM) {}

  private record Ranked(CoastBin bin, double leastM) {}

  private final List<CoastBin> bins;
  private final double horizonM;
  private final Map<Integer, Order> kept = new ConcurrentHashMap<>();

  /**
   * @param bins those that hold coast
   * @param horizonM farther bins are left out, unless they may hold the nearest coast, m of chord
   */
  CoarseCoast(List<CoastBin> bins, double horizonM) {
    this.bins = List.copyOf(bins);
    this.horizonM = horizonM;
  }

  /** The order for the square around a point. */
  Order from(double latitudeDeg, double longitudeDeg) {
    int key = CoastBin.keyOf(latitudeDeg, longitudeDeg);
    Order order = kept.get(key);
    if (order == null) {
      if (kept.size() >= MOST_KEPT) {
        kept.clear();
      }
      order = order(CoastBin.empty(latitudeDeg, longitudeDeg));
      kept.put(key, order);
    }
    return order;
  }

  private Order order(CoastBin square) {
    double surelyM = Double.POSITIVE_INFINITY;
    for (CoastBin bin : bins) {
      surelyM = Math.min(surelyM, square.mostM(bin));
    }
    double limitM = Math.max(horizonM, surelyM);
    List<Ranked> ranked = new ArrayList<>();
    for (CoastBin bin : bins) {
      double leastM = square.leastM(bin);
      if (leastM <= limitM) {
        ranked.add(new Ranked(bin, leastM));
      }
    }
    ranked.sort(Comparator.comparingDouble(Ranked::leastM));
    return new Order(
        ranked.stream().map(Ranked::bin).toArray(CoastBin[]::new),
        ranked.stream().mapToDouble(Ranked::leastM).toArray());
  }
}
