package saltspoke.advice;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.AnnualAir;
import saltspoke.atmosphere.Category;
import saltspoke.atmosphere.DayType;
import saltspoke.atmosphere.LongTermLoss;
import saltspoke.atmosphere.Metal;
import saltspoke.atmosphere.MetalCorrosivity;
import saltspoke.atmosphere.MonthAir;
import saltspoke.atmosphere.RoadSalt;
import saltspoke.atmosphere.Setting;
import saltspoke.places.Place;
import saltspoke.places.SeaView;
import saltspoke.places.Surroundings;
import saltspoke.values.Note;
import saltspoke.values.Quantiles;

/** Climates invented for tests, from sines over the year; no real place is meant. */
public final class TestClimates {
  private TestClimates() {}

  /** Six invented climates by name. */
  public static Map<String, AirClimate> all() {
    Map<String, AirClimate> all = new LinkedHashMap<>();
    all.put("maritime-salted", maritimeSalted());
    all.put("dry-inland", dryInland());
    all.put("tropical-sea-front", tropicalSeaFront());
    all.put(
        "cold-continental",
        climate(4, 14, 74, 8, 9, 120, 1, 55, 4, new double[] {10, 0.6, 0.4, 0.1}));
    all.put(
        "humid-subtropical",
        climate(20, 8, 74, 0, 9, 120, 10, 0, 0, new double[] {35, 1.8, 1.6, 0.4}));
    all.put("hot-desert", climate(25, 9, 30, 8, 15, 20, 2, 0, 0, new double[] {3, 0.2, 0.1, 0.05}));
    return all;
  }

  static AirClimate maritimeSalted() {
    return climate(10, 6, 81, 6, 7, 165, 10, 50, 3, new double[] {32, 1.5, 1.3, 0.25});
  }

  static AirClimate dryInland() {
    return climate(15, 11, 45, 6, 14, 55, 1, 0, 0, new double[] {5, 0.3, 0.2, 0.05});
  }

  static AirClimate tropicalSeaFront() {
    return climate(27, 2, 80, 0, 7, 150, 350, 0, 0, new double[] {130, 5.5, 4, 2.5});
  }

  static AirClimate climate(
      double meanC,
      double amplitudeC,
      double rhPct,
      double rhSwingPct,
      double rangeC,
      double wetDays,
      double chloride,
      double treatments,
      double saltOnRoad,
      double[] firstYearUm) {
    List<MonthAir> months = new ArrayList<>();
    List<RoadSalt.Month> salted = new ArrayList<>();
    for (int m = 0; m < 12; m++) {
      double winter = Math.cos(2 * Math.PI * m / 12);
      double celsius = meanC - amplitudeC * winter;
      double rh = rhPct + rhSwingPct * winter;
      double hpa = rh / 100 * saturationHpa(celsius);
      List<DayType> days = new ArrayList<>();
      for (double spell : new double[] {-1.4, -0.5, 0.5, 1.4}) {
        double dayC = celsius + 2.5 * spell;
        double moist = hpa * (1 + 0.18 * spell + 0.05 * spell * spell);
        days.add(new DayType(0.25, dayC, rangeC, Math.min(moist, 0.99 * saturationHpa(dayC))));
      }
      double nearFreezing =
          30 / (1 + Math.exp((celsius - 3) / 1.5)) / (1 + Math.exp(-(celsius + 8) / 2));
      months.add(
          new MonthAir(
              m + 1,
              celsius,
              rh,
              hpa,
              rangeC,
              0,
              0,
              0,
              0,
              wetDays * 5 / 12,
              wetDays / 12,
              4,
              nearFreezing,
              nearFreezing,
              chloride,
              days));
      double share = Math.max(0, winter) / 3.732;
      salted.add(new RoadSalt.Month(m + 1, treatments * share, saltOnRoad * Math.max(0, winter)));
    }
    double[] far = new double[SeaView.DIRECTIONS];
    return new AirClimate(
        new Place(
            "invented",
            "",
            "",
            50,
            0,
            10,
            new SeaView(10, far, far, far),
            new Surroundings(0, 0, 0),
            List.of()),
        months,
        new AnnualAir(meanC, rhPct, 0, wetDays * 5, 0, 0),
        new Quantiles(chloride / 2, chloride, chloride * 2),
        new Quantiles(0.5, 1, 2),
        Setting.RURAL,
        false,
        "τ4",
        "S1",
        "P0",
        losses(firstYearUm),
        new RoadSalt(
            treatments > 0 ? "usual" : "none",
            "high",
            new Quantiles(treatments, treatments, treatments),
            0.1,
            salted),
        Note.of("air-invented"),
        List.of());
  }

  private static List<MetalCorrosivity> losses(double[] firstYearUm) {
    List<MetalCorrosivity> losses = new ArrayList<>();
    for (Metal metal : Metal.values()) {
      double um = firstYearUm[metal.ordinal()];
      // ×/÷ 1.7 at 10 and 90 %, and slowing by the power 0.7, for all: invented.
      losses.add(
          new MetalCorrosivity(
              metal,
              new Quantiles(um / 1.7, um, um * 1.7),
              Category.C3,
              Map.of(Category.C3, 1.0),
              List.of(
                  new LongTermLoss(1, new Quantiles(um / 1.7, um, um * 1.7)),
                  new LongTermLoss(10, new Quantiles(um * 2.9, um * 5, um * 8.5)))));
    }
    return losses;
  }

  /** Magnus form over water, hPa. */
  private static double saturationHpa(double celsius) {
    return 6.112 * Math.exp(17.62 * celsius / (243.12 + celsius));
  }
}
