package saltspoke.atmosphere;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import saltspoke.sources.CsvTable;
import saltspoke.sources.CsvWriter;
import saltspoke.values.Refusal;

/** The table of site corrections: its columns are named here alone. */
public final class CorrectionFile {
  private static final List<String> COLUMNS =
      List.of(
          "site",
          "latitude_deg",
          "longitude_deg",
          "elevation_m",
          "sea_distance_km",
          "quantity",
          "month",
          "kind",
          "amount",
          "spread");

  private static final List<String> EXPLANATION =
      List.of(
          "Site corrections: how far measurements lie from the model. Later answers near a site are"
              + " moved with air, advise, sensitivity or serve --corrections FILE.",
          "sea_distance_km: distance to the nearest sea.",
          "quantity and kind: temperature add (K); relative-humidity add (points);"
              + " chloride multiply (factor); wet-hours multiply (factor on a month's wet hours as they"
              + " follow from its temperature and humidity).",
          "month: 1..12, or empty for every month of the year.",
          "spread: one standard deviation of the corrected value at the site, in the unit of the"
              + " amount, of its natural logarithm for a factor; 0 to meet it exactly.");

  private static final int LONGEST_NAME = 80;
  private static final MathContext AMOUNT_DIGITS = new MathContext(5);

  private CorrectionFile() {}

  /**
   * Reads the rows of a correction file.
   *
   * @param fileName for the refusals
   * @throws Refusal naming file, line and column of the first cell that is not as described
   */
  public static List<SiteCorrection> read(List<CsvTable.Row> rows, String fileName) {
    if (rows.isEmpty()) {
      throw Refusal.dataDamaged(
          "no-rows", fileName, "", "at least one row under the columns " + COLUMNS);
    }
    List<SiteCorrection> corrections = new ArrayList<>();
    Map<SiteCorrection, String> seen = new HashMap<>();
    for (CsvTable.Row row : rows) {
      SiteCorrection correction = correction(row);
      String before = seen.put(stem(correction), row.where());
      if (before != null) {
        throw Refusal.dataDamaged(
            "duplicate-row",
            row.where() + " month",
            row.text("month"),
            "one row for a site, quantity and month; the other is " + before);
      }
      corrections.add(correction);
    }
    return corrections;
  }

  private static SiteCorrection stem(SiteCorrection row) {
    return new SiteCorrection(row.site(), row.spot(), row.quantity(), row.month(), 0, 0);
  }

  private static SiteCorrection correction(CsvTable.Row row) {
    CorrectedQuantity quantity = quantity(row);
    if (!row.text("kind").equals(quantity.kind())) {
      throw Refusal.dataDamaged(
          "unknown-word", row.where() + " kind", row.text("kind"), quantity.kind());
    }
    return new SiteCorrection(
        site(row),
        new CorrectionSpot(
            row.number("latitude_deg", -90, 90),
            row.number("longitude_deg", -180, 180),
            row.number("elevation_m", -500, 9000),
            row.number("sea_distance_km", 0, 3000)),
        quantity,
        row.text("month").isEmpty() ? 0 : row.whole("month", 1, PlaceFields.MONTHS),
        row.number("amount", quantity.least(), quantity.most()),
        row.number("spread", 0, quantity.largestSpread()));
  }

  private static String site(CsvTable.Row row) {
    String site = row.text("site");
    if (site.isEmpty() || site.length() > LONGEST_NAME) {
      throw Refusal.dataDamaged(
          "out-of-range",
          row.where() + " site",
          site,
          "a name of 1 to " + LONGEST_NAME + " letters");
    }
    return site;
  }

  private static CorrectedQuantity quantity(CsvTable.Row row) {
    String text = row.text("quantity");
    return Arrays.stream(CorrectedQuantity.values())
        .filter(quantity -> quantity.id().equals(text))
        .findFirst()
        .orElseThrow(
            () ->
                Refusal.dataDamaged(
                    "unknown-word",
                    row.where() + " quantity",
                    text,
                    "one of "
                        + Arrays.stream(CorrectedQuantity.values())
                            .map(CorrectedQuantity::id)
                            .toList()));
  }

  /** The text of a correction file, with what was found by leaving sites out on its top. */
  public static String write(LeaveOneOut.Drafted drafted) {
    List<String> comments = new ArrayList<>(EXPLANATION);
    drafted.errors().forEach(error -> comments.add(error.sentence()));
    return CsvWriter.write(
        comments, COLUMNS, drafted.rows().stream().map(CorrectionFile::cells).toList());
  }

  private static List<String> cells(SiteCorrection row) {
    return List.of(
        row.site().substring(0, Math.min(LONGEST_NAME, row.site().length())),
        plain(row.spot().latitudeDeg(), 5),
        plain(row.spot().longitudeDeg(), 5),
        plain(row.spot().elevationM(), 1),
        plain(row.spot().seaDistanceKm(), 3),
        row.quantity().id(),
        row.month() == 0 ? "" : Integer.toString(row.month()),
        row.quantity().kind(),
        digits(row.amount()),
        digits(row.spread()));
  }

  private static String plain(double value, int digits) {
    return String.format(Locale.ROOT, "%." + digits + "f", value);
  }

  private static String digits(double value) {
    return new BigDecimal(value).round(AMOUNT_DIGITS).toPlainString();
  }
}
