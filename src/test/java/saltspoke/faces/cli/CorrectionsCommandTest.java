package saltspoke.faces.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import saltspoke.faces.Answers;
import saltspoke.faces.LocalCorrections;
import saltspoke.faces.json.Json;
import saltspoke.faces.web.Api;
import saltspoke.faces.web.WebServer;
import saltspoke.fields.DataSet;

/** Measurements → correction file → answers, over the command line and HTTP. */
@Tag("law")
class CorrectionsCommandTest {
  private static final String CHLORIDE =
      "programme,station_id,distance_to_coast_km,elevation_m,wind_speed_m_s,"
          + "saline_wind_fraction,roughness,chloride_mg_m2_day";

  @TempDir Path folder;

  private Path write(String name, String text) throws IOException {
    return Files.writeString(folder.resolve(name), text);
  }

  private Path stations() throws IOException {
    StringBuilder header = new StringBuilder("station,latitude_deg,longitude_deg,elevation_m");
    StringBuilder months = new StringBuilder();
    for (String stem : List.of("temperature_c", "relative_humidity_pct")) {
      for (int m = 1; m <= 12; m++) {
        header.append(String.format(Locale.ROOT, ",%s_%02d", stem, m));
        months.append(stem.startsWith("t") ? "," + (m + 4) : ",71");
      }
    }
    return write(
        "stations.csv",
        header + "\nHill,54.32,10.13,40" + months + "\nHill,54.32,10.13,40" + months + "\n");
  }

  private static JsonNode answer(String... args) throws IOException {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    assertEquals(
        ExitCode.DONE, Main.run(args, new PrintWriter(out), new PrintWriter(err)), err.toString());
    return Json.MAPPER.readTree(out.toString());
  }

  private static JsonNode refusal(int code, String... args) throws IOException {
    StringWriter err = new StringWriter();
    assertEquals(code, Main.run(args, new PrintWriter(new StringWriter()), new PrintWriter(err)));
    return Json.MAPPER.readTree(err.toString());
  }

  @Test
  void whatWasMeasuredIsAnsweredAtTheStation() throws IOException {
    Path file = folder.resolve("local.csv");
    JsonNode written =
        answer(
            "compare",
            "climate",
            stations().toString(),
            "--json",
            "--write-corrections",
            file.toString());
    JsonNode corrections = written.get("corrections");
    assertEquals(24, corrections.get("rows").asInt());
    assertEquals("duplicate-row", corrections.at("/refused/0/error").asText());
    assertEquals("temperature", corrections.at("/leaveOneOut/0/quantity").asText());
    try (Stream<Path> left = Files.list(folder)) {
      assertEquals(2, left.count(), "nothing is left beside the file");
    }
    String[] air = {"air", "--at", "54.32,10.13", "--elevation", "40", "--json"};
    JsonNode plain = answer(air);
    JsonNode moved =
        answer(
            Stream.concat(Stream.of(air), Stream.of("--corrections", file.toString()))
                .toArray(String[]::new));
    for (int m = 0; m < 12; m++) {
      JsonNode month = moved.get("months").get(m);
      assertEquals(m + 5, month.get("temperatureC").asDouble(), 0.4, "month " + (m + 1));
      assertEquals(71, month.get("relativeHumidityPct").asDouble(), 2, "month " + (m + 1));
    }
    assertTrue(moved.get("flags").toString().contains("Hill (0 km)"));
    assertFalse(plain.get("flags").toString().contains("Hill"));
    assertEquals(names(plain), names(moved), "the form of the answer stays");
    StringWriter advice = new StringWriter();
    String[] advise = {
      "advise",
      "--at",
      "54.32,10.13",
      "--profile",
      "trainer-only",
      "--rim",
      "carbon-bare",
      "--nipple",
      "brass-nickel",
      "--interface",
      "none",
      "--spoke",
      "stainless",
      "--corrections",
      file.toString()
    };
    assertEquals(
        ExitCode.DONE,
        Main.run(advise, new PrintWriter(advice), new PrintWriter(new StringWriter())));
    assertTrue(advice.toString().contains("Hill (0 km)"), advice.toString());
  }

  private static List<String> names(JsonNode node) {
    return node.properties().stream().map(java.util.Map.Entry::getKey).toList();
  }

  @Test
  void chlorideNeedsCoordinatesToCorrectAndThenMovesTheAnswer() throws IOException {
    Path without = write("sites.csv", CHLORIDE + "\nP,1,0.5,10,5,1,0.2,80\n");
    String target = folder.resolve("salt.csv").toString();
    JsonNode refused =
        refusal(
            ExitCode.DATA_DAMAGED,
            "compare",
            "chloride",
            without.toString(),
            "--json",
            "--write-corrections",
            target);
    assertEquals("no-coordinates", refused.get("error").asText());
    assertEquals("sites.csv:2 latitude_deg, longitude_deg", refused.get("field").asText());
    assertFalse(Files.exists(Path.of(target)));

    Path with =
        write(
            "placed.csv",
            CHLORIDE + ",latitude_deg,longitude_deg\nP,1,0.5,10,5,1,0.2,80,52.37,4.53\n");
    answer("compare", "chloride", with.toString(), "--json", "--write-corrections", target);
    JsonNode air =
        answer(
            "air",
            "--at",
            "52.37,4.53",
            "--elevation",
            "10",
            "--sea-distance",
            "0.5",
            "--json",
            "--corrections",
            target);
    double ln = Math.log(air.at("/chlorideDepositionMgPerM2Day/median").asDouble() / 80);
    assertEquals(0, ln, 0.3, "within the measurement's own spread");
  }

  @Test
  void filesThatCannotServeAreRefused() throws IOException {
    String missing = folder.resolve("none.csv").toString();
    assertEquals(
        "corrections",
        refusal(ExitCode.NOT_FOUND, "air", "--at", "50,8", "--json", "--corrections", missing)
            .get("field")
            .asText());
    Path stations = stations();
    assertEquals(
        "same-file",
        refusal(
                ExitCode.WRONG_USE,
                "compare",
                "climate",
                stations.toString(),
                "--json",
                "--write-corrections",
                stations.toString())
            .get("error")
            .asText());
    assertEquals(
        "unwritable-file",
        refusal(
                ExitCode.WRONG_USE,
                "compare",
                "climate",
                stations.toString(),
                "--json",
                "--write-corrections",
                folder.resolve("no/such/folder.csv").toString())
            .get("error")
            .asText());
    Path foreign = write("foreign.csv", "site,amount\nA,2\n");
    assertEquals(
        "foreign.csv:2 quantity",
        refusal(
                ExitCode.DATA_DAMAGED,
                "air",
                "--at",
                "50,8",
                "--json",
                "--corrections",
                foreign.toString())
            .get("field")
            .asText());
  }

  @Test
  void theServerStatesItsFileAndAnswersByIt() throws Exception {
    Path file = folder.resolve("local.csv");
    answer(
        "compare",
        "climate",
        stations().toString(),
        "--json",
        "--write-corrections",
        file.toString());
    try (WebServer server =
        Api.server(0, new Answers(DataSet.shipped(), LocalCorrections.read(file)))) {
      String base = server.start();
      JsonNode about = get(base + "api/about").get("corrections");
      assertEquals("local.csv", about.get("file").asText());
      assertEquals(24, about.get("rows").asInt());
      assertEquals(1, about.get("sites").asInt());
      assertTrue(
          get(base + "api/air?at=54.32,10.13&elevation=40").toString().contains("Hill (0 km)"));
    }
  }

  private static JsonNode get(String address) throws Exception {
    return Json.MAPPER.readTree(
        HttpClient.newHttpClient()
            .send(
                HttpRequest.newBuilder(URI.create(address)).build(),
                HttpResponse.BodyHandlers.ofString())
            .body());
  }
}
