package saltspoke.wheel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import saltspoke.values.Refusal;

@Tag("law")
class RidingProfileTest {
  private static RidingProfile with(int month, double hours, double wet, double sea, double sweat) {
    return new RidingProfile(
        "mine",
        "Mine",
        new TreeSet<>(Set.of(month)),
        hours,
        wet,
        SaltedRoads.NO,
        sea,
        sweat,
        Storage.OPEN,
        Rinsing.NEVER,
        false,
        false,
        ThreadCompound.NONE,
        Sealant.NONE);
  }

  @Test
  void sixReadyProfilesCoverEveryStorageAndAreFoundByName() {
    Profiles profiles = Profiles.shipped();
    assertEquals(6, profiles.all().size());
    Set<Storage> places = new TreeSet<>();
    profiles.all().forEach(p -> places.add(p.storage()));
    assertEquals(Storage.values().length, places.size());
    assertTrue(profiles.get("trainer-only").months().isEmpty());
    Refusal refusal = assertThrows(Refusal.class, () -> profiles.get("nobody"));
    assertTrue(refusal.allowed().contains("all-winter-commuter"));
  }

  @ParameterizedTest
  @CsvSource({
    "13, 1, 0, 0, 0, months",
    "1, 61, 0, 0, 0, hoursPerWeek",
    "1, NaN, 0, 0, 0, hoursPerWeek",
    "1, 1, 1.1, 0, 0, wetRideShare",
    "1, 1, NaN, 0, 0, wetRideShare",
    "1, 1, 0, -0.1, 0, seaRideShare",
    "1, 1, 0, 0, 31, trainerHoursPerWeek"
  })
  void namesTheFieldOutOfRange(
      int month, double hours, double wet, double sea, double sweat, String field) {
    Refusal refusal = assertThrows(Refusal.class, () -> with(month, hours, wet, sea, sweat));
    assertEquals(field, refusal.field());
    assertEquals(Refusal.Kind.OUT_OF_RANGE, refusal.kind());
  }

  @Test
  void anyNegativeWetShareStandsForTheClimate() {
    assertEquals(with(1, 1, -1, 0, 0), with(1, 1, -0.3, 0, 0));
  }

  @Test
  void buildAndChoicesRefuseWithTheirField() {
    assertEquals(
        "spokeCount",
        assertThrows(Refusal.class, () -> new WheelBuild(11, 1100, true, false)).field());
    assertEquals(
        "tensionN",
        assertThrows(Refusal.class, () -> new WheelBuild(28, Double.NaN, true, false)).field());
    Refusal refusal = assertThrows(Refusal.class, () -> Storage.of("cellar"));
    assertEquals("storage", refusal.field());
    assertTrue(refusal.allowed().contains("unheated-shed"));
    assertEquals(Storage.OPEN, Storage.of("open"));
  }
}
