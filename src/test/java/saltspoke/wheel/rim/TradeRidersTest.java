package saltspoke.wheel.rim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.sources.CsvTable;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;

/** The riders of the four trade cases live in weathers as far apart as the cases say. */
@Tag("law")
class TradeRidersTest {
  private static Profiles riders() {
    String path = "/saltspoke/wheel/trade-profiles.csv";
    return Profiles.from(CsvTable.read(TradeRidersTest.class.getResourceAsStream(path), path));
  }

  private static WheelYear year(String climate, String rider) {
    return WheelWeather.over(
        InventedClimates.all().get(climate), riders().get(rider), WheelBuild.USUAL);
  }

  @Test
  void dryRiderHardlyWetCommuterMostlyWetSeaFrontAlwaysWet() {
    double dry = WheelWeatherTest.wetHours(year("dry-inland", "dry-fair-weather"));
    WheelYear commuter = year("maritime-winter", "salted-commuter-aluminium");
    WheelYear seaFront = year("tropical-sea-front", "tropical-sea-front");
    assertTrue(dry < 100, "dry rider " + dry + " h");
    assertTrue(WheelWeatherTest.wetHours(commuter) > 5000);
    assertTrue(WheelWeatherTest.wetHours(seaFront) > 8000);
    assertTrue(WheelWeatherTest.meanSalt(seaFront) > 2 * WheelWeatherTest.meanSalt(commuter));
    assertTrue(seaFront.months().stream().allMatch(m -> m.saltedWetRides() == 0));
    assertEquals(commuter.months(), year("maritime-winter", "salted-commuter-brass").months());
  }
}
