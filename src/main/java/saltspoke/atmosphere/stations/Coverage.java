package saltspoke.atmosphere.stations;

/**
 * When a month counts. WMO-No. 1203 (2017), "Guidelines on the Calculation of Climate Normals",
 * leaves a month out when eleven days or more, or five in a row, are missing; here the first rule
 * is taken more strictly: at least 80 % of the reports that the station's own rhythm (one an hour,
 * or one in three hours) would give.
 */
final class Coverage {
  /** Least share of the expected reports, 0..1. */
  static final double LEAST_SHARE = 0.8;

  /** Days in a row that may not be missing (WMO-No. 1203). */
  static final int LONGEST_GAP_DAYS = 5;

  /** The rhythms that are known: a synoptic station reports every three hours. */
  private static final int SYNOPTIC_HOURS = 3;

  /** Share of reports at three-hourly distance from which a year counts as synoptic. */
  private static final double MOSTLY = 0.7;

  private Coverage() {}

  /** What a month came to. */
  enum Verdict {
    KEPT,
    /** No report at all. */
    EMPTY,
    TOO_FEW,
    LONG_GAP
  }

  /** Places from one report to the next that the year mostly keeps: 1 or, of hours, 3. */
  static int rhythm(YearHours year, boolean[] usable) {
    if (year.isDaily()) {
      return 1;
    }
    int before = -1;
    int all = 0;
    int synoptic = 0;
    for (int i = 0; i < year.slots(); i++) {
      if (usable[i]) {
        if (before >= 0) {
          all++;
          synoptic += i - before == SYNOPTIC_HOURS ? 1 : 0;
        }
        before = i;
      }
    }
    return synoptic > MOSTLY * all ? SYNOPTIC_HOURS : 1;
  }

  /** Whether a month counts, by its usable reports. */
  static Verdict of(YearHours year, int month, boolean[] usable, int rhythm) {
    int from = year.from(month);
    int to = year.from(month + 1);
    int count = 0;
    int gap = 0;
    int longest = 0;
    for (int i = from; i < to; i++) {
      if (usable[i]) {
        count++;
        gap = 0;
      } else {
        longest = Math.max(longest, ++gap);
      }
    }
    if (count == 0) {
      return Verdict.EMPTY;
    }
    if (count < LEAST_SHARE * (to - from) / rhythm) {
      return Verdict.TOO_FEW;
    }
    return longest >= LONGEST_GAP_DAYS * year.perDay() ? Verdict.LONG_GAP : Verdict.KEPT;
  }
}
