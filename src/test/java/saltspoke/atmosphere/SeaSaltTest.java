package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.places.SeaView;
import saltspoke.sources.CsvTable;
import saltspoke.values.Quantiles;
import saltspoke.values.Refusal;

@Tag("law")
class SeaSaltTest {
  private static final double[] FLAT = new double[36];
  private static final WindMonth ALL_SIDES = WindMonth.fromAllSides(5);

  /**
   * A straight coast whose sea lies south; directions fall between the normals' tens of degrees.
   */
  private static SeaView coast(double distanceKm, double fetchKm, double salinity) {
    double[] shore = new double[36];
    double[] fetch = new double[36];
    double[] salt = new double[36];
    for (int k = 0; k < 36; k++) {
      double cosine = -Math.cos(Math.toRadians(10 * k + 5));
      boolean seaward = cosine > 0;
      shore[k] = seaward ? distanceKm / cosine : Double.POSITIVE_INFINITY;
      fetch[k] = seaward ? fetchKm : 0;
      salt[k] = seaward ? salinity : 0;
    }
    return new SeaView(distanceKm, shore, fetch, salt);
  }

  private static double at(SeaView sea, WindMonth wind) {
    return new SeaSalt(sea, FLAT, 0.2, 10, 1000).monthMgPerM2Day(wind);
  }

  @Test
  void fieldFormAndSiteFormAgreeOnAStraightCoast() {
    for (double km : new double[] {0.02, 0.2, 1, 10, 100, 400}) {
      for (double wind : new double[] {2, 5, 8}) {
        double field = at(coast(km, 500, 1), WindMonth.fromAllSides(wind));
        double site = ChlorideFromSite.predict(km, wind, 1, 0.2, 10).median();
        assertEquals(site, field, 1e-6 * site, km + " km, " + wind + " m/s");
      }
    }
  }

  @Test
  void lessWithDistanceAndMoreWithWind() {
    double before = Double.POSITIVE_INFINITY;
    for (double km : new double[] {0, 0.1, 0.5, 2, 10, 50, 200, 1000}) {
      double now = at(coast(km, 500, 1), ALL_SIDES);
      assertTrue(now < before);
      before = now;
    }
    assertTrue(
        at(coast(0.1, 500, 1), WindMonth.fromAllSides(7)) > at(coast(0.1, 500, 1), ALL_SIDES));
  }

  @Test
  void shelteredBaysLeeCoastsAndBrackishSeasComeOutLower() {
    SeaView open = coast(0.2, 500, 1);
    assertTrue(at(coast(0.2, 5, 1), ALL_SIDES) < 0.6 * at(open, ALL_SIDES));
    WindMonth onshore = new WindMonth(5, 0, 3);
    WindMonth offshore = new WindMonth(5, 0, -3);
    assertTrue(at(open, offshore) < 0.5 * at(open, onshore));
    assertEquals(0.2, at(coast(0.2, 500, 0.2), ALL_SIDES) / at(open, ALL_SIDES), 0.01);
    assertTrue(at(coast(0.2, 500, 0), ALL_SIDES) < 0.2, "a fresh lake gives nothing");
  }

  @Test
  void crestsKeepSaltOutAndFarDesertsLieAtTheFloor() {
    double[] crest = new double[36];
    Arrays.fill(crest, 2500);
    SeaView inland = coast(80, 500, 1);
    double behind = new SeaSalt(inland, crest, 0.2, 500, 800).monthMgPerM2Day(ALL_SIDES);
    double open = new SeaSalt(inland, FLAT, 0.2, 500, 800).monthMgPerM2Day(ALL_SIDES);
    assertTrue(behind < 0.1 * open);
    double[] none = new double[36];
    Arrays.fill(none, Double.POSITIVE_INFINITY);
    SeaView desert = new SeaView(2000, none, new double[36], new double[36]);
    assertTrue(at(desert, ALL_SIDES) <= FittedRange.SD_MIN_MG_PER_M2_DAY);
  }

  @Test
  void rainWashesSaltOutInland() {
    SeaView inland = coast(150, 500, 1);
    double wet = new SeaSalt(inland, FLAT, 0.2, 50, 2500).monthMgPerM2Day(ALL_SIDES);
    double usual = new SeaSalt(inland, FLAT, 0.2, 50, 1000).monthMgPerM2Day(ALL_SIDES);
    double dry = new SeaSalt(inland, FLAT, 0.2, 50, 100).monthMgPerM2Day(ALL_SIDES);
    assertTrue(wet < 0.85 * usual, wet + " of " + usual);
    assertEquals(usual, dry, 1e-12, "drier air mixes salt deeper");
  }

  @Test
  void sectorsHoldAllTheWind() {
    for (WindMonth wind : List.of(ALL_SIDES, new WindMonth(6, 3, 1), new WindMonth(7, -20, 0))) {
      SectorWind sectors = new SectorWind(wind);
      double time = 0;
      for (int k = 0; k < 36; k++) {
        time += Math.PI / 18 * sectors.carriedPerRadian(10 * k, 0, 0, 5);
      }
      assertEquals(1, time, 1e-4);
    }
    double calm = 36 * Math.PI / 18 * new SectorWind(ALL_SIDES).carriedPerRadian(0, 3, 0, 5);
    assertEquals(Math.exp(-Math.PI / 4 * 9 / 25), calm, 1e-6, "Rayleigh's law");
  }

  @Test
  void mostWindComesFromWhereTheVectorComesFrom() {
    SectorWind westerly = new SectorWind(new WindMonth(6, 4, 0));
    assertTrue(
        westerly.carriedPerRadian(270, 3, 0, 5) > 5 * westerly.carriedPerRadian(90, 3, 0, 5));
  }

  @Test
  void siteFormRefusesNonsenseAndFlagsWhatLiesBeyondItsStations() {
    assertThrows(Refusal.class, () -> ChlorideFromSite.predict(-1, 5, 1, 0, 0));
    assertThrows(Refusal.class, () -> ChlorideFromSite.predict(1, Double.NaN, 1, 0, 0));
    assertThrows(Refusal.class, () -> ChlorideFromSite.predict(1, 5, 1.5, 0, 0));
    assertEquals(2, ChlorideFromSite.flags(800, 12).size());
    assertEquals(0, ChlorideFromSite.flags(10, 5).size());
    Quantiles q = ChlorideFromSite.predict(1, 5, 1, 0.1, 10);
    assertEquals(2 * NormalLaw.Z90 * ChlorideFromSite.LN_SPREAD, Math.log(q.p90() / q.p10()), 1e-9);
  }

  @Test
  void calmSitesWithoutSalineMonthsGetLess() {
    double calm = ChlorideFromSite.predict(5, 1.5, 0, 0.2, 10).median();
    double windy = ChlorideFromSite.predict(5, 5, 1, 0.2, 10).median();
    assertTrue(calm < 0.5 * windy);
  }

  @Test
  void spreadOfDirectionsHoldsOnHourlyWinds() {
    String[] octants = {"n", "ne", "e", "se", "s", "sw", "w", "nw"};
    double error = 0;
    double withoutDirection = 0;
    List<CsvTable.Row> rows = Reference.rows("tmy-winds/octant-shares.csv");
    for (CsvTable.Row row : rows) {
      double speed = row.number("mean_speed");
      WindMonth wind = new WindMonth(speed, row.number("eastward"), row.number("northward"));
      for (int o = 0; o < octants.length; o++) {
        double counted = row.number(octants[o]);
        error += Math.abs(octant(wind, o) - counted);
        withoutDirection += Math.abs(octant(WindMonth.fromAllSides(speed), o) - counted);
      }
    }
    int n = rows.size() * octants.length;
    assertTrue(error / n < 0.04, "mean error of an octant's share: " + error / n);
    assertTrue(error < 0.8 * withoutDirection, error + " against " + withoutDirection);
  }

  private static double octant(WindMonth wind, int index) {
    SectorWind sectors = new SectorWind(wind);
    double share = 0;
    for (int i = 0; i < 9; i++) {
      share += Math.toRadians(5) * sectors.carriedPerRadian(45 * index - 20 + 5 * i, 3, 0, 5);
    }
    return share;
  }
}
