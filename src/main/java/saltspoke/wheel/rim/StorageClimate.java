package saltspoke.wheel.rim;

import java.util.ArrayList;
import java.util.List;
import saltspoke.atmosphere.DayType;
import saltspoke.atmosphere.MonthAir;
import saltspoke.atmosphere.SaturationPressure;
import saltspoke.wheel.Storage;

/**
 * Temperature and humidity where a bicycle is kept, from the day types outside: the same vapour at
 * the place's own temperature. Outside, T(h) = T_day + R/2·cos(2π(h − 15)/24) with R the day's
 * range and the warmest hour at 15 (common practice).
 *
 * <ul>
 *   <li>Covered outdoors: the air outside, without cooling to the sky.
 *   <li>Open: the same, and at night the wheel lies below the air by a share of R (cooling to the
 *       sky goes with clear nights, and those with a large range), so that dew forms on it.
 *   <li>Unheated shed: a first-order lag τ, so the swing is R/2·1/√(1 + (ωτ)²), later by
 *       atan(ωτ)/ω; of the remaining swing of humidity, wood and cloth take up a share.
 *   <li>Heated room: T = max(room, T_day); vapour of the outside air plus a gain from people that
 *       falls from {@link #ROOM_GAIN_HPA} at 0 °C outside to none at 20 °C, at most saturated.
 * </ul>
 */
public final class StorageClimate {
  /** Slots of a day. */
  public static final int SLOTS = 6;

  /**
   * Vapour gained in a dwelling while it is 0 °C or colder outside, hPa. ASSUMPTION: middle of
   * humidity class 2 of EN ISO 13788 (270–540 Pa, from memory), spread 2–6.5 hPa.
   */
  public static final double ROOM_GAIN_HPA = 4.0;

  /** Outside temperature at which that gain has fallen to nothing, °C (EN ISO 13788, memory). */
  private static final double NO_GAIN_FROM_C = 20;

  private static final double WARMEST_HOUR = 15;
  private static final double OMEGA_PER_HOUR = 2 * Math.PI / 24;

  private StorageClimate() {}

  /** The month's states, {@link #SLOTS} per day type in order of the hour; shares add to 1. */
  public static List<KeptAir> of(MonthAir month, Storage storage, RimAssumptions assumptions) {
    List<KeptAir> states = new ArrayList<>(SLOTS * month.dayTypes().size());
    for (int d = 0; d < month.dayTypes().size(); d++) {
      addDay(states, d, month.dayTypes().get(d), storage, assumptions);
    }
    return states;
  }

  private static void addDay(
      List<KeptAir> states, int d, DayType day, Storage storage, RimAssumptions a) {
    double outsideHpa = day.vapourPressureHpa();
    double half = day.diurnalRangeC() / 2;
    int first = states.size();
    for (int slot = 0; slot < SLOTS; slot++) {
      double hour = (slot + 0.5) * 24 / SLOTS;
      double swing = Math.cos(OMEGA_PER_HOUR * (hour - WARMEST_HOUR));
      double temperatureC = day.meanTemperatureC() + half * swing;
      double hpa = outsideHpa;
      switch (storage) {
        case COVERED_OUTDOORS -> {}
        case OPEN ->
            temperatureC -=
                a.get(RimAssumption.SKY_COOLING_SHARE)
                    * day.diurnalRangeC()
                    * Math.max(0, Math.cos(OMEGA_PER_HOUR * hour));
        case UNHEATED_SHED -> {
          double lag = OMEGA_PER_HOUR * a.get(RimAssumption.SHED_LAG_HOURS);
          temperatureC =
              day.meanTemperatureC()
                  + half
                      / Math.sqrt(1 + lag * lag)
                      * Math.cos(OMEGA_PER_HOUR * (hour - WARMEST_HOUR) - Math.atan(lag));
        }
        case HEATED_ROOM -> {
          temperatureC = Math.max(a.get(RimAssumption.ROOM_C), day.meanTemperatureC());
          double coldness = (NO_GAIN_FROM_C - Math.max(0, day.meanTemperatureC())) / NO_GAIN_FROM_C;
          hpa += ROOM_GAIN_HPA * Math.max(0, Math.min(1, coldness));
        }
      }
      states.add(state(day.share() / SLOTS, d, temperatureC, hpa));
    }
    if (storage == Storage.UNHEATED_SHED) {
      buffer(states, first, a.get(RimAssumption.SHED_BUFFERING));
    }
  }

  private static KeptAir state(double share, int day, double temperatureC, double hpa) {
    double saturation = SaturationPressure.overWaterHpa(temperatureC);
    double held = Math.min(hpa, saturation);
    return new KeptAir(share, day, temperatureC, held, Math.min(100, 100 * held / saturation));
  }

  /** Draws the day's humidities towards their mean. */
  private static void buffer(List<KeptAir> states, int first, double buffering) {
    double mean = 0;
    for (int i = first; i < states.size(); i++) {
      mean += states.get(i).relativeHumidityPct() / SLOTS;
    }
    for (int i = first; i < states.size(); i++) {
      KeptAir s = states.get(i);
      double rh =
          Math.min(100, s.relativeHumidityPct() + buffering * (mean - s.relativeHumidityPct()));
      double hpa = rh / 100 * SaturationPressure.overWaterHpa(s.temperatureC());
      states.set(i, new KeptAir(s.share(), s.day(), s.temperatureC(), hpa, rh));
    }
  }
}
