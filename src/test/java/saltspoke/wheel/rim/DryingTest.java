package saltspoke.wheel.rim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.atmosphere.SaturationPressure;
import saltspoke.sources.CsvTable;
import saltspoke.wheel.WheelBuild;

class DryingTest {
  private static List<CsvTable.Row> rows() {
    String path = "/reference/science-calculated/cavity-drying.csv";
    return CsvTable.read(DryingTest.class.getResourceAsStream(path), path);
  }

  private static double lossGPerDay(double celsius, double rhPct) {
    double hpa = rhPct / 100 * SaturationPressure.overWaterHpa(celsius);
    return CavityDrying.gPerDay(CavityDrying.gapsM3PerS(24, 1), celsius, hpa);
  }

  @Test
  @Tag("published")
  void closedCavityLosesThePrintedGramsADay() {
    for (CsvTable.Row row : rows()) {
      assertEquals(
          row.number("g_per_day"),
          lossGPerDay(row.number("temperature_c"), row.number("relative_humidity_pct")),
          row.number("half_of_last_digit"),
          row.where());
    }
  }

  /** Printed: 5 g take 10 to 90 days, to the ten. */
  @Test
  @Tag("published")
  void fiveGramsLastTenToNinetyDays() {
    assertEquals(10, 5 / lossGPerDay(20, 60), 0.5);
    assertEquals(90, 5 / lossGPerDay(0, 85), 0.5);
  }

  /** Printed: an open film of 100 µm dries in 0.8 to 7.6 h in the same airs. */
  @Test
  @Tag("published")
  void openFilmDriesInThePrintedHours() {
    assertEquals(0.8, 100 / openLoss(20, 60), 0.05);
    assertEquals(7.6, 100 / openLoss(0, 85), 0.05);
  }

  private static double openLoss(double celsius, double rhPct) {
    return SeatDrying.openFilmGPerM2Hour(
        celsius, rhPct / 100 * SaturationPressure.overWaterHpa(celsius));
  }

  @Test
  @Tag("law")
  void moreOpeningsDryFasterAndDampAirSlower() {
    RimAssumptions a = RimAssumptions.MEDIAN;
    double closed = CavityDrying.rimM3PerS(WheelBuild.USUAL, false, a);
    assertTrue(CavityDrying.rimM3PerS(WheelBuild.USUAL, true, a) > closed);
    assertTrue(
        CavityDrying.rimM3PerS(WheelBuild.USUAL, false, a.shifted(RimAssumption.OPEN_GAP_SHARE, 1))
            > closed);
    assertTrue(lossGPerDay(10, 60) > lossGPerDay(10, 90));
    assertEquals(0, lossGPerDay(10, 100), 1e-12);
    assertTrue(lossGPerDay(-5, 50) > 0);
  }
}
