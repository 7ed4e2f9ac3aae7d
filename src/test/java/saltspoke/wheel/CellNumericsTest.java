package saltspoke.wheel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * The numerical solution against closed forms, against itself refined, and the tables against it.
 */
@Tag("law")
class CellNumericsTest {
  /**
   * A cathode that gives its limit until the potential difference is used up: r0 3 mm, limit 221
   * µA/cm², σ 0.050 S/cm, δ 100 µm, ΔE 0.5 V give R 14.4 mm and 1.38 mA.
   */
  @Test
  void ringAroundAHole() {
    Polarisation limited =
        (v, out) -> {
          double width = 0.002;
          double e = Math.exp(v / width);
          out[0] = 221 / (1 + e);
          out[1] = -221 * e / ((1 + e) * (1 + e) * width);
          if (v > 0.2) {
            out[0] = 0;
            out[1] = 0;
          }
        };
    StripGrid grid = new StripGrid(3, 0, 1, 40, 400);
    FilmStrip strip = FilmStrip.held(grid, 500, limited, -0.5);
    double closed = Math.PI * (1.44 * 1.44 - 0.09) * 221;
    assertEquals(1380, closed, 5);
    assertEquals(closed, strip.currentUA(), 0.01 * closed);
  }

  /** Linear kinetics along a strip: I = σδ p ΔU/λ · tanh(L/λ), λ² = σδ/k. */
  @Test
  void linearStripAgainstTanh() {
    double perVolt = 200;
    Polarisation linear =
        (v, out) -> {
          out[0] = -perVolt * v;
          out[1] = -perVolt;
        };
    for (double sheetMicroS : new double[] {0.5, 5, 50}) {
      double circumferenceCm = 2 * Math.PI * 0.225;
      double lambdaCm = Math.sqrt(sheetMicroS / perVolt);
      double exact = sheetMicroS * circumferenceCm * 0.1 / lambdaCm * Math.tanh(0.5 / lambdaCm);
      FilmStrip strip =
          FilmStrip.held(new StripGrid(2.25, 5, 0, 2.25, 40), sheetMicroS, linear, -0.1);
      assertEquals(exact, strip.currentUA(), 0.005 * exact);
    }
  }

  /** Halving the cells' width quarters the error: second order. */
  @Test
  void gridRefinementOrder() {
    for (Film film : List.of(CellFixtures.shed(80), CellFixtures.rain())) {
      CellSpec spec = CellFixtures.nippleOnCarbon(0.02);
      double finest = GalvanicCell.solve(spec, film, 1, 1280).galvanicCurrentUA();
      double e20 = GalvanicCell.solve(spec, film, 1, 20).galvanicCurrentUA() - finest;
      double e40 = GalvanicCell.solve(spec, film, 1, 40).galvanicCurrentUA() - finest;
      double e80 = GalvanicCell.solve(spec, film, 1, 80).galvanicCurrentUA() - finest;
      assertEquals(2, Math.log(e20 / e40) / Math.log(2), 0.15);
      assertEquals(2, Math.log(e40 / e80) / Math.log(2), 0.15);
      assertTrue(Math.abs(e40) < 0.002 * finest);
    }
  }

  /** All currents balance: what leaves the ring arrives at the cathode. */
  @Test
  void currentIsConserved() {
    Film film = CellFixtures.rain();
    CellCurrents c = GalvanicCell.solve(CellFixtures.nippleOnCarbon(0.05), film);
    double[] out = new double[2];
    new AnodeLaw(Kinetics.of(Material.ALUMINIUM_WROUGHT), FilmFactors.of(film))
        .at(c.couplePotentialVSce(), out);
    assertEquals(out[0], c.galvanicUAPerCm2(), 1e-6 * out[0]);
  }

  @Test
  void tableAgainstDirectSolve() {
    Random random = new Random(20261201);
    CellTables tables = new CellTables(CellTables.USUAL_CAPACITY);
    List<Double> errors = new ArrayList<>();
    while (errors.size() < 600) {
      Film film = film(random);
      if (film.thicknessUm() < 0.05) {
        continue;
      }
      CellSpec spec = spec(random);
      double widthMm = Math.pow(10, -1.3 + 2 * random.nextDouble());
      double scale = Math.pow(10, -1 + 2 * random.nextDouble());
      double direct =
          GalvanicCell.solve(spec.withRingWidthMm(widthMm), film, scale).penetrationUmPerYear();
      double looked = tables.table(spec).rate(film, widthMm, scale);
      assertEquals(direct, looked, 0.04 * direct + 0.02, () -> spec + " " + film);
      errors.add(Math.abs(looked - direct) / (direct + 1));
    }
    errors.sort(null);
    assertTrue(errors.get(570) < 0.01, "95 % of errors below " + errors.get(570));
  }

  private static Film film(Random random) {
    SaltMix salt =
        new SaltMix(
            random.nextInt(2) * Math.pow(10, 4 * random.nextDouble()),
            Math.pow(10, 4 * random.nextDouble() - 1),
            random.nextInt(2) * Math.pow(10, 3 * random.nextDouble()),
            0);
    double temperatureC = -15 + 40 * random.nextDouble();
    return random.nextBoolean()
        ? ThinFilm.inEquilibrium(salt, 36 + 62 * random.nextDouble(), temperatureC)
        : ThinFilm.ofWater(salt, Math.pow(10, 3 * random.nextDouble()), temperatureC);
  }

  private static CellSpec spec(Random random) {
    Material[] anodes = {
      Material.ALUMINIUM_WROUGHT,
      Material.ALUMINIUM_HIGH_STRENGTH,
      Material.BRASS,
      Material.ZINC,
      Material.CARBON_STEEL
    };
    Material[] cathodes = {
      Material.CARBON_FIBRE,
      Material.BRASS,
      Material.STAINLESS,
      Material.TITANIUM,
      Material.NICKEL,
      null
    };
    return new CellSpec(
        anodes[random.nextInt(anodes.length)],
        cathodes[random.nextInt(cathodes.length)],
        2.25,
        14,
        0.3,
        random.nextInt(2) * 0.35,
        random.nextBoolean() ? 0.02 : 1,
        random.nextBoolean() ? 3 : 12,
        random.nextInt(2) * 100,
        random.nextInt(4) == 0 ? 1 : 0);
  }

  /** Bounded: the least recently used cathode goes first, and answers do not change. */
  @Test
  void tablesAreBounded() {
    CellTables tables = new CellTables(2);
    CellSpec spec = CellFixtures.nippleOnCarbon(0.02);
    double first = tables.table(spec).rate(CellFixtures.shed(80), 0.3, 1);
    for (double share = 0.01; share < 0.05; share += 0.01) {
      tables.table(CellFixtures.nippleOnCarbon(share + 1e-4));
    }
    assertEquals(2, tables.size());
    assertEquals(first, tables.table(spec).rate(CellFixtures.shed(80), 0.3, 1), 0);
  }

  /** Many threads on one cold table get the bits that one thread gets. */
  @Test
  void tableServesManyThreads() {
    CellSpec spec = CellFixtures.nippleOnCarbon(0.02);
    CellTables shared = new CellTables(1);
    CellTables own = new CellTables(1);
    double[] together =
        IntStream.range(0, 400)
            .parallel()
            .mapToDouble(i -> shared.at(spec, CellFixtures.shed(76 + 0.05 * i)).reachMm())
            .toArray();
    for (int i = 0; i < together.length; i++) {
      assertEquals(own.at(spec, CellFixtures.shed(76 + 0.05 * i)).reachMm(), together[i], 0);
    }
  }
}
