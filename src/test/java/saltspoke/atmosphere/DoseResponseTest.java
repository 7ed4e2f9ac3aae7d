package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;
import saltspoke.sources.CsvTable;
import saltspoke.values.Refusal;

class DoseResponseTest {
  @Test
  @org.junit.jupiter.api.Tag("regression")
  void reproducesRowsComputedElsewhere() {
    String[] columns = {"steel_um", "zinc_um", "copper_um", "aluminium_um"};
    for (CsvTable.Row row : Reference.rows("iso-9223-2012/regression-rows.csv")) {
      Exposure x =
          new Exposure(
              row.number("temperature_c"),
              row.number("relative_humidity_pct"),
              row.number("so2_mg_m2_day"),
              row.number("chloride_mg_m2_day"));
      for (Metal metal : Metal.values()) {
        String column = columns[metal.ordinal()];
        double tolerance = row.text(column).equals("479.116") ? 1e-3 : 1e-4;
        assertEquals(
            row.number(column),
            DoseResponse.of(metal).firstYear(x).um(),
            tolerance,
            row.where() + " " + column);
      }
    }
  }

  @Property(tries = 200)
  @Tag("law")
  void moreSulfurSaltOrHumidityNeverCorrodesLess(
      @ForAll @DoubleRange(min = -17, max = 28) double t,
      @ForAll @DoubleRange(min = 34, max = 92) double rh,
      @ForAll @DoubleRange(min = 0.7, max = 150) double pd,
      @ForAll @DoubleRange(min = 0.4, max = 700) double sd) {
    for (Metal metal : Metal.values()) {
      double base = Corrosion.firstYear(metal, t, rh, pd, sd).um();
      assertTrue(Corrosion.firstYear(metal, t, rh + 1, pd, sd).um() > base);
      assertTrue(Corrosion.firstYear(metal, t, rh, pd * 1.1, sd).um() > base);
      assertTrue(Corrosion.firstYear(metal, t, rh, pd, sd * 1.1).um() > base);
    }
  }

  @Test
  @org.junit.jupiter.api.Tag("law")
  void isContinuousAtTheKnee() {
    for (Metal metal : Metal.values()) {
      assertEquals(
          Corrosion.firstYear(metal, 10, 80, 10, 10).um(),
          Corrosion.firstYear(metal, Math.nextUp(10.0), 80, 10, 10).um(),
          1e-9);
    }
  }

  @Test
  @org.junit.jupiter.api.Tag("law")
  void raisesDepositionToTheFloorAndSaysSo() {
    FittedRange clean = FittedRange.of(new Exposure(10, 70, 0.1, 0.2));
    assertEquals(0.7, clean.exposure().so2MgPerM2Day());
    assertEquals(0.4, clean.exposure().chlorideMgPerM2Day());
    assertEquals(
        java.util.List.of("air-so2-raised-to-floor", "air-chloride-raised-to-floor"),
        clean.flags().stream().map(n -> n.code()).toList());
    assertEquals(0, clean.steps());
    for (Metal metal : Metal.values()) {
      assertEquals(
          Corrosion.firstYear(metal, 10, 70, 0.7, 0.4), Corrosion.firstYear(metal, 10, 70, 0, 0));
    }
  }

  @Test
  @org.junit.jupiter.api.Tag("law")
  void flagsEveryEdgeOfTheFittedRangeOnBothSides() {
    double[][] inside = {
      {-17.1, 70, 1, 1}, {28.7, 70, 1, 1}, {10, 34, 1, 1}, {10, 93, 1, 1},
      {10, 70, 0.7, 1}, {10, 70, 150.4, 1}, {10, 70, 1, 0.4}, {10, 70, 1, 760.5}
    };
    double[][] outside = {
      {-17.2, 70, 1, 1}, {28.8, 70, 1, 1}, {10, 33.9, 1, 1}, {10, 93.1, 1, 1},
      {10, 70, 0.69, 1}, {10, 70, 150.5, 1}, {10, 70, 1, 0.39}, {10, 70, 1, 760.6}
    };
    for (double[] x : inside) {
      assertEquals(0, FittedRange.of(new Exposure(x[0], x[1], x[2], x[3])).flags().size());
    }
    for (double[] x : outside) {
      assertEquals(1, FittedRange.of(new Exposure(x[0], x[1], x[2], x[3])).flags().size());
    }
  }

  @Test
  @org.junit.jupiter.api.Tag("law")
  void refusesWhatIsNoExposure() {
    assertThrows(Refusal.class, () -> new Exposure(Double.NaN, 70, 1, 1));
    assertThrows(Refusal.class, () -> new Exposure(10, 101, 1, 1));
    assertThrows(Refusal.class, () -> new Exposure(10, 70, -1, 1));
    assertThrows(Refusal.class, () -> new Exposure(10, 70, 1, Double.POSITIVE_INFINITY));
  }
}
