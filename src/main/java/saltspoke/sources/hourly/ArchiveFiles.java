package saltspoke.sources.hourly;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import java.util.zip.GZIPInputStream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import saltspoke.values.Refusal;

/**
 * The files of an archive: single files, folders with all below them, and the members of zip files.
 * Each opens unpacked; gzip is told by its first two bytes (RFC 1952), zip by its name.
 */
public final class ArchiveFiles {
  private static final int BUFFER = 1 << 16;

  private ArchiveFiles() {}

  /**
   * One file.
   *
   * @param name its path below the archive that was named, with forward slashes
   * @param bytes size as it lies there, packed
   * @param changedMillis when it was last changed, so that a new version is told from the old
   */
  public record Item(String name, Path file, String member, long bytes, long changedMillis) {
    /**
     * Its content, unpacked.
     *
     * @throws Refusal when it cannot be opened
     */
    public InputStream open() {
      try {
        return gunzipped(member.isEmpty() ? Files.newInputStream(file) : zipMember());
      } catch (IOException e) {
        throw Refusal.dataDamaged(
            "unreadable-file", name + ":1 file", e.getMessage(), "a whole file that can be read");
      }
    }

    private InputStream zipMember() throws IOException {
      ZipFile zip = new ZipFile(file.toFile());
      InputStream in = zip.getInputStream(zip.getEntry(member));
      return new BufferedInputStream(in, BUFFER) {
        @Override
        public void close() throws IOException {
          super.close();
          zip.close();
        }
      };
    }

    private static InputStream gunzipped(InputStream raw) throws IOException {
      BufferedInputStream in = new BufferedInputStream(raw, BUFFER);
      in.mark(2);
      boolean gzip = in.read() == 0x1f && in.read() == 0x8b;
      in.reset();
      return gzip ? new GZIPInputStream(in, BUFFER) : in;
    }
  }

  /**
   * Lists archives, each file once, sorted by name.
   *
   * @throws Refusal when one is not there
   */
  public static List<Item> list(List<Path> archives) throws IOException {
    List<Item> items = new ArrayList<>();
    for (Path archive : archives) {
      if (Files.isDirectory(archive)) {
        try (Stream<Path> walk = Files.walk(archive)) {
          for (Path file : walk.filter(Files::isRegularFile).sorted().toList()) {
            add(items, file, archive.relativize(file).toString().replace('\\', '/'));
          }
        }
      } else if (Files.isRegularFile(archive)) {
        add(items, archive, archive.getFileName().toString());
      } else {
        throw Refusal.notFound(
            "unreadable-file", "ARCHIVE", archive, "a file or folder that can be read");
      }
    }
    items.sort(Comparator.comparing(Item::name));
    return items;
  }

  private static void add(List<Item> items, Path file, String name) throws IOException {
    long changed = Files.getLastModifiedTime(file).toMillis();
    if (!name.toLowerCase(Locale.ROOT).endsWith(".zip")) {
      items.add(new Item(name, file, "", Files.size(file), changed));
      return;
    }
    try (ZipFile zip = new ZipFile(file.toFile())) {
      zip.stream()
          .filter(entry -> !entry.isDirectory())
          .sorted(Comparator.comparing(ZipEntry::getName))
          .forEach(
              entry ->
                  items.add(
                      new Item(
                          name + "/" + entry.getName(),
                          file,
                          entry.getName(),
                          Math.max(0, entry.getCompressedSize()),
                          changed)));
    } catch (IOException e) {
      // Opening it later fails alike and sets it aside with its reason.
      items.add(new Item(name, file, "", Files.size(file), changed));
    }
  }
}
