package saltspoke.fields;

import java.io.InputStream;
import java.util.List;
import saltspoke.sources.CsvTable;

/** A folder (or its copy inside the jar) of verified climate layers with their manifest. */
public interface DataSet {
  /** The bands of a raster layer, read at first use and kept. */
  FieldStack stack(String layerId);

  /** The bytes of a layer's file, unpacked when its name ends in {@code .gz}. */
  InputStream open(String layerId);

  /** The bytes of a layer's file as they are stored, packed or not. */
  InputStream openStored(String layerId);

  /** All rows of a layer that is a table. */
  default List<CsvTable.Row> rows(String layerId) {
    return CsvTable.read(open(layerId), layerId + ".csv");
  }
}
