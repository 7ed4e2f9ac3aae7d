package saltspoke.atmosphere;

/**
 * What a run of hours holds, counted by definition.
 *
 * @param hours number of hours counted
 * @param temperatureC their mean
 * @param relativeHumidityPct their mean
 * @param diurnalRangeC mean over whole days of maximum less minimum
 * @param wetHours hours with RH above 80 % and temperature above 0 °C (ISO 9223:2012)
 * @param hoursAbove33Pct hours with RH above 33 %
 * @param hoursAbove75Pct hours with RH above 75 %
 * @param hoursBelow0C hours with temperature below 0 °C
 * @param frostDays whole days with minimum below 0 °C
 * @param nearFreezingDays whole days with minimum below +1 °C and maximum above −5 °C
 */
public record HourlyCount(
    int hours,
    double temperatureC,
    double relativeHumidityPct,
    double diurnalRangeC,
    int wetHours,
    int hoursAbove33Pct,
    int hoursAbove75Pct,
    int hoursBelow0C,
    int frostDays,
    int nearFreezingDays) {
  private static final int DAY = 24;

  /**
   * Counts hours in time order; every 24 make a day, and a rest shorter than that is no day.
   *
   * @param temperatureC at least 24 values
   * @param relativeHumidityPct as many
   */
  public static HourlyCount of(double[] temperatureC, double[] relativeHumidityPct) {
    int n = temperatureC.length;
    if (n < DAY || relativeHumidityPct.length != n) {
      throw new IllegalArgumentException("a count needs 24 hours or more, of both quantities");
    }
    double sumT = 0;
    double sumRh = 0;
    int wet = 0;
    int above33 = 0;
    int above75 = 0;
    int cold = 0;
    for (int i = 0; i < n; i++) {
      double t = temperatureC[i];
      double rh = relativeHumidityPct[i];
      sumT += t;
      sumRh += rh;
      wet += rh > WetHours.WET_RH_PCT && t > WetHours.WET_TEMPERATURE_C ? 1 : 0;
      above33 += rh > 33 ? 1 : 0;
      above75 += rh > 75 ? 1 : 0;
      cold += t < 0 ? 1 : 0;
    }
    double range = 0;
    int frost = 0;
    int near = 0;
    int days = n / DAY;
    for (int day = 0; day < days; day++) {
      double low = Double.POSITIVE_INFINITY;
      double high = Double.NEGATIVE_INFINITY;
      for (int i = day * DAY; i < (day + 1) * DAY; i++) {
        low = Math.min(low, temperatureC[i]);
        high = Math.max(high, temperatureC[i]);
      }
      range += high - low;
      frost += low < FrostDays.FROST_C ? 1 : 0;
      near += low < FrostDays.SALTING_MINIMUM_C && high > FrostDays.SALTING_MAXIMUM_C ? 1 : 0;
    }
    return new HourlyCount(
        n, sumT / n, sumRh / n, range / days, wet, above33, above75, cold, frost, near);
  }
}
