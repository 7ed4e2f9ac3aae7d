package saltspoke.atmosphere;

/**
 * One kind of day in a month: all hours of such days share a vapour pressure, and their temperature
 * follows the day–night cycle about the mean. A month is a handful of these whose shares add to 1.
 *
 * @param share share of the month's days, 0..1
 * @param meanTemperatureC mean over the 24 hours
 * @param diurnalRangeC maximum less minimum over the day, ≥ 0
 * @param vapourPressureHpa water-vapour pressure, hPa
 */
public record DayType(
    double share, double meanTemperatureC, double diurnalRangeC, double vapourPressureHpa) {}
