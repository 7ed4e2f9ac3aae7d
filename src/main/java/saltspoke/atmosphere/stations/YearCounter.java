package saltspoke.atmosphere.stations;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import saltspoke.atmosphere.DiurnalCycle;
import saltspoke.atmosphere.FrostDays;
import saltspoke.atmosphere.SaturationPressure;
import saltspoke.atmosphere.WetHours;
import saltspoke.atmosphere.stations.Coverage.Verdict;
import saltspoke.atmosphere.stations.MonthSums.Sum;
import saltspoke.sources.hourly.HourlyQuantity;

/**
 * Judges and counts a year. Not safe for several threads: it keeps its working arrays.
 *
 * <p>Relative humidity is 100 e(dew point) / e(temperature), both over water (WMO-No. 8, 2018, part
 * I, annex 4.B), where the file has a dew point; else the file's own.
 */
public final class YearCounter {
  private static final int DAY = 24;

  private final double[] humidityPct = new double[366 * DAY];
  private final boolean[] usable = new boolean[366 * DAY];

  /**
   * Tests, judges and counts; values of the year that fail are struck out in it.
   *
   * @param hoursAheadOfClock how far the station's day runs ahead of its clock: its longitude over
   *     15 for UTC, 0 for local time
   */
  public YearStatistics count(YearHours year, int hoursAheadOfClock) {
    QualityTests.Struck struck = QualityTests.run(year);
    long reports = humidities(year);
    int rhythm = Coverage.rhythm(year, usable);
    List<Optional<MonthSums>> months = new ArrayList<>(YearHours.MONTHS);
    int tooFew = 0;
    int longGap = 0;
    for (int month = 0; month < YearHours.MONTHS; month++) {
      Verdict verdict = Coverage.of(year, month, usable, rhythm);
      tooFew += verdict == Verdict.TOO_FEW ? 1 : 0;
      longGap += verdict == Verdict.LONG_GAP ? 1 : 0;
      months.add(
          verdict == Verdict.KEPT
              ? Optional.of(month(year, month, rhythm, hoursAheadOfClock))
              : Optional.empty());
    }
    return new YearStatistics(
        year.year(),
        new YearStatistics.Quality(
            year.rows(),
            year.impossible(),
            struck.spikes(),
            struck.stuck(),
            struck.dewPointAbove(),
            year.duplicates(),
            reports,
            year.slots() - reports,
            rhythm,
            tooFew,
            longGap),
        months);
  }

  private long humidities(YearHours year) {
    double[] temperature = year.of(HourlyQuantity.TEMPERATURE);
    double[] dewPoint = year.of(HourlyQuantity.DEW_POINT);
    double[] own = year.of(HourlyQuantity.RELATIVE_HUMIDITY);
    double[] low = year.of(HourlyQuantity.DAY_MINIMUM);
    double[] high = year.of(HourlyQuantity.DAY_MAXIMUM);
    long reports = 0;
    for (int i = 0; i < year.slots(); i++) {
      double t = temperature[i];
      double rh;
      if (Double.isNaN(dewPoint[i])) {
        rh = own[i];
      } else if (year.isDaily() && high[i] > low[i]) {
        rh = dayMeanPct(t, high[i] - low[i], dewPoint[i]);
      } else {
        rh = pct(dewPoint[i], t);
      }
      rh = Math.min(100, rh);
      humidityPct[i] = rh;
      usable[i] = !Double.isNaN(t) && !Double.isNaN(rh);
      reports += usable[i] ? 1 : 0;
    }
    return reports;
  }

  static double pct(double dewPointC, double temperatureC) {
    return 100
        * SaturationPressure.overWaterHpa(dewPointC)
        / SaturationPressure.overWaterHpa(temperatureC);
  }

  /**
   * Mean of the hourly humidity of a day of which only means and range are known: the dew point
   * held, the temperature by the usual cycle. The humidity of the means alone would be too low.
   */
  private static double dayMeanPct(double meanC, double rangeK, double dewPointC) {
    double sum = 0;
    for (int hour = 0; hour < DAY; hour++) {
      double t = DiurnalCycle.temperatureC(meanC, rangeK, hour + 0.5);
      sum += Math.min(100, pct(dewPointC, t));
    }
    return sum / DAY;
  }

  private MonthSums month(YearHours year, int month, int rhythm, int ahead) {
    double[] temperature = year.of(HourlyQuantity.TEMPERATURE);
    double[] direction = year.of(HourlyQuantity.WIND_DIRECTION);
    double[] speed = year.of(HourlyQuantity.WIND_SPEED);
    MonthSums sums = new MonthSums();
    int from = year.from(month);
    int to = year.from(month + 1);
    sums.add(Sum.YEARS, 1);
    sums.add(Sum.PLACES, to - from);
    for (int i = from; i < to; i++) {
      if (usable[i]) {
        double t = temperature[i];
        double rh = humidityPct[i];
        sums.add(Sum.REPORTS, 1);
        sums.add(Sum.TEMPERATURE, Math.round(1000 * t));
        sums.add(Sum.HUMIDITY, Math.round(1000 * rh));
        sums.humidity(rh);
        if (!year.isDaily()) {
          sums.count(Sum.WET, rh > WetHours.WET_RH_PCT && t > WetHours.WET_TEMPERATURE_C);
          sums.count(Sum.ABOVE_33, rh > 33);
          sums.count(Sum.ABOVE_75, rh > 75);
          sums.count(Sum.ABOVE_80, rh > WetHours.WET_RH_PCT);
          sums.count(Sum.BELOW_0, t < 0);
        }
      }
      if (speed[i] == 0 || (!Double.isNaN(speed[i]) && !Double.isNaN(direction[i]))) {
        sums.wind(direction[i], speed[i]);
      }
    }
    if (year.isDaily()) {
      reportedExtremes(year, from, to, sums);
    } else {
      countedExtremes(year, from, to, rhythm, ahead, sums);
    }
    return sums;
  }

  private static void reportedExtremes(YearHours year, int from, int to, MonthSums sums) {
    double[] low = year.of(HourlyQuantity.DAY_MINIMUM);
    double[] high = year.of(HourlyQuantity.DAY_MAXIMUM);
    for (int i = from; i < to; i++) {
      if (high[i] >= low[i]) {
        day(low[i], high[i], sums);
      }
    }
  }

  /** Days by the sun: those of the station's own clock that begin within the month. */
  private void countedExtremes(
      YearHours year, int from, int to, int rhythm, int ahead, MonthSums sums) {
    double[] temperature = year.of(HourlyQuantity.TEMPERATURE);
    int begin = from + Math.floorMod(-ahead, DAY);
    for (int day = begin; day < to && day + DAY <= year.slots(); day += DAY) {
      double low = Double.POSITIVE_INFINITY;
      double high = Double.NEGATIVE_INFINITY;
      int count = 0;
      for (int i = day; i < day + DAY; i++) {
        double t = temperature[i];
        if (!Double.isNaN(t)) {
          low = t < low ? t : low;
          high = t > high ? t : high;
          count++;
        }
      }
      if (count >= Coverage.LEAST_SHARE * DAY / rhythm) {
        day(low, high, sums);
      }
    }
  }

  private static void day(double low, double high, MonthSums sums) {
    sums.add(Sum.DAYS, 1);
    sums.add(Sum.RANGE, Math.round(1000 * (high - low)));
    sums.count(Sum.FROST_DAYS, low < FrostDays.FROST_C);
    sums.count(
        Sum.NEAR_FREEZING_DAYS,
        low < FrostDays.SALTING_MINIMUM_C && high > FrostDays.SALTING_MAXIMUM_C);
  }
}
