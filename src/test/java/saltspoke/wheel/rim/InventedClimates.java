package saltspoke.wheel.rim;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.AnnualAir;
import saltspoke.atmosphere.DayType;
import saltspoke.atmosphere.MonthAir;
import saltspoke.atmosphere.RoadSalt;
import saltspoke.atmosphere.SaturationPressure;
import saltspoke.atmosphere.Setting;
import saltspoke.places.Place;
import saltspoke.places.SeaView;
import saltspoke.places.Surroundings;
import saltspoke.values.Note;
import saltspoke.values.Quantiles;

/** Six made-up climates, from sines over the year. */
public final class InventedClimates {
  private InventedClimates() {}

  /** By name: maritime salted, continental cold, dry inland, tropical sea front, and two mild. */
  public static Map<String, AirClimate> all() {
    Map<String, AirClimate> all = new LinkedHashMap<>();
    all.put("maritime-winter", climate(10, 6, 82, 6, 6, 170, 8, 50, 3));
    all.put("continental-cold", climate(5, 14, 76, 10, 8, 120, 3, 60, 4));
    all.put("dry-inland", climate(17, 11, 42, 5, 15, 50, 2, 0, 0));
    all.put("tropical-sea-front", climate(27, 2, 80, 3, 7, 150, 300, 0, 0));
    all.put("mediterranean-coast", climate(17, 8, 70, 4, 8, 80, 40, 0, 0));
    all.put("temperate-inland", climate(11, 9, 74, 8, 9, 120, 3, 20, 1.5));
    return all;
  }

  /**
   * @param meanC annual mean temperature
   * @param amplitudeC half the difference of July and January
   * @param rhPct humidity at the monthly mean, the same all year up to {@code rhSwingPct} more in
   *     winter and less in summer
   * @param rangeC day–night range
   * @param wetDays days with rain a year
   * @param chloride deposition, mg/(m² d)
   * @param treatments road treatments a winter
   * @param saltOnRoad salt on the road in midwinter, g/m²
   */
  public static AirClimate climate(
      double meanC,
      double amplitudeC,
      double rhPct,
      double rhSwingPct,
      double rangeC,
      double wetDays,
      double chloride,
      double treatments,
      double saltOnRoad) {
    List<MonthAir> months = new ArrayList<>();
    List<RoadSalt.Month> salted = new ArrayList<>();
    double meanRh = 0;
    for (int m = 0; m < 12; m++) {
      double winter = Math.cos(2 * Math.PI * m / 12);
      double celsius = meanC - amplitudeC * winter;
      double rh = rhPct + rhSwingPct * winter;
      double hpa = rh / 100 * SaturationPressure.overWaterHpa(celsius);
      List<DayType> days = new ArrayList<>();
      double[] spell = {-1.4, -0.5, 0.5, 1.4};
      for (double s : spell) {
        days.add(
            new DayType(
                0.25,
                celsius + 2.5 * s,
                rangeC * (1 - 0.2 * s * (winter > 0 ? -1 : 1) * -0.5),
                Math.min(
                    hpa * (1 + 0.18 * s + 0.05 * s * s),
                    0.99 * SaturationPressure.overWaterHpa(celsius + 2.5 * s))));
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
      meanRh += rh / 12;
    }
    Quantiles none = new Quantiles(0, 0, 0);
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
        new AnnualAir(meanC, meanRh, 0, wetDays * 5, 0, 0),
        new Quantiles(chloride / 2, chloride, chloride * 2),
        none,
        Setting.RURAL,
        false,
        "τ4",
        "S1",
        "P0",
        List.of(),
        new RoadSalt(
            treatments > 0 ? "usual" : "none",
            "high",
            new Quantiles(treatments, treatments, treatments),
            0.1,
            salted),
        Note.of("air-invented"),
        List.of());
  }
}
