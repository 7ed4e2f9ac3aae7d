package saltspoke.sources;

import java.util.List;

/**
 * What the manifest says about one file, apart from its sources, size and checksum.
 *
 * @param layer id by which the program asks for the layer; {@code <layer>} has one file
 * @param path relative to the data folder, with forward slashes, {@code coast/land.geojson.gz}
 * @param title for people
 * @param unit unit of the values, empty for places and shapes
 * @param period years that the data stand for, empty when it has none
 * @param bands one label per band for rasters, empty otherwise
 * @param licence terms of this file
 * @param attribution the line to show with it
 * @param remark how it was made from its sources and what to mind; may be empty
 */
public record LayerFile(
    String layer,
    String path,
    String title,
    String unit,
    String period,
    List<String> bands,
    String licence,
    String attribution,
    String remark) {
  public LayerFile {
    if (!layer.matches("[a-z0-9]+(-[a-z0-9]+)*")) {
      throw new IllegalArgumentException("not a layer id: " + layer);
    }
    if (!path.matches("[a-z0-9][a-z0-9._-]*(/[a-z0-9][a-z0-9._-]*)*")) {
      throw new IllegalArgumentException("not a plain relative path: " + path);
    }
    if (title.isBlank() || licence.isBlank() || attribution.isBlank()) {
      throw new IllegalArgumentException(layer + " needs a title, a licence and an attribution");
    }
    bands = List.copyOf(bands);
  }
}
