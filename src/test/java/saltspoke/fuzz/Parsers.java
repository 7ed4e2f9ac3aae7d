package saltspoke.fuzz;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.TreeMap;
import saltspoke.faces.Parameters;
import saltspoke.faces.json.Json;
import saltspoke.faces.json.ProfileJson;
import saltspoke.fields.DataSet;
import saltspoke.places.PlaceDirectory;
import saltspoke.sources.CsvTable;
import saltspoke.sources.GeoTiffRaster;
import saltspoke.sources.NetcdfClassic;
import saltspoke.sources.NumpyArray;
import saltspoke.sources.StationFiles;
import saltspoke.values.Refusal;

/**
 * Every parser of bytes from outside, by the name of its corpus file. It may read, or refuse with a
 * {@link Refusal} or an {@link IOException}; anything else is a finding.
 */
final class Parsers {
  /** Reads bytes. */
  interface Parser {
    void read(byte[] bytes) throws IOException;
  }

  /** Where the corpus lies in the sources; tests run in the project's folder. */
  static final Path CORPUS = Path.of("src", "test", "resources", "fuzz");

  static final Map<String, Parser> ALL = new TreeMap<>();

  static {
    ALL.put("raster.tif", bytes -> GeoTiffRaster.read(bytes, "fuzz.tif"));
    ALL.put(
        "climate.nc",
        bytes -> {
          NetcdfClassic file = new NetcdfClassic(bytes, "fuzz.nc");
          file.variables().keySet().forEach(file::values);
        });
    ALL.put("array.npy", bytes -> NumpyArray.fromNpy(new ByteArrayInputStream(bytes), "fuzz"));
    ALL.put("array.npz", bytes -> NumpyArray.fromNpz(bytes, "fuzz"));
    ALL.put("stations.csv", Parsers::stations);
    ALL.put("manifest.csv", Parsers::manifest);
    ALL.put("postal.txt", Parsers::postal);
    ALL.put("profile.json", Parsers::profile);
    ALL.put(
        "coordinates.txt",
        bytes -> Parameters.latitudeLongitude("at", new String(bytes, StandardCharsets.UTF_8)));
  }

  private Parsers() {}

  static byte[] seed(String name) {
    try {
      return Files.readAllBytes(CORPUS.resolve(name));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static void stations(byte[] bytes) {
    CsvTable.forEach(
        new ByteArrayInputStream(bytes),
        "fuzz.csv",
        row -> {
          StationFiles.climate(row);
          StationFiles.hour(row);
          StationFiles.chloride(row);
          StationFiles.corrosion(row);
        });
  }

  private static void manifest(byte[] bytes) throws IOException {
    Path folder = Files.createTempDirectory("fuzz");
    Path file = folder.resolve("manifest.csv");
    try {
      Files.write(file, bytes);
      DataSet.in(folder);
    } finally {
      Files.deleteIfExists(file);
      Files.delete(folder);
    }
  }

  private static void postal(byte[] bytes) throws IOException {
    Path file = Files.createTempFile("fuzz", ".txt");
    try {
      Files.write(file, bytes);
      PlaceDirectory.open(DataSets.SHIPPED).addPostalFile(file);
    } finally {
      Files.delete(file);
    }
  }

  private static void profile(byte[] bytes) throws IOException {
    JsonNode node;
    try {
      node = Json.MAPPER.readTree(bytes);
    } catch (JsonProcessingException e) {
      return;
    }
    if (node != null && node.has("profile")) {
      ProfileJson.read(node.get("profile"));
    }
  }

  /** Opened once, and only where it is needed. */
  private static final class DataSets {
    private static final DataSet SHIPPED = DataSet.shipped();
  }
}
