package saltspoke.wheel.damage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import saltspoke.advice.TestClimates;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.CellSpec;
import saltspoke.wheel.CellTables;
import saltspoke.wheel.Material;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;
import saltspoke.wheel.rim.WheelWeather;

@Tag("law")
class DamageLawTest {
  private static final Catalogue CATALOGUE = Catalogue.shipped();
  private static final CellRates RATES = CellRates.tabled(new CellTables(64));

  @Property(tries = 200)
  void grooveUndoesItsDose(
      @ForAll @DoubleRange(min = 1, max = 3000) double depthUm,
      @ForAll @DoubleRange(min = 50, max = 1000) double widthUm) {
    double dose = GrooveGrowth.doseUm(depthUm, widthUm);
    assertEquals(depthUm, GrooveGrowth.depthUm(dose, widthUm), 1e-6 * depthUm);
    assertTrue(dose >= depthUm);
  }

  @Property(tries = 200)
  void moreTensionLeavesLessToLose(
      @ForAll @DoubleRange(min = 300, max = 1900) double tensionN,
      @ForAll @DoubleRange(min = 250, max = 900) double strengthMpa) {
    double depth = HeadSection.criticalDepthMm(1.15, 1.2, tensionN, strengthMpa);
    double tighter = HeadSection.criticalDepthMm(1.15, 1.2, tensionN + 100, strengthMpa);
    assertTrue(tighter <= depth && depth < 1.2 && tighter > 0);
  }

  @Property(tries = 100)
  void doseNeverFallsAndRepeatsByTheYearOnceTheWheelIsOld(
      @ForAll @DoubleRange(min = 0, max = 400) double months,
      @ForAll @IntRange(min = 1, max = 12) int buildMonth) {
    double[] monthly = {9, 8, 5, 2, 1, 0, 0, 0, 1, 3, 6, 8};
    double[] winter = {1, 0.9, 0.7, 0.5, 0.3, 0.1, 0, 0.1, 0.3, 0.5, 0.7, 0.9};
    SeasonalDose dose = new SeasonalDose(monthly, buildMonth, winter, new Maturity(9));
    assertTrue(dose.um(months + 0.3) >= dose.um(months));
    assertEquals(0, dose.um(0));
    if (months > 120) {
      assertEquals(43, dose.um(months + 12) - dose.um(months), 0.43);
    }
  }

  @Property(tries = 1)
  void winterStartsDeeper() {
    double[] even = new double[12];
    java.util.Arrays.fill(even, 1);
    double[] winter = {1, 0.9, 0.7, 0.5, 0.3, 0.1, 0, 0.1, 0.3, 0.5, 0.7, 0.9};
    Maturity maturity = new Maturity(0);
    double inWinter = new SeasonalDose(even, 12, winter, maturity).um(3);
    double inSummer = new SeasonalDose(even, 6, winter, maturity).um(3);
    double ratio = inWinter / inSummer;
    assertTrue(ratio > 1.5 && ratio < 2.5, "ratio " + ratio);
  }

  @Property(tries = 1)
  void lessNobleOfTwoIsEaten() {
    Couple aluminiumOnCarbon = couple("carbon-bare", "aluminium-bare", "none", "stainless", 0);
    assertEquals("nipple", aluminiumOnCarbon.part());
    assertEquals(Material.CARBON_FIBRE, aluminiumOnCarbon.spec().cathode());
    for (String nipple : List.of("brass-bare", "brass-nickel", "titanium", "stainless")) {
      Parts parts = parts(new Pairing("aluminium-bare", nipple, "none", "stainless"));
      Couple rim =
          SpokeHole.couples(parts).stream()
              .filter(c -> c.part().equals("rim"))
              .findFirst()
              .orElseThrow();
      assertEquals(Material.ALUMINIUM_WROUGHT, rim.metal());
      assertTrue(rim.spec().cathode() != null, nipple + " drives the rim");
    }
    Couple washer = couple("carbon-bare", "aluminium-bare", "washer-stainless", "stainless", 0);
    assertEquals(Material.STAINLESS, washer.spec().cathode());
    assertTrue(
        SpokeHole.couples(parts(new Pairing("carbon-bare", "brass-bare", "none", "steel-zinc")))
            .stream()
            .anyMatch(c -> c.part().equals("spoke") && c.metal() == Material.ZINC));
  }

  @Property(tries = 1)
  void pooledFilmsLoseWhatAllFilmsLose() {
    WheelYear year =
        WheelWeather.over(
            TestClimates.all().get("maritime-salted"),
            Profiles.shipped().get("all-winter-commuter"),
            WheelBuild.USUAL);
    List<CellSpec> specs = new ArrayList<>();
    for (String nipple : List.of("aluminium-bare", "brass-bare", "steel-nickel")) {
      specs.add(couple("carbon-bare", nipple, "none", "stainless", 0).spec());
      specs.add(couple("carbon-ply", nipple, "none", "stainless", 1).spec());
    }
    FilmPool pool = FilmPool.of(year);
    for (CellSpec spec : specs) {
      double all = 0;
      for (WheelYear.Month month : year.months()) {
        for (WheelYear.FilmHours part : month.films()) {
          all +=
              RATES.of(spec).apply(part.film()).penetrationUmPerYear()
                  * part.hours()
                  / FilmLoss.HOURS_PER_YEAR;
        }
      }
      double pooled = 0;
      for (double um : FilmLoss.over(pool, spec, RATES).monthlyUm()) {
        pooled += um;
      }
      assertEquals(1, pooled / all, 0.05, spec.toString());
    }
  }

  private static Couple couple(String rim, String nipple, String between, String spoke, int i) {
    return SpokeHole.couples(parts(new Pairing(rim, nipple, between, spoke))).get(i);
  }

  private static Parts parts(Pairing p) {
    return new Parts(
        CATALOGUE.rim(p.rim()),
        CATALOGUE.nipple(p.nipple()),
        CATALOGUE.between(p.between()),
        CATALOGUE.spoke(p.spoke()));
  }
}
