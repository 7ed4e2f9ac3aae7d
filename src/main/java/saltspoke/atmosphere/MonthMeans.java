package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Monthly means from which a month's hours are built, whether modelled or measured.
 *
 * @param temperatureC twelve monthly means
 * @param relativeHumidityPct twelve means of hourly relative humidity, above 0 to 100
 * @param diurnalRangeC twelve mean daily ranges, at least 0
 * @param rainMm twelve totals
 * @param windMPerS twelve means at 10 m
 */
public record MonthMeans(
    double[] temperatureC,
    double[] relativeHumidityPct,
    double[] diurnalRangeC,
    double[] rainMm,
    double[] windMPerS) {
  /** Days of each month, February with its quarter (Gregorian mean within 0.01). */
  private static final double[] DAYS = {31, 28.25, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31};

  /** Driest month that a correction may leave, %. */
  private static final double LEAST_HUMIDITY_PCT = 1;

  public MonthMeans {
    for (double[] values :
        new double[][] {temperatureC, relativeHumidityPct, diurnalRangeC, rainMm, windMPerS}) {
      if (values.length != PlaceFields.MONTHS) {
        throw new IllegalArgumentException("monthly means need twelve values");
      }
    }
  }

  /** Days in a month, 1..12; February has 28.25. */
  public static double daysIn(int month) {
    return DAYS[month - 1];
  }

  /** The same with every month this much warmer (K) and moister (points). */
  MonthMeans moved(double temperatureK, double humidityPct) {
    double[] warmer = new double[PlaceFields.MONTHS];
    double[] moister = new double[PlaceFields.MONTHS];
    Arrays.fill(warmer, temperatureK);
    Arrays.fill(moister, humidityPct);
    return moved(warmer, moister);
  }

  /** The same with each month warmer (K) and moister (points); humidity stays within 1..100 %. */
  MonthMeans moved(double[] temperatureK, double[] humidityPct) {
    double[] temperature = new double[PlaceFields.MONTHS];
    double[] humidity = new double[PlaceFields.MONTHS];
    for (int m = 0; m < PlaceFields.MONTHS; m++) {
      temperature[m] = temperatureC[m] + temperatureK[m];
      humidity[m] = Site.hold(relativeHumidityPct[m] + humidityPct[m], LEAST_HUMIDITY_PCT, 100);
    }
    return new MonthMeans(temperature, humidity, diurnalRangeC, rainMm, windMPerS);
  }

  /** January to December with wet hours, frost and all else that follows from the means. */
  public List<MonthClimate> climate(double latitudeDeg) {
    YearShape year = YearShape.of(temperatureC, rainMm);
    List<MonthClimate> months = new ArrayList<>(PlaceFields.MONTHS);
    for (int m = 0; m < PlaceFields.MONTHS; m++) {
      months.add(month(m, year, latitudeDeg));
    }
    return months;
  }

  private MonthClimate month(int m, YearShape year, double latitudeDeg) {
    double t = temperatureC[m];
    double range = diurnalRangeC[m];
    double mean = year.annualMeanC();
    double season = year.seasonalRangeK();
    double spread = DaySpread.of(latitudeDeg, t, mean, season);
    List<DayType> types = DayTypes.of(t, relativeHumidityPct[m], range, spread);
    double vapour = 0;
    for (DayType type : types) {
      vapour += type.share() * type.vapourPressureHpa();
    }
    double days = DAYS[m];
    double hours = 24 * days;
    return new MonthClimate(
        m + 1,
        t,
        relativeHumidityPct[m],
        vapour,
        range,
        hours * WetHours.above(types, WetHours.WET_RH_PCT, WetHours.WET_TEMPERATURE_C),
        hours * WetHours.above(types, 33, Double.NEGATIVE_INFINITY),
        hours * WetHours.above(types, 75, Double.NEGATIVE_INFINITY),
        hours * WetHours.below(types, 0),
        rainMm[m],
        WetDays.of(rainMm[m], t, days),
        windMPerS[m],
        days * FrostDays.nearFreezingShare(t, range, spread),
        days * FrostDays.frostShare(t, range, spread),
        types);
  }
}
