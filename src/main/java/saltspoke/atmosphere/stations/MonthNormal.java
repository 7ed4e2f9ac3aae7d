package saltspoke.atmosphere.stations;

import saltspoke.atmosphere.MonthMeans;
import saltspoke.atmosphere.stations.MonthSums.Sum;

/**
 * A calendar month of a station over its years, brought to a month of full length.
 *
 * @param month 1..12
 * @param sums of all years
 */
public record MonthNormal(int month, MonthSums sums) {
  private static final int DAY = 24;

  /** Monthly mean, °C. */
  public double temperatureC() {
    return sums.get(Sum.TEMPERATURE) / 1000.0 / sums.get(Sum.REPORTS);
  }

  /** Mean of hourly humidity, %. */
  public double relativeHumidityPct() {
    return sums.get(Sum.HUMIDITY) / 1000.0 / sums.get(Sum.REPORTS);
  }

  /** Mean daily range, K; NaN when no day could be told. */
  public double diurnalRangeK() {
    long days = sums.get(Sum.DAYS);
    return days == 0 ? Double.NaN : sums.get(Sum.RANGE) / 1000.0 / days;
  }

  /** Hours a month of what was counted by hour. */
  public double hours(Sum counted) {
    return MonthMeans.daysIn(month) * DAY * sums.get(counted) / sums.get(Sum.REPORTS);
  }

  /** Days a month of what was counted by day; NaN when no day could be told. */
  public double days(Sum counted) {
    long days = sums.get(Sum.DAYS);
    return days == 0 ? Double.NaN : MonthMeans.daysIn(month) * sums.get(counted) / days;
  }
}
