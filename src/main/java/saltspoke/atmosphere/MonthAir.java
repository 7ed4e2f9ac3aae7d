package saltspoke.atmosphere;

import java.util.List;

/**
 * Outside air of one calendar month at a place.
 *
 * @param month 1..12
 * @param temperatureC monthly mean
 * @param relativeHumidityPct mean of the hourly relative humidity, 0..100
 * @param vapourPressureHpa monthly mean
 * @param diurnalRangeC mean daily maximum less minimum
 * @param wetHours hours with RH > 80 % and T > 0 °C (ISO 9223), per month
 * @param hoursAbove33Pct hours with RH > 33 % (magnesium chloride), any temperature
 * @param hoursAbove75Pct hours with RH > 75 % (sodium chloride), any temperature
 * @param hoursBelow0C hours with T < 0 °C
 * @param rainMm precipitation, mm per month
 * @param wetDays days with at least 1 mm, estimated
 * @param windMPerS mean wind speed at 10 m
 * @param nearFreezingDays days with minimum below +1 °C and maximum above −5 °C
 * @param frostDays days with minimum below 0 °C
 * @param chlorideDepositionMgPerM2Day median sea-salt chloride deposition of the month, wet candle
 * @param dayTypes the kinds of day that make the month, shares adding to 1
 */
public record MonthAir(
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
    double chlorideDepositionMgPerM2Day,
    List<DayType> dayTypes) {
  public MonthAir {
    dayTypes = List.copyOf(dayTypes);
  }
}
