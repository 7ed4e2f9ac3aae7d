package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.sources.CsvTable;

/** The functions against losses measured at exposure sites, with the inputs measured there. */
class ExposureSitesTest {
  @Test
  @Tag("published")
  void mostSitesLieWithinAFactorTwoAndOneCategory() {
    List<CsvTable.Row> rows = Reference.rows("exposure-sites/isocorrag-steel-from-memory.csv");
    int withinTwo = 0;
    int withinOneCategory = 0;
    StringBuilder report = new StringBuilder();
    for (CsvTable.Row row : rows) {
      Metal metal = Reference.metal(row.text("metal"));
      double measured = row.number("first_year_loss_um");
      FirstYearLoss computed =
          Corrosion.firstYear(
              metal,
              row.number("temperature_c"),
              row.number("relative_humidity_pct"),
              row.number("so2_mg_m2_day"),
              row.number("chloride_mg_m2_day"));
      Category found = CategoryLimits.categoryOf(metal, computed);
      Category expected = CategoryLimits.categoryOf(metal, new FirstYearLoss(measured));
      withinTwo += Math.abs(Math.log(computed.um() / measured)) <= Math.log(2) ? 1 : 0;
      withinOneCategory += Math.abs(found.ordinal() - expected.ordinal()) <= 1 ? 1 : 0;
      report.append(
          String.format(
              "%n%s: %.1f against %.0f µm, %s against %s",
              row.text("site"), computed.um(), measured, found, expected));
    }
    assertTrue(withinTwo >= 0.8 * rows.size(), "within a factor 2: " + withinTwo + report);
    assertTrue(
        withinOneCategory == rows.size(), "within a category: " + withinOneCategory + report);
  }
}
