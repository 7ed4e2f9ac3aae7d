package saltspoke.atmosphere.stations;

import java.util.Arrays;
import saltspoke.sources.hourly.HourlyQuantity;
import saltspoke.sources.hourly.HourlyRow;

/**
 * The hours (or days) of one station and one year, each in its place whatever the order of the
 * rows. Made once and used again for year after year, so that memory does not grow with an archive.
 */
public final class YearHours {
  static final int MONTHS = 12;
  private static final int DAY = 24;
  private static final int LONGEST_YEAR = 366;
  private static final int HALF_HOUR = 30;
  private static final int[] DAYS = {31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31};
  private static final HourlyQuantity[] QUANTITIES = HourlyQuantity.values();

  /** The quantities up to here are those of hours; days have the rest too. */
  private static final int HOURLY = HourlyQuantity.DAY_MINIMUM.ordinal();

  private final double[][] values = new double[QUANTITIES.length][LONGEST_YEAR * DAY];

  /** Minutes from the full hour of the report that is kept, plus 1; 0 where there is none. */
  private final byte[] reported = new byte[LONGEST_YEAR * DAY];

  private final int[] firstDay = new int[MONTHS + 1];
  private boolean daily;
  private int year;
  private long rows;
  private long impossible;
  private long duplicates;

  /** Begins a year; 0 stands for a typical year of 365 days. */
  public void begin(int newYear, boolean isDaily) {
    year = newYear;
    daily = isDaily;
    rows = 0;
    impossible = 0;
    duplicates = 0;
    Arrays.fill(reported, (byte) 0);
    for (int m = 0; m < MONTHS; m++) {
      firstDay[m + 1] = firstDay[m] + DAYS[m] + (m == 1 && leap(year) ? 1 : 0);
    }
    for (double[] column : values) {
      Arrays.fill(column, 0, slots(), Double.NaN);
    }
  }

  private static boolean leap(int year) {
    return year != 0 && year % 4 == 0 && (year % 100 != 0 || year % 400 == 0);
  }

  /**
   * Puts a row into its place. Of several reports for an hour the one nearest to it counts, the
   * first of those alike; the others are counted as duplicates.
   */
  public void put(HourlyRow row) {
    rows++;
    impossible += row.impossible();
    int day = firstDay[row.month() - 1] + row.day() - 1;
    int slot = daily ? day : day * DAY + row.hour() + (row.minute() >= HALF_HOUR ? 1 : 0);
    if (slot >= slots()) {
      // The last half hour of a year belongs to the next one, which has its own hour 0.
      duplicates++;
      return;
    }
    int off = 1 + (row.minute() >= HALF_HOUR ? 60 - row.minute() : row.minute());
    if (reported[slot] != 0) {
      duplicates++;
      if (reported[slot] <= off) {
        return;
      }
    }
    reported[slot] = (byte) off;
    int quantities = daily ? QUANTITIES.length : HOURLY;
    for (int q = 0; q < quantities; q++) {
      values[q][slot] = row.get(QUANTITIES[q]);
    }
  }

  int year() {
    return year;
  }

  boolean isDaily() {
    return daily;
  }

  long rows() {
    return rows;
  }

  long impossible() {
    return impossible;
  }

  long duplicates() {
    return duplicates;
  }

  /** Places in this year: its hours, or its days. */
  int slots() {
    return firstDay[MONTHS] * perDay();
  }

  int perDay() {
    return daily ? 1 : DAY;
  }

  /** First place of a month, 0..11; with 12 the end of the year. */
  int from(int month) {
    return firstDay[month] * perDay();
  }

  boolean isReported(int slot) {
    return reported[slot] != 0;
  }

  /** The values of a quantity by place, NaN where missing; the tests strike out in it. */
  double[] of(HourlyQuantity quantity) {
    return values[quantity.ordinal()];
  }
}
