package saltspoke.fields;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import saltspoke.fields.build.GeoTiffExport;
import saltspoke.sources.LayerBuilder;
import saltspoke.sources.LayerFile;
import saltspoke.sources.LayerSink;
import saltspoke.sources.Registry;
import saltspoke.sources.SourcePackage;
import saltspoke.sources.SourcePackages;
import saltspoke.values.Refusal;

/** A small world: built, built again, damaged in every way. */
@Tag("law")
class DataFolderTest {
  private static final SourcePackage PACKAGE =
      new SourcePackage("pack", Registry.PYPI, "pack", "1.0", "CC0-1.0", "who", "mind, \"this\"");
  private static final String TABLE =
      "# title: A table\n# license: CC0-1.0\n# attribution: us\n# note: one\n# note: two\na,b\n1,2\n";

  @TempDir Path temp;
  private Path sources;
  private Path target;

  /** Writes one raster and one packed text. */
  private static class SmallBuilder implements LayerBuilder {
    @Override
    public String id() {
      return "small";
    }

    @Override
    public List<String> needs() {
      return List.of("pack");
    }

    @Override
    public void build(SourcePackages in, LayerSink out) throws IOException {
      byte[] text = in.bytes("pack", "a.txt");
      Field field = new Field(Grid.of(1, 2, 1, 1, 2, 2), "m", new float[] {1, 2, 3, Float.NaN});
      try (OutputStream file = out.file(file("height", "h/height.tif", List.of("height")))) {
        file.write(GeoTiffExport.write(new FieldStack("height", List.of(field)), "height"));
      }
      try (OutputStream file = out.file(file("text", "t/text.txt.gz", List.of()))) {
        file.write(text);
      }
    }

    private static LayerFile file(String layer, String path, List<String> bands) {
      return new LayerFile(
          layer, path, "Title, " + layer, "m", "2000", bands, "CC0-1.0", "who", "");
    }
  }

  @BeforeEach
  void lay() throws IOException {
    sources = Files.createDirectories(temp.resolve("sources"));
    target = temp.resolve("world");
    Files.createDirectories(target.resolve("tables"));
    Files.writeString(target.resolve("tables/kept.csv"), TABLE);
    try (ZipOutputStream zip =
        new ZipOutputStream(Files.newOutputStream(sources.resolve("pack-1.0-py3-none-any.whl")))) {
      zip.putNextEntry(new ZipEntry("pack/a.txt"));
      zip.write("salt".getBytes(StandardCharsets.US_ASCII));
    }
  }

  private Manifest ingest(Path into, LayerBuilder... builders) throws IOException {
    return new DefaultIngest(
            List.of(builders), List.of(PACKAGE), () -> DataHome.folder(temp.resolve("none")))
        .run(sources, into, (done, total, what) -> {});
  }

  private static TreeMap<String, String> contents(Path folder) throws IOException {
    TreeMap<String, String> contents = new TreeMap<>();
    try (Stream<Path> walk = Files.walk(folder)) {
      for (Path file : walk.filter(Files::isRegularFile).toList()) {
        contents.put(folder.relativize(file).toString(), Checksum.of(file));
      }
    }
    return contents;
  }

  @Test
  void buildsTheSameBytesTwiceAndReadsThemBack() throws IOException {
    Manifest manifest = ingest(target, new SmallBuilder());
    TreeMap<String, String> first = contents(target);
    ingest(target, new SmallBuilder());
    assertEquals(first, contents(target));
    try (Stream<Path> left = Files.list(temp)) {
      assertEquals(2, left.count(), "something was left beside the folder");
    }

    DataSet data = DataSet.in(target);
    assertEquals(manifest, data.manifest());
    assertEquals(List.of("pack"), manifest.get("height").sources());
    assertEquals("mind, \"this\"", manifest.sources().get(0).notice());
    assertEquals("one; two", manifest.get("kept").notice());
    assertEquals("2", data.rows("kept").get(0).text("b"));
    assertArrayEquals("salt".getBytes(StandardCharsets.US_ASCII), data.open("text").readAllBytes());
    assertEquals(0x1f, data.openStored("text").read());
    FieldStack height = data.stack("height");
    assertSame(height, data.stack("height"));
    assertEquals("m", height.band(0).unit());
    assertEquals(2, height.sample(0, 1, 3));
    assertTrue(Double.isNaN(height.band(0).at(1, 1)));
    assertEquals(Grid.of(1, 2, 1, 1, 2, 2), height.band(0).grid());
  }

  @Test
  void namesEveryMissingOrDamagedFileAndTheMend() throws IOException {
    ingest(target, new SmallBuilder());
    Path raster = target.resolve("h/height.tif");
    byte[] good = Files.readAllBytes(raster);
    byte[] flipped = good.clone();
    flipped[good.length / 2] ^= 1;
    Files.write(raster, flipped);
    assertDamage("h/height.tif has another content");
    Files.write(raster, Arrays.copyOf(good, good.length - 1));
    assertDamage("h/height.tif has " + (good.length - 1) + " bytes instead of " + good.length);
    Files.delete(raster);
    Files.delete(target.resolve("t/text.txt.gz"));
    assertDamage("h/height.tif is missing; t/text.txt.gz is missing");
    Files.delete(target.resolve("manifest.csv"));
    assertDamage("manifest.csv is missing");
  }

  private void assertDamage(String words) {
    Refusal refusal = assertThrows(Refusal.class, () -> DataSet.in(target));
    assertEquals(Refusal.Kind.DATA_DAMAGED, refusal.kind());
    assertTrue(refusal.was().contains(words), refusal.was());
    assertTrue(refusal.allowed().contains("ingest default"), refusal.allowed());
  }

  @Test
  void namesTheLayersWhenOneIsUnknown() throws IOException {
    ingest(target, new SmallBuilder());
    DataSet data = DataSet.in(target);
    assertFalse(data.has("depth"));
    Refusal refusal = assertThrows(Refusal.class, () -> data.stack("depth"));
    assertTrue(refusal.allowed().contains("height"), refusal.allowed());
  }

  @Test
  void namesMissingPackagesWithTheWayToFetchThem() throws IOException {
    Files.delete(sources.resolve("pack-1.0-py3-none-any.whl"));
    Refusal refusal = assertThrows(Refusal.class, () -> ingest(target, new SmallBuilder()));
    assertTrue(refusal.allowed().contains("pip download --no-deps pack==1.0"), refusal.allowed());
    assertFalse(Files.exists(target.resolve("manifest.csv")));
  }

  @Test
  void takesTheFallBackAndNotesIt() throws IOException {
    Files.delete(sources.resolve("pack-1.0-py3-none-any.whl"));
    Manifest manifest =
        ingest(
            target,
            new SmallBuilder() {
              @Override
              public Optional<String> fallBack() {
                return Optional.of("the world is smaller");
              }
            });
    assertEquals(List.of("small left out, without pack: the world is smaller"), manifest.notes());
    assertEquals(manifest, DataSet.in(target).manifest());
  }

  @Test
  void aBrokenRunLeavesTheOldFolderAsItWas() throws IOException {
    ingest(target, new SmallBuilder());
    TreeMap<String, String> before = contents(target);
    LayerBuilder broken =
        new SmallBuilder() {
          @Override
          public void build(SourcePackages in, LayerSink out) throws IOException {
            super.build(in, out);
            throw new IOException("disk full");
          }
        };
    assertThrows(IOException.class, () -> ingest(target, broken));
    assertEquals(before, contents(target));
    try (Stream<Path> left = Files.list(temp)) {
      assertEquals(2, left.count(), "something was left beside the folder");
    }
  }

  /** A killed run leaves its half-written folder beside the old one, and nothing else. */
  @Test
  void whatAKilledRunLeftIsInNobodysWay() throws IOException {
    ingest(target, new SmallBuilder());
    TreeMap<String, String> before = contents(target);
    Path half = Files.createDirectories(temp.resolve("world.new-1").resolve("h"));
    Files.writeString(half.resolve("height.tif"), "half");
    assertEquals(2, DataSet.in(target).stack("height").band(0).grid().rows());
    ingest(target, new SmallBuilder());
    assertEquals(before, contents(target));
  }

  @Test
  void keepsFilesThatAreNotItsOwnAndSpareFolders() throws IOException {
    ingest(target, new SmallBuilder());
    Files.writeString(target.resolve("mine.txt"), "mine");
    ingest(target, new SmallBuilder());
    assertEquals("mine", Files.readString(target.resolve("mine.txt")));
    Path photos = Files.createDirectories(temp.resolve("photos"));
    Files.writeString(photos.resolve("cat.txt"), "cat");
    assertThrows(Refusal.class, () -> ingest(photos, new SmallBuilder()));
    assertEquals("cat", Files.readString(photos.resolve("cat.txt")));
  }

  @Test
  void registersChangedTablesAndRefusesTablesWithoutHead() throws IOException {
    ingest(target, new SmallBuilder());
    Files.writeString(target.resolve("tables/kept.csv"), TABLE + "3,4\n");
    assertDamage("tables/kept.csv has");
    DefaultIngest.registerTables(target);
    assertEquals(2, DataSet.in(target).rows("kept").size());
    Files.writeString(target.resolve("tables/bare.csv"), "a,b\n1,2\n");
    Refusal refusal = assertThrows(Refusal.class, () -> DefaultIngest.registerTables(target));
    assertEquals("tables/bare.csv", refusal.field());
  }
}
