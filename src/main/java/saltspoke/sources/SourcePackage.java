package saltspoke.sources;

import java.util.List;
import java.util.regex.Matcher;

/**
 * A package from a public registry that the shipped world is built from, with its terms as the
 * package itself states them.
 *
 * @param id short name used by the layer builders
 * @param registry where it is served
 * @param name name in the registry
 * @param version the version that the shipped data were built from
 * @param licence terms of the data in it
 * @param attribution the line to show with the data
 * @param notice further words that must or should go with the data; may be empty
 */
public record SourcePackage(
    String id,
    Registry registry,
    String name,
    String version,
    String licence,
    String attribution,
    String notice) {

  private static final class Declared {
    static final List<SourcePackage> ALL =
        CsvTable.read(SourcePackage.class.getResourceAsStream("packages.csv"), "packages.csv")
            .stream()
            .map(
                row ->
                    new SourcePackage(
                        row.text("id"),
                        Registry.of(row.text("registry")),
                        row.text("name"),
                        row.text("version"),
                        row.text("licence"),
                        row.text("attribution"),
                        row.text("notice")))
            .toList();
  }

  /** Every package that the default world may be built from, as listed in packages.csv. */
  public static List<SourcePackage> declared() {
    return Declared.ALL;
  }

  /** Version in a file name, or null when the file is not this package. */
  String versionIn(String fileName) {
    Matcher matcher = registry.filePattern(name).matcher(fileName);
    return matcher.matches() ? matcher.group(1) : null;
  }

  /** How a person fetches it, as one sentence part. */
  public String howToFetch() {
    return name + " " + version + " (" + registry.fetchCommand(name, version) + ")";
  }
}
