package saltspoke.atmosphere;

import java.util.List;

/**
 * Shares of a month's hours, integrated over its kinds of day and their day–night cycles. The kinds
 * are few, so each stands for days on both sides of it: a share counts in full from half a width
 * above the limit and not at all from half a width below.
 */
public final class WetHours {
  /** Limits of time of wetness (ISO 9223:2012): RH above 80 %, temperature above 0 °C. */
  public static final double WET_RH_PCT = 80;

  public static final double WET_TEMPERATURE_C = 0;

  /** ASSUMPTION: width in RH of what one kind of day stands for, %. Part of the fit. */
  private static final double RH_WIDTH_PCT = 12;

  /** ASSUMPTION: width in temperature of what one kind of day stands for, K. Part of the fit. */
  private static final double TEMPERATURE_WIDTH_K = 2;

  /** Added before wet hours of a month are compared by their quotient, so that none is 0/0, h. */
  private static final double QUOTIENT_FLOOR_H = 1;

  private WetHours() {}

  /** Measured over modelled wet hours of a month, both at least 0. */
  public static double quotient(double measuredH, double modelledH) {
    return (measuredH + QUOTIENT_FLOOR_H) / (modelledH + QUOTIENT_FLOOR_H);
  }

  /** The hours that {@link #quotient} over {@code modelledH} says, from 0 to {@code mostH}. */
  static double times(double quotient, double modelledH, double mostH) {
    return Site.hold(quotient * (modelledH + QUOTIENT_FLOOR_H) - QUOTIENT_FLOOR_H, 0, mostH);
  }

  /**
   * Share of hours, 0..1, with relative humidity over water above {@code relativeHumidityPct} and
   * temperature above {@code minTemperatureC} (use {@code Double.NEGATIVE_INFINITY} for any).
   */
  public static double above(
      List<DayType> dayTypes, double relativeHumidityPct, double minTemperatureC) {
    if (relativeHumidityPct <= 0 && minTemperatureC == Double.NEGATIVE_INFINITY) {
      return 1;
    }
    if (relativeHumidityPct >= 100) {
      return 0;
    }
    double width =
        Math.min(RH_WIDTH_PCT, 2 * Math.min(relativeHumidityPct, 100 - relativeHumidityPct));
    int steps = DiurnalCycle.steps();
    double sum = 0;
    for (DayType day : dayTypes) {
      double wet = 0;
      for (int s = 0; s < steps; s++) {
        double t = day.meanTemperatureC() + day.diurnalRangeC() * DiurnalCycle.departure(s);
        double rh = 100 * day.vapourPressureHpa() / SaturationPressure.overWaterHpa(t);
        wet +=
            (width > 0 ? ramp((rh - relativeHumidityPct) / width) : 1)
                * ramp((t - minTemperatureC) / TEMPERATURE_WIDTH_K);
      }
      sum += day.share() * wet / steps;
    }
    return sum;
  }

  /** Share of hours, 0..1, with temperature below {@code temperatureC}. */
  public static double below(List<DayType> dayTypes, double temperatureC) {
    int steps = DiurnalCycle.steps();
    double sum = 0;
    for (DayType day : dayTypes) {
      double cold = 0;
      for (int s = 0; s < steps; s++) {
        double t = day.meanTemperatureC() + day.diurnalRangeC() * DiurnalCycle.departure(s);
        cold += ramp((temperatureC - t) / TEMPERATURE_WIDTH_K);
      }
      sum += day.share() * cold / steps;
    }
    return sum;
  }

  /** Mean of the hourly relative humidity over water, capped at 100 %. */
  public static double meanRelativeHumidityPct(List<DayType> dayTypes) {
    int steps = DiurnalCycle.steps();
    double sum = 0;
    for (DayType day : dayTypes) {
      double rh = 0;
      for (int s = 0; s < steps; s++) {
        double t = day.meanTemperatureC() + day.diurnalRangeC() * DiurnalCycle.departure(s);
        rh += Math.min(100, 100 * day.vapourPressureHpa() / SaturationPressure.overWaterHpa(t));
      }
      sum += day.share() * rh / steps;
    }
    return sum;
  }

  private static double ramp(double x) {
    return Math.max(0, Math.min(1, x + 0.5));
  }
}
