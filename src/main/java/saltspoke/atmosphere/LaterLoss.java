package saltspoke.atmosphere;

import java.util.List;
import saltspoke.values.Quantiles;

/**
 * ISO 9224:2012: loss after more than a year. D = r·t^b up to 20 years; beyond, it goes on along
 * the tangent: D = r·[20^b + b·20^(b−1)·(t − 20)].
 *
 * @param mean exponent B1
 * @param upper exponent B2
 */
public record LaterLoss(double mean, double upper) {
  /** Years given in answers. */
  public static final List<Integer> YEARS = List.of(1, 2, 5, 10, 20, 50);

  /** End of the power law, years; ISO 9224:2012. */
  private static final double POWER_LAW_END_YEARS = 20;

  /** B2 is B1 plus this many standard deviations of the exponent; from memory of ISO 9224. */
  private static final double UPPER_IN_DEVIATIONS = 2;

  /** Exponents B1 and B2 of ISO 9224:2012 as published. */
  public static LaterLoss of(Metal metal) {
    return switch (metal) {
      case CARBON_STEEL -> new LaterLoss(0.523, 0.575);
      case ZINC -> new LaterLoss(0.813, 0.873);
      case COPPER -> new LaterLoss(0.667, 0.726);
      case ALUMINIUM -> new LaterLoss(0.728, 0.807);
    };
  }

  /** Loss after some years over the first year's, for exponent {@code b}. */
  public static double timesFirstYear(double b, double years) {
    if (years <= POWER_LAW_END_YEARS) {
      return Math.pow(years, b);
    }
    return Math.pow(POWER_LAW_END_YEARS, b)
        + b * Math.pow(POWER_LAW_END_YEARS, b - 1) * (years - POWER_LAW_END_YEARS);
  }

  /** Loss after each of {@link #YEARS}, from the spread of the first-year loss and of b. */
  public List<LongTermLoss> from(Quantiles firstYearUm) {
    return YEARS.stream().map(years -> new LongTermLoss(years, after(firstYearUm, years))).toList();
  }

  private Quantiles after(Quantiles firstYearUm, int years) {
    double factor = timesFirstYear(mean, years);
    double oneUp = mean + (upper - mean) / UPPER_IN_DEVIATIONS;
    double exponentLnSpread = Math.log(timesFirstYear(oneUp, years) / factor);
    double median = firstYearUm.median() * factor;
    double down = lnSpread(firstYearUm.median(), firstYearUm.p10(), exponentLnSpread);
    double up = lnSpread(firstYearUm.p90(), firstYearUm.median(), exponentLnSpread);
    return new Quantiles(
        median * Math.exp(-NormalLaw.Z90 * down), median, median * Math.exp(NormalLaw.Z90 * up));
  }

  private static double lnSpread(double high, double low, double exponentLnSpread) {
    return Math.hypot(Math.log(high / low) / NormalLaw.Z90, exponentLnSpread);
  }
}
