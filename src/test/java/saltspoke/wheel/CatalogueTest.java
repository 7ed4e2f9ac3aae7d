package saltspoke.wheel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.values.Refusal;

@Tag("law")
class CatalogueTest {
  private final Catalogue catalogue = Catalogue.shipped();

  @Test
  void holdsThePartsOfTheBriefAndEveryPairingIsValidOnce() {
    assertEquals(
        List.of("carbon-bare", "carbon-ply", "aluminium-bare", "aluminium-anodised"),
        catalogue.rims().stream().map(Rim::id).toList());
    assertEquals(9, catalogue.nipples().size());
    assertEquals(7, catalogue.interfaces().size());
    assertEquals(3, catalogue.spokes().size());
    List<Pairing> pairings = catalogue.pairings();
    assertEquals(pairings.size(), new HashSet<>(pairings).size());
    int refused = 0;
    for (Rim rim : catalogue.rims()) {
      for (Nipple nipple : catalogue.nipples()) {
        for (SeatInterface between : catalogue.interfaces()) {
          for (Spoke spoke : catalogue.spokes()) {
            Pairing pairing = new Pairing(rim.id(), nipple.id(), between.id(), spoke.id());
            boolean valid = catalogue.refusal(pairing).isEmpty();
            assertEquals(valid, pairings.contains(pairing));
            refused += valid ? 0 : 1;
          }
        }
      }
    }
    assertEquals(4 * 9 * 7 * 3, pairings.size() + refused);
  }

  @Test
  void refusesWhatCannotBeBuiltWithTheReason() {
    assertEquals(
        "wheel-refused-eyelet-carbon",
        catalogue
            .refusal(new Pairing("carbon-bare", "brass-bare", "eyelet", "stainless"))
            .orElseThrow()
            .code());
    assertTrue(
        catalogue
            .refusal(new Pairing("carbon-bare", "aluminium-bare", "washer-brass", "stainless"))
            .isEmpty());
    Refusal unfit =
        assertThrows(Refusal.class, () -> catalogue.pairings("carbon-ply", null, "eyelet", null));
    assertTrue(unfit.allowed().contains("pressed into"), unfit.allowed());
  }

  @Test
  void unknownIdNamesTheIdsThereAre() {
    Refusal refusal = assertThrows(Refusal.class, () -> catalogue.nipple("tin"));
    assertEquals("nipple", refusal.field());
    assertEquals(Refusal.Kind.WRONG_USE, refusal.kind());
    assertTrue(refusal.allowed().contains("brass-nickel"));
  }

  @Test
  void optionsNarrowThePairings() {
    List<Pairing> one = catalogue.pairings("carbon-bare", "brass-bare", "none", "stainless");
    assertEquals(1, one.size());
    assertEquals(catalogue.pairings(), catalogue.pairings(null, null, null, null));
  }

  @Test
  void nippleCoreStressIsTheTradeFigure() {
    Nipple nipple = catalogue.nipple("aluminium-bare");
    assertEquals(7.8, nipple.coreMm2(), 0.05);
    assertEquals(154, nipple.coreStressMpa(1200), 0.5);
  }
}
