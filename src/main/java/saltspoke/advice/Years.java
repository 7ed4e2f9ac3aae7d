package saltspoke.advice;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import saltspoke.wheel.WheelYear;
import saltspoke.wheel.damage.Site;

/** The year of the pairing in focus: wetness, salt, damage, looks, and when to build. */
final class Years {
  /** A build month is good when its first season does no more than this over the mildest one. */
  private static final double GOOD = 1.15;

  private static final int SEASON = 3;

  private Years() {}

  static YearPlan of(Case focus, WheelYear year, AdviceRequest request) {
    Site limiting = focus.limiting();
    double[] damage = limiting == null ? new double[12] : limiting.monthlyUm();
    double all = 0;
    for (double um : damage) {
      all += um;
    }
    List<YearPlan.Month> months = new ArrayList<>();
    for (WheelYear.Month month : year.months()) {
      months.add(
          new YearPlan.Month(
              month.month(),
              month.wetHours(),
              month.salt().totalMgClPerM2(),
              all > 0 ? damage[month.month() - 1] / all : 0));
    }
    return new YearPlan(months, looks(focus.interval(), request), builds(damage));
  }

  private static List<Integer> looks(Interval interval, AdviceRequest request) {
    int now = request.buildMonth() - 1 + (int) Math.floor(request.ageMonths());
    TreeSet<Integer> months = new TreeSet<>();
    double step = Math.max(interval.everyMonths(), 1);
    for (double at = interval.firstMonths(); at <= 12; at += step) {
      months.add((now + (int) Math.floor(at)) % 12 + 1);
    }
    return List.copyOf(months);
  }

  private static List<Integer> builds(double[] damage) {
    double[] season = new double[12];
    double least = Double.POSITIVE_INFINITY;
    for (int m = 0; m < 12; m++) {
      for (int k = 0; k < SEASON; k++) {
        season[m] += damage[(m + k) % 12];
      }
      least = Math.min(least, season[m]);
    }
    List<Integer> good = new ArrayList<>();
    for (int m = 0; m < 12; m++) {
      if (season[m] <= GOOD * least) {
        good.add(m + 1);
      }
    }
    return good;
  }
}
