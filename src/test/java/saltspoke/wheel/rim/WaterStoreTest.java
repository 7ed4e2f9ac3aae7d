package saltspoke.wheel.rim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.DoubleRange;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.MonthAir;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Rinsing;
import saltspoke.wheel.SaltedRoads;
import saltspoke.wheel.Storage;
import saltspoke.wheel.WheelBuild;

@Tag("law")
class WaterStoreTest {
  @Property(tries = 60)
  void whatComesInGoesOutOrStays(
      @ForAll @DoubleRange(min = 0.01, max = 1) double evaporationGPerDay,
      @ForAll @DoubleRange(min = 0, max = 20) double hours,
      @ForAll boolean drainHoles,
      @ForAll Rinsing rinsing) {
    AirClimate air = InventedClimates.all().get("maritime-winter");
    RidingProfile profile =
        WheelWeatherTest.profile(hours, 0.4, SaltedRoads.NO, Storage.OPEN, rinsing, drainHoles);
    RimAssumptions a = RimAssumptions.MEDIAN;
    RideMonth[] rides = new RideMonth[Calendar.MONTHS];
    double[] evaporation = new double[Calendar.MONTHS];
    Arrays.fill(evaporation, evaporationGPerDay);
    for (int m = 0; m < Calendar.MONTHS; m++) {
      rides[m] = RideMonth.of(air, m, profile, a);
    }
    WaterStore store =
        WaterStore.settle(
            air.months().toArray(MonthAir[]::new),
            rides,
            evaporation,
            profile,
            WheelBuild.USUAL,
            a);
    assertEquals(
        store.inG,
        store.evaporatedG + store.drainedG + store.driedG + store.gainG,
        1e-9 * (1 + store.inG));
    double expected = 0;
    for (RideMonth ride : rides) {
      expected += ride.wetRideHours() * 0.25 + ride.rinses() * 0.4;
    }
    expected += air.months().stream().mapToDouble(MonthAir::wetDays).sum() * 6 * 0.02;
    assertEquals(expected, store.inG, 12 * (1 + 0.4 + 0.12) + 1e-9);
    for (double share : store.wetShare) {
      assertTrue(share >= 0 && share <= 1);
    }
  }
}
