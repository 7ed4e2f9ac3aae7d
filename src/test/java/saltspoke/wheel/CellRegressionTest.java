package saltspoke.wheel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.sources.CsvTable;

/** Figures computed elsewhere from the same inputs: they hold the code, they prove nothing. */
@Tag("regression")
class CellRegressionTest {
  @Test
  void sodiumChlorideFilms() {
    SaltMix oneGram = new SaltMix(0, 1000 * 35.453 / 58.44, 0, 0);
    for (CsvTable.Row row : Reference.rows("robinson-stokes/nacl_film.csv")) {
      double um = ThinFilm.inEquilibrium(oneGram, row.number("rh_pct") + 1e-9, 25).thicknessUm();
      double expected = row.number("thickness_um");
      assertEquals(expected, um, 0.01 * expected + 0.05, row.where());
    }
  }

  /** Salted shed: about 8 µA, 120–200 µA/cm², 1.3–2.2 mm/a while wet, for shares 0.5–5 %. */
  @Test
  void saltedShed() {
    for (double rhPct : new double[] {78, 85}) {
      for (double share : new double[] {0.005, 0.02, 0.05}) {
        CellCurrents c =
            GalvanicCell.solve(CellFixtures.nippleOnCarbon(share), CellFixtures.shed(rhPct));
        assertTrue(c.galvanicCurrentUA() > 4 && c.galvanicCurrentUA() < 12, c.toString());
        assertTrue(c.galvanicUAPerCm2() > 100 && c.galvanicUAPerCm2() < 220, c.toString());
        double mm = c.penetrationUmPerYear() / 1000;
        assertTrue(mm > 1.3 && mm < 2.4, c.toString());
      }
    }
  }

  /** Rain only: about 1 µA and 0.2 mm/a by Faraday's law, within a factor 2. */
  @Test
  void rainOnly() {
    CellCurrents c = GalvanicCell.solve(CellFixtures.nippleOnCarbon(0.02), CellFixtures.rain());
    double mm = c.galvanicUAPerCm2() * Faraday.ALUMINIUM.umPerYearPerUAPerCm2() / 1000;
    assertTrue(c.galvanicCurrentUA() > 0.5 && c.galvanicCurrentUA() < 2, c.toString());
    assertTrue(mm > 0.1 && mm < 0.4, c.toString());
  }
}
