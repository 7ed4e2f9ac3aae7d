package saltspoke.wheel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.sources.CsvTable;

/** Films and cells against printed values; sources stand in the heads of the reference files. */
@Tag("published")
class CellPublishedTest {
  /** Bulk sea water, diffusion layer 0.6 mm: common for still or slow water, from memory. */
  private static final double STILL_WATER_UM = 600;

  /** Flowing sea water, diffusion layer 0.15 mm, from memory. */
  private static final double FLOWING_WATER_UM = 150;

  @Test
  void zincInAcid() {
    Tafel hydrogen = new Tafel(0, 1e-10, -0.08);
    Tafel zinc = new Tafel(-0.763, 1e-7, 0.09);
    for (CsvTable.Row row : Reference.rows("callister-zinc-acid/mixed_potential.csv")) {
      double potentialV = MixedPotential.of(zinc, hydrogen, row.number("area_ratio"));
      assertEquals(
          row.number("potential_v"), potentialV, row.number("potential_tolerance"), row.where());
      assertEquals(
          row.number("current_a_per_cm2"),
          zinc.at(potentialV),
          row.number("current_tolerance"),
          row.where());
    }
  }

  @Test
  void faradayFactors() {
    for (CsvTable.Row row : Reference.rows("astm-g102/faraday.csv")) {
      assertEquals(
          row.number("um_per_year"),
          Faraday.valueOf(row.text("name")).umPerYearPerUAPerCm2(),
          row.number("tolerance") + 1e-9,
          row.where());
    }
  }

  @Test
  void oxygenLimitsOfFreshWater() {
    for (CsvTable.Row row : Reference.rows("oxygen-limit/limit_100um.csv")) {
      double c = row.number("temperature_c");
      assertEquals(row.number("oxygen_umol_per_l"), Oxygen.freshUmolPerL(c), 0.5, row.where());
      double limit =
          Oxygen.diffusionLimitUAPerCm2(Oxygen.diffusivityCm2PerS(c), Oxygen.freshUmolPerL(c), 100);
      assertEquals(row.number("limit_ua_per_cm2"), limit, 0.5, row.where());
      Film film = ThinFilm.ofWater(SaltMix.NONE, 99.8, c + 1e-9);
      assertEquals(
          row.number("limit_ua_per_cm2"), ThinFilm.oxygenLimitUAPerCm2(film), 0.5, row.where());
    }
  }

  @Test
  void saltingOut() {
    for (CsvTable.Row row : Reference.rows("oxygen-limit/sea_solubility.csv")) {
      double chloride = row.number("chloride_mol_per_kg");
      double mg = chloride * 35453;
      boolean sea = row.number("sea") == 1;
      Film film =
          ThinFilm.ofWater(
              sea ? new SaltMix(mg, 0, 0, 0) : new SaltMix(0, mg, 0, 0),
              1000,
              row.number("temperature_c") + 1e-9);
      double printed = row.number("oxygen_umol_per_l");
      assertEquals(printed, film.oxygenUmolPerL(), 0.02 * printed, row.where());
    }
  }

  /**
   * Sea water at 25 °C: about 159 µA/cm² through 100 µm with the diffusivity of fresh water. The
   * film's own, 6 % less for its viscosity, gives 150.
   */
  @Test
  void oxygenLimitOfSeaWater() {
    Film sea = CellFixtures.sea(100);
    double fresh = Oxygen.diffusivityCm2PerS(25);
    assertEquals(159, Oxygen.diffusionLimitUAPerCm2(fresh, sea.oxygenUmolPerL(), 100), 1);
    assertEquals(150, ThinFilm.oxygenLimitUAPerCm2(sea), 1);
  }

  @Test
  void conductivityTable() {
    for (CsvTable.Row row : Reference.rows("brine-data/conductivity_20c.csv")) {
      double w = row.number("mass_percent") / 100;
      for (Brine brine : Brine.values()) {
        double printed = row.number(brine.name().toLowerCase(java.util.Locale.ROOT));
        assertEquals(printed, brine.conductivityAt20CMSPerCm(w), 1e-9, row.where());
      }
    }
  }

  /** Greenspan 1977 and the eutectics that science quotes. */
  @Test
  void deliquescenceAndEutectics() {
    SaltMix rock = new SaltMix(0, 100, 0, 0);
    SaltMix sea = new SaltMix(100, 0, 0, 0);
    SaltMix brine = new SaltMix(0, 0, 100, 0);
    assertEquals(75.3, Deliquescence.onsetRhPct(rock, 25), 0.05);
    assertEquals(35, Deliquescence.onsetRhPct(sea, 25), 0.5);
    assertEquals(29, Deliquescence.onsetRhPct(brine, 25), 0.5);
    assertEquals(-21, Deliquescence.freezingC(rock, 6), 0.5);
    assertEquals(-33, Deliquescence.freezingC(sea, 12), 0.5);
  }

  /**
   * 1 mol/kg NaCl freezes at −3.37 °C, sea water at −1.92 °C (handbook, from memory); the model's
   * sea salt has no sulfate and freezes 0.15 °C higher.
   */
  @Test
  void freezingLine() {
    assertEquals(-3.37, Deliquescence.freezingC(new SaltMix(0, 100, 0, 0), 1), 0.05);
    assertEquals(-1.92, Deliquescence.freezingC(new SaltMix(100, 0, 0, 0), 0.566), 0.2);
  }

  /** Both metals diffusion limited: i_a = i_L (1 + Ac/Aa), Mansfeld 1971; 40 and 10 → 440. */
  @Test
  void catchmentRule() {
    Film film = CellFixtures.withThicknessUm(ThinFilm.ofWater(SaltMix.NONE, 400, 25), 497.6);
    assertEquals(40, ThinFilm.oxygenLimitUAPerCm2(film), 0.05);
    Kinetics eager =
        new Kinetics(
            new Tafel(-0.75, 1e6, -0.2),
            new Tafel(-1, 1e-9, -0.12),
            new Tafel(-0.9, 1, 0.04),
            0,
            9,
            0,
            0.06,
            Faraday.ALUMINIUM.umPerYearPerUAPerCm2(),
            0);
    Kinetics inert =
        new Kinetics(
            eager.oxygen(), eager.hydrogen(), new Tafel(1, 1e-9, 0.1), 0, 9, 0, 0.06, 0, 0);
    AnodeLaw anode = new AnodeLaw(eager, FilmFactors.of(film));
    CellSpec ten =
        new CellSpec(Material.ALUMINIUM_WROUGHT, Material.PLATINUM, 2.25, 10, 1, 1, 0, 2.25, 0, 0);
    FilmStrip strip =
        FilmStrip.joined(
            StripGrid.of(ten, 40),
            1e9,
            new CathodeLaw(inert, 40),
            anode,
            ten.ringAreaCm2(),
            0,
            anode.restV());
    double[] self = new double[2];
    anode.cathodic(strip.anodeV(), self);
    double total = strip.currentUA() / ten.ringAreaCm2() + self[0];
    assertEquals(440, total, 1);
    assertEquals(4.8, total * Faraday.ALUMINIUM.umPerYearPerUAPerCm2() / 1000, 0.05);
  }

  @Test
  void potentialsInFlowingSeaWater() {
    for (CsvTable.Row row : Reference.rows("astm-g82-laque/potentials.csv")) {
      Material metal = Material.valueOf(row.text("material"));
      double restV =
          new AnodeLaw(Kinetics.of(metal), FilmFactors.of(CellFixtures.sea(FLOWING_WATER_UM)))
              .restV();
      assertTrue(
          restV >= row.number("low_v") - 0.005 && restV <= row.number("high_v") + 0.005,
          row.where() + " " + metal + " rests at " + restV);
    }
  }

  @Test
  void aluminiumOneToOneInSeaWater() {
    double before = 0;
    for (CsvTable.Row row : Reference.rows("mil-std-889d/aluminium_one_to_one.csv")) {
      Material cathode = Material.valueOf(row.text("cathode"));
      double rate =
          GalvanicCell.solve(
                  CellFixtures.oneToOne(Material.ALUMINIUM_WROUGHT, cathode),
                  CellFixtures.sea(STILL_WATER_UM))
              .penetrationUmPerYear();
      double factor = rate / row.number("um_per_year");
      assertTrue(factor > 0.5 && factor < 2, row.where() + " " + cathode + " " + rate);
      assertTrue(rate > before, "rank of " + cathode);
      before = rate;
    }
  }

  /** A skirt cuts the current about 3 decades, 6 at 6.4 mm: Srinivasan and Hihara 2016. */
  @Test
  void skirt() {
    assertEquals(-3, Math.log10(GalvanicCell.skirtFactor(1)), 0.5);
    assertEquals(-6, Math.log10(GalvanicCell.skirtFactor(6.4)), 1e-9);
    assertEquals(1, GalvanicCell.skirtFactor(0), 0);
  }

  /** Outdoors under 30 % of the loss is galvanic current: Quiambao and Hihara 2019. */
  @Test
  void galvanicShareOfWeakCouples() {
    CellSpec weak =
        new CellSpec(
            Material.ALUMINIUM_WROUGHT, Material.CARBON_FIBRE, 2.25, 14, 3, 0.01, 0, 2.25, 0, 0);
    CellCurrents c = GalvanicCell.solve(weak, CellFixtures.shed(85));
    double share =
        c.galvanicUAPerCm2() / (c.galvanicUAPerCm2() + c.selfUAPerCm2() + c.localUAPerCm2());
    assertTrue(share > 0.1 && share < 0.32, "share " + share);
  }
}
