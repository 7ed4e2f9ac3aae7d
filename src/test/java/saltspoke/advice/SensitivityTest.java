package saltspoke.advice;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.values.Refusal;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.damage.Assumption;
import saltspoke.wheel.rim.RimAssumption;

@Tag("law")
class SensitivityTest {
  private static final Sensitivity SENSITIVITY = new Sensitivity(Catalogue.shipped());

  @Test
  void everyAssumptionHasItsBarWidestFirst() {
    AdviceRequest request =
        Asked.of(
            Asked.ready("all-winter-commuter"),
            "carbon-bare",
            "aluminium-bare",
            "none",
            "stainless");
    Tornado tornado = SENSITIVITY.of(TestClimates.maritimeSalted(), request);
    assertEquals(
        Assumption.values().length + RimAssumption.values().length + 1, tornado.bars().size());
    double before = Double.POSITIVE_INFINITY;
    for (Tornado.Bar bar : tornado.bars()) {
      assertTrue(bar.factor() >= 1 && bar.factor() <= before, bar.toString());
      before = bar.factor();
    }
    assertTrue(tornado.bars().get(0).factor() > 1.05, "something must matter");
  }

  @Test
  void onlyOnePairingAtATime() {
    assertThrows(
        Refusal.class,
        () ->
            SENSITIVITY.of(
                TestClimates.dryInland(), Asked.of(Asked.ready("trainer-only"), "carbon-bare")));
  }
}
