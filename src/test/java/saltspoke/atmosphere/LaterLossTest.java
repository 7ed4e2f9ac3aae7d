package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.sources.CsvTable;
import saltspoke.values.Quantiles;

class LaterLossTest {
  @Test
  @Tag("published")
  void twentyYearsAsPrinted() {
    for (CsvTable.Row row : Reference.rows("iso-9224-2012/twenty-years.csv")) {
      LaterLoss law = LaterLoss.of(Reference.metal(row.text("metal")));
      assertEquals(
          row.number("times_first_year"), LaterLoss.timesFirstYear(law.mean(), 20), 0.0005);
    }
  }

  @Test
  @Tag("law")
  void goesOnAlongTheTangent() {
    double b = LaterLoss.of(Metal.ZINC).mean();
    double slope = LaterLoss.timesFirstYear(b, 20) - LaterLoss.timesFirstYear(b, 19.999);
    assertEquals(
        LaterLoss.timesFirstYear(b, 20) + 30 * slope / 0.001,
        LaterLoss.timesFirstYear(b, 50),
        1e-3);
    assertEquals(1, LaterLoss.timesFirstYear(b, 1), 0);
  }

  @Test
  @Tag("law")
  void lossesGrowAndTheirSpreadWidens() {
    Quantiles first = new Quantiles(10, 20, 45);
    List<LongTermLoss> all = LaterLoss.of(Metal.CARBON_STEEL).from(first);
    assertEquals(LaterLoss.YEARS, all.stream().map(LongTermLoss::years).toList());
    assertEquals(20, all.get(0).um().median(), 1e-12);
    assertEquals(10, all.get(0).um().p10(), 1e-9);
    assertEquals(45, all.get(0).um().p90(), 1e-9);
    for (int i = 1; i < all.size(); i++) {
      Quantiles before = all.get(i - 1).um();
      Quantiles now = all.get(i).um();
      assertTrue(now.median() > before.median());
      assertTrue(now.p90() / now.p10() > before.p90() / before.p10());
    }
  }
}
