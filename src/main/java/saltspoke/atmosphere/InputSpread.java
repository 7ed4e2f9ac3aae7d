package saltspoke.atmosphere;

/**
 * How uncertain the four inputs of ISO 9223 are, as one standard deviation each.
 *
 * @param temperatureK of the annual mean, K
 * @param relativeHumidityPct of the annual mean, points
 * @param so2Ln of ln Pd
 * @param chlorideLn of ln Sd
 */
public record InputSpread(
    double temperatureK, double relativeHumidityPct, double so2Ln, double chlorideLn) {
  /** Inputs known exactly: only the standard's own spread remains. */
  public static final InputSpread NONE = new InputSpread(0, 0, 0, 0);

  public InputSpread {
    if (!(temperatureK >= 0 && relativeHumidityPct >= 0 && so2Ln >= 0 && chlorideLn >= 0)) {
      throw new IllegalArgumentException("spreads are numbers of at least 0");
    }
  }
}
