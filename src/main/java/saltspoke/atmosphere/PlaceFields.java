package saltspoke.atmosphere;

import java.util.function.Function;
import saltspoke.fields.Field;
import saltspoke.fields.FieldStack;
import saltspoke.fields.Grid;

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

  /** Spacing of the nine points over which the surroundings' elevation is averaged, degrees. */
  private static final double AROUND_STEP_DEG = 1 / 3.0;

  private final FieldStack temperature;
  private final FieldStack vapourDensity;
  private final FieldStack scaleHeight;
  private final FieldStack vapourTopography;
  private final FieldStack rain;
  private final FieldStack seasonalVapour;
  private final FieldStack marineTemperature;
  private final FieldStack marineWind;
  private final FieldStack elevation;

  PlaceFields(Function<String, FieldStack> layers) {
    temperature = layers.apply("temperature-monthly");
    vapourDensity = layers.apply("vapour-density-exceedance");
    scaleHeight = layers.apply("vapour-scale-height");
    vapourTopography = layers.apply("vapour-topography");
    rain = layers.apply("rain-monthly");
    seasonalVapour = seasons(layers.apply("vapour-pressure-harmonic"));
    marineTemperature = layers.apply("marine-air-temperature");
    marineWind = layers.apply("marine-wind-speed");
    elevation = layers.apply("elevation");
  }

  /** Values at a point; monthly arrays from January. */
  record At(
      double[] temperatureC,
      double[] vapourDensityGPerM3,
      double scaleHeightKm,
      double vapourTopographyM,
      double surroundingsM,
      double[] rainMm,
      double[] seasonalVapourHpa,
      double[] marineTemperatureC,
      double[] marineWindMPerS) {}

  At at(double latitudeDeg, double longitudeDeg) {
    double around = 0;
    for (int i = -1; i <= 1; i++) {
      for (int j = -1; j <= 1; j++) {
        around +=
            Math.max(
                    0,
                    elevation.sample(
                        0, latitudeDeg + i * AROUND_STEP_DEG, longitudeDeg + j * AROUND_STEP_DEG))
                / 9;
      }
    }
    int medianBand = scaleHeight.size() == 1 ? 0 : EXCEEDED_50;
    return new At(
        sample(temperature, latitudeDeg, longitudeDeg),
        sample(vapourDensity, latitudeDeg, longitudeDeg),
        scaleHeight.sample(medianBand, latitudeDeg, longitudeDeg),
        vapourTopography.sample(0, latitudeDeg, longitudeDeg),
        around,
        sample(rain, latitudeDeg, longitudeDeg),
        sample(seasonalVapour, latitudeDeg, longitudeDeg),
        sample(marineTemperature, latitudeDeg, longitudeDeg),
        sample(marineWind, latitudeDeg, longitudeDeg));
  }

  /**
   * Phase of the season in a month: cosine (first index 0) and sine, largest in the northern
   * January.
   */
  static double[] season(int month) {
    double phase = 2 * Math.PI * (MID_MONTH_DAY[month] - MID_MONTH_DAY[0]) / 365.25;
    return new double[] {Math.cos(phase), Math.sin(phase)};
  }

  private static double[] sample(FieldStack stack, double latitudeDeg, double longitudeDeg) {
    double[] values = new double[stack.size()];
    for (int i = 0; i < values.length; i++) {
      values[i] = stack.sample(i, latitudeDeg, longitudeDeg);
    }
    return values;
  }

  /**
   * Months from mean a1, amplitude a2 and day of minimum a3 of the year's harmonic (ITU-R P.834): e
   * = a1 − a2·cos(2π(d − a3)/365.25). Taken at the grid's points, since a day of the year cannot be
   * interpolated.
   */
  private static FieldStack seasons(FieldStack harmonic) {
    Grid grid = harmonic.band(0).grid();
    Field[] months = new Field[MONTHS];
    for (int m = 0; m < MONTHS; m++) {
      float[] values = new float[grid.rows() * grid.columns()];
      for (int row = 0, i = 0; row < grid.rows(); row++) {
        for (int column = 0; column < grid.columns(); column++, i++) {
          double phase =
              2 * Math.PI * (MID_MONTH_DAY[m] - harmonic.band(2).at(row, column)) / 365.25;
          values[i] =
              (float)
                  (harmonic.band(0).at(row, column)
                      - harmonic.band(1).at(row, column) * Math.cos(phase));
        }
      }
      months[m] = new Field(grid, harmonic.band(0).unit(), values);
    }
    return new FieldStack(harmonic.layer(), java.util.List.of(months));
  }
}
