package saltspoke.atmosphere;

import java.util.List;
import saltspoke.values.Quantiles;

/**
 * How far the modelled climate lies from stations, as one standard deviation. Each grows with the
 * height of the place, where the maps are coarser than the ground.
 *
 * <p>Set so that 80 % of one half of 1500 stations of CRU CL 2.0 (New et al. 2002) lie within ±1.28
 * of it (quantile regression on height); the other half then holds 79.6 % (monthly temperature),
 * 78.7 % (annual), 80.6 % (monthly humidity) and 80.5 % (annual). Errors have longer tails than the
 * normal law: their root mean square is a fifth larger.
 */
public final class ClimateSpread {
  /** Highest stations of the fit, km. */
  private static final double HIGHEST_KM = 4.5;

  /**
   * ASSUMPTION: spread of ln wet hours a year when the monthly means are exact; from the median
   * absolute error of 7 and 10 % on hourly years left out of the fit of {@link DayTypes}.
   */
  static final double WET_HOURS_LN = 0.13;

  /** Wet hours added before a logarithm is taken, so that the driest deserts have one, h/a. */
  private static final double WET_HOURS_FLOOR = 10;

  private static final double HOURS_A_YEAR = 8766;

  private ClimateSpread() {}

  /** Of a monthly mean temperature, K. */
  public static double monthlyTemperatureK(double elevationM) {
    return 0.74 + 0.50 * heightKm(elevationM);
  }

  /** Of the annual mean temperature, K. */
  public static double annualTemperatureK(double elevationM) {
    return 0.54 + 0.50 * heightKm(elevationM);
  }

  /** Of a monthly mean relative humidity, points. */
  public static double monthlyHumidityPct(double elevationM) {
    return 5.1 + 1.2 * heightKm(elevationM);
  }

  /** Of the annual mean relative humidity, points. */
  public static double annualHumidityPct(double elevationM) {
    return 3.3 + 1.6 * heightKm(elevationM);
  }

  /** The 10–90 % band about an estimate, held between limits. */
  public static Quantiles band(double estimate, double spread, double least, double most) {
    double reach = NormalLaw.Z90 * spread;
    return new Quantiles(
        Math.max(least, Math.min(estimate, estimate - reach)),
        estimate,
        Math.min(most, Math.max(estimate, estimate + reach)));
  }

  /** Wet hours a year from exact monthly means: only the hours' own model is unsure. */
  public static Quantiles wetHoursOfExactMeans(MonthMeans means, double latitudeDeg) {
    return logBand(wetHours(means, latitudeDeg), WET_HOURS_LN);
  }

  /**
   * Wet hours a year from modelled monthly means. The months' errors in temperature and in humidity
   * are taken as those of the year, alike in all months.
   */
  public static Quantiles wetHoursOfModelledMeans(
      MonthMeans means, double latitudeDeg, double elevationM) {
    double humidityPct = annualHumidityPct(elevationM);
    double temperatureK = annualTemperatureK(elevationM);
    double humidity =
        lnRise(means.moved(0, -humidityPct), means.moved(0, humidityPct), latitudeDeg);
    double temperature =
        lnRise(means.moved(-temperatureK, 0), means.moved(temperatureK, 0), latitudeDeg);
    double spread = Math.hypot(WET_HOURS_LN, Math.hypot(humidity, temperature) / 2);
    return logBand(wetHours(means, latitudeDeg), spread);
  }

  private static double lnRise(MonthMeans low, MonthMeans high, double latitudeDeg) {
    return Math.log(
        (wetHours(high, latitudeDeg) + WET_HOURS_FLOOR)
            / (wetHours(low, latitudeDeg) + WET_HOURS_FLOOR));
  }

  private static Quantiles logBand(double hours, double lnSpread) {
    double factor = Math.exp(NormalLaw.Z90 * lnSpread);
    double floored = hours + WET_HOURS_FLOOR;
    return new Quantiles(
        Math.max(0, floored / factor - WET_HOURS_FLOOR),
        hours,
        Math.max(hours, Math.min(HOURS_A_YEAR, floored * factor - WET_HOURS_FLOOR)));
  }

  private static double wetHours(MonthMeans means, double latitudeDeg) {
    List<MonthClimate> months = means.climate(latitudeDeg);
    return months.stream().mapToDouble(MonthClimate::wetHours).sum();
  }

  private static double heightKm(double elevationM) {
    return Site.hold(elevationM / 1000, 0, HIGHEST_KM);
  }
}
