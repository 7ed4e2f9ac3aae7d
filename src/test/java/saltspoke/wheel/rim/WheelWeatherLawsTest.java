package saltspoke.wheel.rim;

import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import saltspoke.atmosphere.AirClimate;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Rinsing;
import saltspoke.wheel.SaltedRoads;
import saltspoke.wheel.Storage;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;

@Tag("law")
class WheelWeatherLawsTest {
  private static final AirClimate MARITIME = InventedClimates.all().get("maritime-winter");

  /**
   * The one exception is taken out here by a fully open seat: more salt makes a cavity breathe more
   * slowly, so that a damp spell no longer reaches its deliquescence where the mean lies below it.
   */
  @Property(tries = 60)
  void moreSaltOnTheRoadIsNeverFewerWetHours(
      @ForAll @DoubleRange(min = 0, max = 4) double saltOnRoad,
      @ForAll @DoubleRange(min = 0, max = 1) double wetShare,
      @ForAll Storage storage,
      @ForAll boolean drainHoles) {
    RidingProfile profile =
        WheelWeatherTest.profile(
            6, wetShare, SaltedRoads.BY_CLIMATE, storage, Rinsing.NEVER, drainHoles);
    double less = WheelWeatherTest.wetHours(overSalt(saltOnRoad, profile));
    double more = WheelWeatherTest.wetHours(overSalt(saltOnRoad * 1.5 + 0.1, profile));
    assertTrue(more >= less - 1e-6, less + " > " + more);
  }

  private static WheelYear overSalt(double saltOnRoad, RidingProfile profile) {
    return WheelWeather.over(
        InventedClimates.climate(8, 8, 78, 6, 7, 150, 5, 50, saltOnRoad),
        profile,
        WheelBuild.USUAL,
        RimAssumptions.MEDIAN.with(RimAssumption.OPEN_SEAT_SHARE, 1));
  }

  /**
   * Riding in fresh rain also washes salt off, and a rim with less salt may be wet for fewer hours:
   * the one exception, with washing and draining of salt taken out here.
   */
  @Property(tries = 60)
  void moreWetRidingIsNeverFewerWetHoursButForTheSaltItWashesOff(
      @ForAll @IntRange(min = 0, max = 9) int wetTenths,
      @ForAll Storage storage,
      @ForAll boolean drainHoles,
      @ForAll SaltedRoads salted) {
    RimAssumptions noWash =
        RimAssumptions.MEDIAN
            .with(RimAssumption.WASHED_PER_RAIN_HOUR, 1e-12)
            .with(RimAssumption.SALT_RETENTION, 1);
    double less =
        WheelWeatherTest.wetHours(ridden(wetTenths / 10.0, storage, drainHoles, salted, noWash));
    double more =
        WheelWeatherTest.wetHours(
            ridden((wetTenths + 1) / 10.0, storage, drainHoles, salted, noWash));
    assertTrue(more >= less - 0.5, less + " > " + more);
  }

  private static WheelYear ridden(
      double wetShare, Storage storage, boolean drainHoles, SaltedRoads salted, RimAssumptions a) {
    return WheelWeather.over(
        MARITIME,
        WheelWeatherTest.profile(6, wetShare, salted, storage, Rinsing.NEVER, drainHoles),
        WheelBuild.USUAL,
        a);
  }
}
