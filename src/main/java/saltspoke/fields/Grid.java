package saltspoke.fields;

/**
 * A regular latitude–longitude grid of points. Row 0 is the northernmost, column 0 the westernmost;
 * values stand at the points named here, not at cell corners.
 *
 * @param northDeg latitude of row 0, −90..90
 * @param westDeg longitude of column 0, −180..180
 * @param stepLatDeg distance between rows, positive
 * @param stepLonDeg distance between columns, positive
 * @param wrapsLongitude whether the column after the last is the first
 */
public record Grid(
    double northDeg,
    double westDeg,
    double stepLatDeg,
    double stepLonDeg,
    int rows,
    int columns,
    boolean wrapsLongitude) {
  public Grid {
    if (rows < 2 || columns < 2 || !(stepLatDeg > 0) || !(stepLonDeg > 0)) {
      throw new IllegalArgumentException("a grid needs two rows, two columns and positive steps");
    }
  }

  /** A grid that wraps when its columns go once round the world, to a thousandth of a degree. */
  public static Grid of(
      double northDeg,
      double westDeg,
      double stepLatDeg,
      double stepLonDeg,
      int rows,
      int columns) {
    boolean wraps = Math.abs(columns * stepLonDeg - 360) < 1e-3;
    return new Grid(northDeg, westDeg, stepLatDeg, stepLonDeg, rows, columns, wraps);
  }

  /** Latitude of a row, degrees. */
  public double latitudeDeg(int row) {
    return northDeg - row * stepLatDeg;
  }

  /** Longitude of a column, degrees. */
  public double longitudeDeg(int column) {
    return westDeg + column * stepLonDeg;
  }
}
