package saltspoke.fields;

/**
 * The four points of a grid around a place, with the share of each in a bilinear value. Beyond the
 * outermost rows (and columns, where the grid does not wrap) the edge holds.
 */
final class Corners {
  /** Index of the first value of the row to the north and of that to the south. */
  final int upper;

  final int lower;

  /** Columns to the west and to the east. */
  final int left;

  final int right;

  final double northWest;
  final double northEast;
  final double southWest;
  final double southEast;

  Corners(Grid grid, double latitudeDeg, double longitudeDeg) {
    double y = (grid.northDeg() - latitudeDeg) / grid.stepLatDeg();
    y = Math.max(0, Math.min(grid.rows() - 1, y));
    int row = Math.min((int) y, grid.rows() - 2);
    double fy = y - row;

    double x = (longitudeDeg - grid.westDeg()) / grid.stepLonDeg();
    int columns = grid.columns();
    double fx;
    if (grid.wrapsLongitude()) {
      x = x - columns * Math.floor(x / columns);
      left = (int) x % columns;
      right = left + 1 == columns ? 0 : left + 1;
      fx = x - Math.floor(x);
    } else {
      x = Math.max(0, Math.min(columns - 1, x));
      left = Math.min((int) x, columns - 2);
      right = left + 1;
      fx = x - left;
    }
    upper = row * columns;
    lower = upper + columns;
    northWest = (1 - fy) * (1 - fx);
    northEast = (1 - fy) * fx;
    southWest = fy * (1 - fx);
    southEast = fy * fx;
  }
}
