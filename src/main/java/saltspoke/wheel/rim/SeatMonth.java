package saltspoke.wheel.rim;

import java.util.List;
import saltspoke.atmosphere.MonthAir;
import saltspoke.atmosphere.SaturationPressure;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.SaltMix;
import saltspoke.wheel.Storage;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;

/**
 * The films of one month at a mean nipple seat. A seat is wet
 *
 * <ul>
 *   <li>while free water in the rim lies on it: water spreads over the bed to a least thickness, so
 *       little water wets a share of the seats; the other seats then feel the damp it makes in the
 *       cavity, an open seat in part and a hidden one wholly;
 *   <li>while a seat open to the outside has not dried from rain, spray or sweat;
 *   <li>and otherwise while its salt is dissolved at the humidity it feels.
 * </ul>
 *
 * A hidden seat feels the cavity only; wet riding reaches it as the water that gets in.
 */
final class SeatMonth {
  /** Humidity in a cavity that holds free water, %. ASSUMPTION: nearly saturated, 95 to 99. */
  private static final double DAMP_CAVITY_PCT = 97;

  private final MonthAir outside;
  private final RideMonth rides;
  private final List<KeptAir> kept;
  private final RidingProfile profile;
  private final boolean hidden;
  private final RimAssumptions a;
  private final double keptHours;

  SeatMonth(
      MonthAir outside,
      RideMonth rides,
      List<KeptAir> kept,
      RidingProfile profile,
      WheelBuild build,
      RimAssumptions assumptions) {
    this.outside = outside;
    this.rides = rides;
    this.kept = kept;
    this.profile = profile;
    this.hidden = build.hiddenNipples();
    this.a = assumptions;
    this.keptHours = Calendar.hours(outside.month() - 1) - rides.rideHours();
  }

  /** Times in a month that rain or spray wets the seats. */
  static double wettings(MonthAir outside, RideMonth rides, RidingProfile profile) {
    double rain = profile.storage() == Storage.OPEN ? outside.wetDays() : 0;
    return rides.wetRides() + rides.rinses() + rain;
  }

  /**
   * @param seats the air that the seats feel without free water
   * @param dissolved chance that sodium chloride is dissolved in each of these states
   * @param salt on the seats
   * @param cavityShare share of the time with free water in the rim, 0..1
   * @param whileWetG mean free water in that time, g
   * @param meanG mean free water, g
   */
  WheelYear.Month films(
      List<KeptAir> seats,
      double[] dissolved,
      SaltMix salt,
      double cavityShare,
      double whileWetG,
      double meanG) {
    FilmBins bins = new FilmBins(salt, a.get(RimAssumption.CONTINUOUS_FILM_UM));
    double freeGPerM2 = whileWetG / a.get(RimAssumption.WETTED_BED_M2);
    double leastGPerM2 = a.get(RimAssumption.PATCH_FILM_UM);
    // While there is water, it is taken to lie between none and twice its mean, in two halves.
    double little = freeGPerM2 / 2;
    double much = freeGPerM2 * 1.5;
    double littlePatch = cavityShare / 2 * Math.min(1, little / leastGPerM2);
    double muchPatch = cavityShare / 2 * Math.min(1, much / leastGPerM2);
    double besidePatch = cavityShare - littlePatch - muchPatch;
    double openWet = hidden ? 0 : openSeatWetShare();
    double openShare = hidden ? 0 : a.get(RimAssumption.OPEN_SEAT_SHARE);
    Side cold = new Side();
    Side warm = new Side();
    for (int i = 0; i < seats.size(); i++) {
      KeptAir s = seats.get(i);
      double hours = s.share() * keptHours;
      double rh = s.relativeHumidityPct();
      (s.temperatureC() < 0 ? cold : warm).add(hours, rh, s.temperatureC());
      double dryOpen = hours * (1 - openWet);
      addAir(bins, dryOpen * (1 - cavityShare), rh, s.temperatureC(), dissolved[i]);
      double damp = rh + (1 - openShare) * Math.max(0, DAMP_CAVITY_PCT - rh);
      addAir(bins, dryOpen * besidePatch, damp, s.temperatureC(), dissolved[i]);
    }
    for (Side side : List.of(cold, warm)) {
      if (side.hours > 0) {
        double rh = side.rhHours / side.hours;
        double celsius = side.degreeHours / side.hours;
        bins.addWater(side.hours * littlePatch, Math.max(little, leastGPerM2), rh, celsius);
        bins.addWater(side.hours * muchPatch, Math.max(much, leastGPerM2), rh, celsius);
        bins.addWater(
            side.hours * (1 - littlePatch - muchPatch) * openWet,
            a.get(RimAssumption.CREVICE_FILM_UM) / 2,
            rh,
            celsius);
      }
    }
    addRides(bins, dissolved, Math.max(freeGPerM2, leastGPerM2));
    List<WheelYear.FilmHours> films = bins.films();
    double wetHours = films.stream().mapToDouble(WheelYear.FilmHours::hours).sum();
    return new WheelYear.Month(
        outside.month(), wetHours, salt, meanG, rides.wetRides() * rides.saltedShare(), films);
  }

  private static void addAir(
      FilmBins bins, double hours, double rhPct, double temperatureC, double dissolved) {
    double chance = Math.max(dissolved, Hysteresis.dissolves(rhPct, temperatureC) ? 1 : 0);
    bins.addAir(hours * chance, rhPct, temperatureC, true);
    bins.addAir(hours * (1 - chance), rhPct, temperatureC, false);
  }

  /** Share of the kept time in which an open seat is wet from rain, spray or sweat. */
  private double openSeatWetShare() {
    double each = SeatDrying.creviceHours(kept, a);
    if (profile.driedAfterWet()) {
      each *= 1 - a.get(RimAssumption.DRIED_SHARE);
    }
    double rain = profile.storage() == Storage.OPEN ? outside.wetDays() : 0;
    double rainHours = rain * a.get(RimAssumption.RAIN_HOURS_PER_WET_DAY);
    double sweatHours = rides.trainerHours() * a.get(RimAssumption.SWEAT_WET_SHARE);
    double lasting =
        (wettings(outside, rides, profile) * each + rainHours + sweatHours) / keptHours;
    // Wettings fall at random, so the chance of none in the time one lasts is exponential.
    return -Math.expm1(-lasting);
  }

  /** Riding: in the dry a seat feels the air of the day, in the wet it is flooded. */
  private void addRides(FilmBins bins, double[] dissolved, double cavityGPerM2) {
    if (rides.rideHours() == 0) {
      return;
    }
    double floodedGPerM2 =
        hidden ? cavityGPerM2 : Math.max(cavityGPerM2, a.get(RimAssumption.CREVICE_FILM_UM));
    bins.addWater(
        rides.wetRideHours(), floodedGPerM2, outside.relativeHumidityPct(), outside.temperatureC());
    double chance = 0;
    for (double d : dissolved) {
      chance += d / dissolved.length;
    }
    // By day the air is warmer than its mean by about a quarter of the range (common practice).
    double celsius = outside.temperatureC() + outside.diurnalRangeC() / 4;
    double saturation = SaturationPressure.overWaterHpa(celsius);
    double rh = Math.min(100, 100 * outside.vapourPressureHpa() / saturation);
    addAir(bins, rides.rideHours() - rides.wetRideHours(), rh, celsius, chance);
  }

  /** Kept hours on one side of 0 °C, with their mean humidity and temperature. */
  private static final class Side {
    private double hours;
    private double rhHours;
    private double degreeHours;

    private void add(double added, double rhPct, double temperatureC) {
      hours += added;
      rhHours += added * rhPct;
      degreeHours += added * temperatureC;
    }
  }
}
