package saltspoke.fields;

import java.util.List;

/** Fields of one layer on one grid: twelve months, exceedance levels, or a single band. */
public final class FieldStack {
  private final String layer;
  private final List<Field> bands;

  /**
   * @param layer id of the layer in the manifest
   * @param bands at least one, all on the same grid
   */
  public FieldStack(String layer, List<Field> bands) {
    if (bands.isEmpty()) {
      throw new IllegalArgumentException("layer " + layer + " has no band");
    }
    for (Field band : bands) {
      if (!band.grid().equals(bands.get(0).grid())) {
        throw new IllegalArgumentException("layer " + layer + " mixes grids");
      }
    }
    this.layer = layer;
    this.bands = List.copyOf(bands);
  }

  public String layer() {
    return layer;
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
}
