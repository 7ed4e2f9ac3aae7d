package saltspoke.atlas;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import saltspoke.values.Refusal;

/**
 * The outcome of comparing a station file with the program's estimates.
 *
 * @param kind {@code climate}, {@code wetness}, {@code chloride} or {@code corrosion}
 * @param series one per quantity, most important first
 * @param refused rows and stations that could not be read, with file and line; the rest was judged
 */
public record Comparison(String kind, List<Series> series, List<Refusal> refused) {
  public Comparison {
    series = List.copyOf(series);
    refused = List.copyOf(refused);
  }

  /**
   * The pairs of one quantity with their judgement.
   *
   * @param ratioScale whether ratios mean something for it
   */
  public record Series(String quantity, boolean ratioScale, List<Pair> pairs, Judgement judgement) {
    public Series {
      pairs = List.copyOf(pairs);
    }

    static Series of(String quantity, boolean ratioScale, List<Pair> pairs) {
      return new Series(quantity, ratioScale, pairs, Judgement.of(quantity, ratioScale, pairs));
    }

    /** The pairs farthest off: by ratio where that means something, else by difference. */
    public List<Pair> worst(int count) {
      Comparator<Pair> off =
          Comparator.comparingDouble(
              p ->
                  ratioScale && p.measured() > 0 && p.estimated() > 0
                      ? -Math.abs(Math.log(p.estimated() / p.measured()))
                      : -Math.abs(p.error()));
      return pairs.stream().sorted(off).limit(count).toList();
    }
  }

  /** Gathers pairs by quantity and leaves out quantities without any. */
  static final class Gather {
    private final List<Series> series = new ArrayList<>();

    void add(String quantity, boolean ratioScale, List<Pair> pairs) {
      if (!pairs.isEmpty()) {
        series.add(Series.of(quantity, ratioScale, pairs));
      }
    }

    Comparison comparison(String kind, List<Refusal> refused) {
      return new Comparison(kind, series, refused);
    }
  }
}
