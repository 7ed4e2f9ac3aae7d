package saltspoke.faces.export;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import saltspoke.advice.Advice;
import saltspoke.advice.AdviceRequest;
import saltspoke.advice.Finding;
import saltspoke.advice.PairingAdvice;
import saltspoke.advice.RiskLevel;
import saltspoke.advice.StateTimes;
import saltspoke.advice.YearPlan;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.AnnualAir;
import saltspoke.atmosphere.Category;
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
import saltspoke.wheel.Pairing;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Rinsing;
import saltspoke.wheel.SaltedRoads;
import saltspoke.wheel.Sealant;
import saltspoke.wheel.Storage;
import saltspoke.wheel.ThreadCompound;
import saltspoke.wheel.WheelBuild;

/** A made-up answer with every kind of time in it: open, closed, beyond the horizon, impossible. */
final class SampleAdvice {
  static final StateTimes CLOSED = new StateTimes("nipple", 6.0, 14.0, 29.0, false, false);
  static final StateTimes OPEN = new StateTimes("rim", 40.0, 150.0, null, true, false);
  static final StateTimes BEYOND = new StateTimes("nipple", null, null, null, true, false);
  static final StateTimes NEVER = new StateTimes("nipple", null, null, null, false, true);

  private SampleAdvice() {}

  static Advice at(String placeName) {
    double[] none = new double[SeaView.DIRECTIONS];
    Place place =
        new Place(
            placeName,
            "Łódzkie",
            "PL",
            51.77,
            19.46,
            201,
            new SeaView(287.4, none, none, none),
            new Surroundings(0, 0, 0),
            List.of());
    Quantiles some = new Quantiles(1, 2, 4);
    List<MonthAir> months = new ArrayList<>();
    List<YearPlan.Month> year = new ArrayList<>();
    for (int month = 1; month <= 12; month++) {
      months.add(
          new MonthAir(month, 8, 78, 9, 8, 200, 700, 400, 50, 50, 10, 4, 5, 4, 3, List.of()));
      year.add(new YearPlan.Month(month, 100 + 20 * month, 300, 1 / 12.0));
    }
    List<MetalCorrosivity> metals = new ArrayList<>();
    for (Metal metal : Metal.values()) {
      metals.add(
          new MetalCorrosivity(
              metal, some, Category.C3, Map.of(Category.C3, 0.55, Category.C2, 0.45), List.of()));
    }
    AirClimate air =
        new AirClimate(
            place,
            months,
            new AnnualAir(8, 78, 2400, 600, 90, 60),
            some,
            some,
            Setting.CITY,
            false,
            "τ3",
            "S1",
            "P0",
            metals,
            new RoadSalt("usual", "medium", some, 0.1, List.of()),
            Note.of("sample-summary"),
            List.of());
    RidingProfile profile =
        new RidingProfile(
            "all-winter-commuter",
            "All-winter commuter",
            new TreeSet<>(List.of(1, 2, 3)),
            6,
            -1,
            SaltedRoads.BY_CLIMATE,
            0,
            0,
            Storage.UNHEATED_SHED,
            Rinsing.NEVER,
            false,
            false,
            ThreadCompound.OIL,
            Sealant.NONE);
    AdviceRequest request =
        new AdviceRequest(
            profile,
            WheelBuild.USUAL,
            null,
            null,
            null,
            null,
            RiskLevel.USUAL,
            12,
            0,
            Finding.NOT_LOOKED,
            true);
    return new Advice(
        air,
        request,
        List.of(
            pairing("aluminium-anodised-thin", CLOSED, CLOSED, OPEN, 2.7, 2.2, 17.0),
            pairing("stainless", NEVER, BEYOND, BEYOND, 24, 24, null)),
        new YearPlan(year, List.of(2, 4, 7), List.of(4, 5)),
        List.of(),
        List.of(Note.of("sample-look"), Note.of("sample-look-again")),
        List.of(Note.of("sample-stop")),
        List.of(Note.of("sample-caution")),
        List.of());
  }

  private static PairingAdvice pairing(
      String nipple,
      StateTimes attack,
      StateTimes seized,
      StateTimes headLoss,
      double first,
      double every,
      Double replace) {
    return new PairingAdvice(
        new Pairing("carbon-bare", nipple, "none", "stainless"),
        attack,
        seized,
        headLoss,
        first,
        every,
        replace,
        "tape-off",
        40,
        "seized-risk",
        110,
        List.of(Note.of("sample-reason")));
  }
}
