package saltspoke.advice;

import java.util.*;
import saltspoke.wheel.*;
import saltspoke.wheel.damage.*;
import saltspoke.wheel.rim.WheelWeather;

public class Prof {
  static long cpu() {
    return java.lang.management.ManagementFactory.getThreadMXBean().getCurrentThreadCpuTime();
  }

  public static void main(String[] a) {
    Catalogue cat = Catalogue.shipped();
    RidingProfile pr = Profiles.shipped().get("all-winter-commuter");
    var air = TestClimates.maritimeSalted();
    CellRates base = CellRates.tabled(new CellTables(256));
    int[] calls = {0, 0};
    CellRates counted =
        s -> {
          calls[0]++;
          var f = base.of(s);
          return x -> {
            calls[1]++;
            return f.apply(x);
          };
        };
    for (int i = 0; i < 12; i++) {
      calls[0] = calls[1] = 0;
      WheelYear y = WheelWeather.over(air, pr, WheelBuild.USUAL);
      long t0 = cpu();
      Sites st = new Sites(air, pr, WheelBuild.USUAL, 10, y, counted);
      Set<Site> all = Collections.newSetFromMap(new IdentityHashMap<>());
      List<List<Site>> lists = new ArrayList<>();
      for (Pairing p : cat.pairings()) {
        List<Site> l =
            st.of(
                new Parts(
                    cat.rim(p.rim()),
                    cat.nipple(p.nipple()),
                    cat.between(p.between()),
                    cat.spoke(p.spoke())));
        lists.add(l);
        all.addAll(l);
      }
      long t1 = cpu();
      Draws d = Draws.of(Draws.SEED);
      long t2 = cpu();
      IdentityHashMap<Site, SiteRisk> m = new IdentityHashMap<>();
      for (Site s : all) m.put(s, new SiteRisk(s, d, .4));
      long t3 = cpu();
      WorstOf w = new WorstOf(28, d);
      Interval v = null;
      for (List<Site> l : lists) {
        List<SiteRisk> r = l.stream().map(m::get).toList();
        WheelRisk k = new WheelRisk(r, w, false);
        v =
            Interval.of(
                k,
                k.atMeanPace(),
                History.NEW,
                RiskLimits.of(RiskLevel.USUAL),
                LookKind.OUTSIDE,
                false);
      }
      long t4 = cpu();
      System.out.printf(
          "specs %d films %d sites %d: sites %.1f ms (cell), draws %.1f, siterisk %.1f, interval %.1f%n",
          calls[0],
          calls[1],
          all.size(),
          (t1 - t0) / 1e6,
          (t2 - t1) / 1e6,
          (t3 - t2) / 1e6,
          (t4 - t3) / 1e6);
    }
  }
}
