package saltspoke.faces.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import saltspoke.faces.json.Json;

/** A real station year → data set → answers, over the command line. */
@Tag("law")
class StationsCommandTest {
  private static final String ISD = "src/test/resources/reference/noaa-isd-lite/725300-2015.gz";

  @TempDir Path folder;

  private static String run(int expected, String... args) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int code = Main.run(args, new PrintWriter(out), new PrintWriter(err));
    assertEquals(expected, code, err.toString());
    return expected == ExitCode.DONE ? out.toString() : err.toString();
  }

  private String ingested() throws IOException {
    Path list = folder.resolve("list.csv");
    Files.writeString(
        list,
        "station,name,latitude_deg,longitude_deg,elevation_m\n"
            + "725300,Chicago O'Hare,41.995,-87.934,204.8\n");
    String set = folder.resolve("chicago").toString();
    String said =
        run(
            ExitCode.DONE,
            "ingest",
            "stations",
            ISD,
            "--station-list",
            list.toString(),
            "--least-years",
            "1",
            "--into",
            set);
    assertTrue(said.contains("1 files, 8,758 rows, 1 station years of 1 stations"), said);
    return set;
  }

  @Test
  void theAnswerAtTheStationIsWhatItMeasured() throws IOException {
    String set = ingested();
    List<String> air =
        new ArrayList<>(List.of("air", "--at", "41.995,-87.934", "--elevation", "204.8", "--json"));
    JsonNode plain = Json.MAPPER.readTree(run(ExitCode.DONE, air.toArray(String[]::new)));
    air.addAll(List.of("--stations", set));
    JsonNode moved = Json.MAPPER.readTree(run(ExitCode.DONE, air.toArray(String[]::new)));
    // Counted from the file by a few lines of another language: RH from the dew point, > 80 %, > 0
    // °C.
    int[] wetHours = {55, 25, 73, 132, 246, 268, 202, 231, 274, 214, 190, 352};
    double[] humidity = {
      73.568, 67.769, 63.830, 58.800, 68.272, 72.875, 68.034, 68.532, 71.139, 67.125, 71.945, 81.469
    };
    double wet = 0;
    double measured = 0;
    for (int m = 0; m < 12; m++) {
      JsonNode month = moved.get("months").get(m);
      assertEquals(
          humidity[m], month.get("relativeHumidityPct").asDouble(), 1.5, "month " + (m + 1));
      wet += month.get("wetHours").asDouble();
      measured += wetHours[m];
    }
    assertEquals(measured, wet, 0.05 * measured);
    String flags = moved.get("flags").toString();
    assertTrue(flags.contains("Chicago O'Hare (0 km)"), flags);
    assertTrue(flags.contains("air-stations-unjudged"), flags);
    assertTrue(flags.contains("air-corrected-wet-hours"), flags);
    assertFalse(plain.get("flags").toString().contains("Chicago"));
  }

  @Test
  void dataSetsAreListedComparedAndRemoved() throws IOException {
    String set = ingested();
    String listed = run(ExitCode.DONE, "datasets", "list", folder.toString());
    assertTrue(listed.contains("chicago: 1 stations in use, 1 station years"), listed);
    String compared = run(ExitCode.DONE, "datasets", "compare", set, set);
    assertTrue(compared.contains("12 station months in both, 0 only in"), compared);
    assertTrue(compared.contains("+0.000 K"), compared);
    run(ExitCode.DONE, "datasets", "remove", set);
    assertFalse(Files.exists(Path.of(set)));
    String gone = run(ExitCode.NOT_FOUND, "air", "--at", "42,-88", "--stations", set, "--json");
    assertEquals("no-station-data-set", Json.MAPPER.readTree(gone).get("error").asText());
    run(ExitCode.NOT_FOUND, "datasets", "remove", "climate-data");
  }

  @Test
  void wrongUseIsTold() throws IOException {
    String into = folder.resolve("x").toString();
    run(ExitCode.NOT_FOUND, "ingest", "stations", into + "none", "--into", into);
    run(ExitCode.NOT_FOUND, "ingest", "stations", ISD, "--least-years", "0", "--into", into);
    String unknown = run(ExitCode.DATA_DAMAGED, "ingest", "stations", ISD, "--into", into);
    assertTrue(unknown.contains("unknown station") && unknown.contains("--station-list"), unknown);
    assertFalse(Files.exists(Path.of(into)) || Files.exists(Path.of(into + ".work")));
    run(ExitCode.WRONG_USE, "air", "--at", "42,-88", "--stations", into, "--corrections", ISD);
  }
}
