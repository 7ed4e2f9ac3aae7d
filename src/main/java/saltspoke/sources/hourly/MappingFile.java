package saltspoke.sources.hourly;

import java.io.InputStream;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import saltspoke.sources.CsvTable;
import saltspoke.sources.hourly.ColumnMap.Column;
import saltspoke.sources.hourly.ColumnMap.Unit;
import saltspoke.values.Refusal;

/**
 * A mapping file: people's own word for what the columns of their table mean. CSV with the columns
 * {@code quantity, column, unit, missing}. A row names a measured quantity ({@link
 * HourlyQuantity}), a part of place or time ({@code station, name, latitude_deg, longitude_deg,
 * elevation_m, time, year, month, day, hour, minute}) or a setting ({@code separator}: comma,
 * semicolon, tab, pipe, space; {@code data_after}: beginning of the line before the table; {@code
 * kind}: hourly, daily, typical; {@code clock}: utc, local). {@code column} is a header name,
 * {@code #3} for the third cell, {@code =text} for every row or {@code @file} for the file's name
 * up to its first dot. The unit of {@code hour} may be {@code ending} for hours 1 to 24. Several
 * missing codes are parted by blanks.
 */
public final class MappingFile {
  private static final List<String> PARTS =
      List.of(
          "station",
          "name",
          "latitude_deg",
          "longitude_deg",
          "elevation_m",
          "time",
          "year",
          "month",
          "day",
          "hour",
          "minute");

  private static final Map<String, Character> SEPARATORS =
      Map.of("comma", ',', "semicolon", ';', "tab", '\t', "pipe", '|', "space", ' ');

  private char separator = ',';
  private String dataAfter = "";
  private HourlyStation.Kind kind = HourlyStation.Kind.HOURLY;
  private boolean utc;
  private boolean hoursEnding;
  private final Map<String, Column> columns = new LinkedHashMap<>();

  private MappingFile() {}

  /**
   * Reads a mapping; closes the stream.
   *
   * @throws Refusal naming file, line and column
   */
  static HourlyFormat read(InputStream in, String fileName) {
    MappingFile file = new MappingFile();
    CsvTable.forEach(in, fileName, file::take);
    return new SeparatedHours(
        "tables as " + fileName + " describes them",
        line -> true,
        new ColumnMap(
            file.separator,
            file.dataAfter,
            file.kind,
            file.utc,
            file.hoursEnding,
            Map.copyOf(file.columns)));
  }

  private void take(CsvTable.Row row) {
    String quantity = row.text("quantity");
    String column = row.text("column");
    if (column.isEmpty()) {
      throw Refusal.dataDamaged(
          "empty-cell", row.where() + " column", "", "a header name, #3, =text or @file");
    }
    switch (quantity) {
      case "separator" -> separator = SEPARATORS.get(one(row, column, SEPARATORS.keySet()));
      case "data_after" -> dataAfter = column;
      case "kind" ->
          kind =
              HourlyStation.Kind.valueOf(
                  one(row, column, List.of("hourly", "daily", "typical")).toUpperCase(Locale.ROOT));
      case "clock" -> utc = one(row, column, List.of("utc", "local")).equals("utc");
      default -> column(row, quantity, column);
    }
  }

  private void column(CsvTable.Row row, String quantity, String column) {
    List<String> known = new ArrayList<>(PARTS);
    Arrays.stream(HourlyQuantity.values()).map(HourlyQuantity::id).forEach(known::add);
    if (!known.contains(quantity)) {
      known.addAll(List.of("separator", "data_after", "kind", "clock"));
      throw Refusal.dataDamaged(
          "unknown-word", row.where() + " quantity", quantity, "one of " + known);
    }
    if (column.startsWith("#") && !column.matches("#[1-9]\\d{0,2}")) {
      throw Refusal.dataDamaged(
          "out-of-range", row.where() + " column", column, "#1..#999, counted from 1");
    }
    String unit = row.has("unit") ? row.text("unit") : "";
    String missing = row.has("missing") ? row.text("missing") : "";
    if (quantity.equals("hour") && unit.equals("ending")) {
      hoursEnding = true;
      unit = "";
    }
    String checked = unit;
    Column made =
        new Column(
            List.of(column),
            checked.isEmpty()
                ? Unit.NONE
                : Unit.find(checked)
                    .orElseThrow(
                        () ->
                            Refusal.dataDamaged(
                                "unknown-word",
                                row.where() + " unit",
                                checked,
                                "one of " + Unit.names())),
            missing.isEmpty() ? List.of() : List.of(missing.split(" +")),
            "");
    if (columns.put(quantity, made) != null) {
      throw Refusal.dataDamaged(
          "duplicate-row", row.where() + " quantity", quantity, "one row for a quantity");
    }
  }

  private static String one(CsvTable.Row row, String word, java.util.Collection<String> allowed) {
    if (!allowed.contains(word)) {
      throw Refusal.dataDamaged(
          "unknown-word",
          row.where() + " column",
          word,
          "one of " + allowed.stream().sorted().toList());
    }
    return word;
  }
}
