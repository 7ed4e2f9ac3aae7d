package saltspoke.wheel.rim;

import java.util.ArrayList;
import java.util.List;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.MonthAir;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.SaltMix;
import saltspoke.wheel.Storage;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;

/**
 * The wheel's own weather: from the air outside, the way a bicycle is ridden and kept, and the
 * build of the wheel, to the films at its nipple seats through a settled year.
 *
 * <p>A nipple's seat is wet while free water lies in the rim (it runs round as the wheel turns, so
 * every seat has its share), while a seat open to the outside has not dried from rain or spray, and
 * otherwise while the salt on it is dissolved at the humidity it feels. Nothing is cut off at 0 °C:
 * ice caps the humidity that a brine feels, and the brine's eutectic ends the film. A seat of a
 * hidden nipple feels the cavity only; wet riding reaches it as the water that gets in.
 */
public final class WheelWeather {
  private final AirClimate air;
  private final RidingProfile profile;
  private final WheelBuild build;
  private final RimAssumptions a;
  private final double conductanceM3PerS;

  private WheelWeather(
      AirClimate air, RidingProfile profile, WheelBuild build, RimAssumptions assumptions) {
    this.air = air;
    this.profile = profile;
    this.build = build;
    this.a = assumptions;
    this.conductanceM3PerS = CavityDrying.rimM3PerS(build, profile.drainHoles(), assumptions);
  }

  /** The settled year with every assumption at its median. */
  public static WheelYear over(AirClimate air, RidingProfile profile, WheelBuild build) {
    return over(air, profile, build, RimAssumptions.MEDIAN);
  }

  /** The settled year under the given assumptions. */
  public static WheelYear over(
      AirClimate air, RidingProfile profile, WheelBuild build, RimAssumptions assumptions) {
    return new WheelWeather(air, profile, build, assumptions).year();
  }

  private WheelYear year() {
    MonthAir[] outside = air.months().toArray(MonthAir[]::new);
    List<List<KeptAir>> kept = new ArrayList<>();
    RideMonth[] rides = new RideMonth[Calendar.MONTHS];
    double[] evaporation = new double[Calendar.MONTHS];
    for (int m = 0; m < Calendar.MONTHS; m++) {
      kept.add(StorageClimate.of(outside[m], profile.storage(), a));
      rides[m] = RideMonth.of(air, m, profile, a);
      evaporation[m] = CavityDrying.meanGPerDay(conductanceM3PerS, kept.get(m));
    }
    WaterStore water = WaterStore.settle(outside, rides, evaporation, profile, build, a);
    SaltStore salt = SaltStore.settle(air, rides, water, profile, build, a);
    double openSeat = build.hiddenNipples() ? 0 : a.get(RimAssumption.OPEN_SEAT_SHARE);
    double bedM2 = a.get(RimAssumption.WETTED_BED_M2);
    List<List<KeptAir>> seats = new ArrayList<>();
    double[][] dissolved = new double[Calendar.MONTHS][];
    for (int m = 0; m < Calendar.MONTHS; m++) {
      seats.add(SeatAir.at(kept.get(m), salt.months.get(m), conductanceM3PerS, bedM2, openSeat));
      dissolved[m] = new double[seats.get(m).size()];
    }
    double wakesWet = 0;
    for (int pass = 0; pass < 2; pass++) {
      for (int m = 0; m < Calendar.MONTHS; m++) {
        double wettings = wettings(outside[m], rides[m]) / Calendar.days(m);
        wakesWet = Hysteresis.month(seats.get(m), wettings, wakesWet, dissolved[m]);
      }
    }
    List<WheelYear.Month> months = new ArrayList<>();
    for (int m = 0; m < Calendar.MONTHS; m++) {
      months.add(
          month(m, outside[m], rides[m], kept.get(m), seats.get(m), dissolved[m], water, salt));
    }
    return new WheelYear(months, WeatherFlags.of(air, profile, build, rides, water, salt));
  }

  /** Times in a month that rain or spray wets the seats. */
  private double wettings(MonthAir outside, RideMonth rides) {
    double rain = profile.storage() == Storage.OPEN ? outside.wetDays() : 0;
    return rides.wetRides() + rides.rinses() + rain;
  }

  private WheelYear.Month month(
      int m,
      MonthAir outside,
      RideMonth rides,
      List<KeptAir> kept,
      List<KeptAir> seats,
      double[] dissolved,
      WaterStore water,
      SaltStore salt) {
    SaltMix mix = salt.months.get(m);
    FilmBins bins = new FilmBins(mix, a.get(RimAssumption.CONTINUOUS_FILM_UM));
    double keptHours = Calendar.hours(m) - rides.rideHours();
    double bedM2 = a.get(RimAssumption.WETTED_BED_M2);
    double freeGPerM2 = water.meanWhileWetG(m) / bedM2;
    double cavityShare = water.wetShare[m];
    double seatShare = build.hiddenNipples() ? 0 : seatWetShare(outside, rides, kept, keptHours);
    double creviceGPerM2 = a.get(RimAssumption.CREVICE_FILM_UM) / 2;
    double[] coldHours = new double[2];
    double[] rhHours = new double[2];
    double[] degreeHours = new double[2];
    for (int i = 0; i < seats.size(); i++) {
      KeptAir s = seats.get(i);
      double hours = s.share() * keptHours;
      int side = s.temperatureC() < 0 ? 0 : 1;
      coldHours[side] += hours;
      rhHours[side] += hours * s.relativeHumidityPct();
      degreeHours[side] += hours * s.temperatureC();
      double airHours = hours * (1 - cavityShare) * (1 - seatShare);
      addAir(bins, airHours, s.relativeHumidityPct(), s.temperatureC(), dissolved[i]);
    }
    for (int side = 0; side < 2; side++) {
      if (coldHours[side] > 0) {
        double rh = rhHours[side] / coldHours[side];
        double celsius = degreeHours[side] / coldHours[side];
        double cavityHours = coldHours[side] * cavityShare;
        // Water between none and twice its mean, in two halves.
        bins.addWater(cavityHours / 2, freeGPerM2 / 2, rh, celsius);
        bins.addWater(cavityHours / 2, freeGPerM2 * 1.5, rh, celsius);
        double seatHours = coldHours[side] * (1 - cavityShare) * seatShare;
        bins.addWater(seatHours, creviceGPerM2, rh, celsius);
      }
    }
    addRides(bins, outside, rides, dissolved, freeGPerM2, creviceGPerM2);
    List<WheelYear.FilmHours> films = bins.films();
    double wetHours = films.stream().mapToDouble(WheelYear.FilmHours::hours).sum();
    return new WheelYear.Month(
        m + 1, wetHours, mix, water.meanG[m], rides.wetRides() * rides.saltedShare(), films);
  }

  private static void addAir(
      FilmBins bins, double hours, double rhPct, double temperatureC, double dissolved) {
    bins.addAir(hours * dissolved, rhPct, temperatureC, true);
    bins.addAir(hours * (1 - dissolved), rhPct, temperatureC, false);
  }

  /** Share of the kept time in which an open seat is wet from rain or spray. */
  private double seatWetShare(
      MonthAir outside, RideMonth rides, List<KeptAir> kept, double keptHours) {
    double each = SeatDrying.creviceHours(kept, a);
    if (profile.driedAfterWet()) {
      each *= 1 - a.get(RimAssumption.DRIED_SHARE);
    }
    double rain = profile.storage() == Storage.OPEN ? outside.wetDays() : 0;
    double rainHours = rain * a.get(RimAssumption.RAIN_HOURS_PER_WET_DAY);
    // Wettings fall at random, so the chance of none in the time one lasts is exponential.
    double sweatHours = rides.trainerHours() * a.get(RimAssumption.SWEAT_WET_SHARE);
    double lasting = (wettings(outside, rides) * each + rainHours + sweatHours) / keptHours;
    return -Math.expm1(-lasting);
  }

  /** Riding: in the dry the seat feels the air of the day, in the wet it is flooded. */
  private void addRides(
      FilmBins bins,
      MonthAir outside,
      RideMonth rides,
      double[] dissolved,
      double freeGPerM2,
      double creviceGPerM2) {
    if (rides.rideHours() == 0) {
      return;
    }
    double wetGPerM2 = build.hiddenNipples() ? freeGPerM2 : Math.max(freeGPerM2, 2 * creviceGPerM2);
    bins.addWater(
        rides.wetRideHours(), wetGPerM2, outside.relativeHumidityPct(), outside.temperatureC());
    double dry = rides.rideHours() - rides.wetRideHours();
    double chance = 0;
    for (double d : dissolved) {
      chance += d / dissolved.length;
    }
    // By day the air is warmer than its mean by about a quarter of the range (common practice).
    double celsius = outside.temperatureC() + outside.diurnalRangeC() / 4;
    double rh = Math.min(100, 100 * outside.vapourPressureHpa() / Vapour.saturationHpa(celsius));
    addAir(bins, dry, rh, celsius, chance);
  }
}
