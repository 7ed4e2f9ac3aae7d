package saltspoke.wheel.rim;

import java.util.List;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.MonthAir;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.SaltMix;
import saltspoke.wheel.Storage;
import saltspoke.wheel.WheelBuild;

/**
 * Chloride at the nipple seats by kind, month by month through a settled year. In: sea salt from
 * the air where the wheel is kept and where it is ridden, salted road water that gets into the rim
 * and into the crevice of an open seat, sweat. Out: with draining water (less what stays behind),
 * washed off by rain on rides and by rinses, and slowly with dust. The store S of a kind follows
 * dS/dt = in − r·S with monthly in and r, solved exactly within each month; the year that repeats
 * itself is found in closed form, since the equation is linear.
 */
final class SaltStore {
  /** Chloride's share of sodium chloride's mass (computed from atomic masses). */
  private static final double CHLORIDE_OF_NACL = 0.607;

  /** Kinds in the order sea, rock, brine, sweat. */
  private static final int KINDS = 4;

  /** Mean of each month. */
  final List<SaltMix> months;

  /** Years after which a new wheel holds 90 % of the settled salt. */
  final double settlingYears;

  private SaltStore(List<SaltMix> months, double settlingYears) {
    this.months = months;
    this.settlingYears = settlingYears;
  }

  static SaltStore settle(
      AirClimate air,
      RideMonth[] rides,
      WaterStore water,
      RidingProfile profile,
      WheelBuild build,
      RimAssumptions a) {
    double[][] perMonth = new double[Calendar.MONTHS][];
    double[] lossPerMonth = new double[Calendar.MONTHS];
    double lossYear = 0;
    for (int m = 0; m < Calendar.MONTHS; m++) {
      perMonth[m] = gainedMg(air.months().get(m), rides[m], profile, build, a);
      lossPerMonth[m] = loss(air.months().get(m), rides[m], water.flushed[m], profile, build, a);
      lossYear += lossPerMonth[m];
    }
    double[][] mean = new double[Calendar.MONTHS][KINDS];
    for (int kind = 0; kind < KINDS; kind++) {
      double fromEmpty = 0;
      for (int m = 0; m < Calendar.MONTHS; m++) {
        fromEmpty = after(fromEmpty, perMonth[m][kind], lossPerMonth[m]);
      }
      double store = fromEmpty / -Math.expm1(-lossYear);
      for (int m = 0; m < Calendar.MONTHS; m++) {
        double next = after(store, perMonth[m][kind], lossPerMonth[m]);
        // Balance of the month: what was gained and not stored was lost, at a known rate.
        mean[m][kind] = Math.max(0, (perMonth[m][kind] - (next - store)) / lossPerMonth[m]);
        store = next;
      }
    }
    SaltMix[] mixes = new SaltMix[Calendar.MONTHS];
    for (int m = 0; m < Calendar.MONTHS; m++) {
      mixes[m] = new SaltMix(mean[m][0], mean[m][1], mean[m][2], mean[m][3]);
    }
    return new SaltStore(List.of(mixes), Math.log(10) / lossYear);
  }

  /** Store after a month with gain and loss spread evenly: S e^(−L) + G (1 − e^(−L))/L. */
  private static double after(double store, double gain, double loss) {
    return store * Math.exp(-loss) + gain * -Math.expm1(-loss) / loss;
  }

  /** Gain of each kind in a month, mg Cl/m². */
  private static double[] gainedMg(
      MonthAir outside,
      RideMonth rides,
      RidingProfile profile,
      WheelBuild build,
      RimAssumptions a) {
    double capture =
        a.get(RimAssumption.SEA_CAPTURE_SHARE)
            * (build.hiddenNipples() ? a.get(RimAssumption.HIDDEN_CAPTURE_RATIO) : 1);
    double air = outside.chlorideDepositionMgPerM2Day();
    double days = Calendar.days(outside.month() - 1);
    double keptDays = days - rides.rideHours() / 24;
    double shore = Math.max(air, a.get(RimAssumption.SEA_FRONT_MG_PER_M2_DAY));
    double riddenAir = air + profile.seaRideShare() * (shore - air);
    double sea =
        capture
            * (keptDays * air * shelter(profile.storage(), a)
                + rides.rideHours() / 24 * riddenAir * a.get(RimAssumption.MOVING_FACTOR));
    double waterGPerM2Hour = WaterStore.perWetHourG(build, a) / a.get(RimAssumption.WETTED_BED_M2);
    if (!build.hiddenNipples()) {
      // 1 µm of water is 1 g/m².
      waterGPerM2Hour +=
          a.get(RimAssumption.CREVICE_FILM_UM) * a.get(RimAssumption.WASHED_PER_RAIN_HOUR);
    }
    double road =
        1000
            * rides.wetRideHours()
            * rides.saltedShare()
            * waterGPerM2Hour
            * (rides.brinePct() / 100)
            * CHLORIDE_OF_NACL;
    double sweat =
        rides.trainerHours()
            * a.get(RimAssumption.SWEAT_MG_PER_M2_HOUR)
            * (build.hiddenNipples() ? a.get(RimAssumption.HIDDEN_CAPTURE_RATIO) : 1);
    return new double[] {
      sea, road * (1 - rides.magnesiumShare()), road * rides.magnesiumShare(), sweat
    };
  }

  private static double shelter(Storage storage, RimAssumptions a) {
    return switch (storage) {
      case OPEN -> 1;
      case COVERED_OUTDOORS -> a.get(RimAssumption.COVERED_DEPOSITION);
      case UNHEATED_SHED -> a.get(RimAssumption.SHED_DEPOSITION);
      case HEATED_ROOM -> a.get(RimAssumption.ROOM_DEPOSITION);
    };
  }

  /** Loss of a month as the exponent of what stays; always above 0. */
  private static double loss(
      MonthAir outside,
      RideMonth rides,
      double flushed,
      RidingProfile profile,
      WheelBuild build,
      RimAssumptions a) {
    double rainHours = rides.wetRideHours();
    if (profile.storage() == Storage.OPEN) {
      rainHours +=
          outside.wetDays()
              * a.get(RimAssumption.RAIN_HOURS_PER_WET_DAY)
              * a.get(RimAssumption.PARKED_WASH_RATIO);
    }
    double washed =
        (rainHours * a.get(RimAssumption.WASHED_PER_RAIN_HOUR)
                + rides.rinses() * a.get(RimAssumption.WASHED_PER_RINSE))
            * (build.hiddenNipples() ? a.get(RimAssumption.HIDDEN_WASH_SHARE) : 1);
    double drained = flushed * (1 - a.get(RimAssumption.SALT_RETENTION));
    double shed =
        a.get(RimAssumption.SALT_SHED_PER_YEAR) * Calendar.days(outside.month() - 1) / 365;
    return washed + drained + shed;
  }
}
