package saltspoke.sources.hourly;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import saltspoke.values.Refusal;

/**
 * NOAA's Integrated Surface Database "Lite": one file per station and year, fixed columns, times in
 * UTC. Layout: NOAA NCEI, "Integrated Surface Data – Lite, Format Documentation" (20 June 2006):
 * year 1–4, month 6–7, day 9–10, hour 12–13, air temperature 14–19 and dew point 20–25 in tenths of
 * °C, sea level pressure 26–31, wind direction 32–37 in degrees (calm is 0), wind speed 38–43 in
 * tenths of m/s; −9999 is missing. The files name the station only: {@code USAF-WBAN-YEAR}.
 */
final class IsdLite implements HourlyFormat {
  private static final Pattern ROW = Pattern.compile("\\d{4} \\d\\d \\d\\d \\d\\d[ \\d-]{30,}");
  private static final Pattern NAME = Pattern.compile("([0-9A-Z]{6}(?:-\\d{5})?)-\\d{4}(?:\\..*)?");
  private static final int LEAST_LENGTH = 61;
  private static final int MISSING = -9999;

  /** First and past-last byte of each column that is used, counted from 0. */
  private enum Column {
    TEMPERATURE(HourlyQuantity.TEMPERATURE, 13, 19, 10),
    DEW_POINT(HourlyQuantity.DEW_POINT, 19, 25, 10),
    WIND_DIRECTION(HourlyQuantity.WIND_DIRECTION, 31, 37, 1),
    WIND_SPEED(HourlyQuantity.WIND_SPEED, 37, 43, 10);

    private final HourlyQuantity quantity;
    private final int from;
    private final int to;
    private final double scale;

    Column(HourlyQuantity quantity, int from, int to, double scale) {
      this.quantity = quantity;
      this.from = from;
      this.to = to;
      this.scale = scale;
    }
  }

  private static final Column[] COLUMNS = Column.values();

  @Override
  public String description() {
    return "ISD-Lite (fixed columns, file named USAF-WBAN-YEAR, with a station list)";
  }

  @Override
  public boolean fits(String firstLine) {
    return ROW.matcher(firstLine).matches();
  }

  @Override
  public void read(LineReader lines, String fileName, StationList stations, HourlySink sink) {
    Matcher name = NAME.matcher(fileName);
    if (!name.matches()) {
      throw lines.refuse(
          "unnamed-station", "file", fileName, "the name as published, 725300-94846-2015.gz");
    }
    sink.station(stations.get(name.group(1), lines).as(HourlyStation.Kind.HOURLY, true));
    Plausibility plausible = new Plausibility(lines);
    HourlyRow row = new HourlyRow();
    do {
      byte[] bytes = lines.bytes();
      int start = lines.start();
      if (lines.end() - start < LEAST_LENGTH) {
        throw lines.refuse(
            "short-row", "line", lines.text(), LEAST_LENGTH + " characters, all columns");
      }
      row.clear(lines.number());
      row.at(
          Clock.year(lines, bytes, start, start + 4),
          Clock.month(lines, bytes, start + 5, start + 7),
          Clock.day(lines, bytes, start + 8, start + 10),
          Clock.hour(lines, bytes, start + 11, start + 13),
          0);
      Clock.check(lines, row);
      for (Column column : COLUMNS) {
        int value = signed(lines, column, bytes, start);
        if (value != MISSING) {
          plausible.take(row, column.quantity, value / column.scale);
        }
      }
      plausible.rowDone(row);
      sink.row(row);
    } while (lines.next());
    plausible.fileDone();
  }

  private static int signed(LineReader lines, Column column, byte[] bytes, int start) {
    int at = start + column.from;
    int to = start + column.to;
    while (at < to && bytes[at] == ' ') {
      at++;
    }
    boolean negative = at < to && bytes[at] == '-';
    int value = Decimal.whole(bytes, negative ? at + 1 : at, to);
    if (value < 0) {
      throw notWhole(lines, column, start);
    }
    return negative ? -value : value;
  }

  private static Refusal notWhole(LineReader lines, Column column, int start) {
    return lines.refuse(
        "not-a-number",
        column.quantity.id() + " (characters " + (column.from + 1) + "-" + column.to + ")",
        new String(
            lines.bytes(),
            start + column.from,
            column.to - column.from,
            java.nio.charset.StandardCharsets.ISO_8859_1),
        "a whole number, or -9999 for missing");
  }
}
