package saltspoke.advice;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.Size;
import saltspoke.atmosphere.AirClimate;
import saltspoke.values.Refusal;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.CellTables;
import saltspoke.wheel.Film;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.SaltMix;
import saltspoke.wheel.ThinFilm;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;
import saltspoke.wheel.damage.CellRates;

@Tag("law")
class AdviceLawTest {
  private static final Catalogue CATALOGUE = Catalogue.shipped();
  private static final Advisor ADVISOR = new Advisor(CATALOGUE);
  private static final CellRates RATES = CellRates.tabled(new CellTables(64));
  private static final AirClimate AIR = TestClimates.maritimeSalted();

  /** A year of one film, so many hours in each month. */
  private static WheelYear year(Film film, List<Double> hours) {
    List<WheelYear.Month> months = new ArrayList<>();
    for (int m = 0; m < 12; m++) {
      double h = hours.get(m);
      months.add(
          new WheelYear.Month(
              m + 1, h, SaltMix.NONE, 0, 0, List.of(new WheelYear.FilmHours(film, h))));
    }
    return new WheelYear(months, List.of());
  }

  private static Interval under(WheelYear year, Pairing p) {
    AdviceRequest request =
        Asked.of(Asked.ready("all-winter-commuter"), p.rim(), p.nipple(), p.between(), p.spoke());
    return new Advisor(CATALOGUE, (air, profile, build) -> year, RATES)
        .open(AIR, request, Draws.of(Draws.SEED), WheelRisk.NIPPLE_SCATTER)
        .of(p)
        .interval();
  }

  private static Pairing pairing(int i) {
    return CATALOGUE.pairings().get(Math.floorMod(i * 37, CATALOGUE.pairings().size()));
  }

  private static Film film(double saltG, double rhPct, double celsius) {
    return ThinFilm.inEquilibrium(new SaltMix(0, 1000 * saltG, 0, 0), rhPct, celsius, true);
  }

  @Property(tries = 200)
  void moreHoursInTheSameFilmNeverLengthen(
      @ForAll @Size(12) List<@DoubleRange(min = 0, max = 600) Double> hours,
      @ForAll @IntRange(min = 0, max = 11) int month,
      @ForAll @DoubleRange(min = 1, max = 140) double extra,
      @ForAll @DoubleRange(min = 0.05, max = 2) double saltG,
      @ForAll @IntRange(min = 0, max = 700) int i) {
    Film film = film(saltG, 85, 10);
    List<Double> more = new ArrayList<>(hours);
    more.set(month, more.get(month) + extra);
    Interval before = under(year(film, hours), pairing(i));
    Interval after = under(year(film, more), pairing(i));
    assertTrue(after.freeFirstMonths() <= before.freeFirstMonths() * (1 + 1e-9));
    assertTrue(
        after.freeEveryMonths() <= before.freeEveryMonths() * (1 + 1e-9), before + " " + after);
    assertTrue(after.replaceByMonths() <= before.replaceByMonths() * (1 + 1e-9));
  }

  @Property(tries = 60)
  void insulationNeverShortens(
      @ForAll @DoubleRange(min = 100, max = 700) double hours,
      @ForAll @DoubleRange(min = 0.02, max = 3) double saltG,
      @ForAll @DoubleRange(min = 76, max = 97) double rhPct,
      @ForAll @IntRange(min = 0, max = 100) int i) {
    List<Double> even = new ArrayList<>();
    for (int m = 0; m < 12; m++) {
      even.add(hours);
    }
    WheelYear year = year(film(saltG, rhPct, 10), even);
    String nipple = CATALOGUE.nipples().get(i % CATALOGUE.nipples().size()).id();
    Interval bare = under(year, new Pairing("carbon-bare", nipple, "none", "stainless"));
    for (Pairing insulated :
        List.of(
            new Pairing("carbon-bare", nipple, "washer-insulating", "stainless"),
            new Pairing("carbon-bare", nipple, "bushing-insulating", "stainless"),
            new Pairing("carbon-ply", nipple, "none", "stainless"))) {
      if (CATALOGUE.refusal(insulated).isEmpty()) {
        Interval then = under(year, insulated);
        assertTrue(then.freeFirstMonths() >= bare.freeFirstMonths() * (1 - 1e-9));
        assertTrue(then.replaceByMonths() >= bare.replaceByMonths() * (1 - 1e-9));
      }
    }
    Interval rim = under(year, new Pairing("aluminium-bare", nipple, "none", "stainless"));
    Interval washer =
        under(year, new Pairing("aluminium-bare", nipple, "washer-insulating", "stainless"));
    assertTrue(washer.freeFirstMonths() >= rim.freeFirstMonths() * (1 - 1e-9));
  }

  @Property(tries = 1)
  void sameQuestionSameAnswer() {
    AdviceRequest request = Asked.of(Asked.ready("weekend-gravel"));
    Advice one = ADVISOR.advise(AIR, request);
    Advice other = new Advisor(Catalogue.shipped()).advise(AIR, request);
    assertEquals(one.pairings(), other.pairings());
    assertEquals(one.changes(), other.changes());
    assertEquals(CATALOGUE.pairings().size(), one.pairings().size());
  }

  @Property(tries = 12)
  void statesComeInOrderAndRiskMovesTheLook(@ForAll @IntRange(min = 0, max = 700) int i) {
    Pairing p = pairing(i);
    AdviceRequest request =
        Asked.of(Asked.ready("all-winter-commuter"), p.rim(), p.nipple(), p.between(), p.spoke());
    PairingAdvice usual = ADVISOR.advise(AIR, request).pairings().get(0);
    inOrder(usual.firstAttackMonths(), usual.seizedMonths());
    inOrder(usual.seizedMonths(), usual.headLossMonths());
    double cautious = first(Asked.at(request, RiskLevel.CAUTIOUS, false));
    double relaxed = first(Asked.at(request, RiskLevel.RELAXED, false));
    assertTrue(cautious <= usual.firstLookMonths() && usual.firstLookMonths() <= relaxed);
    PairingAdvice held =
        ADVISOR.advise(AIR, Asked.at(request, RiskLevel.USUAL, true)).pairings().get(0);
    assertTrue(held.firstLookMonths() >= 1 && held.firstLookMonths() <= 24);
    assertTrue(held.everyMonths() >= 1 && held.everyMonths() <= 24);
  }

  private static double first(AdviceRequest request) {
    return ADVISOR.advise(AIR, request).pairings().get(0).firstLookMonths();
  }

  private static void inOrder(StateTimes milder, StateTimes worse) {
    if (milder.median() != null && worse.median() != null) {
      assertTrue(milder.median() <= worse.median() * 1.01);
    }
    for (StateTimes times : List.of(milder, worse)) {
      if (times.p90() != null) {
        assertTrue(times.p10() <= times.median() && times.median() <= times.p90());
      }
      assertFalse(times.notApplicable() && times.p10() != null);
    }
  }

  @Property(tries = 1)
  void aCleanWheelWaitsLongerThanOneWithPowder() {
    AdviceRequest request =
        Asked.of(
            Asked.ready("year-round-club"), "carbon-bare", "brass-nickel", "none", "stainless");
    double clean = first(Asked.inService(request, 24, Finding.CLEAN));
    double powder = first(Asked.inService(request, 24, Finding.POWDER));
    assertTrue(powder < clean, powder + " < " + clean);
    PairingAdvice stiff =
        ADVISOR.advise(AIR, Asked.inService(request, 24, Finding.ONE_STIFF)).pairings().get(0);
    assertEquals(0.0, stiff.seizedMonths().median());
    assertTrue(stiff.firstLookMonths() <= clean, stiff.firstLookMonths() + " <= " + clean);
  }

  @Property(tries = 1)
  void moreNipplesNeverLengthen() {
    AdviceRequest request =
        Asked.of(
            Asked.ready("year-round-club"), "carbon-bare", "brass-nickel", "none", "stainless");
    double few = first(Asked.built(request, new WheelBuild(20, 1100, true, false)));
    double many = first(Asked.built(request, new WheelBuild(36, 1100, true, false)));
    assertTrue(many <= few * 1.02, many + " <= " + few);
  }

  @Property(tries = 1)
  void wrongQuestionsAreRefused() {
    AdviceRequest request = Asked.of(Asked.ready("year-round-club"), "carbon-bare");
    assertThrows(
        Refusal.class, () -> ADVISOR.advise(AIR, Asked.inService(request, 0, Finding.CLEAN)));
    assertThrows(
        Refusal.class, () -> ADVISOR.advise(AIR, Asked.inService(request, 300, Finding.CLEAN)));
    assertThrows(
        Refusal.class,
        () -> ADVISOR.advise(AIR, Asked.inService(request, Double.NaN, Finding.CLEAN)));
    assertThrows(
        Refusal.class, () -> ADVISOR.advise(AIR, Asked.of(Asked.ready("year-round-club"), "wood")));
  }
}
