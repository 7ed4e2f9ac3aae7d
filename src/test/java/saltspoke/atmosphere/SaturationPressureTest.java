package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.sources.CsvTable;

class SaturationPressureTest {
  private static final double WATER_ERROR = 0.006;
  private static final double ICE_ERROR = 0.01;

  @Test
  @Tag("published")
  void meetsThePrintedTablesWithinTheFormulasStatedError() {
    for (CsvTable.Row row : Reference.rows("smithsonian-1951/saturation-vapour-pressure.csv")) {
      double t = row.number("temperature_c");
      double printed = row.number("pressure_hpa");
      boolean water = row.text("surface").equals("water");
      assertEquals(
          printed,
          water ? SaturationPressure.overWaterHpa(t) : SaturationPressure.overIceHpa(t),
          printed * (water ? WATER_ERROR : ICE_ERROR),
          row.where());
    }
  }

  @Test
  @Tag("law")
  void iceHoldsLessVapourThanWaterBelowFreezingAndTheyMeetAtZero() {
    for (double t = -60; t < 0; t += 1) {
      assertTrue(SaturationPressure.overIceHpa(t) < SaturationPressure.overWaterHpa(t));
    }
    assertEquals(SaturationPressure.overIceHpa(0), SaturationPressure.overWaterHpa(0), 1e-12);
  }

  @Test
  @Tag("law")
  void dewPointUndoesSaturation() {
    for (double t = -45; t <= 60; t += 2.5) {
      assertEquals(t, SaturationPressure.dewPointC(SaturationPressure.overWaterHpa(t)), 1e-9);
    }
  }
}
