package saltspoke.wheel;

/** Films and cells that several tests use. */
final class CellFixtures {
  /** Chloride of 965 g of water in standard sea water, mg. */
  private static final double SEA_CHLORIDE_MG = 19350;

  private CellFixtures() {}

  /** Sea water of a given effective thickness at 25 °C. */
  static Film sea(double thicknessUm) {
    Film film = ThinFilm.ofWater(new SaltMix(SEA_CHLORIDE_MG, 0, 0, 0), 965, 25);
    return withThicknessUm(film, thicknessUm);
  }

  static Film withThicknessUm(Film film, double thicknessUm) {
    return new Film(
        thicknessUm,
        film.temperatureC(),
        film.chlorideMolPerKg(),
        film.conductivityMSPerCm(),
        film.oxygenUmolPerL(),
        film.oxygenDiffusivityCm2PerS());
  }

  /** The film on a salted rim (1 g/m² of rock salt) in a shed at 8 °C. */
  static Film shed(double rhPct) {
    return ThinFilm.inEquilibrium(new SaltMix(0, 600, 0, 0), rhPct, 8);
  }

  /** Rain lying 100 µm deep at 8 °C on a rim with 10 mg/m² of chloride. */
  static Film rain() {
    return ThinFilm.ofWater(new SaltMix(10, 0, 0, 0), 100, 8);
  }

  /** An aluminium nipple with a worn ring in a bare carbon rim. */
  static CellSpec nippleOnCarbon(double activeShare) {
    return new CellSpec(
        Material.ALUMINIUM_WROUGHT,
        Material.CARBON_FIBRE,
        2.25,
        14,
        0.3,
        0.35,
        activeShare,
        12,
        0,
        0);
  }

  /** 1 cm² of anode beside 1 cm² of cathode. */
  static CellSpec oneToOne(Material anode, Material cathode) {
    return new CellSpec(anode, cathode, 2.25, 100, 1, 1, 0, 2.25, 0, 0);
  }
}
