package saltspoke.advice;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import saltspoke.atmosphere.AirClimate;
import saltspoke.values.Note;
import saltspoke.values.Refusal;
import saltspoke.values.Stopped;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.CellTables;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.ThreadCompound;
import saltspoke.wheel.WheelYear;
import saltspoke.wheel.damage.CellRates;
import saltspoke.wheel.rim.WheelWeather;

/**
 * Answers questions about wheels: the one advisor behind every face. Safe to share between threads.
 */
public final class Advisor {
  private static final Draws DRAWS = Draws.of(Draws.SEED);

  private final Catalogue catalogue;
  private final WheelYears weather;
  private final CellRates rates;

  /** An advisor on a catalogue, with the shipped models of wheel weather and cell. */
  public Advisor(Catalogue catalogue) {
    this(
        catalogue, WheelWeather::over, CellRates.tabled(new CellTables(CellTables.USUAL_CAPACITY)));
  }

  Advisor(Catalogue catalogue, WheelYears weather, CellRates rates) {
    this.catalogue = catalogue;
    this.weather = weather;
    this.rates = rates;
  }

  /**
   * The advice for the pairings that the request asks for, longest safe interval first.
   *
   * @throws Refusal for parts that are unknown or do not fit, and numbers out of range
   */
  public Advice advise(AirClimate air, AdviceRequest request) {
    WheelYears shared = sharing(weather);
    Workshop shop = open(air, checked(request), shared);
    List<Case> cases = cases(shop, request);
    Case focus = focus(cases);
    List<Change> changes =
        new Changes(catalogue, request, other -> open(air, other, shared))
            .of(focus, shop, air.place().latitudeDeg() < 0);
    List<PairingAdvice> answers = cases.stream().map(c -> Answer.of(c, request)).toList();
    List<Note> flags = new ArrayList<>(Reasons.whatDecides(focus, changes, shop.year(), request));
    flags.addAll(shop.year().flags());
    flags.addAll(Looks.assumptions());
    return new Advice(
        air,
        request,
        answers,
        Years.of(focus, shop.year(), request),
        changes,
        Looks.steps(focus.look()),
        Looks.stopSigns(),
        Looks.cautions(),
        flags);
  }

  /**
   * The pairings of {@link #advise} alone, without year and changes: a fraction of the work, for
   * whoever asks for many places.
   */
  public List<PairingAdvice> pairings(AirClimate air, AdviceRequest request) {
    Workshop shop = open(air, checked(request), weather);
    return cases(shop, request).stream().map(c -> Answer.of(c, request)).toList();
  }

  private List<Case> cases(Workshop shop, AdviceRequest request) {
    List<Case> cases = new ArrayList<>();
    for (Pairing pairing :
        catalogue.pairings(request.rim(), request.nipple(), request.between(), request.spoke())) {
      Stopped.check();
      cases.add(shop.of(pairing));
    }
    cases.sort(
        Comparator.comparingDouble((Case c) -> -c.interval().freeFirstMonths())
            .thenComparingDouble(c -> -c.interval().replaceByMonths()));
    return cases;
  }

  private Workshop open(AirClimate air, AdviceRequest request, WheelYears years) {
    return new Workshop(catalogue, air, request, years, rates, DRAWS, WheelRisk.NIPPLE_SCATTER);
  }

  /** A year worked out once for profiles that differ in the thread's compound only. */
  private static WheelYears sharing(WheelYears weather) {
    Map<List<Object>, WheelYear> known = new HashMap<>();
    return (air, profile, build) ->
        known.computeIfAbsent(
            List.of(Profiled.compound(profile, ThreadCompound.NONE), build),
            k -> weather.over(air, profile, build));
  }

  Workshop open(AirClimate air, AdviceRequest request, Draws draws, double scatter) {
    return new Workshop(catalogue, air, request, weather, rates, draws, scatter);
  }

  /**
   * The pairing that year, changes and look are about: the only one, else the one nearest to the
   * wheel that most shops build (common practice).
   */
  private static Case focus(List<Case> cases) {
    return cases.stream()
        .min(
            Comparator.comparingInt(
                (Case c) ->
                    (c.pairing().nipple().equals("brass-nickel") ? 0 : 4)
                        + (c.pairing().between().equals("none") ? 0 : 2)
                        + (c.pairing().spoke().equals("stainless") ? 0 : 1)))
        .orElseThrow();
  }

  private static AdviceRequest checked(AdviceRequest request) {
    if (request.buildMonth() < 1 || request.buildMonth() > 12) {
      throw Refusal.outOfRange("buildMonth", request.buildMonth(), "1..12");
    }
    if (!(request.ageMonths() >= 0 && request.ageMonths() <= RiskLimits.HORIZON_MONTHS)) {
      throw Refusal.outOfRange("ageMonths", request.ageMonths(), "0..240");
    }
    if (request.ageMonths() == 0 && request.lastFinding() != Finding.NOT_LOOKED) {
      throw Refusal.wrongUse(
          "finding-without-age",
          "lastFinding",
          request.lastFinding().id(),
          "not-looked for a new wheel; give ageMonths for one in service");
    }
    return request;
  }
}
