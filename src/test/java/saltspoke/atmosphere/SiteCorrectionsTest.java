package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import saltspoke.fields.DataSet;
import saltspoke.places.Place;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceOverrides;
import saltspoke.sources.CsvTable;
import saltspoke.values.Refusal;

@Tag("law")
class SiteCorrectionsTest {
  private static final String HEADER =
      "site,latitude_deg,longitude_deg,elevation_m,sea_distance_km,quantity,month,kind,amount,"
          + "spread\n";

  private static CorrectionSpot spot(double latitudeDeg, double longitudeDeg, double elevationM) {
    return new CorrectionSpot(latitudeDeg, longitudeDeg, elevationM, 100);
  }

  private static SiteCorrection row(
      String site,
      CorrectionSpot spot,
      CorrectedQuantity quantity,
      int month,
      double amount,
      double spread) {
    return new SiteCorrection(site, spot, quantity, month, amount, spread);
  }

  private static SiteCorrection warmer(String site, CorrectionSpot spot, double kelvin) {
    return row(site, spot, CorrectedQuantity.TEMPERATURE, 0, kelvin, 0.3);
  }

  private static SiteMove move(CorrectionSpot at, SiteCorrection... rows) {
    return SiteCorrections.of(List.of(rows)).at(CorrectedQuantity.TEMPERATURE, at);
  }

  @Test
  void aSureSiteIsMetExactlyAndAnUnsureOneWithinItsSpread() {
    CorrectionSpot here = spot(50, 8, 100);
    SiteCorrection other = warmer("other", spot(50.5, 8.5, 150), -1);
    SiteMove exact = move(here, row("a", here, CorrectedQuantity.TEMPERATURE, 0, 2.5, 0), other);
    assertEquals(2.5, exact.meanDeparture(), 1e-6);
    assertEquals(0, exact.spreadFactor(), 1e-3);
    SiteMove unsure = move(here, warmer("a", here, 2.5), other);
    assertEquals(2.5, unsure.meanDeparture(), 0.3);
    double spreadK = unsure.spreadFactor() * CorrectedQuantity.TEMPERATURE.priorSpread();
    assertTrue(spreadK > 0.2 && spreadK <= 0.3, "as sure as the measurement: " + spreadK);
  }

  @Test
  void distanceHeightAndShoreAllWeakenASite() {
    SiteCorrection site = warmer("a", spot(50, 8, 100), 2);
    double last = 2;
    for (double north : new double[] {0.1, 0.5, 1, 2, 4, 6}) {
      double now = move(spot(50 + north, 8, 100), site).meanDeparture();
      assertTrue(now < last && now > 0, north + "° north: " + now);
      last = now;
    }
    double level = move(spot(50.2, 8, 100), site).meanDeparture();
    assertTrue(move(spot(50.2, 8, 1500), site).meanDeparture() < level);
    assertTrue(
        move(new CorrectionSpot(50.2, 8, 100, 0), site).meanDeparture() < level, "at the shore");
  }

  @Test
  void twoSitesAtOneSpotShareTheirSayAndAClusterDoesNotOutvoteALoneSite() {
    CorrectionSpot here = spot(50, 8, 100);
    SiteMove both = move(here, warmer("a", here, 1), warmer("b", here, 2));
    assertEquals(1.5, both.meanDeparture(), 0.1);
    CorrectionSpot east = spot(50, 9, 100);
    CorrectionSpot west = spot(50, 7, 100);
    SiteMove between =
        move(
            here,
            warmer("lone", east, 2),
            warmer("c1", west, -2),
            warmer("c2", west, -2),
            warmer("c3", west, -2));
    assertEquals(0, between.meanDeparture(), 0.15);
  }

  @Test
  void onlyMeasuredMonthsMove() {
    CorrectionSpot here = spot(50, 8, 100);
    SiteMove move = move(here, row("a", here, CorrectedQuantity.TEMPERATURE, 7, 2, 0));
    assertEquals(2, move.departure()[6], 1e-6);
    assertEquals(0, move.departure()[5]);
    assertEquals(1, move.varianceLeft()[5]);
    SiteMove both =
        move(
            here,
            row("a", here, CorrectedQuantity.TEMPERATURE, 7, 2, 0),
            row("a", here, CorrectedQuantity.TEMPERATURE, 0, 1, 0));
    assertEquals(2, both.departure()[6], 1e-6, "a month goes before the year");
    assertEquals(1, both.departure()[5], 1e-6);
  }

  @Test
  void anAnswerFarAwayStaysAsItWasAndOneNearBySaysWhatMovedIt() {
    DataSet data = DataSet.in(Path.of("climate-data"));
    PlaceDirectory places = PlaceDirectory.open(data);
    Place kiel = places.at(54.32, 10.13, PlaceOverrides.NONE);
    CorrectionSpot there = CorrectionSpot.of(kiel);
    AirModel plain = AirModel.from(data);
    List<SiteCorrection> rows =
        new ArrayList<>(
            List.of(
                row("mast", there, CorrectedQuantity.TEMPERATURE, 0, 1.5, 0),
                row("mast", there, CorrectedQuantity.RELATIVE_HUMIDITY, 0, -6, 0),
                row("candle", there, CorrectedQuantity.CHLORIDE, 0, 3, 0)));
    double wetHoursOfMeans =
        AirModel.from(data, SiteCorrections.of(rows))
            .at(kiel, AirOverrides.NONE)
            .annual()
            .wetHours();
    rows.add(row("mast", there, CorrectedQuantity.WET_HOURS, 0, 0.9, 0));
    AirModel moved = AirModel.from(data, SiteCorrections.of(rows));
    Place madrid = places.at(40.42, -3.70, PlaceOverrides.NONE);
    assertEquals(
        plain.at(madrid, AirOverrides.NONE), moved.at(madrid, AirOverrides.NONE), "far away");
    AirClimate before = plain.at(kiel, AirOverrides.NONE);
    AirClimate after = moved.at(kiel, AirOverrides.NONE);
    assertEquals(before.annual().temperatureC() + 1.5, after.annual().temperatureC(), 1e-4);
    assertEquals(
        before.annual().relativeHumidityPct() - 6, after.annual().relativeHumidityPct(), 1e-4);
    assertTrue(wetHoursOfMeans < before.annual().wetHours(), "wet hours follow");
    assertEquals(0.9 * (wetHoursOfMeans + 12), after.annual().wetHours() + 12, 0.1);
    double factor =
        after.chlorideDepositionMgPerM2Day().median()
            / before.chlorideDepositionMgPerM2Day().median();
    assertEquals(3, factor, 1e-3);
    assertEquals(
        1,
        after.chlorideDepositionMgPerM2Day().p90() / after.chlorideDepositionMgPerM2Day().p10(),
        1e-3,
        "a sure measurement leaves no spread");
    List<String> codes = after.flags().stream().map(note -> note.code()).toList();
    for (CorrectedQuantity quantity : CorrectedQuantity.values()) {
      assertTrue(codes.contains("air-corrected-" + quantity.id()), codes.toString());
    }
    String sites =
        after.flags().stream()
            .filter(note -> note.code().equals("air-corrected-chloride"))
            .map(note -> note.args().get("sites").toString())
            .findFirst()
            .orElseThrow();
    assertEquals("candle (0 km)", sites);
  }

  /** An error of the model that varies over some 500 km, measured at scattered sites. */
  private static List<SiteCorrection> inventedField(double noiseK) {
    Random random = new Random(7);
    List<SiteCorrection> rows = new ArrayList<>();
    for (int i = 0; i < 120; i++) {
      double latitudeDeg = 44 + 8 * random.nextDouble();
      double longitudeDeg = 2 + 12 * random.nextDouble();
      double error = 1.2 * Math.sin(latitudeDeg * 0.8) + 0.8 * Math.cos(longitudeDeg * 0.6);
      rows.add(
          warmer(
              "s" + i,
              spot(latitudeDeg, longitudeDeg, 400 * random.nextDouble()),
              error + noiseK * random.nextGaussian()));
    }
    return rows;
  }

  @Test
  void leavingOutOneByOneTheErrorFallsOnAnInventedField() {
    LeaveOneOut smooth = LeaveOneOut.draft(inventedField(0.1)).errors().get(0);
    assertEquals(120, smooth.withNeighbours());
    assertTrue(smooth.rmseAfter() < 0.4 * smooth.rmseBefore(), smooth.toString());
    assertTrue(smooth.bandCoveragePct() >= 80, smooth.toString());
  }

  @Test
  void sitesThatDoNotAgreeAreWrittenWithALargerSpread() {
    LeaveOneOut.Drafted noisy = LeaveOneOut.draft(inventedField(2.5));
    LeaveOneOut judged = noisy.errors().get(0);
    assertTrue(judged.spread() > 1.5, judged.toString());
    assertTrue(judged.bandCoveragePct() >= 80, judged.toString());
    assertEquals(judged.spread(), noisy.rows().get(3).spread());
  }

  @Test
  void aFileReadsBackAsItWasWritten() {
    List<SiteCorrection> rows = new ArrayList<>();
    rows.add(row("A, \"north\"", spot(50, 8, 100), CorrectedQuantity.TEMPERATURE, 3, 1.25, 0.3));
    rows.add(row("B", spot(-50.25, 8, 0), CorrectedQuantity.RELATIVE_HUMIDITY, 12, -7.5, 2));
    rows.add(row("C", spot(10, -170.5, 0), CorrectedQuantity.CHLORIDE, 0, 0.00123, 0.3));
    String text = CorrectionFile.write(LeaveOneOut.draft(rows));
    assertEquals(rows, read(text));
    assertTrue(text.startsWith("# Site corrections"), text);
    assertTrue(text.contains("# temperature (add): 1 sites, none near enough"), text);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "A,50,8,100,100,salt,,multiply,2,0.3|local.csv:2 quantity",
        "A,50,8,100,100,chloride,,add,2,0.3|local.csv:2 kind",
        "A,50,8,100,100,chloride,13,multiply,2,0.3|local.csv:2 month",
        "A,50,8,100,100,chloride,1.5,multiply,2,0.3|local.csv:2 month",
        "A,50,8,100,100,chloride,,multiply,0,0.3|local.csv:2 amount",
        "A,50,8,100,100,temperature,,add,two,0.3|local.csv:2 amount",
        "A,50,8,100,100,temperature,,add,2,-1|local.csv:2 spread",
        "A,95,8,100,100,temperature,,add,2,0|local.csv:2 latitude_deg",
        ",50,8,100,100,temperature,,add,2,0|local.csv:2 site"
      })
  void aWrongCellIsRefusedWithFileLineAndColumn(String line, String field) {
    Refusal refusal = assertThrows(Refusal.class, () -> read(HEADER + line + "\n"));
    assertEquals(field, refusal.field());
    assertTrue(!refusal.allowed().isEmpty());
  }

  @Test
  void aRowThatStandsTwiceAndAnEmptyFileAreRefused() {
    String line = "A,50,8,100,100,temperature,1,add,2,0.3\n";
    Refusal twice = assertThrows(Refusal.class, () -> read(HEADER + line + line));
    assertEquals("local.csv:3 month", twice.field());
    assertEquals("no-rows", assertThrows(Refusal.class, () -> read(HEADER)).error());
  }

  @Test
  void withoutAFileNothingIsMoved() {
    SiteMove move = SiteCorrections.NONE.at(CorrectedQuantity.CHLORIDE, spot(0, 0, 0));
    assertTrue(move.isNone());
    assertArrayEquals(new double[12], move.departure());
    assertEquals(1, move.spreadFactor(), 1e-12);
  }

  private static List<SiteCorrection> read(String text) {
    return CorrectionFile.read(
        CsvTable.read(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "local.csv"),
        "local.csv");
  }
}
