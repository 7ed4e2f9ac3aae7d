package saltspoke.fields;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import saltspoke.values.Refusal;

/**
 * Tables kept by hand in the folder {@code tables} of the data folder. Each says what it is in
 * {@code # key: words} lines on top: {@code title}, {@code licence} (or {@code license}) and {@code
 * attribution} must stand there, {@code unit}, {@code period} and {@code note} may, the last more
 * than once. The layer id is the file's name without {@code .csv}.
 */
final class HandTables {
  static final String FOLDER = "tables";
  private static final List<String> REQUIRED = List.of("title", "licence", "attribution");

  private HandTables() {}

  /** Whether a path in a data folder belongs to a table kept by hand. */
  static boolean owns(String path) {
    return path.startsWith(FOLDER + "/");
  }

  /** Manifest rows of all tables in a data folder, by name. */
  static List<Manifest.Entry> entries(Path dataFolder) throws IOException {
    Path tables = dataFolder.resolve(FOLDER);
    if (!Files.isDirectory(tables)) {
      return List.of();
    }
    List<Path> files;
    try (Stream<Path> listing = Files.list(tables)) {
      files = listing.filter(f -> f.getFileName().toString().endsWith(".csv")).sorted().toList();
    }
    List<Manifest.Entry> entries = new ArrayList<>();
    for (Path file : files) {
      entries.add(entry(file));
    }
    return entries;
  }

  private static Manifest.Entry entry(Path file) throws IOException {
    String name = file.getFileName().toString();
    String path = FOLDER + "/" + name;
    Map<String, String> head = head(file);
    for (String key : REQUIRED) {
      if (head.getOrDefault(key, "").isEmpty()) {
        throw Refusal.dataDamaged(
            "table-without-head", path, "no " + key, "a line `# " + key + ": …` above the header");
      }
    }
    return new Manifest.Entry(
        name.substring(0, name.length() - ".csv".length()),
        path,
        head.get("title"),
        head.getOrDefault("unit", ""),
        head.getOrDefault("period", ""),
        List.of(),
        List.of(),
        head.get("licence"),
        head.get("attribution"),
        head.getOrDefault("note", ""),
        Checksum.of(file),
        Files.size(file));
  }

  private static Map<String, String> head(Path file) throws IOException {
    Map<String, String> head = new HashMap<>();
    for (String line : Files.readString(file, StandardCharsets.UTF_8).split("\\R")) {
      if (!line.startsWith("#")) {
        break;
      }
      int colon = line.indexOf(':');
      if (colon > 0) {
        String key = line.substring(1, colon).trim();
        head.merge(
            key.equals("license") ? "licence" : key,
            line.substring(colon + 1).trim(),
            (first, next) -> first + "; " + next);
      }
    }
    return head;
  }
}
