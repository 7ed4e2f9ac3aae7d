package saltspoke.atmosphere;

/**
 * Outside air over the year.
 *
 * @param temperatureC annual mean
 * @param relativeHumidityPct annual mean
 * @param wetHours hours a year with RH > 80 % and T > 0 °C
 * @param rainMm precipitation a year
 * @param frostDays days a year with minimum below 0 °C
 * @param nearFreezingDays days a year with minimum below +1 °C and maximum above −5 °C
 */
public record AnnualAir(
    double temperatureC,
    double relativeHumidityPct,
    double wetHours,
    double rainMm,
    double frostDays,
    double nearFreezingDays) {}
