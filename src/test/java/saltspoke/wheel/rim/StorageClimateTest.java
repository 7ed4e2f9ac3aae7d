package saltspoke.wheel.rim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.MonthAir;
import saltspoke.atmosphere.SaturationPressure;
import saltspoke.wheel.Storage;

@Tag("law")
class StorageClimateTest {
  private static double mean(List<KeptAir> states, java.util.function.ToDoubleFunction<KeptAir> f) {
    return states.stream().mapToDouble(s -> s.share() * f.applyAsDouble(s)).sum();
  }

  private static double swing(List<KeptAir> states) {
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    for (KeptAir s : states) {
      if (s.day() == 0) {
        low = Math.min(low, s.temperatureC());
        high = Math.max(high, s.temperatureC());
      }
    }
    return high - low;
  }

  @Test
  void sameVapourOwnTemperature() {
    for (AirClimate air : InventedClimates.all().values()) {
      for (MonthAir month : air.months()) {
        List<KeptAir> covered = of(month, Storage.COVERED_OUTDOORS);
        List<KeptAir> shed = of(month, Storage.UNHEATED_SHED);
        List<KeptAir> open = of(month, Storage.OPEN);
        for (Storage storage : Storage.values()) {
          List<KeptAir> states = of(month, storage);
          assertEquals(1, states.stream().mapToDouble(KeptAir::share).sum(), 1e-9);
          states.forEach(
              s -> {
                assertTrue(s.relativeHumidityPct() >= 0 && s.relativeHumidityPct() <= 100);
                assertEquals(
                    s.relativeHumidityPct(),
                    100 * s.vapourPressureHpa() / SaturationPressure.overWaterHpa(s.temperatureC()),
                    1e-9);
              });
        }
        assertEquals(mean(covered, KeptAir::temperatureC), mean(shed, KeptAir::temperatureC), 1e-9);
        assertTrue(swing(shed) < swing(covered));
        assertTrue(mean(open, KeptAir::temperatureC) < mean(covered, KeptAir::temperatureC));
        assertTrue(
            mean(open, KeptAir::relativeHumidityPct)
                >= mean(covered, KeptAir::relativeHumidityPct));
      }
    }
  }

  @Test
  void heatedRoomIsDryInWinterAndNeverColderThanItsThermostat() {
    MonthAir january = InventedClimates.all().get("continental-cold").months().get(0);
    List<KeptAir> room = of(january, Storage.HEATED_ROOM);
    assertTrue(mean(room, KeptAir::relativeHumidityPct) < 45);
    room.forEach(s -> assertTrue(s.temperatureC() >= 20));
  }

  private static List<KeptAir> of(MonthAir month, Storage storage) {
    return StorageClimate.of(month, storage, RimAssumptions.MEDIAN);
  }
}
