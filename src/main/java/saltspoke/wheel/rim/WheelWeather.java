package saltspoke.wheel.rim;

import java.util.ArrayList;
import java.util.List;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.MonthAir;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;

/**
 * The wheel's own weather: from the air outside, the way a bicycle is ridden and kept, and the
 * build of the wheel, to the films at its nipple seats through a settled year.
 *
 * <p>{@link SeatMonth} says when a seat is wet. Nothing is cut off at 0 °C: ice caps the humidity
 * that a brine feels, and the brine's eutectic ends the film.
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
    Hysteresis[] hysteresis = new Hysteresis[Calendar.MONTHS];
    for (int m = 0; m < Calendar.MONTHS; m++) {
      List<KeptAir> seat =
          SeatAir.at(kept.get(m), salt.months.get(m), conductanceM3PerS, bedM2, openSeat);
      seats.add(seat);
      hysteresis[m] = new Hysteresis(seat, outside[m].temperatureC());
    }
    double[] wakesWet = new double[Calendar.MONTHS];
    double last = 0;
    for (int pass = 0; pass < 2; pass++) {
      for (int m = 0; m < Calendar.MONTHS; m++) {
        last =
            hysteresis[m].wakesWet(
                SeatMonth.wettings(outside[m], rides[m], profile) / Calendar.days(m), last);
        wakesWet[m] = last;
      }
    }
    List<WheelYear.Month> months = new ArrayList<>();
    for (int m = 0; m < Calendar.MONTHS; m++) {
      SeatMonth month = new SeatMonth(outside[m], rides[m], kept.get(m), profile, build, a);
      months.add(
          month.films(
              seats.get(m),
              hysteresis[m].dissolved(wakesWet[m]),
              salt.months.get(m),
              water.wetShare[m],
              water.meanWhileWetG(m),
              water.meanG[m]));
    }
    return new WheelYear(months, WeatherFlags.of(air, profile, build, rides, water, salt, months));
  }
}
