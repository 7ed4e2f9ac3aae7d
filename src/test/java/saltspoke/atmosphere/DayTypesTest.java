package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

class DayTypesTest {
  private static final double ANY = Double.NEGATIVE_INFINITY;

  @Property
  @net.jqwik.api.Tag("law")
  void daysGiveBackTheMeansTheyWereMadeFrom(
      @ForAll @DoubleRange(min = -50, max = 45) double temperatureC,
      @ForAll @DoubleRange(min = 1, max = 99.4) double humidityPct,
      @ForAll @DoubleRange(min = 0, max = 25) double rangeC,
      @ForAll @DoubleRange(min = 0, max = 8) double spreadC) {
    List<DayType> days = DayTypes.of(temperatureC, humidityPct, rangeC, spreadC);
    assertEquals(1, days.stream().mapToDouble(DayType::share).sum(), 1e-12);
    assertEquals(
        temperatureC, days.stream().mapToDouble(d -> d.share() * d.meanTemperatureC()).sum(), 1e-5);
    assertEquals(rangeC, days.stream().mapToDouble(d -> d.share() * d.diurnalRangeC()).sum(), 1e-9);
    assertEquals(humidityPct, WetHours.meanRelativeHumidityPct(days), 1e-6);
  }

  @Property
  @net.jqwik.api.Tag("law")
  void hoursAboveALimitNeverGrowWithTheLimit(
      @ForAll @DoubleRange(min = -20, max = 35) double temperatureC,
      @ForAll @DoubleRange(min = 5, max = 99) double humidityPct,
      @ForAll @DoubleRange(min = 0, max = 20) double rangeC) {
    List<DayType> days = DayTypes.of(temperatureC, humidityPct, rangeC, 3);
    double before = 1;
    for (double limit = 0; limit <= 100; limit += 2.5) {
      double share = WetHours.above(days, limit, ANY);
      assertTrue(share >= 0 && share <= before + 1e-12, "limit " + limit);
      assertTrue(WetHours.above(days, limit, 0) <= share + 1e-12);
      before = share;
    }
    assertEquals(1, WetHours.above(days, 0, ANY), 0);
    assertEquals(0, WetHours.above(days, 100, ANY), 0);
  }

  @Test
  @Tag("law")
  void moreHumidityMeansMoreWetHours() {
    double before = -1;
    for (double rh = 5; rh <= 99; rh += 1) {
      double share = WetHours.above(DayTypes.of(12, rh, 8, 3), 80, 0);
      assertTrue(share >= before - 1e-9, "RH " + rh);
      before = share;
    }
    assertTrue(before > 0.98, "saturated air is wet nearly always: " + before);
    assertTrue(WetHours.above(DayTypes.of(25, 15, 14, 2), 80, 0) < 0.01, "deserts stay dry");
  }

  @Test
  @Tag("law")
  void steadyAirIsWetOrDryAsAWhole() {
    assertEquals(1, WetHours.above(DayTypes.of(20, 97, 0, 0), 80, 0), 1e-12);
    assertEquals(0, WetHours.above(DayTypes.of(20, 20, 0, 0), 80, 0), 1e-12);
  }

  @Test
  @Tag("law")
  void frozenAirIsNeverWetByTheStandardButMayBeAboveALimit() {
    List<DayType> days = DayTypes.of(-25, 85, 6, 3);
    assertEquals(0, WetHours.above(days, 80, 0), 0);
    assertTrue(WetHours.above(days, 80, ANY) > 0.5);
    assertEquals(1, WetHours.below(days, 0), 1e-12);
  }

  @Test
  @Tag("law")
  void theDayIsWarmestAtThreeAndColdestAtSix() {
    double warm = DiurnalCycle.temperatureC(10, 8, 15);
    double cold = DiurnalCycle.temperatureC(10, 8, 6);
    assertEquals(8, warm - cold, 1e-12);
    double sum = 0;
    int steps = 24 * 60;
    for (int i = 0; i < steps; i++) {
      double t = DiurnalCycle.temperatureC(10, 8, 24.0 * i / steps);
      assertTrue(t <= warm + 1e-12 && t >= cold - 1e-12);
      sum += t;
    }
    assertEquals(10, sum / steps, 1e-3);
  }
}
