package saltspoke.atlas.stations;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import saltspoke.faces.cli.Main;

/**
 * Kills an ingest that replaces an old data set, at random moments: the data set opens every time
 * and is the old or the new one, and the run that goes on ends with the bytes of an undisturbed
 * one. How often: {@code -Dsaltspoke.kills=100} (4).
 */
@Tag("law")
class IngestKillsTest {
  private static final int KILLS = Integer.getInteger("saltspoke.kills", 4);

  @TempDir Path folder;

  private Process start(Path archive, Path into) throws IOException {
    return new ProcessBuilder(
            Path.of(System.getProperty("java.home"), "bin", "java").toString(),
            "-XX:TieredStopAtLevel=1",
            "-cp",
            System.getProperty("java.class.path"),
            Main.class.getName(),
            "ingest",
            "stations",
            archive.toString(),
            "--mapping",
            folder.resolve("mapping.csv").toString(),
            "--least-years",
            "1",
            "--attribution",
            "invented",
            "--data",
            new File("climate-data").getAbsolutePath(),
            "--into",
            into.toString())
        .redirectErrorStream(true)
        .redirectOutput(folder.resolve("log.txt").toFile())
        .start();
  }

  private void run(Path archive, Path into) throws Exception {
    int code = start(archive, into).waitFor();
    assertEquals(0, code, () -> log());
  }

  private String log() {
    try {
      return Files.readString(folder.resolve("log.txt"));
    } catch (IOException e) {
      return e.getMessage();
    }
  }

  private static Map<String, String> dataSet(Path set) throws IOException {
    StationDataSet opened = StationDataSet.open(set);
    Map<String, String> bytes = StationIngestTest.bytes(set);
    List<String> named = opened.manifest().files().stream().map(file -> file.path()).toList();
    bytes.keySet().removeIf(name -> !named.contains(name) && !name.equals("manifest.csv"));
    return bytes;
  }

  @Test
  @Timeout(value = 60, unit = TimeUnit.MINUTES)
  void theDataSetIsAlwaysTheOldOrTheNewOne() throws Exception {
    Path small = InventedArchive.write(folder.resolve("small"), 1, 1);
    Path large = InventedArchive.write(folder.resolve("large"), 6, 6);
    Path set = folder.resolve("set");
    Path undisturbed = folder.resolve("undisturbed");
    run(small, set);
    Map<String, String> old = dataSet(set);
    long begin = System.nanoTime();
    run(large, undisturbed);
    long wholeMs = TimeUnit.NANOSECONDS.toMillis(System.nanoTime() - begin);
    Map<String, String> whole = StationIngestTest.bytes(undisturbed);
    Random random = new Random(100);
    int killed = 0;
    int ended = 0;
    while (killed < KILLS) {
      Process process = start(large, set);
      // A little beyond the end too, so that the swap and the sweep are met as well.
      boolean over =
          process.waitFor((long) (1.1 * wholeMs * random.nextDouble()), TimeUnit.MILLISECONDS);
      process.destroyForcibly().waitFor();
      Map<String, String> now = dataSet(set);
      boolean isNew = now.equals(whole);
      assertTrue(isNew || now.equals(old), "neither old nor new after kill " + killed);
      ended += over ? 1 : 0;
      killed += over ? 0 : 1;
      assertTrue(ended < 10 * KILLS, "the runs end before they can be killed");
      if (isNew || killed % 3 == 0) {
        // Now and then to the end, on what the killed runs left.
        run(large, set);
        assertEquals(whole, StationIngestTest.bytes(set), "after kill " + killed);
        run(small, set);
        assertEquals(old, StationIngestTest.bytes(set));
      }
    }
    run(large, set);
    assertEquals(whole, StationIngestTest.bytes(set));
  }
}
