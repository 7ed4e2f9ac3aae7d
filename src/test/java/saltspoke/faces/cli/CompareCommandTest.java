package saltspoke.faces.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import saltspoke.atmosphere.DiurnalCycle;
import saltspoke.atmosphere.SaturationPressure;

@Tag("law")
class CompareCommandTest {
  private static final List<String> KEYS =
      List.of(
          "quantity",
          "n",
          "bias",
          "mae",
          "rmse",
          "lnRmse",
          "withinFactor2Pct",
          "withinFactor3Pct",
          "bandCoveragePct");

  @TempDir Path folder;

  @Test
  void climateNamesTheBadRowAndJudgesTheGoodOne() throws IOException {
    StringBuilder header = new StringBuilder("latitude_deg,longitude_deg,elevation_m");
    StringBuilder row = new StringBuilder();
    for (String stem : List.of("temperature_c", "relative_humidity_pct", "frost_days")) {
      for (int m = 1; m <= 12; m++) {
        header.append(String.format(Locale.ROOT, ",%s_%02d", stem, m));
        row.append(stem.startsWith("t") ? ",9.5" : stem.startsWith("r") ? ",78" : ",3");
      }
    }
    Path file = write("climate.csv", header + "\n50,8,120" + row + "\n95,8,120" + row + "\n");
    JsonNode answer = answer("compare", "climate", file.toString(), "--json");
    JsonNode first = answer.get("results").get(0);
    for (String key : KEYS) {
      assertTrue(first.has(key), key);
    }
    assertEquals(12, first.get("n").asInt());
    assertEquals("climate.csv:3 latitude_deg", answer.get("refused").get(0).get("field").asText());
  }

  @Test
  void wetnessOfAMadeUpStationIsMetFromItsOwnMeans() throws IOException {
    StringBuilder text =
        new StringBuilder(
            "station,latitude_deg,longitude_deg,elevation_m,month,hour,temperature_c,"
                + "relative_humidity_pct\n");
    for (int month = 1; month <= 12; month++) {
      for (int day = 0; day < 28; day++) {
        double vapour = 9 + 3 * Math.sin(day * 1.7);
        for (int hour = 0; hour < 24; hour++) {
          double t = DiurnalCycle.temperatureC(14 + 2 * Math.sin(day * 0.9), 8, hour);
          double rh = Math.min(100, 100 * vapour / SaturationPressure.overWaterHpa(t));
          text.append(
              String.format(Locale.ROOT, "Made up,50,8,100,%d,%d,%.2f,%.1f%n", month, hour, t, rh));
        }
      }
    }
    Path picture = folder.resolve("wet.png");
    JsonNode answer =
        answer(
            "compare",
            "wetness",
            write("hours.csv", text.toString()).toString(),
            "--json",
            "--picture",
            picture.toString());
    JsonNode own = answer.get("results").get(0);
    assertEquals("wet hours a year, from own monthly means", own.get("quantity").asText());
    assertTrue(own.get("medianAbsErrorPct").asDouble() < 35, own.toString());
    assertTrue(ImageIO.read(picture.toFile()).getWidth() > 400);
  }

  @Test
  void aMissingFileIsNotFound() {
    assertEquals(
        ExitCode.NOT_FOUND,
        Main.run(
            new String[] {"compare", "chloride", folder.resolve("none.csv").toString()},
            new PrintWriter(new StringWriter()),
            new PrintWriter(new StringWriter())));
  }

  private Path write(String name, String text) throws IOException {
    return Files.writeString(folder.resolve(name), text);
  }

  private static JsonNode answer(String... args) throws IOException {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    assertEquals(
        ExitCode.DONE, Main.run(args, new PrintWriter(out), new PrintWriter(err)), err.toString());
    return new ObjectMapper().readTree(out.toString());
  }
}
