package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.fields.DataSet;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceOverrides;
import saltspoke.sources.CsvTable;

class AirModelTest {
  private static PlaceDirectory places;
  private static AirModel model;

  @BeforeAll
  static void openTheShippedWorld() {
    DataSet data = DataSet.in(Path.of("climate-data"));
    places = PlaceDirectory.open(data);
    model = AirModel.from(data);
  }

  private static AirClimate at(double latitudeDeg, double longitudeDeg) {
    return model.at(places.at(latitudeDeg, longitudeDeg, PlaceOverrides.NONE), AirOverrides.NONE);
  }

  private static double chloride(double latitudeDeg, double longitudeDeg) {
    return at(latitudeDeg, longitudeDeg).chlorideDepositionMgPerM2Day().median();
  }

  @Test
  @Tag("published")
  void treatmentsASeasonAsPublished() {
    for (CsvTable.Row row : Reference.rows("road-salt-published/treatments-a-season.csv")) {
      double found =
          at(row.number("latitude_deg"), row.number("longitude_deg"))
              .roadSalt()
              .treatmentsPerWinter()
              .median();
      assertTrue(found >= row.number("treatments_low") / 1.3, row.text("place") + ": " + found);
      assertTrue(found <= row.number("treatments_high") * 1.3, row.text("place") + ": " + found);
    }
  }

  @Test
  @Tag("law")
  void openCoastsCarryMoreThanShelteredOnesAndInlandLess() {
    double zandvoort = chloride(52.37, 4.53);
    double utrecht = chloride(52.09, 5.12);
    double munich = chloride(48.14, 11.57);
    assertTrue(zandvoort > utrecht && utrecht > munich, zandvoort + " " + utrecht + " " + munich);
    assertTrue(chloride(58.35, 11.25) > 2 * chloride(60.17, 24.94), "Skagerrak over Baltic");
    assertTrue(chloride(40.41, 49.87) < zandvoort / 3, "the Caspian is brackish");
    assertTrue(chloride(36.96, -122.02) > 3 * chloride(37.30, -120.48), "behind the Coast Range");
  }

  @Test
  @Tag("law")
  void lakesAndFarDesertsGiveNoSeaSalt() {
    assertTrue(chloride(41.88, -87.63) < 1, "Lake Michigan is fresh");
    assertTrue(chloride(46.51, 6.63) < 3, "so is Lake Geneva");
    assertTrue(chloride(23, 5) <= FittedRange.SD_MIN_MG_PER_M2_DAY, "Sahara");
    assertTrue(chloride(40, 85) <= FittedRange.SD_MIN_MG_PER_M2_DAY, "Taklamakan");
  }

  @Test
  @Tag("law")
  void whatIsGivenReplacesTheMapAndIsFlagged() {
    OptionalDouble none = OptionalDouble.empty();
    AirOverrides given =
        new AirOverrides(
            Optional.of(Setting.INDUSTRIAL),
            OptionalDouble.of(120),
            OptionalDouble.of(30),
            OptionalDouble.of(12),
            OptionalDouble.of(85));
    AirClimate air = model.at(places.at(52.09, 5.12, PlaceOverrides.NONE), given);
    assertEquals(Setting.INDUSTRIAL, air.setting());
    assertTrue(air.settingGiven());
    assertEquals(120, air.chlorideDepositionMgPerM2Day().median());
    double mean =
        air.months().stream()
            .mapToDouble(MonthAir::chlorideDepositionMgPerM2Day)
            .average()
            .orElseThrow();
    assertEquals(120, mean, 1e-9);
    double expected = DoseResponse.of(Metal.ZINC).firstYear(new Exposure(12, 85, 30, 120)).um();
    assertEquals(
        expected, air.corrosivity().get(Metal.ZINC.ordinal()).firstYearLossUm().median(), 1e-6);
    for (String code :
        new String[] {
          "air-chloride-given", "air-so2-given", "air-temperature-given", "air-humidity-given"
        }) {
      assertTrue(air.flags().stream().anyMatch(n -> n.code().equals(code)), code);
    }
    AirOverrides setting = new AirOverrides(Optional.of(Setting.RURAL), none, none, none, none);
    AirClimate rural = model.at(places.at(52.09, 5.12, PlaceOverrides.NONE), setting);
    assertFalse(rural.flags().stream().anyMatch(n -> n.code().equals("air-setting-guessed")));
  }

  @Test
  @Tag("law")
  void roadSaltDoesNotTouchTheStandardsClass() {
    // Malmö lies in a country that salts, and a place without practice differs by the country only.
    AirClimate salted = at(55.6, 13.0);
    assertTrue(salted.roadSalt().treatmentsPerWinter().median() > 30);
    Exposure x =
        new Exposure(
            salted.annual().temperatureC(),
            salted.annual().relativeHumidityPct(),
            salted.so2DepositionMgPerM2Day().median(),
            salted.chlorideDepositionMgPerM2Day().median());
    double alone =
        Corrosion.firstYear(
                Metal.CARBON_STEEL,
                x.temperatureC(),
                x.relativeHumidityPct(),
                x.so2MgPerM2Day(),
                x.chlorideMgPerM2Day())
            .um();
    double answered = salted.corrosivity().get(0).firstYearLossUm().median();
    assertEquals(1, answered / alone, 0.25, "only spreads, no road salt, lie between the two");
  }
}
