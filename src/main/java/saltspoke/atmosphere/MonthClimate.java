package saltspoke.atmosphere;

import java.util.List;

/**
 * Climate of one calendar month at a place: all of {@link MonthAir} but the salt.
 *
 * @param month 1..12
 * @param temperatureC monthly mean, period 1961–1990
 * @param relativeHumidityPct mean of the hourly relative humidity over water, 0..100
 * @param vapourPressureHpa monthly mean
 * @param diurnalRangeC mean daily maximum less minimum
 * @param wetHours hours a month with RH > 80 % and T > 0 °C (ISO 9223)
 * @param hoursAbove33Pct hours with RH > 33 %, any temperature
 * @param hoursAbove75Pct hours with RH > 75 %, any temperature
 * @param hoursBelow0C hours with T < 0 °C
 * @param rainMm precipitation, mm per month
 * @param wetDays days with at least 1 mm, estimated
 * @param windMPerS mean wind speed at 10 m
 * @param nearFreezingDays days with minimum below +1 °C and maximum above −5 °C
 * @param frostDays days with minimum below 0 °C
 * @param dayTypes the kinds of day that make the month, shares adding to 1
 */
public record MonthClimate(
    int month,
    double temperatureC,
    double relativeHumidityPct,
    double vapourPressureHpa,
    double diurnalRangeC,
    double wetHours,
    double hoursAbove33Pct,
    double hoursAbove75Pct,
    double hoursBelow0C,
    double rainMm,
    double wetDays,
    double windMPerS,
    double nearFreezingDays,
    double frostDays,
    List<DayType> dayTypes) {
  public MonthClimate {
    dayTypes = List.copyOf(dayTypes);
  }

  /** This month with other wet hours, as measured near by. */
  MonthClimate withWetHours(double otherWetHours) {
    return new MonthClimate(
        month,
        temperatureC,
        relativeHumidityPct,
        vapourPressureHpa,
        diurnalRangeC,
        otherWetHours,
        hoursAbove33Pct,
        hoursAbove75Pct,
        hoursBelow0C,
        rainMm,
        wetDays,
        windMPerS,
        nearFreezingDays,
        frostDays,
        dayTypes);
  }

  /** This month with its salt. */
  public MonthAir withChloride(double chlorideDepositionMgPerM2Day) {
    return new MonthAir(
        month,
        temperatureC,
        relativeHumidityPct,
        vapourPressureHpa,
        diurnalRangeC,
        wetHours,
        hoursAbove33Pct,
        hoursAbove75Pct,
        hoursBelow0C,
        rainMm,
        wetDays,
        windMPerS,
        nearFreezingDays,
        frostDays,
        chlorideDepositionMgPerM2Day,
        dayTypes);
  }
}
