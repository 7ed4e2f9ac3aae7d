package saltspoke.atmosphere;

import java.util.function.Function;
import saltspoke.fields.FieldStack;

/** The layers that the climate is computed from, and their values at a point. */
final class PlaceFields {
  static final int MONTHS = 12;

  /**
   * Levels of the vapour-density layer, share of the time exceeded, % (ITU-R P.836-6). Its bands
   * stand in this order.
   */
  static final double[] EXCEEDED_PCT = {
    0.1, 0.2, 0.3, 0.5, 1, 2, 3, 5, 10, 20, 30, 50, 60, 70, 80, 90, 95, 99
  };

  /** Index of 10 %, 50 % and 90 % in {@link #EXCEEDED_PCT}. */
  static final int EXCEEDED_10 = 8;

  static final int EXCEEDED_50 = 11;
  static final int EXCEEDED_90 = 15;

  /** Middle of each month as day of a 365-day year. */
  private static final double[] MID_MONTH_DAY = {
    15.5, 45, 74.5, 105, 135.5, 166, 196.5, 227.5, 258, 288.5, 319, 349.5
  };

  /** Bands of the vapour-pressure harmonic. */
  private static final int MEAN = 0;

  private static final int COSINE = 3;
  private static final int SINE = 4;

  /**
   * Spacing of the nine points over which the temperature map's ground is averaged, degrees: the
   * model's own orography is smoother than the means over its cells.
   */
  private static final double AROUND_STEP_DEG = 0.75;

  private final FieldStack temperature;
  private final FieldStack vapourDensity;
  private final FieldStack scaleHeight;
  private final FieldStack vapourTopography;
  private final FieldStack rain;
  private final FieldStack vapourHarmonic;
  private final FieldStack marineTemperature;
  private final FieldStack marineWind;
  private final FieldStack temperatureHeight;
  private final FieldStack elevation;

  PlaceFields(Function<String, FieldStack> layers) {
    temperature = layers.apply("temperature-monthly");
    vapourDensity = layers.apply("vapour-density-exceedance");
    scaleHeight = layers.apply("vapour-scale-height");
    vapourTopography = layers.apply("vapour-topography");
    rain = layers.apply("rain-monthly");
    vapourHarmonic = layers.apply("vapour-pressure-harmonic");
    temperatureHeight = layers.apply("temperature-height");
    marineTemperature = layers.apply("marine-air-temperature");
    marineWind = layers.apply("marine-wind-speed");
    elevation = layers.apply("elevation");
  }

  /**
   * Values at a point; monthly arrays from January.
   *
   * @param temperatureGroundM height of the ground that the temperature map stands on
   * @param mapElevationM elevation of the 10′ map
   */
  record At(
      double[] temperatureC,
      double[] vapourDensityGPerM3,
      double scaleHeightKm,
      double vapourTopographyM,
      double temperatureGroundM,
      double mapElevationM,
      double[] rainMm,
      double[] seasonalVapourHpa,
      double[] marineTemperatureC,
      double[] marineWindMPerS) {}

  At at(double latitudeDeg, double longitudeDeg) {
    double around = 0;
    for (int i = -1; i <= 1; i++) {
      for (int j = -1; j <= 1; j++) {
        around +=
            temperatureHeight.sample(
                    0, latitudeDeg + i * AROUND_STEP_DEG, longitudeDeg + j * AROUND_STEP_DEG)
                / 9;
      }
    }
    return new At(
        temperature.sampleAll(latitudeDeg, longitudeDeg),
        vapourDensity.sampleAll(latitudeDeg, longitudeDeg),
        scaleHeight.sample(EXCEEDED_50, latitudeDeg, longitudeDeg),
        vapourTopography.sample(0, latitudeDeg, longitudeDeg),
        around,
        elevation.sample(0, latitudeDeg, longitudeDeg),
        rain.sampleAll(latitudeDeg, longitudeDeg),
        seasonalVapour(latitudeDeg, longitudeDeg),
        marineTemperature.sampleAll(latitudeDeg, longitudeDeg),
        marineWind.sampleAll(latitudeDeg, longitudeDeg));
  }

  /**
   * Phase of the season in a month: cosine (first index 0) and sine, largest in the northern
   * January.
   */
  static double[] season(int month) {
    double phase = 2 * Math.PI * (MID_MONTH_DAY[month] - MID_MONTH_DAY[0]) / 365.25;
    return new double[] {Math.cos(phase), Math.sin(phase)};
  }

  /** Months of the year's harmonic of vapour pressure (ITU-R P.834), hPa. */
  private double[] seasonalVapour(double latitudeDeg, double longitudeDeg) {
    double mean = vapourHarmonic.sample(MEAN, latitudeDeg, longitudeDeg);
    double cosine = vapourHarmonic.sample(COSINE, latitudeDeg, longitudeDeg);
    double sine = vapourHarmonic.sample(SINE, latitudeDeg, longitudeDeg);
    double[] months = new double[MONTHS];
    for (int m = 0; m < MONTHS; m++) {
      double phase = 2 * Math.PI * MID_MONTH_DAY[m] / 365.25;
      months[m] = mean + cosine * Math.cos(phase) + sine * Math.sin(phase);
    }
    return months;
  }
}
