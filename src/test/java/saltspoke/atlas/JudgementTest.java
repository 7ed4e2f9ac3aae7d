package saltspoke.atlas;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.ByteArrayInputStream;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.values.Refusal;

@Tag("law")
class JudgementTest {
  @Test
  void numbersAreThoseOfTheDefinition() {
    Judgement j =
        Judgement.of(
            "x",
            true,
            List.of(
                new Pair("a", 10, 20, 5, 15),
                new Pair("b", 10, 5, 8, 9),
                new Pair("c", 10, 40, 1, 100),
                Pair.of("d", 10, 10)));
    assertEquals(4, j.n());
    assertEquals((10 - 5 + 30) / 4.0, j.bias(), 1e-12);
    assertEquals((10 + 5 + 30) / 4.0, j.mae(), 1e-12);
    assertEquals(Math.sqrt((100 + 25 + 900) / 4.0), j.rmse(), 1e-12);
    assertEquals(Math.log(2) * Math.sqrt(6 / 4.0), j.lnRmse(), 1e-12);
    assertEquals(75, j.withinFactor2Pct(), 1e-12);
    assertEquals(75, j.withinFactor3Pct(), 1e-12);
    assertEquals(200 / 3.0, j.bandCoveragePct(), 1e-12);
    assertEquals(75, j.medianAbsErrorPct(), 1e-12);
    assertNull(j.correlation(), "no spread in the measurements");
  }

  @Test
  void correlationIsOneForALineAndRatiosNeedATrueZero() {
    Judgement j =
        Judgement.of(
            "x", false, List.of(Pair.of("a", 1, 3), Pair.of("b", 2, 5), Pair.of("c", 4, 9)));
    assertEquals(1, j.correlation(), 1e-12);
    assertNull(j.lnRmse());
    assertNull(j.bandCoveragePct());
  }

  @Test
  void aBadCellIsRefusedWithFileAndLineAndTheRestGoesOn() {
    Comparison comparison =
        SiteComparison.corrosion(
            csv(
                "site,temperature_c,relative_humidity_pct,so2_mg_m2_day,chloride_mg_m2_day,"
                    + "carbon_steel_um,zinc_um\n"
                    + "A,10,75,5,3,20,\n"
                    + "B,ten,75,5,3,20,1\n"
                    + "C,10,180,5,3,20,1\n"
                    + "D,10,80,10,10,40,1.5\n"),
            "sites.csv");
    assertEquals(2, comparison.series().size());
    assertEquals(2, comparison.series().get(0).judgement().n());
    assertEquals(1, comparison.series().get(1).judgement().n());
    assertEquals(
        List.of("sites.csv:3 temperature_c", "sites.csv:4 relative_humidity_pct"),
        comparison.refused().stream().map(Refusal::field).toList());
  }

  @Test
  void aFileWithoutAUsableRowIsRefusedAsAWhole() {
    Refusal refusal =
        assertThrows(Refusal.class, () -> SiteComparison.chloride(csv("a,b\n1,2\n"), "wrong.csv"));
    assertEquals("missing-column", refusal.error());
    assertThrows(Refusal.class, () -> SiteComparison.chloride(csv("a,b\n"), "empty.csv"));
  }

  @Test
  void continentsLieWhereTheyShould() {
    assertEquals(Continent.EUROPE, Continent.at(48, 2));
    assertEquals(Continent.AFRICA, Continent.at(6, 3));
    assertEquals(Continent.AFRICA, Continent.at(2, 45));
    assertEquals(Continent.ASIA, Continent.at(25, 45));
    assertEquals(Continent.ASIA, Continent.at(35, 139));
    assertEquals(Continent.OCEANIA, Continent.at(-33, 151));
    assertEquals(Continent.OCEANIA, Continent.at(21, -158));
    assertEquals(Continent.NORTH_AMERICA, Continent.at(40, -100));
    assertEquals(Continent.SOUTH_AMERICA, Continent.at(-15, -60));
    assertEquals(Continent.ANTARCTICA, Continent.at(-78, 167));
  }

  private static InputStream csv(String text) {
    return new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8));
  }
}
