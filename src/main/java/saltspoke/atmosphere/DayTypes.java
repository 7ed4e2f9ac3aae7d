package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.List;

/**
 * The kinds of day that make a month, from its mean temperature, mean relative humidity, mean daily
 * range and the spread of temperature between days.
 *
 * <p>Five equally frequent kinds from dry to moist, each in a cold, a middle and a mild form. The
 * saturation ratio at the day's mean temperature is log-normal between days; dry days have the
 * larger range; moist days tend to be mild. The level of humidity is then set so that the mean of
 * the hourly relative humidity, capped at 100 %, is exactly the month's.
 *
 * <p>The form is this program's own assumption. Its three numbers and {@link
 * DiurnalCycle#SECOND_HARMONIC} were fitted together by least squares on the hours above 33, 75 and
 * 80 % of 16 hourly typical years (United States, Britain, Spain, Brazil, India, Australia). Fitted
 * on one half of them, the other half's wet hours a year come out with a median absolute error of 7
 * % and 10 %.
 */
public final class DayTypes {
  /**
   * Spread of ln saturation ratio between days in fully dry air, fitted (0.6 and 1.1 on halves).
   */
  private static final double HUMIDITY_SPREAD = 0.7639;

  /** Power of (1 − RH) by which that spread shrinks in moist air, fitted (1.1 and 1.5). */
  private static final double HUMIDITY_SPREAD_POWER = 1.2025;

  /** How much smaller ln of the range is per standard deviation towards moist, fitted (0.3). */
  private static final double RANGE_SHRINK = 0.3079;

  /**
   * ASSUMPTION: correlation between a day's moistness and its mean temperature within the month,
   * chosen among 0, 0.3 and 0.6; spread ±0.3.
   */
  private static final double MILD_WHEN_MOIST = 0.6;

  /** Medians of five equal slices of the normal distribution, scaled to unit variance; computed. */
  private static final double[] MOISTNESS = {-1.463366, -0.598798, 0, 0.598798, 1.463366};

  /** Three equally frequent nodes of unit variance; computed. */
  private static final double[] WARMTH = {-1.224745, 0, 1.224745};

  private static final double HIGHEST_MEAN_RH_PCT = 99.5;
  private static final int MOST_STEPS = 60;

  private DayTypes() {}

  /**
   * @param temperatureC monthly mean
   * @param relativeHumidityPct mean of the hourly values, above 0; above 99.5 counts as 99.5
   * @param diurnalRangeC mean daily maximum less minimum, at least 0
   * @param daySpreadC standard deviation of daily mean temperature within the month, at least 0
   */
  public static List<DayType> of(
      double temperatureC, double relativeHumidityPct, double diurnalRangeC, double daySpreadC) {
    double target = Math.min(HIGHEST_MEAN_RH_PCT, relativeHumidityPct);
    int kinds = MOISTNESS.length * WARMTH.length;
    double spread = HUMIDITY_SPREAD * Math.pow(1 - target / 100, HUMIDITY_SPREAD_POWER);
    double[] meanC = new double[kinds];
    double[] rangeC = new double[kinds];
    double[] vapour = new double[kinds];
    double rangeScale = meanRangeFactor();
    for (int m = 0, k = 0; m < MOISTNESS.length; m++) {
      for (int w = 0; w < WARMTH.length; w++, k++) {
        double warmth =
            MILD_WHEN_MOIST * MOISTNESS[m]
                + Math.sqrt(1 - MILD_WHEN_MOIST * MILD_WHEN_MOIST) * WARMTH[w];
        meanC[k] = temperatureC + daySpreadC * warmth;
        rangeC[k] = diurnalRangeC * Math.exp(-RANGE_SHRINK * MOISTNESS[m]) / rangeScale;
        vapour[k] = SaturationPressure.overWaterHpa(meanC[k]) * Math.exp(spread * MOISTNESS[m]);
      }
    }
    double level = level(target, meanC, rangeC, vapour);
    List<DayType> types = new ArrayList<>(kinds);
    for (int k = 0; k < kinds; k++) {
      types.add(new DayType(1.0 / kinds, meanC[k], rangeC[k], level * vapour[k]));
    }
    return types;
  }

  private static double meanRangeFactor() {
    double sum = 0;
    for (double m : MOISTNESS) {
      sum += Math.exp(-RANGE_SHRINK * m);
    }
    return sum / MOISTNESS.length;
  }

  /**
   * The factor on all vapour pressures that gives the wanted mean relative humidity. The mean is a
   * rising, piecewise linear and concave function of the factor, so Newton's step from below is
   * exact once the set of saturated hours settles.
   */
  private static double level(double target, double[] meanC, double[] rangeC, double[] vapour) {
    int steps = DiurnalCycle.steps();
    double[] relative = new double[meanC.length * steps];
    for (int k = 0, i = 0; k < meanC.length; k++) {
      for (int s = 0; s < steps; s++, i++) {
        double t = meanC[k] + rangeC[k] * DiurnalCycle.departure(s);
        relative[i] = 100 * vapour[k] / SaturationPressure.overWaterHpa(t);
      }
    }
    double level = 0;
    for (int step = 0; step < MOST_STEPS; step++) {
      double unsaturated = 0;
      int saturated = 0;
      for (double r : relative) {
        if (level * r >= 100) {
          saturated++;
        } else {
          unsaturated += r;
        }
      }
      double next = (target * relative.length - 100.0 * saturated) / unsaturated;
      if (next <= level * (1 + 1e-12)) {
        return level;
      }
      level = next;
    }
    return level;
  }
}
