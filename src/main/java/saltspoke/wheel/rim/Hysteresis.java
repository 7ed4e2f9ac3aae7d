package saltspoke.wheel.rim;

import java.util.List;
import saltspoke.wheel.Deliquescence;
import saltspoke.wheel.SaltMix;

/**
 * Whether sodium chloride is dissolved in each state of a month: it dissolves where the humidity
 * passes its deliquescence, stays dissolved while it keeps above the drying line, and between the
 * two it is as it was. Both lines are taken at the month's mean temperature (they move by 0.01 %
 * per kelvin). Within a day the slots follow one another; a day that never leaves the between
 * carries on what the day before left. Days of all types follow one another at random, so the
 * chance of waking wet is wettings/(wettings + dryings); where there are neither, it is the last
 * month's.
 */
final class Hysteresis {
  private static final SaltMix SODIUM = new SaltMix(0, 1000, 0, 0);

  private final List<KeptAir> states;
  private final double onsetPct;
  private final double dryingPct;

  /**
   * @param states the month's states, slots of each day type in order
   * @param meanC the month's mean temperature
   */
  Hysteresis(List<KeptAir> states, double meanC) {
    this.states = states;
    this.onsetPct = Deliquescence.onsetRhPct(SODIUM, meanC);
    this.dryingPct = Deliquescence.dryingRhPct(SODIUM, meanC);
  }

  /** Whether sodium chloride goes into solution at this humidity, whatever was before. */
  static boolean dissolves(double rhPct, double temperatureC) {
    return rhPct >= Deliquescence.onsetRhPct(SODIUM, temperatureC);
  }

  /**
   * This month's chance of waking wet, 0..1.
   *
   * @param wettingsPerDay wet rides, rinses and rains a day, each of which dissolves the salt
   * @param before the last month's chance
   */
  double wakesWet(double wettingsPerDay, double before) {
    double wetting = wettingsPerDay;
    double drying = 0;
    int slots = StorageClimate.SLOTS;
    for (int first = 0; first < states.size(); first += slots) {
      boolean fromDry = false;
      boolean fromWet = true;
      for (int i = first; i < first + slots; i++) {
        fromDry = next(i, fromDry);
        fromWet = next(i, fromWet);
      }
      double share = states.get(first).share() * slots;
      wetting += fromDry ? share : 0;
      drying += fromWet ? 0 : share;
    }
    return wetting + drying > 0 ? wetting / (wetting + drying) : before;
  }

  /** Chance that sodium chloride is dissolved in each state, given the chance of waking wet. */
  double[] dissolved(double wakesWet) {
    double[] chance = new double[states.size()];
    int slots = StorageClimate.SLOTS;
    for (int first = 0; first < states.size(); first += slots) {
      boolean fromDry = false;
      boolean fromWet = true;
      for (int i = first; i < first + slots; i++) {
        fromDry = next(i, fromDry);
        fromWet = next(i, fromWet);
        chance[i] = (fromWet ? wakesWet : 0) + (fromDry ? 1 - wakesWet : 0);
      }
    }
    return chance;
  }

  private boolean next(int state, boolean wet) {
    return states.get(state).relativeHumidityPct() >= (wet ? dryingPct : onsetPct);
  }
}
