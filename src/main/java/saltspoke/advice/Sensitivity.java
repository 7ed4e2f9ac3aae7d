package saltspoke.advice;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import saltspoke.atmosphere.AirClimate;
import saltspoke.values.Refusal;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.CellTables;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.damage.Assumption;
import saltspoke.wheel.damage.CellRates;
import saltspoke.wheel.rim.RimAssumption;
import saltspoke.wheel.rim.RimAssumptions;
import saltspoke.wheel.rim.WheelWeather;

/**
 * The tornado table of a pairing: every assumption moved by its stated spread, one after the other,
 * everything else as drawn, and how far the first look moves. Takes about as many answers as there
 * are assumptions, twice.
 */
public final class Sensitivity {
  /** Least and most of the spread of {@link WheelRisk#NIPPLE_SCATTER}. */
  private static final double[] SCATTER = {0.3, 0.55};

  private final Catalogue catalogue;
  private final CellRates rates;

  public Sensitivity(Catalogue catalogue) {
    this.catalogue = catalogue;
    this.rates = CellRates.tabled(new CellTables(CellTables.USUAL_CAPACITY));
  }

  /**
   * @param request must name one pairing by all four parts
   * @throws Refusal when it does not
   */
  public Tornado of(AirClimate air, AdviceRequest request) {
    List<Pairing> pairings =
        catalogue.pairings(request.rim(), request.nipple(), request.between(), request.spoke());
    if (pairings.size() != 1) {
      throw Refusal.wrongUse(
          "one-pairing-needed",
          "rim",
          pairings.size() + " pairings",
          "a rim, a nipple, an interface and a spoke that name one pairing");
    }
    Pairing pairing = pairings.get(0);
    Draws draws = Draws.of(Draws.SEED);
    double scatter = WheelRisk.NIPPLE_SCATTER;
    double base = first(air, request, pairing, WheelWeather::over, draws, scatter);
    List<Tornado.Bar> bars = new ArrayList<>();
    for (Assumption assumption : Assumption.values()) {
      double low =
          first(air, request, pairing, WheelWeather::over, draws.holding(assumption, -1), scatter);
      double high =
          first(air, request, pairing, WheelWeather::over, draws.holding(assumption, 1), scatter);
      bars.add(bar(assumption.id(), "damage", assumption.spread(), base, low, high));
    }
    for (RimAssumption assumption : RimAssumption.values()) {
      double low = first(air, request, pairing, shifted(assumption, -1), draws, scatter);
      double high = first(air, request, pairing, shifted(assumption, 1), draws, scatter);
      String spread =
          assumption.p10() + " to " + assumption.p90() + " " + assumption.unit() + " (10..90 %)";
      bars.add(bar("rim-weather-" + assumption.id(), "rim-weather", spread, base, low, high));
    }
    bars.add(
        bar(
            "nipple-scatter",
            "risk",
            "ln " + SCATTER[0] + " to " + SCATTER[1],
            base,
            first(air, request, pairing, WheelWeather::over, draws, SCATTER[0]),
            first(air, request, pairing, WheelWeather::over, draws, SCATTER[1])));
    bars.sort(Comparator.comparingDouble(Tornado.Bar::factor).reversed());
    return new Tornado(Answer.rounded(base), bars);
  }

  private static WheelYears shifted(RimAssumption assumption, double deviations) {
    RimAssumptions moved = RimAssumptions.MEDIAN.shifted(assumption, deviations);
    return (air, profile, build) -> WheelWeather.over(air, profile, build, moved);
  }

  private double first(
      AirClimate air,
      AdviceRequest request,
      Pairing pairing,
      WheelYears weather,
      Draws draws,
      double scatter) {
    Workshop shop = new Workshop(catalogue, air, request, weather, rates, draws, scatter);
    return Math.max(shop.of(pairing).interval().freeFirstMonths(), SiteTable.FIRST_MONTHS);
  }

  private static Tornado.Bar bar(
      String name, String room, String spread, double base, double low, double high) {
    double factor = Math.max(Math.max(low / base, base / low), Math.max(high / base, base / high));
    return new Tornado.Bar(
        name, room, spread, Answer.rounded(low), Answer.rounded(high), Answer.rounded(factor));
  }
}
