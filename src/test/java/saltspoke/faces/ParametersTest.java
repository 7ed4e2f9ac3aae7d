package saltspoke.faces;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import saltspoke.atmosphere.Setting;
import saltspoke.values.Refusal;

@Tag("law")
class ParametersTest {
  private static Parameters of(String name, String value) {
    return new Parameters(Map.of(name, value), Set.of(name));
  }

  private static Refusal refused(Runnable question) {
    return assertThrows(Refusal.class, question::run);
  }

  @Test
  void anUnknownNameIsRefusedWithTheKnownOnes() {
    Refusal refusal = refused(() -> new Parameters(Map.of("colour", "red"), Set.of("at", "place")));
    assertEquals(Refusal.Kind.WRONG_USE, refusal.kind());
    assertEquals("colour", refusal.was());
    assertEquals("at, place", refusal.allowed());
  }

  @ParameterizedTest
  @ValueSource(strings = {"NaN", "Infinity", "-Infinity", "2026-12-01", "12f", "0x10", "1e", "ten"})
  void whatIsNoNumberIsWrongUse(String text) {
    Refusal refusal = refused(() -> of("elevation", text).number("elevation", -450, 6000, "m"));
    assertEquals(Refusal.Kind.WRONG_USE, refusal.kind());
    assertEquals("not-a-number", refusal.error());
    assertEquals("a number, -450..6000 m", refusal.allowed());
  }

  @Test
  void limitsAreInsideAndBeyondIsOutOfRange() {
    assertEquals(6000, of("e", "6000").number("e", -450, 6000, "m").getAsDouble());
    assertEquals(-450, of("e", "-450").number("e", -450, 6000, "m").getAsDouble());
    Refusal refusal = refused(() -> of("e", "6000.1").number("e", -450, 6000, "m"));
    assertEquals(Refusal.Kind.OUT_OF_RANGE, refusal.kind());
  }

  @ParameterizedTest
  @CsvSource({
    "'95,10',latitudeDeg,OUT_OF_RANGE",
    "'-90.01,10',latitudeDeg,OUT_OF_RANGE",
    "'10,180.5',longitudeDeg,OUT_OF_RANGE",
    "'NaN,10',latitudeDeg,WRONG_USE",
    "'10',at,WRONG_USE",
    "'1,2,3',at,WRONG_USE",
    "'2026-12-01,10',latitudeDeg,WRONG_USE"
  })
  void coordinatesNameTheFaultyPart(String text, String field, Refusal.Kind kind) {
    Refusal refusal = refused(() -> Parameters.latitudeLongitude("at", text));
    assertEquals(field, refusal.field());
    assertEquals(kind, refusal.kind());
  }

  @Test
  void aLongTextIsCutBeforeItIsRepeated() {
    Refusal refusal =
        refused(
            () ->
                of("setting", "x".repeat(10_000)).choice("setting", Setting.values(), Setting::id));
    assertEquals(81, refusal.was().length());
    assertEquals("remote, rural, town, city, industrial, port", refusal.allowed());
  }

  @Test
  void anEmptyTextIsNotTheSameAsNone() {
    assertEquals("empty", refused(() -> of("postcode", " ").text("postcode")).error());
    assertEquals(true, new Parameters(Map.of(), Set.of("postcode")).text("postcode").isEmpty());
  }

  @Test
  void exactlyOneWayToNameAPlace() {
    assertEquals(
        "no-place",
        refused(() -> PlaceQuestion.from(new Parameters(Map.of(), Questions.AIR))).error());
    assertEquals(
        "several-places",
        refused(
                () ->
                    PlaceQuestion.from(
                        new Parameters(Map.of("at", "1,2", "place", "x"), Questions.AIR)))
            .error());
    assertEquals(
        "no-country",
        refused(() -> PlaceQuestion.from(new Parameters(Map.of("postcode", "1"), Questions.AIR)))
            .error());
  }
}
