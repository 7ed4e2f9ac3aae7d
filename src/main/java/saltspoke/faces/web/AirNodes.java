package saltspoke.faces.web;

import java.util.Arrays;
import java.util.Optional;
import saltspoke.atmosphere.AirClimate;
import saltspoke.values.Kept;

/**
 * The air at the nodes of nested lattices in the Web Mercator plane, worked out when a tile first
 * needs them and kept. A node of a coarse lattice is also one of every finer lattice, so that
 * zooming in costs only the new ones. Every zoom halves the distance between nodes: towards a shore
 * the map grows as sharp as the model is.
 *
 * <p>A node in the water stands for the land beside it, a quarter of a step behind the shore: so
 * colours run up to the shore without blocks, and an island between nodes has its own. What lies
 * beside depends on the step, so these nodes are worked out anew at every zoom.
 */
final class AirNodes {
  /** Nodes along a tile's edge: one every 16 pixels. */
  static final int PER_TILE = 16;

  private static final int MOST_KEPT = 100_000;
  private static final int LAYERS = MapLayer.values().length;

  /** Farthest shore that a node in the water stands for, in steps: the diagonal of a cell. */
  private static final double REACH_STEPS = 1.5;

  private static final double INLAND_STEPS = 0.25;
  private static final double EQUATOR_KM = 40_075;

  /** Marks the key of a node in the water at one zoom. */
  private static final long WATER = 1L << 62;

  private static final float[] IN_WATER = {};

  /** What the nodes ask of the world. */
  interface World {
    /** The air at a point, nothing in the water. */
    Optional<AirClimate> air(double latitudeDeg, double longitudeDeg);

    /** A point of land beside one in the water, see {@code PlaceDirectory.landBeside}. */
    Optional<double[]> landBeside(
        double latitudeDeg, double longitudeDeg, double reachKm, double inlandKm);
  }

  private final World world;
  private final Kept<Long, float[]> kept = new Kept<>(MOST_KEPT, node -> 1);

  AirNodes(World world) {
    this.world = world;
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

  /** All layers' values, then all their sureness; NaN where no land is near. */
  private float[] node(int zoom, int column, int row) {
    int level = zoom;
    int x = column;
    int y = row;
    while (level > 0 && x % 2 == 0 && y % 2 == 0) {
      level--;
      x /= 2;
      y /= 2;
    }
    int coarsest = level;
    int coarsestX = x;
    int coarsestY = y;
    float[] node =
        kept.get(
            key(level, x, y),
            k ->
                onLand(latitudeDeg(coarsest, coarsestY), longitudeDeg(coarsest, coarsestX))
                    .orElse(IN_WATER));
    return node == IN_WATER
        ? kept.get(WATER | key(zoom, column, row), k -> beside(zoom, column, row))
        : node;
  }

  private static long key(int level, int x, int y) {
    return (long) level << 48 | (long) y << 24 | x;
  }

  private Optional<float[]> onLand(double latitudeDeg, double longitudeDeg) {
    return world.air(latitudeDeg, longitudeDeg).map(AirNodes::values);
  }

  /** A node in the water, as the land beside it. */
  private float[] beside(int zoom, int column, int row) {
    double latitudeDeg = latitudeDeg(zoom, row);
    double stepKm = EQUATOR_KM * Math.cos(Math.toRadians(latitudeDeg)) / across(zoom);
    return world
        .landBeside(
            latitudeDeg, longitudeDeg(zoom, column), REACH_STEPS * stepKm, INLAND_STEPS * stepKm)
        .flatMap(point -> onLand(point[0], point[1]))
        .orElseGet(AirNodes::none);
  }

  private static float[] values(AirClimate air) {
    float[] node = new float[2 * LAYERS];
    for (MapLayer layer : MapLayer.values()) {
      node[layer.ordinal()] = (float) layer.value(air);
      node[LAYERS + layer.ordinal()] = (float) layer.sureness(air);
    }
    return node;
  }

  private static float[] none() {
    float[] node = new float[2 * LAYERS];
    Arrays.fill(node, Float.NaN);
    return node;
  }

  private static double across(int zoom) {
    return (1 << zoom) * (double) PER_TILE;
  }

  private static double longitudeDeg(int zoom, int column) {
    return Math.min(180, column / across(zoom) * 360 - 180);
  }

  private static double latitudeDeg(int zoom, int row) {
    return Math.toDegrees(Math.atan(Math.sinh(Math.PI * (1 - 2 * row / across(zoom)))));
  }
}
