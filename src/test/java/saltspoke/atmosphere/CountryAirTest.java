package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.places.Surroundings;
import saltspoke.sources.CsvTable;
import saltspoke.values.Refusal;

@Tag("law")
class CountryAirTest {
  static CountryAir shipped() {
    Path file = Path.of("climate-data/tables/country-air.csv");
    try {
      return CountryAir.read(CsvTable.read(Files.newInputStream(file), file.toString()));
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }

  @Test
  void holdsTheCountriesThatMatterMost() {
    CountryAir table = shipped();
    assertTrue(table.list().size() >= 60);
    for (String code :
        ("AL AT BA BE BG BY CH CY CZ DE DK EE ES FI FR GB GR HR HU IE IS IT LT LU LV MD ME MK MT NL"
                + " NO PL PT RO RS RU SE SI SK TR UA XK US CA MX JP KR CN IN BR AU NZ AR CL ZA")
            .split(" ")) {
      assertTrue(table.find(code).isPresent(), code);
    }
  }

  @Test
  void saysNothingOfSaltWhereNoneIsSpread() {
    for (CountryAir.Country each : shipped().list()) {
      assertEquals(
          each.roadSaltPractice().equals("none"),
          each.treatmentsPerMoistDay() == 0,
          each.countryCode());
    }
  }

  @Test
  void refusesADamagedCellWithItsPlace() {
    String head =
        "country_code,so2_city_ug_per_m3,so2_confidence,road_salt_practice,road_salt_confidence,"
            + "treatments_per_moist_near_freezing_day,magnesium_calcium_share\n";
    for (String row :
        List.of("AA,x,high,none,high,0,0", "AA,1,sure,none,high,0,0", "AA,1,high,none,high,9,0")) {
      byte[] bytes = (head + row + "\n").getBytes(StandardCharsets.UTF_8);
      Refusal refusal =
          assertThrows(
              Refusal.class,
              () -> CountryAir.read(CsvTable.read(new ByteArrayInputStream(bytes), "t.csv")));
      assertTrue(refusal.field().startsWith("t.csv:"), refusal.field());
    }
  }

  @Test
  void guessesTheSettingFromPeopleAndLights() {
    assertEquals(Setting.REMOTE, Settings.guess(new Surroundings(0, 500, 3)));
    assertEquals(Setting.RURAL, Settings.guess(new Surroundings(900, 30_000, 40)));
    assertEquals(Setting.TOWN, Settings.guess(new Surroundings(20_000, 60_000, 90)));
    assertEquals(Setting.CITY, Settings.guess(new Surroundings(300_000, 900_000, 250)));
    assertEquals(Setting.CITY, Settings.guess(new Surroundings(0, 3_600_000, 175)));
  }

  @Test
  void dirtierSettingsDepositMoreAndGuessesAreLessSure() {
    Optional<CountryAir.Country> germany = shipped().find("DE");
    double before = 0;
    for (Setting setting :
        List.of(
            Setting.REMOTE,
            Setting.RURAL,
            Setting.TOWN,
            Setting.CITY,
            Setting.PORT,
            Setting.INDUSTRIAL)) {
      double now = Settings.so2(setting, true, germany).depositionMgPerM2Day().median();
      assertTrue(now > before);
      before = now;
    }
    Settings.So2 given = Settings.so2(Setting.CITY, true, germany);
    Settings.So2 guessed = Settings.so2(Setting.CITY, false, germany);
    assertEquals(0.8 * germany.get().so2CityUgPerM3(), given.depositionMgPerM2Day().median());
    assertTrue(guessed.lnSpread() > given.lnSpread());
    assertEquals(
        "air-so2-country-unknown",
        Settings.so2(Setting.CITY, true, Optional.empty()).flags().get(0).code());
  }
}
