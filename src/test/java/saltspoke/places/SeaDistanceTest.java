package saltspoke.places;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import saltspoke.sources.CsvTable;

class SeaDistanceTest {
  /** The project's own aim: km inside 5 km of the shore, and elsewhere. */
  private static final double NEAR_KM = 0.4;

  private static final double FAR_KM = 2;

  static List<CsvTable.Row> named() {
    return table("/reference/shore-distances-2026/places.csv");
  }

  static List<CsvTable.Row> poles() {
    return table("/reference/garcia-castellanos-2007/poles.csv");
  }

  static List<CsvTable.Row> oceanicPole() {
    return table("/reference/lukatela-1992/poles.csv");
  }

  private static List<CsvTable.Row> table(String name) {
    return CsvTable.read(SeaDistanceTest.class.getResourceAsStream(name), name);
  }

  @ParameterizedTest
  @MethodSource({"named", "poles", "oceanicPole"})
  @Tag("published")
  void distanceToTheSeaIsTheNamedOne(CsvTable.Row row) {
    double expected = row.number("distance_km");
    double found =
        World.COAST.nearest(row.number("latitude_deg"), row.number("longitude_deg")).distanceKm();
    assertEquals(expected, found, expected < 5 ? NEAR_KM : FAR_KM, row.text("name"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "Rotterdam, NL",
        "Antwerp",
        "Bremerhaven",
        "Gdańsk",
        "Liverpool, GB",
        "Marseille",
        "Genoa",
        "Naples, IT",
        "Piraeus",
        "Odesa",
        "Durban",
        "Mombasa",
        "Mumbai",
        "Yokohama",
        "Busan",
        "Singapore",
        "Sydney, AU",
        "Auckland",
        "Valparaíso",
        "Santos",
        "Halifax, CA",
        "Bergen, NO",
        "Esbjerg",
        "Le Havre",
        "Brest, FR",
        "Cuxhaven",
        "Reykjavík",
        "Aberdeen, GB"
      })
  @Tag("law")
  void harbourTownsAreOnLand(String town) {
    Place place = World.PLACES.byName(town, PlaceOverrides.NONE);
    assertTrue(World.COAST.isLand(place.latitudeDeg(), place.longitudeDeg()), town);
    assertTrue(place.sea().distanceKm() < 25, town);
  }

  @Test
  @Tag("law")
  void lakesAreLandAndTheCaspianIsSea() {
    assertTrue(World.COAST.isLand(43.0, -87.0), "Lake Michigan");
    assertTrue(World.COAST.isLand(-1.0, 33.0), "Lake Victoria");
    assertTrue(World.COAST.isLand(53.5, 108.0), "Lake Baikal");
    assertTrue(World.COAST.isLand(52.7, 5.4), "IJsselmeer behind its dam");
    assertFalse(World.COAST.isLand(42.0, 50.5), "Caspian");
    assertFalse(World.COAST.isLand(46.0, 37.0), "Sea of Azov");
    assertTrue(World.COAST.nearest(41.8781, -87.6298).distanceKm() > 800, "Chicago");
    assertTrue(World.COAST.nearest(40.4093, 49.8671).distanceKm() < 7, "Baku");
  }

  @Test
  @Tag("law")
  void theDateLineIsNoCoast() {
    double west = World.COAST.nearest(-16.85, 179.9999).distanceKm();
    double east = World.COAST.nearest(-16.85, -179.9999).distanceKm();
    assertEquals(west, east, 0.05);
    assertEquals(World.COAST.isLand(-16.85, 180), World.COAST.isLand(-16.85, -180));
    assertTrue(World.COAST.nearest(66.5, 180).distanceKm() > 20, "Chukotka, across the line");
  }

  @Test
  @Tag("law")
  void polesAnswer() {
    assertFalse(World.COAST.isLand(90, 0));
    assertTrue(World.COAST.isLand(-90, 0));
    double greenland = World.COAST.nearest(90, 0).distanceKm();
    assertTrue(greenland > 690 && greenland < 720, "Kaffeklubben island, 83.68° N: " + greenland);
    assertTrue(World.COAST.nearest(-90, 77).distanceKm() > 1000);
  }

  @ParameterizedTest
  @CsvSource({"7.09,171.38,Majuro", "-15.93,-5.72,Saint Helena", "64.14,-21.9,Iceland"})
  @Tag("law")
  void islandsAreNearTheSea(double latitudeDeg, double longitudeDeg, String name) {
    assertTrue(World.COAST.nearest(latitudeDeg, longitudeDeg).distanceKm() < 10, name);
  }

  @Test
  @Tag("law")
  void distanceChangesByNoMoreThanTheWay() {
    double before = World.COAST.nearest(47.0, 2.0).distanceKm();
    for (int i = 1; i <= 300; i++) {
      double now = World.COAST.nearest(47.0, 2.0 - 0.02 * i).distanceKm();
      // 0.02° of longitude at 47° is 1.52 km; coarse and fine coast may differ by 1.2 km at the
      // seam.
      assertTrue(Math.abs(now - before) <= 1.52 + 1.2 + 0.01, "at " + (2.0 - 0.02 * i));
      before = now;
    }
  }
}
