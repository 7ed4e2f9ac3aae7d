package saltspoke.advice;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.atmosphere.AirClimate;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.RidingProfile;

/**
 * The cases of common practice that bound what the model may say, practice limits off, in invented
 * climates. The calibration constant is set on the first two; assumptions were chosen with all four
 * in view, so that this holds the model to them and does not prove it.
 */
@Tag("law")
class TradeCasesTest {
  private static final Advisor ADVISOR = new Advisor(Catalogue.shipped());

  private static PairingAdvice one(AirClimate air, RidingProfile rider, String rim, String nipple) {
    return ADVISOR.advise(air, Asked.of(rider, rim, nipple, "none", "stainless")).pairings().get(0);
  }

  private static void within(double least, double most, double months) {
    assertTrue(months >= least && months <= most, months + " not in " + least + ".." + most);
  }

  @Test
  void saltedCommuterAluminiumOnCarbon() {
    PairingAdvice advice =
        one(
            TestClimates.maritimeSalted(),
            Asked.rider("salted-commuter-aluminium"),
            "carbon-bare",
            "aluminium-bare");
    within(1, 3, advice.firstLookMonths());
    within(12, 30, advice.replaceByMonths());
  }

  @Test
  void saltedCommuterBrassOnCarbon() {
    PairingAdvice advice =
        one(
            TestClimates.maritimeSalted(),
            Asked.rider("salted-commuter-brass"),
            "carbon-bare",
            "brass-nickel");
    within(6, 12, advice.firstLookMonths());
  }

  @Test
  void dryIndoorsAluminiumOnAluminium() {
    PairingAdvice advice =
        one(
            TestClimates.dryInland(),
            Asked.rider("dry-fair-weather"),
            "aluminium-anodised",
            "aluminium-anodised-thin");
    within(12, 24, advice.firstLookMonths());
  }

  @Test
  void tropicalSeaFrontAluminiumOnCarbon() {
    PairingAdvice advice =
        one(
            TestClimates.tropicalSeaFront(),
            Asked.rider("tropical-sea-front"),
            "carbon-bare",
            "aluminium-bare");
    within(0, 1, advice.firstLookMonths());
  }

  @Test
  void firstLooksSpanAFactorOfTwenty() {
    List<Double> looks = new ArrayList<>();
    for (RidingProfile profile : Profiles.shipped().all()) {
      for (AirClimate air : TestClimates.all().values()) {
        Workshop shop =
            ADVISOR.open(air, Asked.of(profile), Draws.of(Draws.SEED), WheelRisk.NIPPLE_SCATTER);
        Catalogue.shipped()
            .pairings()
            .forEach(pairing -> looks.add(shop.of(pairing).interval().freeFirstMonths()));
      }
    }
    looks.sort(null);
    // Without the pairings that never wear, and without the last hundredth at either end.
    List<Double> worn =
        looks.stream().filter(months -> months < RiskLimits.HORIZON_MONTHS).toList();
    double span = worn.get(worn.size() * 99 / 100) / worn.get(worn.size() / 100);
    assertTrue(span >= 20, "span " + span);
  }
}
