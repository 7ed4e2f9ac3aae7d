package saltspoke.fields;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import saltspoke.sources.LayerSink;
import saltspoke.values.Refusal;

/**
 * A data folder that changes from one content to the next in one step. Each file carries the
 * beginning of its SHA-256 in its name, so that old and new ones lie side by side; the manifest
 * that names them is replaced by one atomic move. Whoever opens the folder, even after a kill at
 * any moment, finds the old content or the new one.
 */
public final class PublishedFolder {
  private static final int HASH_LETTERS = 12;

  private PublishedFolder() {}

  /** Writes the content. */
  public interface Content {
    void write(LayerSink sink) throws IOException;
  }

  /**
   * Writes new content aside and publishes it.
   *
   * @param folder the data folder; made when it is not there
   * @param aside a folder on the same disk for files that are not finished
   * @throws Refusal when the folder holds something else than published content
   */
  public static Manifest publish(Path folder, Path aside, Content content) throws IOException {
    refuseOther(folder);
    Files.createDirectories(aside);
    List<String> notes = new ArrayList<>();
    FolderSink sink = new FolderSink(aside, notes::add);
    content.write(sink);
    Files.createDirectories(folder);
    List<Manifest.Entry> files = new ArrayList<>();
    for (Manifest.Entry written : sink.entries(Set.of())) {
      Manifest.Entry entry = named(written);
      Path file = aside.resolve(written.path());
      force(file);
      Files.move(file, folder.resolve(entry.path()), StandardCopyOption.ATOMIC_MOVE);
      files.add(entry);
    }
    Manifest manifest = new Manifest(List.of(), files, notes);
    Path text = aside.resolve(Manifest.FILE_NAME);
    Files.writeString(text, manifest.write(), StandardCharsets.UTF_8);
    force(text);
    Files.move(text, folder.resolve(Manifest.FILE_NAME), StandardCopyOption.ATOMIC_MOVE);
    sweep(folder, manifest);
    return manifest;
  }

  /**
   * Refuses a folder that something else lies in, so that nothing foreign is ever swept away.
   *
   * @throws Refusal when there are files and no manifest
   */
  public static void refuseOther(Path folder) throws IOException {
    if (Files.isRegularFile(folder.resolve(Manifest.FILE_NAME)) || !Files.exists(folder)) {
      return;
    }
    try (Stream<Path> listing =
        Files.isDirectory(folder) ? Files.list(folder) : Stream.of(folder)) {
      // A kill before the very first manifest leaves files that only carry our names.
      if (!listing.allMatch(file -> isOurs(file.getFileName().toString()))) {
        throw Refusal.wrongUse(
            "not-a-data-folder", "into", folder, "an empty or new folder, or a station data set");
      }
    }
  }

  /** Removes published content, and the folder with it when nothing else lies there. */
  public static void remove(Path folder) throws IOException {
    Files.delete(folder.resolve(Manifest.FILE_NAME));
    sweep(folder, new Manifest(List.of(), List.of(), List.of()));
    try (Stream<Path> listing = Files.list(folder)) {
      if (listing.findAny().isPresent()) {
        return;
      }
    }
    Files.delete(folder);
  }

  private static Manifest.Entry named(Manifest.Entry e) {
    int dot = e.path().indexOf('.');
    String path =
        e.path().substring(0, dot)
            + "-"
            + e.sha256().substring(0, HASH_LETTERS)
            + e.path().substring(dot);
    return new Manifest.Entry(
        e.layer(),
        path,
        e.title(),
        e.unit(),
        e.period(),
        e.bands(),
        e.sources(),
        e.licence(),
        e.attribution(),
        e.notice(),
        e.sha256(),
        e.bytes());
  }

  private static boolean isOurs(String name) {
    return name.matches("[a-z-]+-[0-9a-f]{" + HASH_LETTERS + "}\\.[a-z.]+");
  }

  private static void sweep(Path folder, Manifest kept) throws IOException {
    Set<String> names = new HashSet<>();
    kept.files().forEach(file -> names.add(file.path()));
    List<Path> old;
    try (Stream<Path> listing = Files.list(folder)) {
      old =
          listing
              .filter(file -> isOurs(file.getFileName().toString()))
              .filter(file -> !names.contains(file.getFileName().toString()))
              .toList();
    }
    for (Path file : old) {
      Files.delete(file);
    }
  }

  private static void force(Path file) throws IOException {
    try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE)) {
      channel.force(true);
    }
  }
}
