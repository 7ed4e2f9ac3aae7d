package saltspoke.sources;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.zip.GZIPOutputStream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.apache.commons.compress.archivers.ar.ArArchiveEntry;
import org.apache.commons.compress.archivers.ar.ArArchiveOutputStream;
import org.apache.commons.compress.archivers.tar.TarArchiveEntry;
import org.apache.commons.compress.archivers.tar.TarArchiveOutputStream;
import org.apache.commons.compress.compressors.xz.XZCompressorOutputStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import saltspoke.values.Refusal;

@Tag("law")
class SourcePackagesTest {
  private static final byte[] CONTENT = "salt".getBytes(StandardCharsets.US_ASCII);
  private static final List<SourcePackage> DECLARED =
      List.of(
          declared("n", Registry.NPM, "nodes.json", "1.2.3"),
          declared("d", Registry.DEBIAN, "deb-data", "22.1-3"),
          declared("p", Registry.PYPI, "py_thing", "0.4.0"),
          declared("m", Registry.MAVEN, "org.some:thing", "13.1"));

  @TempDir Path folder;

  private static SourcePackage declared(String id, Registry registry, String name, String version) {
    return new SourcePackage(id, registry, name, version, "licence", "who", "");
  }

  private static void tar(OutputStream out, String path) throws IOException {
    TarArchiveOutputStream tar = new TarArchiveOutputStream(out);
    TarArchiveEntry entry = new TarArchiveEntry(path);
    entry.setSize(CONTENT.length);
    tar.putArchiveEntry(entry);
    tar.write(CONTENT);
    tar.closeArchiveEntry();
    tar.finish();
  }

  private void npm(String fileName) throws IOException {
    try (OutputStream out = new GZIPOutputStream(Files.newOutputStream(folder.resolve(fileName)))) {
      tar(out, "package/data/a.txt");
    }
  }

  private void deb(String fileName) throws IOException {
    ByteArrayOutputStream data = new ByteArrayOutputStream();
    try (OutputStream xz = new XZCompressorOutputStream(data)) {
      tar(xz, "./usr/share/data/a.txt");
    }
    try (ArArchiveOutputStream ar =
        new ArArchiveOutputStream(Files.newOutputStream(folder.resolve(fileName)))) {
      for (String name : List.of("debian-binary", "data.tar.xz")) {
        byte[] bytes =
            name.startsWith("data")
                ? data.toByteArray()
                : "2.0\n".getBytes(StandardCharsets.US_ASCII);
        ar.putArchiveEntry(new ArArchiveEntry(name, bytes.length));
        ar.write(bytes);
        ar.closeArchiveEntry();
      }
    }
  }

  private void zip(String fileName) throws IOException {
    try (ZipOutputStream zip =
        new ZipOutputStream(Files.newOutputStream(folder.resolve(fileName)))) {
      zip.putNextEntry(new ZipEntry("some/data/a.txt"));
      zip.write(CONTENT);
    }
  }

  @Test
  void readsEveryKindOfArchiveAndRemembersWhichWereUsed() throws IOException {
    npm("nodes.json-1.2.3.tgz");
    deb("deb-data_4%3a22.1-3_all.deb");
    zip("py_thing-0.4.0-py2.py3-none-any.whl");
    zip("thing-13.1.jar");
    SourcePackages packages = SourcePackages.in(folder, DECLARED);
    SourcePackages view = packages.freshView();
    for (String id : List.of("n", "d", "m")) {
      assertArrayEquals(CONTENT, view.bytes(id, "data/a.txt"), id);
    }
    assertEquals(Set.of("n", "d", "m"), view.used());
    assertTrue(packages.used().isEmpty());
    assertArrayEquals(CONTENT, packages.bytes("p", "a.txt"));
  }

  @Test
  void namesTheEntryThatIsNotThere() throws IOException {
    npm("nodes.json-1.2.3.tgz");
    SourcePackages packages = SourcePackages.in(folder, DECLARED);
    Refusal refusal = assertThrows(Refusal.class, () -> packages.bytes("n", "b.txt"));
    assertTrue(refusal.field().contains("b.txt"), refusal.field());
    assertFalse(packages.has("d"));
    assertThrows(Refusal.class, () -> packages.bytes("d", "a.txt"));
  }

  @Test
  void takesAnotherVersionWhenItIsTheOnlyOne() throws IOException {
    npm("nodes.json-2.0.0.tgz");
    assertEquals("2.0.0", SourcePackages.in(folder, DECLARED).get("n").version());
    npm("nodes.json-3.0.0.tgz");
    assertThrows(Refusal.class, () -> SourcePackages.in(folder, DECLARED));
    npm("nodes.json-1.2.3.tgz");
    assertEquals("1.2.3", SourcePackages.in(folder, DECLARED).get("n").version());
  }

  @Test
  void knowsFileNamesOfEachRegistry() {
    assertEquals("0.4.0", DECLARED.get(2).versionIn("py-thing-0.4.0.tar.gz"));
    assertEquals("22.1-3", DECLARED.get(1).versionIn("deb-data_22.1-3_all.deb"));
    assertNull(DECLARED.get(0).versionIn("other-nodes.json-1.2.3.tgz"));
    assertNull(DECLARED.get(3).versionIn("thing-else-13.1.jar"));
  }

  @Test
  void refusesArchivesThatBreakOff() throws IOException {
    npm("nodes.json-1.2.3.tgz");
    deb("deb-data_22.1-3_all.deb");
    zip("thing-13.1.jar");
    SourcePackages packages = SourcePackages.in(folder, DECLARED);
    for (String id : List.of("n", "d", "m")) {
      Path file = packages.get(id).file();
      byte[] whole = Files.readAllBytes(file);
      Files.write(file, Arrays.copyOf(whole, whole.length / 2));
      Refusal refusal = assertThrows(Refusal.class, () -> packages.bytes(id, "a.txt"), id);
      assertEquals(Refusal.Kind.DATA_DAMAGED, refusal.kind());
      assertTrue(refusal.field().contains(file.getFileName().toString()), refusal.field());
    }
  }

  @Test
  void everyDeclaredPackageHasItsTerms() {
    assertFalse(SourcePackage.declared().isEmpty());
    for (SourcePackage one : SourcePackage.declared()) {
      assertFalse(one.licence().isBlank() || one.attribution().isBlank(), one.id());
      assertTrue(one.howToFetch().contains(one.version()), one.howToFetch());
    }
  }
}
