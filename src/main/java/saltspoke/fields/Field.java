package saltspoke.fields;

/**
 * One quantity on a grid. Missing values are NaN. Immutable: the array handed in belongs to the
 * field from then on.
 */
public final class Field {
  private final Grid grid;
  private final String unit;
  private final float[] values;

  /**
   * @param grid where the values stand
   * @param unit unit of the values, such as {@code degC}
   * @param values row by row from the north, {@code rows × columns} of them
   */
  public Field(Grid grid, String unit, float[] values) {
    if (values.length != grid.rows() * grid.columns()) {
      throw new IllegalArgumentException(
          "a grid of " + grid.rows() + " × " + grid.columns() + " needs as many values");
    }
    this.grid = grid;
    this.unit = unit;
    this.values = values;
  }

  public Grid grid() {
    return grid;
  }

  public String unit() {
    return unit;
  }

  /** Value at a grid point, NaN when missing. */
  public double at(int row, int column) {
    return values[row * grid.columns() + column];
  }

  /**
   * Bilinear value at a point. Missing corners are left out and the weights of the others scaled
   * up; NaN when all four are missing. Beyond the outermost rows (and columns, where the grid does
   * not wrap) the edge value holds.
   */
  public double sample(double latitudeDeg, double longitudeDeg) {
    return sample(new Corners(grid, latitudeDeg, longitudeDeg));
  }

  /** The same for a point whose corners in this grid are known. */
  double sample(Corners at) {
    double sum =
        at.northWest * values[at.upper + at.left]
            + at.northEast * values[at.upper + at.right]
            + at.southWest * values[at.lower + at.left]
            + at.southEast * values[at.lower + at.right];
    return Double.isNaN(sum) ? withoutMissing(at) : sum;
  }

  private double withoutMissing(Corners at) {
    double[] corner = {
      values[at.upper + at.left],
      values[at.upper + at.right],
      values[at.lower + at.left],
      values[at.lower + at.right]
    };
    double[] share = {at.northWest, at.northEast, at.southWest, at.southEast};
    double sum = 0;
    double weight = 0;
    for (int i = 0; i < 4; i++) {
      if (!Double.isNaN(corner[i]) && share[i] > 0) {
        sum += share[i] * corner[i];
        weight += share[i];
      }
    }
    return weight > 0 ? sum / weight : Double.NaN;
  }
}
