package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.fields.DataSet;
import saltspoke.places.Place;
import saltspoke.places.SeaView;
import saltspoke.places.Surroundings;
import saltspoke.sources.CsvTable;
import saltspoke.values.Note;

class MonthlyClimateTest {
  private static final MonthlyClimate CLIMATE = MonthlyClimate.from(DataSet.shipped());

  @Test
  @Tag("law")
  void everyPlaceOnEarthGetsFiniteBoundedNumbers() {
    for (double lat = -90; lat <= 90; lat += 6) {
      for (double lon = -180; lon <= 180; lon += 7.5) {
        for (double height : new double[] {-400, 0, 2500, 8800}) {
          for (MonthClimate m : CLIMATE.at(lat, lon, height, Math.abs(lon))) {
            String at = lat + "," + lon + "," + height + " month " + m.month();
            assertTrue(m.temperatureC() > -95 && m.temperatureC() < 55, at + " " + m);
            assertTrue(m.relativeHumidityPct() > 0 && m.relativeHumidityPct() < 100, at);
            assertTrue(m.diurnalRangeC() > 0 && m.diurnalRangeC() < 40, at + " " + m);
            assertTrue(m.wetHours() >= 0 && m.wetHours() <= m.hoursAbove75Pct() + 1e-9, at);
            assertTrue(m.hoursAbove75Pct() <= m.hoursAbove33Pct() + 1e-9, at);
            assertTrue(m.hoursAbove33Pct() <= 24 * MonthMeans.daysIn(m.month()) + 1e-9, at);
            assertTrue(m.windMPerS() > 0 && m.windMPerS() < 20, at);
            assertTrue(m.frostDays() >= 0 && m.frostDays() <= 31, at);
          }
        }
      }
    }
  }

  @Test
  @Tag("law")
  void itGetsColderWithHeight() {
    for (double[] place : new double[][] {{46.5, 8}, {0, 37}, {-33, -70}, {28, 85}, {64, -150}}) {
      double before = Double.POSITIVE_INFINITY;
      for (double height = 0; height <= 5000; height += 250) {
        double t = annual(CLIMATE.at(place[0], place[1], height, 100), MonthClimate::temperatureC);
        assertTrue(t < before, place[0] + "," + place[1] + " at " + height);
        before = t;
      }
    }
  }

  @Test
  @Tag("law")
  void nothingJumpsAtTheDateLineOrTheEquator() {
    double[][][] pairs = {
      {{65, 179.999}, {65, -179.999}}, {{0.001, 20}, {-0.001, 20}}, {{51, 0.001}, {51, -0.001}}
    };
    for (double[][] pair : pairs) {
      List<MonthClimate> a = CLIMATE.at(pair[0][0], pair[0][1], 100, 50);
      List<MonthClimate> b = CLIMATE.at(pair[1][0], pair[1][1], 100, 50);
      for (int m = 0; m < 12; m++) {
        assertEquals(a.get(m).temperatureC(), b.get(m).temperatureC(), 0.05);
        assertEquals(a.get(m).relativeHumidityPct(), b.get(m).relativeHumidityPct(), 0.2);
        assertEquals(a.get(m).windMPerS(), b.get(m).windMPerS(), 0.05);
      }
    }
  }

  @Test
  @Tag("law")
  void desertsAreDryAndRainForestsWet() {
    double sahara = annual(CLIMATE.at(24, 10, 600, 900), MonthClimate::relativeHumidityPct);
    double amazon = annual(CLIMATE.at(-3, -63, 50, 1200), MonthClimate::relativeHumidityPct);
    assertTrue(sahara < 40, "Sahara " + sahara);
    assertTrue(amazon > 78, "Amazon " + amazon);
    double saharaWet = 12 * annual(CLIMATE.at(24, 10, 600, 900), MonthClimate::wetHours);
    assertTrue(saharaWet < 250, "Sahara wet hours " + saharaWet);
  }

  @Test
  @Tag("regression")
  void placesKeepTheirClimate() {
    for (CsvTable.Row row : Reference.rows("own-output/monthly-climate.csv")) {
      List<MonthClimate> months =
          CLIMATE.at(
              row.number("latitude_deg"),
              row.number("longitude_deg"),
              row.number("elevation_m"),
              row.number("sea_distance_km"));
      String where = row.where();
      assertEquals(
          row.number("temperature_c"), annual(months, MonthClimate::temperatureC), 0.01, where);
      assertEquals(
          row.number("relative_humidity_pct"),
          annual(months, MonthClimate::relativeHumidityPct),
          0.01,
          where);
      assertEquals(row.number("wet_hours"), 12 * annual(months, MonthClimate::wetHours), 1, where);
      assertEquals(
          row.number("frost_days"), 12 * annual(months, MonthClimate::frostDays), 0.05, where);
    }
  }

  @Test
  @Tag("law")
  void everyNoteHasItsSentence() throws IOException {
    Set<String> codes = new HashSet<>();
    JsonNode texts = new ObjectMapper().readTree(Path.of("web/texts/en/air-climate.json").toFile());
    for (Place place : List.of(place(-25, 134, 500), place(28, 86.9, 8800))) {
      for (Note note : CLIMATE.notes(place)) {
        codes.add(note.code());
        assertTrue(texts.has(note.code()), note.code());
        for (String gap : note.args().keySet()) {
          assertTrue(texts.get(note.code()).asText().contains("{" + gap + "}"), note.code());
        }
      }
    }
    assertEquals(texts.size(), codes.size(), "each sentence is used: " + codes);
  }

  private static Place place(double latitudeDeg, double longitudeDeg, double elevationM) {
    SeaView sea = new SeaView(500, new double[36], new double[36], new double[36]);
    return new Place(
        "",
        "",
        "",
        latitudeDeg,
        longitudeDeg,
        elevationM,
        sea,
        new Surroundings(0, 0, 0),
        List.of());
  }

  private static double annual(
      List<MonthClimate> months, java.util.function.ToDoubleFunction<MonthClimate> quantity) {
    return months.stream().mapToDouble(quantity).average().orElseThrow();
  }
}
