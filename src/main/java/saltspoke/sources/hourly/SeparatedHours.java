package saltspoke.sources.hourly;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;

/** Reads separated files by a {@link ColumnMap}: the published ones and people's own. */
final class SeparatedHours implements HourlyFormat {
  private final String description;
  private final Predicate<String> firstLine;
  private final ColumnMap map;

  SeparatedHours(String description, Predicate<String> firstLine, ColumnMap map) {
    this.description = description;
    this.firstLine = firstLine;
    this.map = map;
  }

  @Override
  public String description() {
    return description;
  }

  @Override
  public boolean fits(String line) {
    return firstLine.test(line);
  }

  @Override
  public void read(LineReader lines, String fileName, StationList stations, HourlySink sink) {
    if (!map.dataAfter().isEmpty()) {
      while (!lines.text().startsWith(map.dataAfter())) {
        if (!lines.next()) {
          throw lines.refuse(
              "no-rows", "data_after", "", "a line that begins with " + map.dataAfter());
        }
      }
      skip(lines);
    }
    Columns columns = new Columns(map, lines);
    boolean header = columns.needHeader();
    if (header) {
      columns.header();
    }
    StationCells station = new StationCells(map, columns, lines, fileName, stations);
    TimeCells time = new TimeCells(map, columns, lines);
    ValueCell[] values = values(columns, lines).toArray(ValueCell[]::new);
    if (header) {
      skip(lines);
    }
    Plausibility plausible = new Plausibility(lines);
    HourlyRow row = new HourlyRow();
    do {
      columns.split();
      row.clear(lines.number());
      time.read(row);
      station.read(sink);
      for (ValueCell value : values) {
        value.read(row, plausible);
      }
      plausible.rowDone(row);
      sink.row(row);
    } while (lines.next());
    plausible.fileDone();
  }

  private static void skip(LineReader lines) {
    if (!lines.next()) {
      throw lines.refuse("no-rows", "line", "", "at least one row under the header");
    }
  }

  private List<ValueCell> values(Columns columns, LineReader lines) {
    List<ValueCell> values = new ArrayList<>();
    for (HourlyQuantity quantity : HourlyQuantity.values()) {
      ColumnMap.Column column = map.columns().get(quantity.id());
      int cell = column == null ? Columns.ABSENT : columns.index(quantity.id());
      if (cell != Columns.ABSENT) {
        int quality =
            column.quality().isEmpty() ? Columns.ABSENT : columns.find(List.of(column.quality()));
        values.add(new ValueCell(quantity, column, columns.cells(), cell, quality, lines));
      }
    }
    Predicate<HourlyQuantity> has = q -> values.stream().anyMatch(v -> v.quantity() == q);
    if (!has.test(HourlyQuantity.TEMPERATURE)
        || !(has.test(HourlyQuantity.DEW_POINT) || has.test(HourlyQuantity.RELATIVE_HUMIDITY))) {
      throw lines.refuse(
          "missing-column",
          "header",
          columns.shown(),
          "columns of temperature and of dew point or relative humidity: " + wanted());
    }
    return values;
  }

  private List<String> wanted() {
    return map.columns().entrySet().stream()
        .filter(e -> !e.getValue().isConstant())
        .sorted(Map.Entry.comparingByKey())
        .map(e -> e.getKey() + " in " + e.getValue().names())
        .toList();
  }
}
