package saltspoke.places;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import saltspoke.values.Refusal;

@Tag("law")
class PlaceDirectoryTest {
  private static final PlaceDirectory PLACES = World.PLACES;

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "Zurich|Zürich|CH",
        "ZÜRICH|Zürich|CH",
        "Sao Paulo|São Paulo|BR",
        "cologne|Köln|DE",
        "Springfield, US|Springfield|US",
        "springfield, illinois|Springfield|US",
        "london, canada|London|CA",
        "Perth, GB|Perth|GB",
        "perth, united kingdom|Perth|GB",
        "st johns, ca|St. John's|CA",
        "Nukualofa|Nuku‘alofa|TO"
      })
  void namesAreFoundWithoutAccentsAndNarrowed(String query, String name, String country) {
    Place place = PLACES.byName(query, PlaceOverrides.NONE);
    assertEquals(name, place.name());
    assertEquals(country, place.countryCode());
  }

  @Test
  void theMostPopulousComesFirstAndShowsRegionAndCountry() {
    List<PlaceHit> hits = PLACES.search("spring", 20);
    for (int i = 1; i < hits.size(); i++) {
      assertTrue(hits.get(i - 1).population() >= hits.get(i).population());
    }
    PlaceHit springfield = PLACES.search("springfield, il", 1).get(0);
    assertEquals("Illinois", springfield.regionName());
    assertEquals("United States", springfield.countryName());
  }

  @Test
  void anExactNameIsNeverCrowdedOut() {
    assertTrue(PLACES.search("Bath", 3).stream().anyMatch(h -> h.name().equals("Bath")));
    assertEquals("Bath", PLACES.byName("Bath", PlaceOverrides.NONE).name());
  }

  @ParameterizedTest
  @CsvSource({
    "10001,US,40.75,-74.00",
    "99501,US,61.22,-149.88",
    "400001,IN,18.94,72.83",
    "110001,IN,28.63,77.22",
    "75001,FR,48.86,2.34",
    "13001,FR,43.30,5.38",
    "29200,FR,48.39,-4.49",
    "20121,IT,45.47,9.19",
    "16121,IT,44.41,8.93",
    "80121,IT,40.85,14.25",
    "10115,DE,52.53,13.38",
    "20095,DE,53.55,10.00",
    "18055,DE,54.09,12.14"
  })
  void postcodesLieInTheirTown(
      String code, String country, double latitudeDeg, double longitudeDeg) {
    Place place = PLACES.byPostcode(code, country, PlaceOverrides.NONE);
    // Ten kilometres: a city's codes may share one point.
    assertEquals(latitudeDeg, place.latitudeDeg(), 0.09, place.name());
    assertEquals(longitudeDeg, place.longitudeDeg(), 0.13, place.name());
  }

  @ParameterizedTest
  @CsvSource({"501,US,00501", "1067,DE,01067", "6000,fr,06000", "118,IT,00118"})
  void eatenZerosArePutBack(String code, String country, String whole) {
    Place place = PLACES.byPostcode(code, country, PlaceOverrides.NONE);
    assertTrue(place.name().startsWith(whole), place.name());
    assertEquals("place-postcode-zeros-added", place.flags().get(0).code());
  }

  @Test
  void aPostcodeWithoutATableNamesWhatCanBeGivenInstead() {
    Refusal country = refusal(() -> PLACES.byPostcode("SW1A 1AA", "GB", PlaceOverrides.NONE));
    assertEquals(Refusal.Kind.NOT_FOUND, country.kind());
    for (String word :
        List.of("DE", "FR", "IN", "IT", "US", "town", "coordinates", "postal file")) {
      assertTrue(country.allowed().contains(word), word);
    }
    Refusal code = refusal(() -> PLACES.byPostcode("99999", "US", PlaceOverrides.NONE));
    assertEquals(Refusal.Kind.NOT_FOUND, code.kind());
    assertTrue(code.allowed().contains("coordinates"));
  }

  @Test
  void emptyQuestionsAreWrongUse() {
    assertEquals(
        Refusal.Kind.WRONG_USE,
        refusal(() -> PLACES.byPostcode(" ", "US", PlaceOverrides.NONE)).kind());
    assertEquals(
        Refusal.Kind.WRONG_USE,
        refusal(() -> PLACES.byPostcode("10001", "", PlaceOverrides.NONE)).kind());
    assertEquals(Refusal.Kind.WRONG_USE, refusal(() -> PLACES.search("", 5)).kind());
    assertEquals(
        Refusal.Kind.WRONG_USE, refusal(() -> PLACES.search("x".repeat(10_000_000), 5)).kind());
    assertEquals(
        Refusal.Kind.NOT_FOUND,
        refusal(() -> PLACES.byPostcode("2026-01-05", "FR", PlaceOverrides.NONE)).kind());
    assertEquals(
        Refusal.Kind.NOT_FOUND, refusal(() -> PLACES.byName("xyzzyq", PlaceOverrides.NONE)).kind());
    assertTrue(PLACES.search(",,", 5).isEmpty());
  }

  @ParameterizedTest
  @CsvSource({"95,0", "-90.01,0", "NaN,0", "0,NaN", "0,180.5", "0,Infinity", "-Infinity,0"})
  void pointsOffTheGlobeAreRefused(double latitudeDeg, double longitudeDeg) {
    Refusal refusal = refusal(() -> PLACES.at(latitudeDeg, longitudeDeg, PlaceOverrides.NONE));
    assertEquals(Refusal.Kind.OUT_OF_RANGE, refusal.kind());
  }

  @Test
  void aPointJustOffTheShoreIsMovedAndOneFarOutRefused() {
    Place pier = PLACES.at(50.811, -0.1372, PlaceOverrides.NONE);
    assertEquals("place-moved-to-shore", pier.flags().get(0).code());
    assertTrue(PLACES.isLand(pier.latitudeDeg(), pier.longitudeDeg()));
    assertTrue(pier.sea().distanceKm() < 0.1);
    Refusal far = refusal(() -> PLACES.at(50.6, -0.1372, PlaceOverrides.NONE));
    assertEquals(Refusal.Kind.OUT_OF_RANGE, far.kind());
    assertEquals("at-sea", far.error());
    assertTrue(far.was().contains("km from land"));
  }

  @Test
  void atollsThatTheCoastMapLacksAreBelieved() {
    Place male = PLACES.at(4.1752, 73.5092, PlaceOverrides.NONE);
    assertEquals("place-missing-from-coast", male.flags().get(0).code());
    assertEquals(0, male.sea().distanceKm());
    assertEquals("MV", male.countryCode());
  }

  @Test
  void coordinatesLearnTheirCountryAndNeighbours() {
    Place place = PLACES.at(47.37, 8.54, PlaceOverrides.NONE);
    assertEquals("CH", place.countryCode());
    assertTrue(place.surroundings().populationWithin5Km() > 100_000);
    assertTrue(
        place.surroundings().populationWithin25Km() >= place.surroundings().populationWithin5Km());
    assertEquals(410, place.elevationM(), 60, "Zürich");
  }

  @Test
  void whatTheUserKnowsComesFirst() {
    PlaceOverrides known = new PlaceOverrides(OptionalDouble.of(12), OptionalDouble.of(3));
    Place place = PLACES.at(50.8225, -0.1372, known);
    assertEquals(12, place.elevationM());
    assertEquals(3, place.sea().distanceKm());
    assertEquals("place-sea-distance-given", place.flags().get(0).code());
    assertThrows(
        Refusal.class,
        () -> new PlaceOverrides(OptionalDouble.of(Double.NaN), OptionalDouble.empty()));
    assertThrows(
        Refusal.class, () -> new PlaceOverrides(OptionalDouble.empty(), OptionalDouble.of(-1)));
  }

  @Test
  void aPostalFileAddsItsCountry(@TempDir Path folder) throws IOException {
    PlaceDirectory own = PlaceDirectory.open(World.DATA);
    Path file = folder.resolve("AT.txt");
    Files.writeString(
        file,
        "AT\t1010\tWien, Innere Stadt\tWien\t09\t\t900\tWien\t90001\t48.2077\t16.3705\t5\n"
            + "AT\t4020\tLinz\tOberösterreich\t04\t\t401\tLinz\t40101\t48.3064\t14.2861\t5\n");
    own.addPostalFile(file);
    assertEquals("4020 Linz", own.byPostcode("4020", "at", PlaceOverrides.NONE).name());
    assertTrue(own.postcodeCountries().contains("AT"));
    assertFalse(PLACES.postcodeCountries().contains("AT"));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "AT\t1010\tWien",
        "AT\t1010\tWien\tWien\t09\t\t900\tWien\t90001\t2026-01-05\t16.3705\t5",
        "AT\t1010\tWien\tWien\t09\t\t900\tWien\t90001\t148.2\t16.3705\t5",
        ""
      })
  void aBadPostalFileIsRefusedWithItsLine(String line, @TempDir Path folder) throws IOException {
    Path file = folder.resolve("bad.txt");
    Files.writeString(file, line);
    Refusal refusal = refusal(() -> PLACES.addPostalFile(file));
    assertEquals(Refusal.Kind.WRONG_USE, refusal.kind());
    assertTrue(line.isEmpty() || refusal.field().startsWith("bad.txt:1"), refusal.field());
  }

  private static Refusal refusal(org.junit.jupiter.api.function.Executable question) {
    return assertThrows(Refusal.class, question);
  }
}
