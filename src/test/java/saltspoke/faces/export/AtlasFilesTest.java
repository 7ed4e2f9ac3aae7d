package saltspoke.faces.export;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import org.geotools.coverage.grid.GridCoverage2D;
import org.geotools.gce.geotiff.GeoTiffReader;
import org.geotools.referencing.CRS;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import saltspoke.atlas.AtlasFrame;
import saltspoke.atlas.AtlasLayer;
import saltspoke.atlas.PlaneToEarth;
import saltspoke.values.Refusal;

@Tag("law")
class AtlasFilesTest {
  private static final AtlasFrame FRAME =
      AtlasFrame.over(new double[] {-11, 40, 60.5, 75}, 0.1, 4326, true);

  @TempDir Path folder;

  /** A tile whose value tells its cell; every seventh is missing. */
  private static float value(int row, int column) {
    return (row + column) % 7 == 0 ? Float.NaN : row + column / 1000f;
  }

  private static float[] tile(AtlasFrame frame, int tile, boolean classes) {
    float[] values = new float[AtlasFrame.TILE * AtlasFrame.TILE];
    Arrays.fill(values, Float.NaN);
    for (int i = 0; i < values.length; i++) {
      int row = tile / frame.tilesAcross() * AtlasFrame.TILE + i / AtlasFrame.TILE;
      int column = tile % frame.tilesAcross() * AtlasFrame.TILE + i % AtlasFrame.TILE;
      if (row < frame.rows() && column < frame.columns()) {
        float value = value(row, column);
        values[i] = classes && !Float.isNaN(value) ? 1 + (row + column) % 6 : value;
      }
    }
    return values;
  }

  private Path tif(AtlasFrame frame, AtlasLayer layer) throws IOException {
    Path target = folder.resolve(layer.id() + "-" + frame.epsg() + ".tif");
    try (AtlasWorkFile work =
        AtlasWorkFile.open(folder.resolve("work.part"), layer.id(), frame.tiles())) {
      for (int i = 0; i < frame.tiles(); i++) {
        work.put(i, tile(frame, i, layer.ofClasses()));
      }
      CloudGeoTiff.write(target, frame, layer, work, "a test");
    }
    return target;
  }

  @Test
  void anotherReaderFindsEveryValueInItsPlace() throws Exception {
    GeoTiffReader reader = new GeoTiffReader(tif(FRAME, AtlasLayer.CHLORIDE).toFile());
    try {
      GridCoverage2D coverage = reader.read(null);
      assertEquals(
          "EPSG:4326", CRS.lookupIdentifier(coverage.getCoordinateReferenceSystem2D(), true));
      assertEquals(-11, coverage.getEnvelope2D().getMinX(), 1e-9);
      assertEquals(75, coverage.getEnvelope2D().getMaxY(), 1e-9);
      assertEquals(60.5, coverage.getEnvelope2D().getMaxX(), 1e-9);
      var raster = coverage.getRenderedImage().getData();
      assertEquals(FRAME.columns(), raster.getWidth());
      for (int row = 0; row < FRAME.rows(); row += 3) {
        for (int column = 0; column < FRAME.columns(); column += 3) {
          assertEquals(value(row, column), raster.getSampleFloat(column, row, 0));
        }
      }
    } finally {
      reader.dispose();
    }
  }

  @Test
  void gdalFindsSystemExtentUnitMissingValueAndOverviews() throws Exception {
    assumeTrue(onPath("gdalinfo"), "gdalinfo is not on the path (Debian: gdal-bin)");
    JsonNode info = gdalinfo(tif(FRAME, AtlasLayer.WET_HOURS));
    assertTrue(info.at("/coordinateSystem/wkt").asText().contains("ID[\"EPSG\",4326]"));
    assertEquals("[-11.0,75.0]", info.at("/cornerCoordinates/upperLeft").toString());
    assertEquals("[60.5,40.0]", info.at("/cornerCoordinates/lowerRight").toString());
    JsonNode band = info.at("/bands/0");
    assertEquals("h/a", band.path("unit").asText());
    assertEquals("wet-hours", band.path("description").asText());
    assertEquals("Float32", band.path("type").asText());
    assertEquals("NaN", band.path("noDataValue").asText());
    assertEquals("[256,256]", band.path("block").toString());
    assertEquals(2, band.path("overviews").size());
  }

  @Test
  void gdalFindsClassesInAnotherSystem() throws Exception {
    assumeTrue(onPath("gdalinfo"), "gdalinfo is not on the path (Debian: gdal-bin)");
    AtlasFrame plane = CoordinateSystem.of("EPSG:3035").frame(new double[] {0, 45, 10, 55}, 10_000);
    JsonNode info = gdalinfo(tif(plane, AtlasLayer.CLASS_ZINC));
    assertTrue(info.at("/coordinateSystem/wkt").asText().contains("ID[\"EPSG\",3035]"));
    assertEquals(plane.west(), info.at("/cornerCoordinates/upperLeft/0").asDouble(), 1e-3);
    assertEquals(plane.north(), info.at("/cornerCoordinates/upperLeft/1").asDouble(), 1e-3);
    assertEquals("Byte", info.at("/bands/0/type").asText());
    assertEquals(0, info.at("/bands/0/noDataValue").asDouble());
  }

  /** The natural origin of the European equal-area grid, by its definition (EPSG:3035). */
  @Test
  void aPlaneComesBackToTheEarth() {
    double[] box = {0, 45, 20, 55};
    PlaneToEarth earth = CoordinateSystem.of("EPSG:3035").toEarth(box);
    double[] origin = earth.lonLat(4_321_000, 3_210_000);
    assertEquals(10, origin[0], 1e-6);
    assertEquals(52, origin[1], 1e-6);
    assertEquals(null, earth.lonLat(4_321_000, 5_500_000));
  }

  @Test
  void anUnknownSystemIsRefused() {
    assertEquals(
        Refusal.Kind.NOT_FOUND,
        assertThrows(Refusal.class, () -> CoordinateSystem.of("EPSG:99999")).kind());
    assertEquals(
        Refusal.Kind.WRONG_USE,
        assertThrows(Refusal.class, () -> CoordinateSystem.of("WGS84")).kind());
  }

  @Test
  void aWorkFileIsTakenUpByTheSameRequestOnly() throws IOException {
    Path file = folder.resolve("a.part");
    try (AtlasWorkFile work = AtlasWorkFile.open(file, "one", 4)) {
      work.put(2, tile(FRAME, 0, false));
      assertEquals(
          "in-use", assertThrows(Refusal.class, () -> AtlasWorkFile.open(file, "one", 4)).error());
    }
    try (AtlasWorkFile work = AtlasWorkFile.open(file, "one", 4)) {
      assertEquals(1, work.count());
      assertFalse(work.has(1));
      assertTrue(Arrays.equals(tile(FRAME, 0, false), work.get(2)));
    }
    try (AtlasWorkFile work = AtlasWorkFile.open(file, "two", 4)) {
      assertEquals(0, work.count());
    }
  }

  private static JsonNode gdalinfo(Path file) throws IOException, InterruptedException {
    Process process =
        new ProcessBuilder("gdalinfo", "-json", file.toString())
            .redirectError(ProcessBuilder.Redirect.DISCARD)
            .start();
    byte[] out = process.getInputStream().readAllBytes();
    assertEquals(0, process.waitFor());
    return new ObjectMapper().readTree(out);
  }

  private static boolean onPath(String program) {
    return Arrays.stream(System.getenv("PATH").split(File.pathSeparator))
        .anyMatch(folder -> Files.isExecutable(Path.of(folder, program)));
  }
}
