package saltspoke.sources.hourly;

import java.util.Arrays;

/**
 * One row of an archive. The reader fills the same object again and again, so that a row costs no
 * memory; whoever keeps a value copies it.
 */
public final class HourlyRow {
  private final double[] values = new double[HourlyQuantity.values().length];
  private int year;
  private int month;
  private int day;
  private int hour;
  private int minute;
  private int impossible;
  private long line;

  /** The value in the unit of the quantity; NaN when missing or impossible. */
  public double get(HourlyQuantity quantity) {
    return values[quantity.ordinal()];
  }

  /** 0 in a typical year. */
  public int year() {
    return year;
  }

  /** 1..12. */
  public int month() {
    return month;
  }

  /** 1..31. */
  public int day() {
    return day;
  }

  /** 0..23. */
  public int hour() {
    return hour;
  }

  /** 0..59. */
  public int minute() {
    return minute;
  }

  /** Values of this row that were outside all weather and count as missing. */
  public int impossible() {
    return impossible;
  }

  /** Line of its file, counted from 1. */
  public long line() {
    return line;
  }

  void clear(long newLine) {
    line = newLine;
    Arrays.fill(values, Double.NaN);
    impossible = 0;
    minute = 0;
  }

  void at(int newYear, int newMonth, int newDay, int newHour, int newMinute) {
    year = newYear;
    month = newMonth;
    day = newDay;
    hour = newHour;
    minute = newMinute;
  }

  /** Takes a value; one that cannot be weather stays missing. Says whether it was possible. */
  boolean set(HourlyQuantity quantity, double value) {
    if (quantity.possible(value)) {
      values[quantity.ordinal()] = value;
      return true;
    }
    impossible++;
    return false;
  }
}
