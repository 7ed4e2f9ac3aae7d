package saltspoke.atlas.stock;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.math.BigDecimal;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import saltspoke.advice.Advisor;
import saltspoke.advice.RiskLevel;
import saltspoke.advice.StateShares;
import saltspoke.atmosphere.AirModel;
import saltspoke.fields.DataSet;
import saltspoke.places.PlaceDirectory;
import saltspoke.sources.LooseTable;
import saltspoke.values.Refusal;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.WheelBuild;

@Tag("law")
class StockTest {
  private static final DataSet DATA = DataSet.shipped();
  private static final PlaceDirectory PLACES = PlaceDirectory.open(DATA);
  private static final AirModel AIR = AirModel.from(DATA);
  private static final Catalogue CATALOGUE = Catalogue.shipped();
  private static final Profiles PROFILES = Profiles.shipped();
  private static final StockQuestion QUESTION =
      new StockQuestion(
          PROFILES.get("year-round-club"),
          new Pairing("carbon-bare", "aluminium-anodised-thin", "none", "stainless"),
          WheelBuild.USUAL,
          RiskLevel.USUAL,
          10,
          StockQuestion.USUAL_WANTED_MONTHS,
          Preference.shipped(CATALOGUE));

  /** What came of a list. */
  private static final class Gathered implements StockRun.Outcome {
    private final Splits splits = new Splits(QUESTION);
    private final List<CustomerAnswer> answers = new ArrayList<>();
    private final List<RefusedRow> refused = new ArrayList<>();

    @Override
    public void answered(CustomerAnswer answer) {
      answers.add(answer);
      splits.add(answer);
    }

    @Override
    public void refused(RefusedRow row) {
      refused.add(row);
    }
  }

  private static Gathered over(byte[] list) throws IOException {
    Gathered gathered = new Gathered();
    try (LooseTable table = LooseTable.open(new ByteArrayInputStream(list), "list.csv")) {
      CustomerDesk desk =
          new CustomerDesk(PLACES, AIR, new Advisor(CATALOGUE), CATALOGUE, PROFILES, QUESTION);
      StockRun.over(
          table,
          new CustomerReader(table, CATALOGUE, PROFILES, QUESTION),
          desk,
          gathered,
          rows -> {});
    }
    return gathered;
  }

  private static Gathered over(String list) throws IOException {
    return over(list.getBytes(StandardCharsets.UTF_8));
  }

  @ParameterizedTest
  @CsvSource({
    "UTF-8,';',''",
    "windows-1252,';',''",
    "UTF-16LE,'\t',\uFEFF",
    "UTF-16BE,'|',\uFEFF",
    "UTF-8,',',\uFEFF"
  })
  void oneListInManyForms(String encoding, String separator, String mark) throws IOException {
    String list = "Ort;Land;Anzahl\r\n\" Mödling\";Österreich;1\r\n  Zürich ;CH;2\r\n";
    byte[] bytes = (mark + list.replace(";", separator)).getBytes(Charset.forName(encoding));
    Gathered gathered = over(bytes);
    assertEquals(List.of(), gathered.refused);
    assertEquals("AT", gathered.answers.get(0).countryCode());
    assertEquals("Zürich", gathered.answers.get(1).place());
    assertEquals(0, BigDecimal.valueOf(3).compareTo(gathered.splits.all().wheels()));
  }

  @ParameterizedTest
  @CsvSource({
    "1067,DE,1,01067 Dresden,1",
    "01067,Deutschland,'3,5',01067 Dresden,3.5",
    "D-20095,de,1 000,20095 Hamburg,1000",
    "98101.0,USA,2,98101 Seattle,2",
    "75001,Frankreich,,75001 Paris,1",
  })
  void whatIsSureIsMended(
      String postcode, String country, String wheels, String place, String weight)
      throws IOException {
    Gathered gathered =
        over(
            "plz;land;wheels\n"
                + postcode
                + ";"
                + country
                + ";"
                + (wheels == null ? "" : wheels)
                + "\n");
    assertEquals(List.of(), gathered.refused);
    CustomerAnswer answer = gathered.answers.get(0);
    assertEquals(place, answer.place());
    assertEquals(0, new BigDecimal(weight).compareTo(answer.customer().wheels()));
  }

  @ParameterizedTest
  @CsvSource({
    "99999,DE,1,postcode",
    "1.2E+4,DE,1,postcode",
    "01067,,1,country",
    "01067,Atlantis,1,country",
    "01067,DE,1.200,wheels",
    "01067,DE,-1,wheels",
    "01067,DE,NaN,wheels",
    ",,1,postcode"
  })
  void whatIsNotSureComesBackWithItsField(
      String postcode, String country, String wheels, String field) throws IOException {
    Gathered gathered =
        over(
            "plz;land;wheels\n"
                + (postcode == null ? "" : postcode)
                + ";"
                + (country == null ? "" : country)
                + ";"
                + wheels
                + "\n");
    assertEquals(0, gathered.answers.size());
    assertEquals(field, gathered.refused.get(0).reason().field());
    assertEquals(2, gathered.refused.get(0).row().line());
  }

  @Test
  void aTableWithoutAPlaceIsRefused() {
    Refusal refusal = assertThrows(Refusal.class, () -> over("name,wheels\na,1\n"));
    assertEquals("missing-column", refusal.error());
    assertThrows(Refusal.class, () -> over(""));
    assertThrows(Refusal.class, () -> over(new byte[] {0, 1, 2, 3}));
  }

  @Test
  void nothingIsDroppedAndPartsMakeTheWholeExactly(@TempDir Path folder) throws IOException {
    Path list = folder.resolve("invented.csv");
    int rows = 1500;
    InventedCustomers.write(rows, list, 3);
    Gathered gathered = over(Files.readAllBytes(list));
    assertEquals(rows, gathered.answers.size() + gathered.refused.size());
    assertTrue(gathered.refused.size() > 5 && gathered.splits.mended() > 50);
    BigDecimal wheels =
        gathered.answers.stream()
            .map(answer -> answer.customer().wheels())
            .reduce(BigDecimal.ZERO, BigDecimal::add);
    Split all = gathered.splits.all();
    assertEquals(0, wheels.compareTo(all.wheels()));
    for (Map<?, BigDecimal> parts : List.of(all.byClass(), all.byProfile(), all.byPairing())) {
      assertEquals(0, wheels.compareTo(sum(parts.values())));
    }
    assertEquals(
        0,
        wheels.compareTo(
            sum(gathered.splits.byRegion().values().stream().map(Split::wheels).toList())));
    for (int year = 1; year <= StockQuestion.YEARS; year++) {
      StateShares at = all.wheelsByState(year);
      double states = at.sound() + at.attacked() + at.seized() + at.lost();
      assertEquals(wheels.doubleValue(), states, 1e-6 * wheels.doubleValue());
    }
    // The same list on another day gives the same answers in the same order.
    Gathered again = over(Files.readAllBytes(list));
    assertEquals(gathered.answers, again.answers);
  }

  private static BigDecimal sum(Iterable<BigDecimal> parts) {
    BigDecimal sum = BigDecimal.ZERO;
    for (BigDecimal part : parts) {
      sum = sum.add(part);
    }
    return sum;
  }

  @Test
  void theFirstOfTheOrderThatLastsLongEnoughIsTaken() throws IOException {
    CustomerAnswer mild =
        over("place,country,profile\nDresden,DE,fair-weather-racer\n").answers.get(0);
    assertEquals("aluminium-anodised-thin", mild.taken().nipple());
    CustomerAnswer harsh =
        over("place,country,profile\nKiel,DE,all-winter-commuter\n").answers.get(0);
    assertTrue(harsh.takenProspect().freeFirstLookMonths() >= QUESTION.wantedMonths());
    assertTrue(!harsh.taken().nipple().startsWith("aluminium"), harsh.taken().toString());
  }

  @Test
  void ordersCoverTheYearInWholePacksAndInTime() throws IOException {
    Gathered gathered = over("place,country,profile,wheels\nKiel,DE,all-winter-commuter,1000\n");
    Pieces.Article article = new Pieces.Article("nipple", gathered.answers.get(0).taken().nipple());
    Pieces.Line none =
        Pieces.order(gathered.splits, new Pieces.Buying(100, 0, Map.of()), 10).get(0);
    assertEquals(article, none.article());
    assertTrue(none.needed() > 0 && none.needed() <= 28_000, "needed " + none.needed());
    assertTrue(none.packs() * 100 >= none.needed() && (none.packs() - 1) * 100 < none.needed());
    Pieces.Line later =
        Pieces.order(
                gathered.splits, new Pieces.Buying(100, 0, Map.of(article, none.needed() / 2)), 10)
            .get(0);
    assertTrue(later.packs() < none.packs());
    Pieces.Line all =
        Pieces.order(gathered.splits, new Pieces.Buying(100, 0, Map.of(article, none.needed())), 10)
            .get(0);
    assertEquals(0, all.packs());
    assertEquals(Optional.empty(), all.orderMonth());
    int soon = none.orderMonth().orElseThrow();
    int early =
        Pieces.order(gathered.splits, new Pieces.Buying(100, 8, Map.of()), 10)
            .get(0)
            .orderMonth()
            .orElseThrow();
    assertEquals(2, Math.floorMod(soon - early, 12));
  }
}
