package saltspoke.fields.build;

import java.awt.image.DataBuffer;
import java.awt.image.WritableRaster;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import javax.media.jai.RasterFactory;
import org.geotools.api.parameter.GeneralParameterValue;
import org.geotools.api.parameter.ParameterValueGroup;
import org.geotools.api.referencing.FactoryException;
import org.geotools.coverage.grid.GridCoverage2D;
import org.geotools.coverage.grid.GridCoverageFactory;
import org.geotools.gce.geotiff.GeoTiffFormat;
import org.geotools.gce.geotiff.GeoTiffWriteParams;
import org.geotools.gce.geotiff.GeoTiffWriter;
import org.geotools.geometry.jts.ReferencedEnvelope;
import org.geotools.referencing.CRS;
import saltspoke.fields.FieldStack;
import saltspoke.fields.Grid;

/**
 * Writes a layer as a GeoTIFF (OGC 19-008r4), Deflate, in EPSG:4326. The same layer gives the same
 * bytes. Cells are areas around the grid's points; missing values are NaN.
 */
public final class GeoTiffExport {
  private static final String IMAGE_DESCRIPTION = "270";
  private static final String SOFTWARE = "305";

  private GeoTiffExport() {}

  /**
   * @param description one line of ASCII for the TIFF tag ImageDescription
   */
  public static byte[] write(FieldStack stack, String description) throws IOException {
    Grid grid = stack.band(0).grid();
    WritableRaster raster =
        RasterFactory.createBandedRaster(
            dataType(stack), grid.columns(), grid.rows(), stack.size(), null);
    for (int band = 0; band < stack.size(); band++) {
      for (int row = 0; row < grid.rows(); row++) {
        for (int column = 0; column < grid.columns(); column++) {
          raster.setSample(column, row, band, (float) stack.band(band).at(row, column));
        }
      }
    }
    GridCoverage2D coverage =
        new GridCoverageFactory().create(stack.layer(), raster, envelope(grid));

    GeoTiffWriteParams compression = new GeoTiffWriteParams();
    compression.setCompressionMode(GeoTiffWriteParams.MODE_EXPLICIT);
    compression.setCompressionType("Deflate");
    compression.setCompressionQuality(1f);
    ParameterValueGroup parameters = new GeoTiffFormat().getWriteParameters();
    parameters
        .parameter(GeoTiffFormat.GEOTOOLS_WRITE_PARAMS.getName().toString())
        .setValue(compression);
    // The writer would declare 0 or the lowest integer as missing; NaN needs no declaration.
    parameters.parameter(GeoTiffFormat.WRITE_NODATA.getName().toString()).setValue(false);

    ByteArrayOutputStream out = new ByteArrayOutputStream();
    GeoTiffWriter writer = new GeoTiffWriter(out);
    try {
      writer.setMetadataValue(IMAGE_DESCRIPTION, description);
      writer.setMetadataValue(SOFTWARE, "Saltspoke");
      writer.write(coverage, parameters.values().toArray(GeneralParameterValue[]::new));
    } finally {
      writer.dispose();
    }
    return out.toByteArray();
  }

  /** Bytes or 16-bit integers when every value is one, else 32-bit numbers. */
  private static int dataType(FieldStack stack) {
    Grid grid = stack.band(0).grid();
    double lowest = 0;
    double highest = 0;
    for (int band = 0; band < stack.size(); band++) {
      for (int row = 0; row < grid.rows(); row++) {
        for (int column = 0; column < grid.columns(); column++) {
          double value = stack.band(band).at(row, column);
          if (value != Math.rint(value)) {
            return DataBuffer.TYPE_FLOAT;
          }
          lowest = Math.min(lowest, value);
          highest = Math.max(highest, value);
        }
      }
    }
    if (lowest >= 0 && highest <= 255) {
      return DataBuffer.TYPE_BYTE;
    }
    return lowest >= Short.MIN_VALUE && highest <= Short.MAX_VALUE
        ? DataBuffer.TYPE_SHORT
        : DataBuffer.TYPE_FLOAT;
  }

  private static ReferencedEnvelope envelope(Grid grid) throws IOException {
    double west = grid.westDeg() - grid.stepLonDeg() / 2;
    double north = grid.northDeg() + grid.stepLatDeg() / 2;
    try {
      return new ReferencedEnvelope(
          west,
          west + grid.columns() * grid.stepLonDeg(),
          north - grid.rows() * grid.stepLatDeg(),
          north,
          CRS.decode("EPSG:4326", true));
    } catch (FactoryException e) {
      throw new IOException("EPSG:4326 cannot be set up", e);
    }
  }
}
