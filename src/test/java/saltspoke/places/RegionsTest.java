package saltspoke.places;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import saltspoke.values.Refusal;

@Tag("law")
class RegionsTest {
  private static final Regions REGIONS = Regions.from(World.DATA);

  /** Towns that everybody knows lie there. */
  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "Bayern; DE; 48.14; 11.58; true",
        "bavaria; DE; 48.14; 11.58; true",
        "Baviera; DE; 52.52; 13.40; false",
        "Bretagne; FR; 48.11; -1.68; true",
        "Scotland; GB; 55.95; -3.19; true",
        "Scotland; GB; 54.98; -1.61; false",
        "Nord, FR; FR; 50.63; 3.06; true",
        "Texas; US; 29.76; -95.37; true",
        "Andalucía; ES; 37.39; -5.99; true",
        "lombardia; IT; 45.46; 9.19; true",
        "NL; NL; 52.37; 4.90; true",
        "Holland; NL; 52.37; 4.90; true"
      })
  void namesInAnyLanguageMeanThatPartOfTheWorld(
      String name, String country, double latitudeDeg, double longitudeDeg, boolean inside) {
    Area area = REGIONS.find(name);
    assertEquals(country, area.countryCode());
    assertEquals(inside, area.contains(latitudeDeg, longitudeDeg));
  }

  @Test
  void aNameOfSeveralCountriesIsRefusedWithTheChoices() {
    Refusal refusal = assertThrows(Refusal.class, () -> REGIONS.find("Nord"));
    assertEquals("ambiguous-region", refusal.error());
    assertTrue(refusal.allowed().contains("Nord, FR"), refusal.allowed());
  }

  @Test
  void anUnknownNameIsRefusedWithSuchAsStartAlike() {
    Refusal refusal = assertThrows(Refusal.class, () -> REGIONS.find("Bretania"));
    assertEquals(Refusal.Kind.NOT_FOUND, refusal.kind());
    assertTrue(refusal.allowed().contains("Brest"), refusal.allowed());
  }

  /** Towns beside a simplified outline belong to the nearest; only far islands are left out. */
  @Test
  void nearlyEveryoneBelongsToARegion() {
    AreaIndex index = new AreaIndex(REGIONS.all());
    long people = 0;
    long within = 0;
    for (PlaceHit town : World.PLACES.within((lat, lon) -> true)) {
      people += town.population();
      within += index.at(town.lat(), town.lon()) >= 0 ? town.population() : 0;
    }
    assertTrue(within > 0.999 * people, within + " of " + people);
  }

  @Test
  void aTownBesideTheOutlineBelongsToTheNearestAreaOnly() {
    double[] west = {0, 0, 1, 0, 1, 1, 0, 1, 0, 0};
    double[] east = {1, 0, 2, 0, 2, 1, 1, 1, 1, 0};
    AreaIndex index =
        new AreaIndex(
            List.of(
                new Area("west", "", "", List.of(List.of(west))),
                new Area("east", "", "", List.of(List.of(east)))));
    assertEquals(0, index.at(0.5, 0.5));
    assertEquals(0, index.at(-0.05, 0.9));
    assertEquals(1, index.at(1.05, 1.1));
    assertEquals(-1, index.at(1.2, 1.1));
    assertEquals(-1, index.at(0.5, 5));
  }

  @Test
  void holesAreLeftOut() {
    double[] outer = {0, 0, 10, 0, 10, 10, 0, 10, 0, 0};
    double[] hole = {4, 4, 4, 6, 6, 6, 6, 4, 4, 4};
    Area ring = new Area("ring", "", "", List.of(List.of(outer, hole)));
    assertTrue(ring.contains(2, 2));
    assertFalse(ring.contains(5, 5));
    assertFalse(ring.contains(11, 5));
  }
}
