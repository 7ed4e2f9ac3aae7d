package saltspoke.fields;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.IntStream;
import java.util.zip.GZIPInputStream;
import saltspoke.sources.CsvTable;
import saltspoke.sources.GeoTiffRaster;
import saltspoke.values.Refusal;

/**
 * A folder (or its copy inside the jar) of climate layers with their manifest. Opening it checks
 * the size and SHA-256 of every file; layers are read at first use and kept. Safe for use by many
 * threads.
 */
public final class DataSet {
  /** Name of the folder that is looked for beside the program and in the working directory. */
  public static final String FOLDER_NAME = "climate-data";

  /** System property that names a data folder, before all other places. */
  public static final String FOLDER_PROPERTY = "saltspoke.data";

  private static final String MEND =
      "the file as published: take the release again, or run `ingest default SOURCES_DIR`";

  private final DataHome home;
  private final Manifest manifest;
  private final Map<String, FieldStack> stacks = new ConcurrentHashMap<>();

  private DataSet(DataHome home) {
    this.home = home;
    this.manifest = Manifest.read(bytes(Manifest.FILE_NAME));
    List<String> complaints =
        manifest.files().parallelStream().map(this::complaint).filter(c -> !c.isEmpty()).toList();
    if (!complaints.isEmpty()) {
      throw Refusal.dataDamaged("damaged-data", home.name(), String.join("; ", complaints), MEND);
    }
  }

  /**
   * The world that the program answers from: the folder named by the system property {@value
   * #FOLDER_PROPERTY}; else {@value #FOLDER_NAME} beside the running jar, then in the working
   * directory, when it holds a manifest; else the copy inside the program.
   *
   * @throws Refusal naming every missing or damaged file
   */
  public static DataSet shipped() {
    return new DataSet(DataHome.shipped());
  }

  /**
   * The data set in a folder.
   *
   * @throws Refusal naming every missing or damaged file
   */
  public static DataSet in(Path folder) {
    return new DataSet(DataHome.folder(folder));
  }

  /** Where the files lie, for people. */
  public String location() {
    return home.name();
  }

  public Manifest manifest() {
    return manifest;
  }

  /** Whether the data set holds a layer. */
  public boolean has(String layerId) {
    return manifest.find(layerId).isPresent();
  }

  /**
   * The bands of a raster layer.
   *
   * @throws Refusal when there is no such layer or it cannot be read
   */
  public FieldStack stack(String layerId) {
    return stacks.computeIfAbsent(layerId, this::read);
  }

  /**
   * The bytes of a layer's file, unpacked when its name ends in {@code .gz}.
   *
   * @throws Refusal when there is no such layer
   */
  public InputStream open(String layerId) {
    InputStream stored = openStored(layerId);
    String path = manifest.get(layerId).path();
    try {
      return path.endsWith(".gz") ? new GZIPInputStream(stored, 1 << 16) : stored;
    } catch (IOException e) {
      throw Refusal.dataDamaged("damaged-data", home.name(), path, MEND);
    }
  }

  /**
   * The bytes of a layer's file as they are stored, packed or not.
   *
   * @throws Refusal when there is no such layer
   */
  public InputStream openStored(String layerId) {
    return new ByteArrayInputStream(checkedBytes(manifest.get(layerId)));
  }

  /** All rows of a layer that is a table. */
  public List<CsvTable.Row> rows(String layerId) {
    return CsvTable.read(open(layerId), layerId + ".csv");
  }

  private FieldStack read(String layerId) {
    Manifest.Entry entry = manifest.get(layerId);
    GeoTiffRaster raster = GeoTiffRaster.read(checkedBytes(entry), entry.path());
    if (raster.bands().length != entry.bands().size()) {
      throw Refusal.dataDamaged(
          "wrong-bands",
          entry.path(),
          raster.bands().length + " bands",
          entry.bands().size() + " bands as the manifest says");
    }
    Grid grid =
        Grid.of(
            raster.northDeg(),
            raster.westDeg(),
            raster.stepLatDeg(),
            raster.stepLonDeg(),
            raster.rows(),
            raster.columns());
    List<Field> bands =
        IntStream.range(0, raster.bands().length)
            .mapToObj(i -> new Field(grid, entry.unit(), raster.bands()[i]))
            .toList();
    return new FieldStack(layerId, entry.bands(), bands);
  }

  /** What is wrong with a file, or nothing. */
  private String complaint(Manifest.Entry entry) {
    try {
      return home.find(entry.path())
          .map(found -> complaint(entry, found))
          .orElse(entry.path() + " is missing");
    } catch (IOException e) {
      return entry.path() + " cannot be read";
    }
  }

  private static String complaint(Manifest.Entry entry, byte[] found) {
    if (found.length != entry.bytes()) {
      return entry.path() + " has " + found.length + " bytes instead of " + entry.bytes();
    }
    return Checksum.of(found).equals(entry.sha256())
        ? ""
        : entry.path() + " has another content (SHA-256) than the manifest says";
  }

  /** The bytes of a file, which may have been damaged or removed since the data set was opened. */
  private byte[] checkedBytes(Manifest.Entry entry) {
    byte[] found = bytes(entry.path());
    String complaint = complaint(entry, found);
    if (!complaint.isEmpty()) {
      throw Refusal.dataDamaged("damaged-data", home.name(), complaint, MEND);
    }
    return found;
  }

  private byte[] bytes(String path) {
    try {
      return home.find(path)
          .orElseThrow(
              () -> Refusal.dataDamaged("damaged-data", home.name(), path + " is missing", MEND));
    } catch (IOException e) {
      throw Refusal.dataDamaged("damaged-data", home.name(), path + " cannot be read", MEND);
    }
  }
}
