package saltspoke.wheel.rim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

@Tag("law")
class RimAssumptionTest {
  @Test
  void quantilesComeOutOfTheirDeviatesAndSharesStayShares() {
    for (RimAssumption assumption : RimAssumption.values()) {
      assertEquals(assumption.p10(), assumption.at(-1.2815515655446004), 1e-9, assumption.id());
      assertEquals(assumption.median(), assumption.at(0), 1e-9, assumption.id());
      assertEquals(assumption.p90(), assumption.at(1.2815515655446004), 1e-9, assumption.id());
      assertTrue(assumption.at(4) > assumption.p90());
      if (assumption.unit().equals("1") && assumption.p90() < 1) {
        assertTrue(assumption.at(6) < 1, assumption.id());
      }
    }
  }

  @Test
  void aChangedSetLeavesTheOldOneAlone() {
    RimAssumptions changed = RimAssumptions.MEDIAN.with(RimAssumption.ROOM_C, 17);
    assertEquals(17, changed.get(RimAssumption.ROOM_C));
    assertEquals(20, RimAssumptions.MEDIAN.get(RimAssumption.ROOM_C));
    assertThrows(
        IllegalArgumentException.class,
        () -> RimAssumptions.MEDIAN.with(RimAssumption.ROOM_C, Double.NaN));
  }
}
