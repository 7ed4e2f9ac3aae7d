package saltspoke.atmosphere;

/**
 * The dose–response functions of ISO 9223:2012, one set of coefficients per metal:
 *
 * <pre>r = a·Pd^b·exp(c·RH + f(T)) + d·Sd^e·exp(g·RH + h·T),  f(T) = k·(T − 10)</pre>
 *
 * with k for T ≤ 10 °C and another for T &gt; 10 °C. T °C, RH %, Pd and Sd mg/(m² d), r µm in the
 * first year for all four metals. Carbon steel as printed in a published transcription of the
 * standard; zinc, copper and aluminium from memory. ASSUMPTION: aluminium, too, is in µm; its unit
 * could not be read in print, and µm puts it in the same or a neighbouring category as the others.
 *
 * <p>Computes as given, also outside the fitted range: {@link FittedRange} says when that happens
 * and clamps the floors.
 */
public record DoseResponse(
    double a,
    double b,
    double c,
    double coldK,
    double warmK,
    double d,
    double e,
    double g,
    double h) {
  /** ISO 9223:2012, carbon steel; published transcription. */
  private static final DoseResponse CARBON_STEEL =
      new DoseResponse(1.77, 0.52, 0.020, 0.150, -0.054, 0.102, 0.62, 0.033, 0.040);

  /** ISO 9223:2012, zinc; from memory. */
  private static final DoseResponse ZINC =
      new DoseResponse(0.0129, 0.44, 0.046, 0.038, -0.071, 0.0175, 0.57, 0.008, 0.085);

  /** ISO 9223:2012, copper; from memory. */
  private static final DoseResponse COPPER =
      new DoseResponse(0.0053, 0.26, 0.059, 0.126, -0.080, 0.01025, 0.27, 0.036, 0.049);

  /** ISO 9223:2012, aluminium; from memory. */
  private static final DoseResponse ALUMINIUM =
      new DoseResponse(0.0042, 0.73, 0.025, 0.009, -0.043, 0.0018, 0.60, 0.020, 0.094);

  /** Temperature at which f(T) changes its slope, °C; ISO 9223:2012. */
  private static final double KNEE_C = 10;

  /** The function of one metal. */
  public static DoseResponse of(Metal metal) {
    return switch (metal) {
      case CARBON_STEEL -> CARBON_STEEL;
      case ZINC -> ZINC;
      case COPPER -> COPPER;
      case ALUMINIUM -> ALUMINIUM;
    };
  }

  /** First-year loss; grows with RH, Pd and Sd. */
  public FirstYearLoss firstYear(Exposure x) {
    return new FirstYearLoss(sulfurPartUm(x) + chloridePartUm(x));
  }

  /** The first term: what the metal loses to SO2, µm in the first year. */
  public double sulfurPartUm(Exposure x) {
    double fromKnee = x.temperatureC() - KNEE_C;
    double f = (fromKnee <= 0 ? coldK : warmK) * fromKnee;
    return a * Math.pow(x.so2MgPerM2Day(), b) * Math.exp(c * x.relativeHumidityPct() + f);
  }

  /** The second term: what the metal loses to chloride, µm in the first year. */
  public double chloridePartUm(Exposure x) {
    return d
        * Math.pow(x.chlorideMgPerM2Day(), e)
        * Math.exp(g * x.relativeHumidityPct() + h * x.temperatureC());
  }
}
