package saltspoke.sources.hourly;

import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Typical-year weather files, see {@link PublishedColumns#epw()}; the header names the station. */
final class EpwWeather implements HourlyFormat {
  private static final int HEADER_LINES = 8;
  private static final int YEAR_HOURS = 8760;

  @Override
  public String description() {
    return "EPW typical-year weather (first line LOCATION,…)";
  }

  @Override
  public boolean fits(String firstLine) {
    return firstLine.startsWith("LOCATION,");
  }

  @Override
  public void read(LineReader lines, String fileName, StationList stations, HourlySink sink) {
    Cells head = new Cells(lines, ',');
    head.split(10);
    if (head.count() < 10) {
      throw lines.refuse("short-row", "LOCATION", lines.text(), "ten cells, the last the height");
    }
    Map<String, ColumnMap.Column> columns = new LinkedHashMap<>(PublishedColumns.epw());
    String wmo = head.text(5, "WMO");
    String city = head.text(1, "city");
    constant(columns, "station", wmo.isEmpty() ? city : wmo);
    constant(columns, "latitude_deg", number(lines, head, 6, "latitude", 90));
    constant(columns, "longitude_deg", number(lines, head, 7, "longitude", 180));
    constant(columns, "elevation_m", number(lines, head, 9, "height", 9000));
    for (int line = 1; line < HEADER_LINES; line++) {
      if (!lines.next()) {
        throw lines.refuse("short-header", "header", "", HEADER_LINES + " header lines");
      }
    }
    if (!lines.text().startsWith("DATA PERIODS")) {
      throw lines.refuse("wrong-header", "header", lines.text(), "DATA PERIODS as eighth line");
    }
    if (!lines.next()) {
      throw lines.refuse("no-rows", "line", "", "rows under the header");
    }
    Counting counting = new Counting(sink, city);
    new SeparatedHours(
            description(),
            line -> true,
            new ColumnMap(',', "", HourlyStation.Kind.TYPICAL, false, true, columns))
        .read(lines, fileName, stations, counting);
    if (counting.rows < YEAR_HOURS) {
      throw lines.refuse(
          "short-year", "rows", Long.toString(counting.rows), YEAR_HOURS + " hours of a year");
    }
  }

  private static String number(
      LineReader lines, Cells head, int cell, String field, double furthest) {
    double value = Decimal.parse(lines.bytes(), head.from(cell), head.to(cell));
    if (!(Math.abs(value) <= furthest)) {
      throw lines.refuse(
          "out-of-range",
          field,
          new String(head.copy(cell), StandardCharsets.ISO_8859_1),
          -furthest + ".." + furthest);
    }
    return Double.toString(value);
  }

  private static void constant(Map<String, ColumnMap.Column> columns, String part, String text) {
    columns.put(
        part, new ColumnMap.Column(List.of("=" + text), ColumnMap.Unit.NONE, List.of(), ""));
  }

  /** Counts rows, and gives the station the name of its city. */
  private static final class Counting implements HourlySink {
    private final HourlySink sink;
    private final String city;
    private long rows;

    Counting(HourlySink sink, String city) {
      this.sink = sink;
      this.city = city;
    }

    @Override
    public void station(HourlyStation s) {
      sink.station(
          new HourlyStation(
              s.id(),
              city.isEmpty() ? s.id() : city,
              s.latitudeDeg(),
              s.longitudeDeg(),
              s.elevationM(),
              s.kind(),
              s.utc()));
    }

    @Override
    public void row(HourlyRow row) {
      rows++;
      sink.row(row);
    }
  }
}
