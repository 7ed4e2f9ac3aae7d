package saltspoke.wheel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.DoubleRange;

/** Laws of brine films. */
@Tag("law")
class FilmLawTest {
  @Property(tries = 200)
  void wetterAirNeverThinsAFilm(
      @ForAll @DoubleRange(min = 0, max = 2000) double sea,
      @ForAll @DoubleRange(min = 1, max = 2000) double rock,
      @ForAll @DoubleRange(min = 0, max = 2000) double brine,
      @ForAll @DoubleRange(min = 5, max = 99) double rhPct,
      @ForAll @DoubleRange(min = 0, max = 10) double more,
      @ForAll @DoubleRange(min = -40, max = 40) double temperatureC) {
    SaltMix salt = new SaltMix(sea, rock, brine, 0);
    double before = ThinFilm.inEquilibrium(salt, rhPct, temperatureC).thicknessUm();
    double after = ThinFilm.inEquilibrium(salt, rhPct + more, temperatureC).thicknessUm();
    assertTrue(after >= before * (1 - 1e-9));
    double kept = ThinFilm.inEquilibrium(salt, rhPct, temperatureC, true).thicknessUm();
    assertTrue(kept >= before * (1 - 1e-9), "hysteresis only keeps water");
  }

  /** Giving a film's own water back gives the film back. */
  @Property(tries = 200)
  void equilibriumAndGivenWaterAgree(
      @ForAll @DoubleRange(min = 10, max = 3000) double rock,
      @ForAll @DoubleRange(min = 76, max = 98) double rhPct,
      @ForAll @DoubleRange(min = 0, max = 30) double temperatureC) {
    SaltMix salt = new SaltMix(0, rock, 0, 0);
    Film film = ThinFilm.inEquilibrium(salt, rhPct, temperatureC);
    double waterGPerM2 = rock / 35.453 / film.chlorideMolPerKg();
    Film again = ThinFilm.ofWater(salt, waterGPerM2, temperatureC);
    assertEquals(film.thicknessUm(), again.thicknessUm(), 1e-6 * film.thicknessUm());
    assertEquals(film.conductivityMSPerCm(), again.conductivityMSPerCm(), 1e-6 * 300);
    assertEquals(film.oxygenUmolPerL(), again.oxygenUmolPerL(), 1e-6 * 500);
  }

  @Property(tries = 200)
  void everythingIsFiniteAndPositive(
      @ForAll @DoubleRange(min = 0, max = 20000) double sea,
      @ForAll @DoubleRange(min = 0, max = 20000) double brine,
      @ForAll @DoubleRange(min = 0, max = 5000) double waterGPerM2,
      @ForAll @DoubleRange(min = -60, max = 50) double temperatureC) {
    Film film = ThinFilm.ofWater(new SaltMix(sea, 0, brine, 0), waterGPerM2, temperatureC);
    assertTrue(film.thicknessUm() >= 0 && film.thicknessUm() < 1e5);
    assertTrue(film.conductivityMSPerCm() > 0 && film.conductivityMSPerCm() < 500);
    assertTrue(film.oxygenUmolPerL() > 0 && film.oxygenDiffusivityCm2PerS() > 0);
    double limit = ThinFilm.oxygenLimitUAPerCm2(film);
    assertTrue(limit >= 0 && limit <= ThinFilm.OXYGEN_CAP_UA_PER_CM2);
  }

  @Property(tries = 100)
  void moreSaltFreezesLater(
      @ForAll @DoubleRange(min = 0.05, max = 5) double molal,
      @ForAll @DoubleRange(min = 1, max = 2) double times) {
    SaltMix rock = new SaltMix(0, 100, 0, 0);
    assertTrue(
        Deliquescence.freezingC(rock, molal * times)
            <= Deliquescence.freezingC(rock, molal) + 1e-9);
  }

  /** No 0 °C cut-off: brine is liquid below zero, and frozen below its eutectic. */
  @Example
  void brineStaysLiquidBelowZero() {
    SaltMix rock = new SaltMix(0, 600, 0, 0);
    assertTrue(ThinFilm.ofWater(rock, 50, -10).thicknessUm() > 1);
    assertEquals(0, ThinFilm.ofWater(rock, 50, -22).thicknessUm());
    assertTrue(ThinFilm.ofWater(new SaltMix(600, 0, 0, 0), 50, -25).thicknessUm() > 0.1);
    assertEquals(0, ThinFilm.ofWater(SaltMix.NONE, 50, -1).thicknessUm());
  }

  @Example
  void saltSetsWhenTheFilmIsThere() {
    SaltMix rock = new SaltMix(0, 600, 0, 0);
    assertEquals(0, ThinFilm.inEquilibrium(rock, 74, 25).thicknessUm());
    assertTrue(ThinFilm.inEquilibrium(rock, 60, 25, true).thicknessUm() > 0);
    assertEquals(0, ThinFilm.inEquilibrium(rock, 44, 25, true).thicknessUm());
    assertTrue(ThinFilm.inEquilibrium(new SaltMix(600, 0, 0, 0), 40, 25).thicknessUm() > 0);
    assertEquals(0, ThinFilm.inEquilibrium(SaltMix.NONE, 99, 25).thicknessUm());
  }
}
