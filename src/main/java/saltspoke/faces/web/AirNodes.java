package saltspoke.faces.web;

import java.util.Arrays;
import java.util.Optional;
import java.util.function.BiFunction;
import saltspoke.atmosphere.AirClimate;
import saltspoke.values.Kept;

/**
 * The air at the nodes of nested lattices in the Web Mercator plane, worked out when a tile first
 * needs them and kept. A node of a coarse lattice is also one of every finer lattice, so that
 * zooming in costs only the new ones. Every zoom halves the distance between nodes: towards a shore
 * the map grows as sharp as the model is.
 */
final class AirNodes {
  /** Nodes along a tile's edge: one every 16 pixels. */
  static final int PER_TILE = 16;

  private static final int MOST_KEPT = 100_000;
  private static final int LAYERS = MapLayer.values().length;

  private final BiFunction<Double, Double, Optional<AirClimate>> air;
  private final Kept<Long, float[]> kept = new Kept<>(MOST_KEPT, node -> 1);

  /**
   * @param air the air at a latitude and longitude, nothing at sea
   */
  AirNodes(BiFunction<Double, Double, Optional<AirClimate>> air) {
    this.air = air;
  }

  /** The nodes of a tile and one row and column more, for one layer. */
  TileValues of(TileFrame frame, MapLayer layer) {
    int n = PER_TILE + 1;
    double[] values = new double[n * n];
    double[] sureness = new double[n * n];
    for (int j = 0; j < n; j++) {
      for (int i = 0; i < n; i++) {
        float[] node =
            node(frame.zoom(), frame.column() * PER_TILE + i, frame.row() * PER_TILE + j);
        values[j * n + i] = node[layer.ordinal()];
        sureness[j * n + i] = node[LAYERS + layer.ordinal()];
      }
    }
    return new TileValues(n, values, sureness);
  }

  /** All layers' values, then all their sureness; NaN at sea. */
  private float[] node(int zoom, int column, int row) {
    int level = zoom;
    int x = column;
    int y = row;
    while (level > 0 && x % 2 == 0 && y % 2 == 0) {
      level--;
      x /= 2;
      y /= 2;
    }
    long key = (long) level << 48 | (long) y << 24 | x;
    int ofLevel = level;
    int atX = x;
    int atY = y;
    return kept.get(key, k -> work(ofLevel, atX, atY));
  }

  private float[] work(int level, int x, int y) {
    double across = (1 << level) * (double) PER_TILE;
    double longitudeDeg = x / across * 360 - 180;
    double latitudeDeg = Math.toDegrees(Math.atan(Math.sinh(Math.PI * (1 - 2 * y / across))));
    Optional<AirClimate> found = air.apply(latitudeDeg, Math.min(180, longitudeDeg));
    float[] node = new float[2 * LAYERS];
    Arrays.fill(node, Float.NaN);
    if (found.isPresent()) {
      for (MapLayer layer : MapLayer.values()) {
        node[layer.ordinal()] = (float) layer.value(found.get());
        node[LAYERS + layer.ordinal()] = (float) layer.sureness(found.get());
      }
    }
    return node;
  }
}
