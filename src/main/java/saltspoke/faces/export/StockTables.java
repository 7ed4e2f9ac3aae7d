package saltspoke.faces.export;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import saltspoke.advice.StateShares;
import saltspoke.atlas.stock.CustomerAnswer;
import saltspoke.atlas.stock.Pieces;
import saltspoke.atlas.stock.RefusedRow;
import saltspoke.atlas.stock.Split;
import saltspoke.atlas.stock.Splits;
import saltspoke.atlas.stock.StockQuestion;
import saltspoke.faces.Texts;
import saltspoke.values.Note;

/** What comes of a customer list as tables (RFC 4180, UTF-8), one row at a time. */
public final class StockTables {
  private final Texts texts;

  public StockTables(Texts texts) {
    this.texts = texts;
  }

  /** A printer of such a table. */
  public static CSVPrinter printer(Appendable out) throws IOException {
    return new CSVPrinter(out, CSVFormat.RFC4180);
  }

  public static void answeredHeader(CSVPrinter out) throws IOException {
    out.printRecord(
        "line",
        "postcode",
        "place",
        "region",
        "country",
        "wheels",
        "profile",
        "class_carbon_steel",
        "today",
        "today_first_look_months",
        "recommended",
        "first_look_months",
        "every_months",
        "reaches_wanted",
        "notes");
  }

  public void answered(CSVPrinter out, CustomerAnswer answer) throws IOException {
    out.printRecord(
        answer.customer().line(),
        Plain.of(answer.customer().postcode()),
        Plain.of(answer.place()),
        Plain.of(answer.regionName()),
        answer.countryCode(),
        answer.customer().wheels().toPlainString(),
        answer.customer().profile(),
        answer.steelCategory(),
        Split.pairingName(answer.today()),
        number(answer.todayProspect().freeFirstLookMonths()),
        Split.pairingName(answer.taken()),
        number(answer.firstLookMonths()),
        number(answer.everyMonths()),
        answer.enough(),
        Plain.of(notes(answer.notes())));
  }

  private String notes(List<Note> notes) {
    return String.join(" ", notes.stream().map(texts::say).toList());
  }

  /** The columns of the list as it came, after three that say what is wrong. */
  public static void refusedHeader(CSVPrinter out, List<String> header) throws IOException {
    List<String> columns = new ArrayList<>(List.of("line", "reason", "field", "was", "allowed"));
    header.forEach(name -> columns.add(Plain.of(name)));
    out.printRecord(columns);
  }

  public static void refused(CSVPrinter out, RefusedRow row) throws IOException {
    List<Object> cells = new ArrayList<>();
    cells.add(row.row().line());
    cells.add(row.reason().error());
    cells.add(row.reason().field());
    cells.add(Plain.of(row.reason().was()));
    cells.add(row.reason().allowed());
    row.row().cells().forEach(cell -> cells.add(Plain.of(cell)));
    out.printRecord(cells);
  }

  /** Wheels by class, profile and recommended pairing, for every region and for all. */
  public static void split(Appendable to, Splits splits) throws IOException {
    CSVPrinter out = printer(to);
    out.printRecord("country", "region", "of", "key", "wheels", "share_pct");
    splitOf(out, "", "", splits.all());
    for (Map.Entry<Splits.RegionKey, Split> region : splits.byRegion().entrySet()) {
      splitOf(out, region.getKey().countryCode(), region.getKey().regionName(), region.getValue());
    }
  }

  private static void splitOf(CSVPrinter out, String country, String region, Split split)
      throws IOException {
    for (Map.Entry<?, BigDecimal> e : split.byClass().entrySet()) {
      share(out, country, region, "class", e, split);
    }
    for (Map.Entry<?, BigDecimal> e : split.byProfile().entrySet()) {
      share(out, country, region, "profile", e, split);
    }
    for (Map.Entry<?, BigDecimal> e : split.byPairing().entrySet()) {
      share(out, country, region, "pairing", e, split);
    }
  }

  private static void share(
      CSVPrinter out,
      String country,
      String region,
      String of,
      Map.Entry<?, BigDecimal> part,
      Split split)
      throws IOException {
    BigDecimal pct =
        part.getValue()
            .multiply(BigDecimal.valueOf(100))
            .divide(split.wheels(), 3, RoundingMode.HALF_EVEN);
    out.printRecord(
        country, region, of, part.getKey(), part.getValue().toPlainString(), pct.toPlainString());
  }

  /** Wheels in each state at the end of each year if they stay as they are. */
  public static void states(Appendable to, Splits splits) throws IOException {
    CSVPrinter out = printer(to);
    out.printRecord("country", "region", "year", "sound", "attacked", "seized", "lost");
    statesOf(out, "", "", splits.all());
    for (Map.Entry<Splits.RegionKey, Split> region : splits.byRegion().entrySet()) {
      statesOf(out, region.getKey().countryCode(), region.getKey().regionName(), region.getValue());
    }
  }

  private static void statesOf(CSVPrinter out, String country, String region, Split split)
      throws IOException {
    for (int year = 1; year <= StockQuestion.YEARS; year++) {
      StateShares at = split.wheelsByState(year);
      out.printRecord(
          country,
          region,
          year,
          number(at.sound()),
          number(at.attacked()),
          number(at.seized()),
          number(at.lost()));
    }
  }

  /** Looks and rebuilds by calendar month. */
  public static void demand(Appendable to, Splits splits) throws IOException {
    CSVPrinter out = printer(to);
    out.printRecord("country", "region", "month", "looks", "rebuilds");
    demandOf(out, "", "", splits.all());
    for (Map.Entry<Splits.RegionKey, Split> region : splits.byRegion().entrySet()) {
      demandOf(out, region.getKey().countryCode(), region.getKey().regionName(), region.getValue());
    }
  }

  private static void demandOf(CSVPrinter out, String country, String region, Split split)
      throws IOException {
    for (int month = 1; month <= 12; month++) {
      out.printRecord(
          country, region, month, number(split.looks(month)), number(split.rebuilds(month)));
    }
  }

  /** What to order. */
  public static void orders(Appendable to, List<Pieces.Line> lines) throws IOException {
    CSVPrinter out = printer(to);
    out.printRecord("kind", "id", "pieces_needed", "pieces_in_hand", "packs", "order_by_month");
    for (Pieces.Line line : lines) {
      out.printRecord(
          line.article().kind(),
          line.article().id(),
          line.needed(),
          line.inHand(),
          line.packs(),
          line.orderMonth().map(String::valueOf).orElse(""));
    }
  }

  private static String number(double value) {
    return String.format(Locale.ROOT, "%.3f", value);
  }
}
