package saltspoke.sources.hourly;

import java.nio.charset.StandardCharsets;

/**
 * The time of a row: one cell as {@code 2019-01-31T05:00} (ISO 8601; a blank for the T and seconds
 * may be there), or cells of its parts. Without a year the rows are of a typical year.
 */
final class TimeCells {
  private static final int DATE_LENGTH = 10;
  private static final int WITH_MINUTE = 16;
  private static final int WITH_SECONDS = 19;

  private final LineReader lines;
  private final Cells cells;
  private final boolean hoursEnding;
  private final boolean daily;
  private final int time;
  private final int year;
  private final int month;
  private final int day;
  private final int hour;
  private final int minute;

  TimeCells(ColumnMap map, Columns columns, LineReader lines) {
    this.lines = lines;
    this.cells = columns.cells();
    this.hoursEnding = map.hoursEnding();
    this.daily = map.kind() == HourlyStation.Kind.DAILY;
    boolean typical = map.kind() == HourlyStation.Kind.TYPICAL;
    // Files of the hourly network have both; whole cells need less reading than a text.
    boolean parts = columns.index("month") != Columns.ABSENT;
    time = parts ? Columns.ABSENT : columns.required("time");
    year = parts && !typical ? columns.required("year") : Columns.ABSENT;
    month = parts ? columns.required("month") : Columns.ABSENT;
    day = parts ? columns.required("day") : Columns.ABSENT;
    hour = parts && !daily ? columns.required("hour") : Columns.ABSENT;
    minute = parts ? columns.index("minute") : Columns.ABSENT;
  }

  void read(HourlyRow row) {
    byte[] bytes = lines.bytes();
    if (time != Columns.ABSENT) {
      text(row, bytes, cells.from(time), cells.to(time));
    } else {
      row.at(
          year == Columns.ABSENT ? 0 : Clock.year(lines, bytes, cells.from(year), cells.to(year)),
          Clock.month(lines, bytes, cells.from(month), cells.to(month)),
          Clock.day(lines, bytes, cells.from(day), cells.to(day)),
          hour == Columns.ABSENT ? 0 : hour(bytes, cells.from(hour), cells.to(hour)),
          minute == Columns.ABSENT || cells.isEmpty(minute)
              ? 0
              : Clock.minute(lines, bytes, cells.from(minute), cells.to(minute)));
    }
    Clock.check(lines, row);
  }

  private int hour(byte[] bytes, int from, int to) {
    return hoursEnding
        ? Clock.hourEnding(lines, bytes, from, to)
        : Clock.hour(lines, bytes, from, to);
  }

  private void text(HourlyRow row, byte[] bytes, int from, int to) {
    int length = to - from;
    boolean shape =
        (daily ? length >= DATE_LENGTH : length >= WITH_MINUTE)
            && bytes[from + 4] == '-'
            && bytes[from + 7] == '-'
            && (length == DATE_LENGTH
                || (length >= WITH_MINUTE
                    && (bytes[from + DATE_LENGTH] == 'T' || bytes[from + DATE_LENGTH] == ' ')
                    && bytes[from + 13] == ':'))
            && (length <= WITH_SECONDS || (length == WITH_SECONDS + 1 && bytes[to - 1] == 'Z'));
    if (!shape) {
      throw lines.refuse(
          "not-a-time",
          "time (cell " + (time + 1) + ")",
          new String(bytes, from, length, StandardCharsets.ISO_8859_1),
          daily ? "a day as 2019-01-31" : "a time as 2019-01-31T05:00");
    }
    row.at(
        Clock.year(lines, bytes, from, from + 4),
        Clock.month(lines, bytes, from + 5, from + 7),
        Clock.day(lines, bytes, from + 8, from + 10),
        length == DATE_LENGTH ? 0 : hour(bytes, from + 11, from + 13),
        length == DATE_LENGTH ? 0 : Clock.minute(lines, bytes, from + 14, from + 16));
  }
}
