package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

@Tag("law")
class MonthDaysTest {
  @Test
  void frostFallsWithWarmthFromAlwaysToNever() {
    double before = 1;
    for (double t = -40; t <= 40; t += 1) {
      double share = FrostDays.frostShare(t, 9, 3);
      assertTrue(share <= before, "at " + t);
      before = share;
    }
    assertEquals(1, FrostDays.frostShare(-40, 9, 3), 1e-6);
    assertEquals(0, FrostDays.frostShare(40, 9, 3), 1e-6);
  }

  @Test
  void nearFreezingDaysNeedNeitherHeatNorDeepCold() {
    assertEquals(0, FrostDays.nearFreezingShare(-40, 9, 3), 1e-6);
    assertEquals(0, FrostDays.nearFreezingShare(30, 9, 3), 1e-6);
    assertTrue(FrostDays.nearFreezingShare(0, 6, 3) > 0.7);
  }

  @Test
  void wetDaysGrowWithRainAndStayWithinTheMonth() {
    double before = 0;
    for (double mm = 0; mm < 3000; mm += 20) {
      double days = WetDays.of(mm, 15, 30);
      assertTrue(days >= before && days <= 30);
      before = days;
    }
    assertEquals(0, WetDays.of(0, 15, 30), 0);
    assertTrue(WetDays.of(100, 27, 30) < WetDays.of(100, 5, 30), "warm rain is heavier");
  }

  @Test
  void hoursAreCountedByDefinition() {
    double[] t = new double[48];
    double[] rh = new double[48];
    for (int i = 0; i < 48; i++) {
      t[i] = i < 24 ? 2 : -3;
      rh[i] = 80;
    }
    t[5] = 0.5;
    rh[0] = 80.5;
    rh[30] = 95;
    HourlyCount count = HourlyCount.of(t, rh);
    assertEquals(1, count.wetHours(), "exactly 80 % is not above, frozen hours do not count");
    assertEquals(48, count.hoursAbove75Pct());
    assertEquals(24, count.hoursBelow0C());
    assertEquals(1, count.frostDays());
    assertEquals(2, count.nearFreezingDays());
    assertEquals(0.75, count.diurnalRangeC(), 1e-12);
    assertThrows(
        IllegalArgumentException.class, () -> HourlyCount.of(new double[23], new double[23]));
  }

  @Test
  void theYearHas365AndAQuarterDays() {
    double sum = 0;
    for (int month = 1; month <= 12; month++) {
      sum += MonthMeans.daysIn(month);
    }
    assertEquals(365.25, sum, 0);
  }
}
