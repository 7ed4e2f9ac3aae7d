package saltspoke.fields;

import java.io.ByteArrayInputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import saltspoke.sources.CsvTable;
import saltspoke.sources.CsvWriter;
import saltspoke.values.Refusal;

/**
 * What a data folder holds and where it comes from, as its {@code manifest.csv} says.
 *
 * @param sources packages that the files were built from, by id
 * @param files the layers' files, by path
 * @param notes what the ingest had to say, such as a fall-back taken
 */
public record Manifest(List<Source> sources, List<Entry> files, List<String> notes) {
  /** Name of the file inside the data folder. */
  public static final String FILE_NAME = "manifest.csv";

  private static final List<String> COLUMNS =
      List.of(
          "kind",
          "id",
          "path",
          "title",
          "unit",
          "period",
          "bands",
          "sources",
          "registry",
          "version",
          "licence",
          "attribution",
          "notice",
          "sha256",
          "bytes");

  /**
   * A package.
   *
   * @param name its name in the registry
   * @param file file name as served
   */
  public record Source(
      String id,
      String registry,
      String name,
      String version,
      String file,
      String licence,
      String attribution,
      String notice,
      String sha256,
      long bytes) {}

  /**
   * A file of the data folder.
   *
   * @param layer id by which the program asks for it
   * @param bands labels of a raster's bands, empty for other files
   * @param sources ids of the packages it was built from; empty for a table kept by hand
   * @param notice how it was made and what to mind
   */
  public record Entry(
      String layer,
      String path,
      String title,
      String unit,
      String period,
      List<String> bands,
      List<String> sources,
      String licence,
      String attribution,
      String notice,
      String sha256,
      long bytes) {}

  public Manifest {
    sources = List.copyOf(sources);
    files = List.copyOf(files);
    notes = List.copyOf(notes);
  }

  /** The file of a layer, if there is one. */
  public Optional<Entry> find(String layer) {
    return files.stream().filter(f -> f.layer().equals(layer)).findFirst();
  }

  /**
   * The file of a layer.
   *
   * @throws Refusal when the folder holds no such layer
   */
  public Entry get(String layer) {
    return find(layer)
        .orElseThrow(
            () ->
                Refusal.dataDamaged(
                    "missing-layer",
                    FILE_NAME,
                    layer,
                    "one of " + files.stream().map(Entry::layer).toList()));
  }

  /** Reads the text of a manifest. */
  static Manifest read(byte[] text) {
    List<Source> sources = new ArrayList<>();
    List<Entry> files = new ArrayList<>();
    List<String> notes = new ArrayList<>();
    for (CsvTable.Row row : CsvTable.read(new ByteArrayInputStream(text), FILE_NAME)) {
      switch (row.text("kind")) {
        case "source" ->
            sources.add(
                new Source(
                    row.text("id"),
                    row.text("registry"),
                    row.text("title"),
                    row.text("version"),
                    row.text("path"),
                    row.text("licence"),
                    row.text("attribution"),
                    row.text("notice"),
                    row.text("sha256"),
                    (long) row.number("bytes")));
        case "file" ->
            files.add(
                new Entry(
                    row.text("id"),
                    row.text("path"),
                    row.text("title"),
                    row.text("unit"),
                    row.text("period"),
                    split(row.text("bands"), "\\|"),
                    split(row.text("sources"), " "),
                    row.text("licence"),
                    row.text("attribution"),
                    row.text("notice"),
                    row.text("sha256"),
                    (long) row.number("bytes")));
        case "note" -> notes.add(row.text("title"));
        default ->
            throw Refusal.dataDamaged(
                "unknown-kind", row.where() + " kind", row.text("kind"), "source, file or note");
      }
    }
    return new Manifest(sources, files, notes);
  }

  private static List<String> split(String text, String separator) {
    return text.isEmpty() ? List.of() : List.of(text.split(separator));
  }

  /** The text of the manifest file. */
  String write() {
    Stream<List<String>> sourceRows =
        sources.stream()
            .map(
                s ->
                    List.of(
                        "source",
                        s.id(),
                        s.file(),
                        s.name(),
                        "",
                        "",
                        "",
                        "",
                        s.registry(),
                        s.version(),
                        s.licence(),
                        s.attribution(),
                        s.notice(),
                        s.sha256(),
                        Long.toString(s.bytes())));
    Stream<List<String>> fileRows =
        files.stream()
            .map(
                f ->
                    List.of(
                        "file",
                        f.layer(),
                        f.path(),
                        f.title(),
                        f.unit(),
                        f.period(),
                        String.join("|", f.bands()),
                        String.join(" ", f.sources()),
                        "",
                        "",
                        f.licence(),
                        f.attribution(),
                        f.notice(),
                        f.sha256(),
                        Long.toString(f.bytes())));
    Stream<List<String>> noteRows =
        notes.stream()
            .map(n -> List.of("note", "", "", n, "", "", "", "", "", "", "", "", "", "", ""));
    return CsvWriter.write(
        List.of(
            "Saltspoke data folder. Rows of kind source: packages it was built from (path = file as",
            "served, title = name in the registry). Rows of kind file: path, what it holds, terms.",
            "Written by the ingest; do not edit: the program checks every size and SHA-256 at start."),
        COLUMNS,
        Stream.of(sourceRows, fileRows, noteRows).flatMap(s -> s).toList());
  }
}
