package saltspoke.sources.hourly;

import java.nio.charset.StandardCharsets;

/** Reads parts of dates from bytes; each refusal names the part. */
final class Clock {
  private static final int[] DAYS = {31, 29, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31};
  private static final int FIRST_YEAR = 1700;
  private static final int LAST_YEAR = 2200;

  private Clock() {}

  static int year(LineReader lines, byte[] bytes, int from, int to) {
    return part(lines, "year", bytes, from, to, FIRST_YEAR, LAST_YEAR);
  }

  static int month(LineReader lines, byte[] bytes, int from, int to) {
    return part(lines, "month", bytes, from, to, 1, 12);
  }

  static int day(LineReader lines, byte[] bytes, int from, int to) {
    return part(lines, "day", bytes, from, to, 1, 31);
  }

  static int hour(LineReader lines, byte[] bytes, int from, int to) {
    return part(lines, "hour", bytes, from, to, 0, 23);
  }

  /** An hour 1..24 that names the end of the hour, as the hour that it began with. */
  static int hourEnding(LineReader lines, byte[] bytes, int from, int to) {
    return part(lines, "hour", bytes, from, to, 1, 24) - 1;
  }

  static int minute(LineReader lines, byte[] bytes, int from, int to) {
    return part(lines, "minute", bytes, from, to, 0, 59);
  }

  /** Refuses the 31st of a month that has none. A typical year has no 29 February. */
  static void check(LineReader lines, HourlyRow row) {
    int days = DAYS[row.month() - 1];
    if (row.month() == 2 && !leap(row.year())) {
      days = 28;
    }
    if (row.day() > days) {
      throw lines.refuse(
          "out-of-range", "day", Integer.toString(row.day()), "1.." + days + " in that month");
    }
  }

  /** Gregorian leap years; year 0 stands for a typical year and is none. */
  static boolean leap(int year) {
    return year != 0 && year % 4 == 0 && (year % 100 != 0 || year % 400 == 0);
  }

  private static int part(
      LineReader lines, String field, byte[] bytes, int from, int to, int low, int high) {
    int at = from;
    while (at < to && bytes[at] == ' ') {
      at++;
    }
    int value = Decimal.whole(bytes, at, to);
    if (value < low || value > high) {
      throw lines.refuse(
          "out-of-range",
          field,
          new String(bytes, from, Math.max(0, to - from), StandardCharsets.ISO_8859_1),
          low + ".." + high);
    }
    return value;
  }
}
