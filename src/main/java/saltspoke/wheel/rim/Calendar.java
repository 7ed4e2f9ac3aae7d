package saltspoke.wheel.rim;

/** A year of 365 days. */
final class Calendar {
  static final int MONTHS = 12;
  static final int DAYS = 365;
  private static final int[] LENGTH = {31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31};

  private Calendar() {}

  /** Days of a month, 0..11. */
  static int days(int monthIndex) {
    return LENGTH[monthIndex];
  }

  static double hours(int monthIndex) {
    return 24.0 * LENGTH[monthIndex];
  }
}
