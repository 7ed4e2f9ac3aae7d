package saltspoke.faces;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.NullNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import saltspoke.atlas.stations.StationDataSet;
import saltspoke.atmosphere.CorrectionFile;
import saltspoke.atmosphere.SiteCorrection;
import saltspoke.atmosphere.SiteCorrections;
import saltspoke.faces.json.Json;
import saltspoke.sources.CsvTable;
import saltspoke.values.Refusal;

/**
 * The correction file or station data set that answers are moved by.
 *
 * @param fileName its name; empty when there is none
 * @param rows number of its rows
 */
public record LocalCorrections(String fileName, int rows, SiteCorrections sites) {
  public static final LocalCorrections NONE = new LocalCorrections("", 0, SiteCorrections.NONE);

  /**
   * Reads a correction file.
   *
   * @throws Refusal when it cannot be read, or naming file, line and column of what is wrong in it
   */
  public static LocalCorrections read(Path file) {
    if (!Files.isRegularFile(file)) {
      throw unreadable(file);
    }
    String name = file.getFileName().toString();
    try (InputStream in = Files.newInputStream(file)) {
      List<SiteCorrection> rows = CorrectionFile.read(CsvTable.read(in, name), name);
      return new LocalCorrections(name, rows.size(), SiteCorrections.of(rows));
    } catch (IOException e) {
      throw unreadable(file);
    }
  }

  /**
   * Takes a station data set.
   *
   * @throws Refusal when the folder holds none, or it is damaged
   */
  public static LocalCorrections stations(Path folder) {
    StationDataSet stations = StationDataSet.open(folder);
    List<SiteCorrection> rows = stations.corrections();
    return new LocalCorrections(
        stations.name(),
        rows.size(),
        SiteCorrections.of(rows).from(List.of(stations.provenance())));
  }

  /** What {@code about} says of it; null when there is none. */
  public JsonNode json() {
    if (fileName.isEmpty()) {
      return NullNode.getInstance();
    }
    ObjectNode node = Json.object();
    node.put("file", fileName);
    node.put("rows", rows);
    node.put("sites", sites.siteCount());
    return node;
  }

  private static Refusal unreadable(Path file) {
    return Refusal.notFound(
        "unreadable-file",
        "corrections",
        file,
        "a correction file that can be read; compare climate FILE --write-corrections makes one");
  }
}
