package saltspoke.atlas.stock;

import java.util.Collections;
import java.util.Map;
import java.util.TreeMap;

/** The splits of all customers and of each region, and what to order for them. */
public final class Splits {
  /** A region of a country; the name is empty when it is not known. */
  public record RegionKey(String countryCode, String regionName) implements Comparable<RegionKey> {
    @Override
    public int compareTo(RegionKey other) {
      int country = countryCode.compareTo(other.countryCode);
      return country != 0 ? country : regionName.compareTo(other.regionName);
    }
  }

  private final StockQuestion question;
  private final Split all = new Split();
  private final Map<RegionKey, Split> byRegion = new TreeMap<>();
  private final Map<Pieces.Article, double[]> pieces = new TreeMap<>();
  private long mended;

  public Splits(StockQuestion question) {
    this.question = question;
  }

  /** Adds a customer. */
  public void add(CustomerAnswer answer) {
    all.add(answer, question.buildMonth());
    byRegion
        .computeIfAbsent(
            new RegionKey(answer.countryCode(), answer.regionName()), key -> new Split())
        .add(answer, question.buildMonth());
    if (!answer.notes().isEmpty()
        && answer.notes().stream()
            .anyMatch(
                note ->
                    note.code().startsWith("stock-mended")
                        || note.code().equals("place-postcode-zeros-added"))) {
      mended++;
    }
    double perWheel = question.build().spokeCount() * answer.customer().wheels().doubleValue();
    need(new Pieces.Article("nipple", answer.taken().nipple()), answer, perWheel);
    if (!answer.taken().between().equals("none")) {
      need(new Pieces.Article("interface", answer.taken().between()), answer, perWheel);
    }
  }

  private void need(Pieces.Article article, CustomerAnswer answer, double perWheel) {
    double[] months = pieces.computeIfAbsent(article, a -> new double[12]);
    for (int m = 0; m < 12; m++) {
      months[m] += perWheel * answer.todayProspect().seizedInMonth().get(m);
    }
  }

  /** All customers together. */
  public Split all() {
    return all;
  }

  /** By region, in the order of country and name. */
  public Map<RegionKey, Split> byRegion() {
    return Collections.unmodifiableMap(byRegion);
  }

  /** Rows in which something was mended. */
  public long mended() {
    return mended;
  }

  /** Pieces needed by calendar month, January first, per article. */
  Map<Pieces.Article, double[]> pieces() {
    return pieces;
  }
}
