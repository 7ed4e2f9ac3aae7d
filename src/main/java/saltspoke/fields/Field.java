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
    double y = (grid.northDeg() - latitudeDeg) / grid.stepLatDeg();
    y = Math.max(0, Math.min(grid.rows() - 1, y));
    int row = Math.min((int) y, grid.rows() - 2);
    double fy = y - row;

    double x = (longitudeDeg - grid.westDeg()) / grid.stepLonDeg();
    int columns = grid.columns();
    int left;
    int right;
    double fx;
    if (grid.wrapsLongitude()) {
      x = x - columns * Math.floor(x / columns);
      left = (int) x % columns;
      right = (left + 1) % columns;
      fx = x - Math.floor(x);
    } else {
      x = Math.max(0, Math.min(columns - 1, x));
      left = Math.min((int) x, columns - 2);
      right = left + 1;
      fx = x - left;
    }
    double sum = 0;
    double weight = 0;
    double[] corner = {at(row, left), at(row, right), at(row + 1, left), at(row + 1, right)};
    double[] share = {(1 - fy) * (1 - fx), (1 - fy) * fx, fy * (1 - fx), fy * fx};
    for (int i = 0; i < 4; i++) {
      if (!Double.isNaN(corner[i]) && share[i] > 0) {
        sum += share[i] * corner[i];
        weight += share[i];
      }
    }
    return weight > 0 ? sum / weight : Double.NaN;
  }
}
