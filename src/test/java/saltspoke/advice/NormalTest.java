package saltspoke.advice;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.sources.CsvTable;

class NormalTest {
  /** Abramowitz and Stegun (1964), table 26.1, ten digits. */
  @Test
  @Tag("published")
  void distributionAsPrinted() {
    String path = "/reference/abramowitz-stegun-1964/normal.csv";
    for (CsvTable.Row row : CsvTable.read(NormalTest.class.getResourceAsStream(path), path)) {
      assertEquals(row.number("p"), Normal.cdf(row.number("x")), 5.1e-11);
      assertEquals(1 - row.number("p"), Normal.cdf(-row.number("x")), 5.1e-11);
    }
  }

  @Test
  @Tag("law")
  void quantileUndoesDistribution() {
    for (double p = 1e-6; p < 1; p += 0.0137) {
      assertEquals(p, Normal.cdf(Normal.quantile(p)), 1e-12);
    }
  }

  @Test
  @Tag("law")
  void tableKeepsToTheLaw() {
    for (double z = -7.9; z < 7.9; z += 0.0317) {
      assertEquals(Normal.cdf(z), Normal.table(z), 4e-5 * Normal.cdf(z));
    }
  }

  @Test
  @Tag("law")
  void drawsAreCentredEvenAndReproducible() {
    Draws draws = Draws.of(7);
    Draws again = Draws.of(7);
    for (int k = 0; k < draws.row(0).length; k++) {
      double mean = 0;
      double square = 0;
      for (int n = 0; n < Draws.COUNT; n++) {
        mean += draws.row(n)[k];
        square += draws.row(n)[k] * draws.row(n)[k];
        assertEquals(draws.row(n)[k], again.row(n)[k]);
      }
      assertEquals(0, mean, 1e-9);
      assertEquals(Draws.COUNT, square, 1e-6);
    }
  }
}
