package saltspoke.wheel.rim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.TreeSet;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.atmosphere.AirClimate;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Rinsing;
import saltspoke.wheel.SaltedRoads;
import saltspoke.wheel.Sealant;
import saltspoke.wheel.Storage;
import saltspoke.wheel.ThreadCompound;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;

@Tag("law")
class WheelWeatherTest {
  private static final AirClimate MARITIME = InventedClimates.all().get("maritime-winter");
  private static final WheelBuild LEAKY = new WheelBuild(28, 1100, false, false);

  static RidingProfile profile(
      double hours,
      double wetShare,
      SaltedRoads salted,
      Storage storage,
      Rinsing rinsing,
      boolean drainHoles) {
    TreeSet<Integer> months = new TreeSet<>();
    IntStream.rangeClosed(1, 12).forEach(months::add);
    return new RidingProfile(
        "test",
        "Test",
        months,
        hours,
        wetShare,
        salted,
        0,
        0,
        storage,
        rinsing,
        false,
        drainHoles,
        ThreadCompound.OIL,
        Sealant.NONE);
  }

  static double wetHours(WheelYear year) {
    return year.months().stream().mapToDouble(WheelYear.Month::wetHours).sum();
  }

  static double meanSalt(WheelYear year) {
    return year.months().stream().mapToDouble(m -> m.salt().totalMgClPerM2()).sum() / 12;
  }

  static double meanWater(WheelYear year) {
    return year.months().stream().mapToDouble(WheelYear.Month::waterG).sum() / 12;
  }

  @Test
  void everyMonthAddsUpAndStaysSmall() {
    InventedClimates.all()
        .forEach(
            (name, air) -> {
              for (RidingProfile profile : Profiles.shipped().all()) {
                for (boolean hidden : new boolean[] {false, true}) {
                  WheelBuild build = new WheelBuild(28, 1100, true, hidden);
                  WheelYear year = WheelWeather.over(air, profile, build);
                  assertEquals(12, year.months().size());
                  for (WheelYear.Month month : year.months()) {
                    String where = name + " " + profile.name() + " " + month.month();
                    double sum =
                        month.films().stream().mapToDouble(WheelYear.FilmHours::hours).sum();
                    assertEquals(month.wetHours(), sum, 1e-9, where);
                    assertTrue(sum <= Calendar.hours(month.month() - 1) + 1e-6, where);
                    assertTrue(month.films().size() <= 24, where);
                    month
                        .films()
                        .forEach(
                            f -> {
                              assertTrue(f.hours() > 0, where);
                              assertTrue(Double.isFinite(f.film().conductivityMSPerCm()), where);
                              assertTrue(f.film().thicknessUm() > 0, where);
                            });
                  }
                }
              }
            });
  }

  @Test
  void heatedRoomIsTheDriestPlace() {
    for (AirClimate air : InventedClimates.all().values()) {
      double room = 0;
      for (Storage storage : Storage.values()) {
        double wet =
            wetHours(
                WheelWeather.over(
                    air,
                    profile(6, -1, SaltedRoads.BY_CLIMATE, storage, Rinsing.NEVER, false),
                    WheelBuild.USUAL));
        if (storage == Storage.HEATED_ROOM) {
          room = wet;
        }
        assertTrue(wet >= room - 1e-9, air.annual() + " " + storage + " " + wet + " < " + room);
      }
    }
  }

  @Test
  void saltedShedRimIsWetForLongerThanAnUnsaltedOne() {
    double factor = 1;
    for (AirClimate air : InventedClimates.all().values()) {
      double salted = wetHours(shed(air, SaltedRoads.YES));
      double unsalted = wetHours(shed(air, SaltedRoads.NO));
      assertTrue(salted >= unsalted - 1e-9);
      factor = Math.max(factor, salted / unsalted);
    }
    assertTrue(factor > 1.3, "largest factor " + factor);
  }

  private static WheelYear shed(AirClimate air, SaltedRoads salted) {
    return WheelWeather.over(
        air, profile(6, -1, salted, Storage.UNHEATED_SHED, Rinsing.NEVER, true), WheelBuild.USUAL);
  }

  @Test
  void rinsingTakesSaltAndBringsWater() {
    WheelYear never = rinsed(Rinsing.NEVER, false);
    WheelYear weekly = rinsed(Rinsing.WEEKLY, false);
    assertTrue(meanSalt(weekly) < meanSalt(never));
    assertTrue(meanWater(weekly) > meanWater(never));
    assertTrue(weekly.flags().stream().anyMatch(n -> n.code().equals("wheel-rinse-without-drain")));
  }

  private static WheelYear rinsed(Rinsing rinsing, boolean drainHoles) {
    return WheelWeather.over(
        MARITIME,
        profile(6, -1, SaltedRoads.YES, Storage.UNHEATED_SHED, rinsing, drainHoles),
        WheelBuild.USUAL);
  }

  @Test
  void drainHolesShortenTheWetAndLeakingTapeLengthensIt() {
    WheelYear closed = rinsed(Rinsing.NEVER, false);
    WheelYear drained = rinsed(Rinsing.NEVER, true);
    assertTrue(meanWater(drained) < 0.7 * meanWater(closed));
    assertTrue(wetHours(drained) < wetHours(closed));
    WheelYear leaky =
        WheelWeather.over(
            MARITIME,
            profile(6, -1, SaltedRoads.YES, Storage.UNHEATED_SHED, Rinsing.NEVER, false),
            LEAKY);
    assertTrue(meanWater(leaky) > meanWater(closed));
    assertTrue(wetHours(leaky) >= wetHours(closed));
  }

  @Test
  void frostDoesNotDryASaltedRim() {
    AirClimate cold = InventedClimates.climate(-6, 1, 84, 2, 4, 120, 3, 60, 4);
    WheelYear year = shed(cold, SaltedRoads.BY_CLIMATE);
    double frozenWet =
        year.months().stream()
            .flatMap(m -> m.films().stream())
            .filter(f -> f.film().temperatureC() < 0)
            .mapToDouble(WheelYear.FilmHours::hours)
            .sum();
    assertTrue(frozenWet > 1000, "wet hours below 0 °C: " + frozenWet);
    WheelYear bitter =
        shed(InventedClimates.climate(-45, 1, 84, 2, 4, 120, 3, 0, 0), SaltedRoads.NO);
    assertTrue(wetHours(bitter) < 1, "wet below every eutectic: " + wetHours(bitter));
  }

  @Test
  void hiddenSeatsCatchLessSaltFromTheAirAndNoSpray() {
    AirClimate seaFront = InventedClimates.all().get("tropical-sea-front");
    RidingProfile profile = Profiles.shipped().get("sea-front-runabout");
    double open = meanSalt(WheelWeather.over(seaFront, profile, WheelBuild.USUAL));
    double hidden =
        meanSalt(WheelWeather.over(seaFront, profile, new WheelBuild(28, 1100, true, true)));
    assertTrue(hidden < open);
  }
}
