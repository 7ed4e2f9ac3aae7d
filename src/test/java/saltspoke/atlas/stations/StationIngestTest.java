package saltspoke.atlas.stations;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import saltspoke.atmosphere.MonthlyClimate;
import saltspoke.fields.DataSet;
import saltspoke.sources.CsvTable;
import saltspoke.sources.hourly.HourlyFormats;
import saltspoke.sources.hourly.StationList;
import saltspoke.values.Refusal;

@Tag("law")
class StationIngestTest {
  private static StationWorld world;

  @TempDir Path folder;

  @BeforeAll
  static void open() {
    world =
        new StationWorld(
            MonthlyClimate.from(DataSet.in(Path.of("climate-data"))), (lat, lon) -> 200);
  }

  private static HourlyFormats formats() {
    return HourlyFormats.published(StationList.NONE)
        .with(
            new ByteArrayInputStream(InventedArchive.MAPPING.getBytes(StandardCharsets.UTF_8)),
            "mapping.csv");
  }

  private StationIngest.Result ingest(Path archive, String into, int threads) throws IOException {
    return ingest(archive, into, threads, new ArrayList<>());
  }

  private StationIngest.Result ingest(Path archive, String into, int threads, List<String> said)
      throws IOException {
    return new StationIngest(
            new StationIngest.Request(
                List.of(archive), folder.resolve(into), formats(), "s", "invented", 1, threads),
            (done, total, what) -> said.add(done + "/" + total + " " + what))
        .run(world);
  }

  /** All bytes of a folder by name. */
  static Map<String, String> bytes(Path dir) throws IOException {
    Map<String, String> bytes = new TreeMap<>();
    try (Stream<Path> walk = Files.walk(dir)) {
      for (Path file : walk.filter(Files::isRegularFile).toList()) {
        bytes.put(
            dir.relativize(file).toString(),
            new String(Files.readAllBytes(file), StandardCharsets.ISO_8859_1));
      }
    }
    return bytes;
  }

  @Test
  void theSameArchiveGivesTheSameBytesWhateverTheThreads() throws IOException {
    Path archive = InventedArchive.write(folder.resolve("in"), 3, 2);
    List<String> said = new ArrayList<>();
    StationIngest.Result one = ingest(archive, "one", 1, said);
    assertEquals(6, one.files());
    assertEquals(6 * 8760, one.rows());
    assertEquals(3, one.used());
    assertTrue(said.get(said.size() - 1).matches("6/6 52,560 rows, .* a second, about 0 s left"));
    ingest(archive, "many", 5);
    assertEquals(bytes(folder.resolve("one")), bytes(folder.resolve("many")));
    ingest(archive, "one", 2);
    assertEquals(bytes(folder.resolve("many")), bytes(folder.resolve("one")), "and once more");
    try (Stream<Path> left = Files.list(folder)) {
      assertEquals(
          List.of("in", "many", "mapping.csv", "one"),
          left.map(p -> p.getFileName().toString()).sorted().toList());
    }
  }

  @Test
  void aZipIsItsFilesAndABadOneIsSetAside() throws IOException {
    Path archive = InventedArchive.write(folder.resolve("in"), 2, 1);
    Path zip = folder.resolve("in.zip");
    try (ZipOutputStream out = new ZipOutputStream(Files.newOutputStream(zip))) {
      try (Stream<Path> files = Files.list(archive)) {
        for (Path file : files.sorted().toList()) {
          out.putNextEntry(new ZipEntry(file.getFileName().toString()));
          out.write(Files.readAllBytes(file));
        }
      }
      out.putNextEntry(new ZipEntry("bad.csv"));
      out.write("station,lat\nx,1\n".getBytes(StandardCharsets.UTF_8));
    }
    StationIngest.Result result = ingest(zip, "set", 2);
    assertEquals(3, result.files());
    assertEquals(1, result.setAsideCount());
    assertEquals("missing-column", result.setAside().get(0).error());
    assertTrue(result.setAside().get(0).field().startsWith("in.zip/bad.csv:1 "));
    StationDataSet set = StationDataSet.open(folder.resolve("set"));
    assertEquals(2, set.used());
    assertEquals(1, set.setAside());
    assertEquals(2 * 12 * 3, set.corrections().size());
  }

  @Test
  void anotherIngestAtOnceIsToldAndTheFirstGoesOn() throws IOException {
    Path archive = InventedArchive.write(folder.resolve("in"), 1, 1);
    try (IngestJournal held = IngestJournal.open(folder.resolve("set.work"), "s")) {
      Refusal busy = assertThrows(Refusal.class, () -> ingest(archive, "set", 1));
      assertEquals("busy-data-set", busy.error());
      assertFalse(held.has("x"));
    }
    assertEquals(1, ingest(archive, "set", 1).used());
  }

  @Test
  void aTornJournalIsCutAndGoneOnWith() throws IOException {
    Path work = folder.resolve("w");
    FileOutcome outcome =
        new FileReading(formats())
            .read(
                "a",
                () ->
                    Files.newInputStream(
                        InventedArchive.write(folder.resolve("in"), 1, 1)
                            .resolve("../mapping.csv")));
    try (IngestJournal journal = IngestJournal.open(work, "s")) {
      journal.add("a", outcome);
      journal.add("b", outcome);
    }
    Path file = work.resolve("journal");
    byte[] whole = Files.readAllBytes(file);
    for (int cut = whole.length - 1; cut > whole.length / 2 + 40; cut -= 7) {
      Files.write(file, java.util.Arrays.copyOf(whole, cut));
      try (IngestJournal journal = IngestJournal.open(work, "s")) {
        assertTrue(journal.has("a"));
        assertFalse(journal.has("b"));
        assertEquals(
            outcome.refusal().orElseThrow().field(),
            journal.get("a").refusal().orElseThrow().field());
      }
    }
    try (IngestJournal other = IngestJournal.open(work, "another setting")) {
      assertFalse(other.has("a"));
    }
  }

  @Test
  void scatteredRowsAreRefusedByLine() throws IOException {
    String head = "station,lat,lon,elev,time,t,td,dir,speed\n";
    String a = "A,50,8,100,2001-01-01T00:00,1,0,90,1\n";
    String b = "B,50,8,100,2001-01-01T00:00,1,0,90,1\n";
    FileOutcome outcome =
        new FileReading(formats())
            .read(
                "x.csv",
                () ->
                    new ByteArrayInputStream((head + a + b + a).getBytes(StandardCharsets.UTF_8)));
    Refusal refusal = outcome.refusal().orElseThrow();
    assertEquals("scattered-rows", refusal.error());
    assertEquals("x.csv:4 station", refusal.field());
  }

  @Test
  void nothingForeignIsOverwrittenOrRemoved() throws IOException {
    Path archive = InventedArchive.write(folder.resolve("in"), 1, 1);
    Refusal refusal = assertThrows(Refusal.class, () -> ingest(archive, "in", 1));
    assertEquals("not-a-data-folder", refusal.error());
    assertThrows(Refusal.class, () -> StationDataSet.remove(Path.of("climate-data")));
    ingest(archive, "set", 1);
    Files.writeString(folder.resolve("set/note.txt"), "mine");
    StationDataSet.remove(folder.resolve("set"));
    try (Stream<Path> left = Files.list(folder.resolve("set"))) {
      assertEquals(List.of(folder.resolve("set/note.txt")), left.toList());
    }
  }

  @Test
  void whatTwoFilesHaveCountsOnce() throws IOException {
    Path archive = InventedArchive.write(folder.resolve("in"), 1, 1);
    StationIngest.Result one = ingest(archive, "one", 1);
    Files.copy(archive.resolve("S00-2001.csv.gz"), archive.resolve("again.csv.gz"));
    ingest(archive, "two", 1);
    StationDataSet.Difference difference =
        StationDataSet.open(folder.resolve("one"))
            .compare(StationDataSet.open(folder.resolve("two")));
    assertEquals(new StationDataSet.Difference(12, 0, 0, 0, 0, 0), difference);
    assertEquals(1, one.used());
    List<CsvTable.Row> quality = DataSet.in(folder.resolve("two")).rows(StationTables.QUALITY);
    assertEquals(12, quality.get(1).number("months_elsewhere"));
  }
}
