package saltspoke.atlas.stock;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What to order for a year's rebuilds: wheels of today's pairing that are expected to seize are
 * rebuilt with the recommended one, every nipple new. The year starts in the month in which wheels
 * go into service.
 */
public final class Pieces {
  private static final double WEEKS_PER_MONTH = 365.25 / 7 / 12;

  /**
   * Something held in stock.
   *
   * @param kind {@code nipple} or {@code interface}
   * @param id catalogue id
   */
  public record Article(String kind, String id) implements Comparable<Article> {
    @Override
    public int compareTo(Article other) {
      int kinds = other.kind.compareTo(kind);
      return kinds != 0 ? kinds : id.compareTo(other.id);
    }
  }

  /**
   * How the shop buys.
   *
   * @param packSize pieces in a pack, at least 1
   * @param leadWeeks weeks from order to delivery, at least 0
   * @param inHand pieces in hand per article; 0 for those that are missing
   */
  public record Buying(int packSize, double leadWeeks, Map<Article, Long> inHand) {
    public Buying {
      inHand = Map.copyOf(inHand);
    }
  }

  /**
   * One line of an order.
   *
   * @param needed pieces needed in the year, rounded up
   * @param inHand pieces in hand
   * @param packs packs to order
   * @param orderMonth calendar month by which to order, 1..12; empty when nothing is to be ordered
   */
  public record Line(
      Article article, long needed, long inHand, long packs, Optional<Integer> orderMonth) {}

  private Pieces() {}

  /** The lines for all articles that are needed. */
  public static List<Line> order(Splits splits, Buying buying, int firstMonth) {
    List<Line> lines = new ArrayList<>();
    splits
        .pieces()
        .forEach((article, months) -> lines.add(line(article, months, buying, firstMonth)));
    return lines;
  }

  private static Line line(Article article, double[] months, Buying buying, int firstMonth) {
    double all = 0;
    for (double month : months) {
      all += month;
    }
    long needed = (long) Math.ceil(all - 1e-9);
    long inHand = buying.inHand().getOrDefault(article, 0L);
    long missing = Math.max(0, needed - inHand);
    long packs = (missing + buying.packSize() - 1) / buying.packSize();
    Optional<Integer> by = Optional.empty();
    double used = 0;
    for (int k = 0; k < 12 && packs > 0 && by.isEmpty(); k++) {
      int month = (firstMonth - 1 + k) % 12;
      used += months[month];
      if (used > inHand) {
        int early = (int) Math.ceil(buying.leadWeeks() / WEEKS_PER_MONTH - 1e-9);
        by = Optional.of(Math.floorMod(month - early, 12) + 1);
      }
    }
    return new Line(article, needed, inHand, packs, by);
  }
}
