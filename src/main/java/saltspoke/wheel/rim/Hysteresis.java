package saltspoke.wheel.rim;

import java.util.List;
import saltspoke.wheel.Deliquescence;
import saltspoke.wheel.SaltMix;

/**
 * Whether sodium chloride is dissolved in each state of a month: it dissolves where the humidity
 * passes its deliquescence, stays dissolved while it keeps above the drying line, and between the
 * two it is as it was. Within a day the slots follow one another; a day that never leaves the
 * between carries on what the day before left. Days of all types follow one another at random, so
 * the chance of waking wet is wettings/(wettings + dryings); where there are neither, it is the
 * last month's.
 */
final class Hysteresis {
  private static final SaltMix SODIUM = new SaltMix(0, 1000, 0, 0);

  private Hysteresis() {}

  /**
   * @param states the month's states, slots of each day type in order
   * @param wettingsPerDay wet rides, rinses and rains a day, each of which dissolves the salt
   * @param wokeWetBefore the last month's chance of waking wet
   * @param dissolved filled with the chance that sodium chloride is dissolved in each state
   * @return this month's chance of waking wet, 0..1
   */
  static double month(
      List<KeptAir> states, double wettingsPerDay, double wokeWetBefore, double[] dissolved) {
    int slots = StorageClimate.SLOTS;
    double wetting = wettingsPerDay;
    double drying = 0;
    for (int first = 0; first < states.size(); first += slots) {
      boolean fromDry = endsWet(states, first, false);
      boolean fromWet = endsWet(states, first, true);
      double share = states.get(first).share() * slots;
      wetting += fromDry ? share : 0;
      drying += fromWet ? 0 : share;
    }
    double wakesWet = wetting + drying > 0 ? wetting / (wetting + drying) : wokeWetBefore;
    for (int first = 0; first < states.size(); first += slots) {
      boolean fromDry = false;
      boolean fromWet = true;
      for (int i = first; i < first + slots; i++) {
        fromDry = next(states.get(i), fromDry);
        fromWet = next(states.get(i), fromWet);
        dissolved[i] = (fromWet ? wakesWet : 0) + (fromDry ? 1 - wakesWet : 0);
      }
    }
    return wakesWet;
  }

  private static boolean endsWet(List<KeptAir> states, int first, boolean startsWet) {
    boolean wet = startsWet;
    for (int i = first; i < first + StorageClimate.SLOTS; i++) {
      wet = next(states.get(i), wet);
    }
    return wet;
  }

  private static boolean next(KeptAir state, boolean wet) {
    double rh = state.relativeHumidityPct();
    return rh
        >= (wet
            ? Deliquescence.dryingRhPct(SODIUM, state.temperatureC())
            : Deliquescence.onsetRhPct(SODIUM, state.temperatureC()));
  }
}
