package saltspoke.faces.web;

/**
 * Values on a square lattice of nodes that spans a tile, the outermost nodes on its edges. Missing
 * nodes are NaN; between the others the logarithm of the value is linear, since losses and salt
 * change by factors.
 */
final class TileValues {
  /** Added before taking the logarithm, so that a true zero stays finite. */
  private static final double FLOOR = 1e-3;

  private final int perEdge;
  private final double[] logs;
  private final double[] sureness;

  /**
   * @param perEdge nodes along an edge, at least 2
   * @param values row by row from the north, ≥ 0 or NaN
   * @param sureness likewise, 0..1 or NaN
   */
  TileValues(int perEdge, double[] values, double[] sureness) {
    this.perEdge = perEdge;
    this.sureness = sureness;
    this.logs = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      logs[i] = Math.log(values[i] + FLOOR);
    }
  }

  /** The value at the middle of a pixel, NaN where all nodes around it are missing. */
  double value(int pixelX, int pixelY) {
    return Math.exp(between(logs, pixelX, pixelY)) - FLOOR;
  }

  /** Probability of the likeliest class at the middle of a pixel. */
  double sureness(int pixelX, int pixelY) {
    return between(sureness, pixelX, pixelY);
  }

  private double between(double[] nodes, int pixelX, int pixelY) {
    double x = node(pixelX);
    double y = node(pixelY);
    int i = (int) x;
    int j = (int) y;
    double fx = x - i;
    double fy = y - j;
    int at = j * perEdge + i;
    double sum = 0;
    double weight = 0;
    for (int corner = 0; corner < 4; corner++) {
      int right = corner & 1;
      int below = corner >> 1;
      double value = nodes[at + right + below * perEdge];
      double share = (right == 1 ? fx : 1 - fx) * (below == 1 ? fy : 1 - fy);
      if (!Double.isNaN(value)) {
        sum += share * value;
        weight += share;
      }
    }
    return weight > 0 ? sum / weight : Double.NaN;
  }

  /** Pixels to nodes; one pixel beyond the edge takes the edge's nodes. */
  private double node(int pixel) {
    double most = perEdge - 1 - 1e-9;
    return Math.max(0, Math.min(most, (pixel + 0.5) * (perEdge - 1) / TileFrame.SIZE_PX));
  }
}
