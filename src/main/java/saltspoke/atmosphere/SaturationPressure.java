package saltspoke.atmosphere;

/**
 * Saturation vapour pressure by the Magnus form. Over liquid water at every temperature unless ice
 * is asked for: relative humidity is reported over water below freezing too (WMO-No. 8, 2018, part
 * I, annex 4.B). Coefficients: Sonntag 1990, as printed there; −45..60 °C over water, −65..0.01 °C
 * over ice, within 0.6 % and 1 %.
 */
public final class SaturationPressure {
  private static final double WATER_HPA = 6.112;
  private static final double WATER_FACTOR = 17.62;
  private static final double WATER_C = 243.12;
  private static final double ICE_FACTOR = 22.46;
  private static final double ICE_C = 272.62;

  private SaturationPressure() {}

  /** Over liquid water, hPa. */
  public static double overWaterHpa(double temperatureC) {
    return WATER_HPA * Math.exp(WATER_FACTOR * temperatureC / (WATER_C + temperatureC));
  }

  /** Over ice, hPa; for temperatures up to 0 °C. */
  public static double overIceHpa(double temperatureC) {
    return WATER_HPA * Math.exp(ICE_FACTOR * temperatureC / (ICE_C + temperatureC));
  }

  /** Temperature at which {@code vapourPressureHpa} (above 0) saturates over water, °C. */
  public static double dewPointC(double vapourPressureHpa) {
    double x = Math.log(vapourPressureHpa / WATER_HPA);
    return WATER_C * x / (WATER_FACTOR - x);
  }
}
