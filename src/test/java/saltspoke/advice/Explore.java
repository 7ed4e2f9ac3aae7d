package saltspoke.advice;

import java.util.*;
import saltspoke.atmosphere.AirClimate;
import saltspoke.wheel.*;
import saltspoke.wheel.damage.*;
import saltspoke.wheel.rim.WheelWeather;

public class Explore {
  static AdviceRequest req(
      String profile, String rim, String nipple, String between, String spoke) {
    return new AdviceRequest(
        Profiles.shipped().get(profile),
        WheelBuild.USUAL,
        rim,
        nipple,
        between,
        spoke,
        RiskLevel.USUAL,
        10,
        0,
        Finding.NOT_LOOKED,
        false);
  }

  static Map<String, CellCurrents> cache = new HashMap<>();
  static CellRates RATES = CellRates.tabled(new CellTables(64));

  public static void main(String[] a) {
    Catalogue cat = Catalogue.shipped();
    System.out.println("pairings " + cat.pairings().size());
    Advisor adv = new Advisor(cat, WheelWeather::over, RATES);
    Object[][] cases = {
      {
        "C dry indoor anod/al 12-24",
        TestClimates.dryInland(),
        "fair-weather-racer",
        "aluminium-anodised",
        "aluminium-anodised-thin"
      },
      {
        "C dry indoor anod/albare",
        TestClimates.dryInland(),
        "fair-weather-racer",
        "aluminium-bare",
        "aluminium-anodised-thin"
      },
      {
        "A commuter al/carbon 1-3, repl 12-30",
        TestClimates.maritimeSalted(),
        "all-winter-commuter",
        "carbon-bare",
        "aluminium-bare"
      },
      {
        "A' commuter anod/carbon",
        TestClimates.maritimeSalted(),
        "all-winter-commuter",
        "carbon-bare",
        "aluminium-anodised-thin"
      },
      {
        "B commuter brass-ni/carbon 6-12",
        TestClimates.maritimeSalted(),
        "all-winter-commuter",
        "carbon-bare",
        "brass-nickel"
      },
      {
        "B' commuter brass/carbon",
        TestClimates.maritimeSalted(),
        "all-winter-commuter",
        "carbon-bare",
        "brass-bare"
      },
      {
        "D tropical front al/carbon <=1",
        TestClimates.tropicalSeaFront(),
        "sea-front-runabout",
        "carbon-bare",
        "aluminium-bare"
      },
      {
        "E trainer al/carbon",
        TestClimates.dryInland(),
        "trainer-only",
        "carbon-bare",
        "aluminium-bare"
      },
      {
        "F desert fair al/carbon",
        TestClimates.all().get("hot-desert"),
        "fair-weather-racer",
        "carbon-bare",
        "aluminium-bare"
      },
      {
        "G club rinser maritime al/carbon",
        TestClimates.maritimeSalted(),
        "year-round-club",
        "carbon-bare",
        "aluminium-bare"
      },
    };
    for (Object[] c : cases) {
      AdviceRequest r = req((String) c[2], (String) c[3], (String) c[4], "none", "stainless");
      Workshop shop =
          adv.open((AirClimate) c[1], r, Draws.of(Draws.SEED), WheelRisk.NIPPLE_SCATTER);
      long t0 = Prof.cpu();
      Case k = shop.of(cat.pairings((String) c[3], (String) c[4], "none", "stainless").get(0));
      PairingAdvice p = Answer.of(k, r);
      double wet = shop.year().months().stream().mapToDouble(WheelYear.Month::wetHours).sum();
      double salt =
          shop.year().months().stream().mapToDouble(m -> m.salt().totalMgClPerM2()).sum() / 12;
      int nf = shop.year().months().stream().mapToInt(m -> m.films().size()).sum();
      System.out.printf(
          "%n== %s  wet %.0f h/a salt %.0f mg films %d  %.0f ms%n",
          c[0], wet, salt, nf, (Prof.cpu() - t0) / 1e6);
      for (Site s :
          java.util.List.of(k.limiting() == null ? k.leader(State.ATTACKED) : k.limiting())) {
        double y = 0;
        for (double v : s.monthlyUm()) y += v;
        System.out.printf(
            "   %s/%s %s: %.2f um/a (wet-rate %.0f um/a) visible %.1f seized %.1f lost %.1f%n",
            s.part(),
            s.cause(),
            s.metal(),
            y,
            y / Math.max(1, wet) * 8766,
            s.visibleUm(),
            s.seizedUm(),
            s.lostUm());
      }
      System.out.printf(
          "   attack %s  seized %s  lost %s%n   first %.2f every %.2f (%s) repl %s by %s%n",
          t(p.firstAttackMonths()),
          t(p.seizedMonths()),
          t(p.headLossMonths()),
          p.firstLookMonths(),
          p.everyMonths(),
          k.interval().everyLimitedBy(),
          p.replaceByMonths(),
          p.limitedBy());
    }
    if (a.length > 0) {
      AdviceRequest r = req("all-winter-commuter", null, null, null, null);
      AirClimate air = TestClimates.maritimeSalted();
      for (int i = 0; i < 8; i++) {
        long t0 = Prof.cpu();
        Workshop shop = adv.open(air, r, Draws.of(Draws.SEED), WheelRisk.NIPPLE_SCATTER);
        long t1 = Prof.cpu();
        java.util.List<Case> cs = new ArrayList<>();
        for (Pairing p : cat.pairings()) cs.add(shop.of(p));
        long t2 = Prof.cpu();
        for (Case c : cs) Answer.of(c, r);
        long t3 = Prof.cpu();
        Advice ad = adv.advise(air, r);
        long t4 = Prof.cpu();
        System.out.printf(
            "weather %.1f cases %.1f answers %.1f  advise %.1f ms%n",
            (t1 - t0) / 1e6, (t2 - t1) / 1e6, (t3 - t2) / 1e6, (t4 - t3) / 1e6);
      }
      return;
    }
    WheelYear y =
        WheelWeather.over(
            TestClimates.maritimeSalted(),
            Profiles.shipped().get("all-winter-commuter"),
            WheelBuild.USUAL);
    for (int m : new int[] {0, 6})
      for (WheelYear.FilmHours f : y.months().get(m).films()) System.out.println(m + " " + f);
  }

  static String t(StateTimes s) {
    return s.part()
        + "["
        + s.p10()
        + " "
        + s.median()
        + " "
        + s.p90()
        + "]"
        + (s.notApplicable() ? "NA" : "");
  }
}
