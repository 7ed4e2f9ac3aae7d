package saltspoke.fields;

import java.util.List;
import java.util.stream.IntStream;

/** Fields of one layer on one grid: twelve months, exceedance levels, or a single band. */
public final class FieldStack {
  private final String layer;
  private final List<String> labels;
  private final List<Field> bands;

  /** A stack whose bands are numbered from 1. */
  public FieldStack(String layer, List<Field> bands) {
    this(layer, IntStream.rangeClosed(1, bands.size()).mapToObj(String::valueOf).toList(), bands);
  }

  /**
   * @param layer id of the layer in the manifest
   * @param labels one per band: months as 1 to 12, exceedance levels in percent, or names
   * @param bands at least one, all on the same grid
   */
  public FieldStack(String layer, List<String> labels, List<Field> bands) {
    if (labels.size() != bands.size()) {
      throw new IllegalArgumentException("layer " + layer + " needs a label for each band");
    }
    if (bands.isEmpty()) {
      throw new IllegalArgumentException("layer " + layer + " has no band");
    }
    for (Field band : bands) {
      if (!band.grid().equals(bands.get(0).grid())) {
        throw new IllegalArgumentException("layer " + layer + " mixes grids");
      }
    }
    this.layer = layer;
    this.labels = List.copyOf(labels);
    this.bands = List.copyOf(bands);
  }

  public String layer() {
    return layer;
  }

  /** One label per band, in order. */
  public List<String> labels() {
    return labels;
  }

  public int size() {
    return bands.size();
  }

  /** Band by index from 0; for monthly layers index 0 is January. */
  public Field band(int index) {
    return bands.get(index);
  }

  /** Bilinear value of one band at a point, NaN where missing. */
  public double sample(int index, double latitudeDeg, double longitudeDeg) {
    return bands.get(index).sample(latitudeDeg, longitudeDeg);
  }

  /** Bilinear values of all bands at a point: one search for its corners serves them all. */
  public double[] sampleAll(double latitudeDeg, double longitudeDeg) {
    Corners at = new Corners(bands.get(0).grid(), latitudeDeg, longitudeDeg);
    double[] values = new double[bands.size()];
    for (int i = 0; i < values.length; i++) {
      values[i] = bands.get(i).sample(at);
    }
    return values;
  }
}
