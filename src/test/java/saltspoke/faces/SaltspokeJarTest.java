package saltspoke.faces;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.BufferedReader;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.Reader;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Properties;
import java.util.concurrent.TimeUnit;
import java.util.jar.JarEntry;
import java.util.jar.JarFile;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The finished jar, started as people start it, from a folder that is not its own. */
@Tag("law")
class SaltspokeJarTest {
  private static final Path JAR = Path.of("target", "saltspoke.jar").toAbsolutePath();
  private static final ObjectMapper JSON = new ObjectMapper();

  @TempDir static Path elsewhere;

  private record Run(int exitCode, String out, String err) {}

  private static Process start(Path out, Path err, String... arguments) throws IOException {
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.add("-jar");
    command.add(JAR.toString());
    command.addAll(List.of(arguments));
    ProcessBuilder builder =
        new ProcessBuilder(command).directory(elsewhere.toFile()).redirectError(err.toFile());
    if (out != null) {
      builder.redirectOutput(out.toFile());
    }
    return builder.start();
  }

  private static Run run(String... arguments) throws Exception {
    Path out = Files.createTempFile(elsewhere, "out", ".txt");
    Path err = Files.createTempFile(elsewhere, "err", ".txt");
    Process process = start(out, err, arguments);
    assertTrue(process.waitFor(2, TimeUnit.MINUTES), "no end within two minutes");
    return new Run(process.exitValue(), Files.readString(out), Files.readString(err));
  }

  @Test
  void airHasTheAgreedForm() throws Exception {
    Run run = run("air", "--at", "54.32,10.13", "--json");
    assertEquals(0, run.exitCode(), run.err());
    JsonNode air = JSON.readTree(run.out());
    for (String key : List.of("latitudeDeg", "longitudeDeg", "elevationM", "seaDistanceKm")) {
      assertTrue(air.at("/place/" + key).isNumber(), key);
    }
    assertEquals(12, air.get("months").size());
    for (JsonNode month : air.get("months")) {
      for (String key :
          List.of(
              "month",
              "temperatureC",
              "relativeHumidityPct",
              "wetHours",
              "rainMm",
              "nearFreezingDays",
              "frostDays")) {
        assertTrue(month.get(key).isNumber(), key);
      }
    }
    for (String key : List.of("temperatureC", "relativeHumidityPct", "wetHours", "rainMm")) {
      assertTrue(air.at("/annual/" + key).isNumber(), key);
    }
    for (String dose : List.of("chlorideDepositionMgPerM2Day", "so2DepositionMgPerM2Day")) {
      assertTrue(
          air.at("/" + dose + "/p10").asDouble() <= air.at("/" + dose + "/median").asDouble());
      assertTrue(
          air.at("/" + dose + "/median").asDouble() <= air.at("/" + dose + "/p90").asDouble());
    }
    List<String> metals = new ArrayList<>();
    for (JsonNode entry : air.get("corrosivity")) {
      metals.add(entry.get("metal").asText());
      double sum = 0;
      for (JsonNode chance : entry.get("categoryProbability")) {
        sum += chance.asDouble();
      }
      assertEquals(1, sum, 0.01);
      assertTrue(entry.get("categoryProbability").has(entry.get("category").asText()));
      assertTrue(entry.at("/firstYearLossUm/median").asDouble() > 0);
    }
    assertEquals(List.of("carbon-steel", "zinc", "copper", "aluminium"), metals);
    assertTrue(air.get("roadSalt").isObject());
    assertTrue(air.get("flags").isArray());
  }

  @Test
  void adviceHasTheAgreedForm() throws Exception {
    Run run =
        run(
            "advise",
            "--postcode",
            "24103",
            "--country",
            "DE",
            "--profile",
            "all-winter-commuter",
            "--json");
    assertEquals(0, run.exitCode(), run.err());
    assertFalse(run.out().contains("NaN") || run.out().contains("Infinity"));
    JsonNode advice = JSON.readTree(run.out());
    assertTrue(advice.get("pairings").size() >= 40);
    double before = Double.POSITIVE_INFINITY;
    for (JsonNode pairing : advice.get("pairings")) {
      for (String part : List.of("rim", "nipple", "interface", "spoke", "limitedBy")) {
        assertTrue(pairing.get(part).isTextual(), part);
      }
      for (String state : List.of("firstAttackMonths", "seizedMonths", "headLossMonths")) {
        JsonNode months = pairing.get(state);
        assertTrue(months.get("part").isTextual());
        boolean open =
            months.path("beyondHorizon").asBoolean() || months.path("notApplicable").asBoolean();
        assertTrue(months.get("p90").isNumber() || open, pairing.toString());
      }
      double first = pairing.get("firstLookMonths").asDouble();
      assertTrue(first >= 1 && first <= 24 && first <= before, "ranked: " + pairing);
      before = first;
      assertTrue(pairing.get("reasons").size() > 0);
    }
    assertTrue(advice.get("cautions").size() > 0);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "3 | advise --place Nowhereburgh --profile all-winter-commuter",
        "2 | advise --postcode '' --country DE --profile all-winter-commuter",
        "3 | advise --postcode 99999 --country DE --profile all-winter-commuter",
        "3 | advise --postcode 1234 --country XX --profile all-winter-commuter",
        "2 | air --at NaN,10",
        "3 | air --at 95,10",
        "2 | air --at 54.3,10.1 --elevation 2026-01-05",
        "3 | air --at 54.9,-30",
        "2 | advise --at 54.3,10.1 --profile nobody",
        "2 | advise --at 54.3,10.1 --profile all-winter-commuter --rim wood",
        "2 | adviser",
        "2 | air",
      })
  void badInputIsToldPlainly(int exitCode, String line) throws Exception {
    Run run = run(line.replace("''", "").split(" "));
    assertEquals(exitCode, run.exitCode(), run.err());
    assertFalse(run.err().isBlank());
    assertFalse(run.err().contains("\tat ") || run.err().contains("Exception"), run.err());
  }

  @Test
  void theServerGivesPageTileSheetAndCalendar() throws Exception {
    Path err = Files.createTempFile(elsewhere, "serve", ".txt");
    Process server = start(null, err, "serve", "--port", "0");
    try (BufferedReader out =
        new BufferedReader(
            new InputStreamReader(server.getInputStream(), StandardCharsets.UTF_8))) {
      String base = out.readLine();
      assertTrue(base != null && base.startsWith("http://127.0.0.1:"), base);
      assertTrue(text(get(base, "")).contains("<html"));
      var tile = ImageIO.read(new ByteArrayInputStream(get(base, "api/tiles/chloride/4/8/5.png")));
      assertEquals(256, tile.getWidth());
      String question =
          "at=54.32,10.13&profile=all-winter-commuter&rim=carbon-bare&nipple=brass-nickel"
              + "&interface=none&spoke=stainless";
      assertTrue(text(get(base, "api/advice.pdf?" + question)).startsWith("%PDF-"));
      assertTrue(text(get(base, "api/advice.ics?" + question)).startsWith("BEGIN:VCALENDAR"));
    } finally {
      server.destroy();
      assertTrue(server.waitFor(30, TimeUnit.SECONDS));
    }
    assertEquals("", Files.readString(err));
  }

  @Test
  void everyLibraryInTheJarHasItsLicenceNamed() throws Exception {
    try (JarFile jar = new JarFile(JAR.toFile())) {
      List<CSVRecord> rows;
      try (Reader in =
          new InputStreamReader(
              jar.getInputStream(jar.getEntry("saltspoke/licences/libraries.csv")),
              StandardCharsets.UTF_8)) {
        rows =
            CSVFormat.DEFAULT
                .builder()
                .setHeader()
                .setSkipHeaderRecord(true)
                .setCommentMarker('#')
                .get()
                .parse(in)
                .getRecords();
      }
      int libraries = 0;
      for (JarEntry entry : Collections.list(jar.entries())) {
        if (entry.getName().matches("META-INF/maven/.*/pom.properties")) {
          Properties library = new Properties();
          library.load(jar.getInputStream(entry));
          String name = library.getProperty("groupId") + ":" + library.getProperty("artifactId");
          if (!name.equals("saltspoke:saltspoke")) {
            libraries++;
            assertTrue(rows.stream().anyMatch(row -> names(row, library)), name);
          }
        }
      }
      assertTrue(libraries > 20);
    }
  }

  private static boolean names(CSVRecord row, Properties library) {
    boolean group =
        Stream.of(row.get("group").split("; "))
            .anyMatch(
                named ->
                    library.getProperty("groupId").equals(named)
                        || library.getProperty("groupId").startsWith(named + "."));
    return group
        && (!row.get("within").isEmpty()
            || row.get("artifact").equals(library.getProperty("artifactId"))
                && row.get("version").equals(library.getProperty("version")));
  }

  private static byte[] get(String base, String path) throws Exception {
    HttpResponse<byte[]> response =
        HttpClient.newHttpClient()
            .send(
                HttpRequest.newBuilder(URI.create(base + path)).build(),
                HttpResponse.BodyHandlers.ofByteArray());
    assertEquals(200, response.statusCode(), path);
    return response.body();
  }

  private static String text(byte[] body) {
    return new String(body, StandardCharsets.ISO_8859_1);
  }
}
