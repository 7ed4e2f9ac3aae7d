package saltspoke.atlas;

import saltspoke.values.Refusal;

/**
 * The cells of an atlas in the plane of its coordinate system, and the tiles that they are worked
 * out in. Row 0 is the northernmost.
 *
 * @param epsg code of the coordinate system
 * @param geographic whether the plane is one of longitude and latitude in degrees
 * @param west left edge of the first column
 * @param north upper edge of the first row
 * @param step width and height of a cell, degrees or metres, positive
 * @param columns at least 1
 * @param rows at least 1
 */
public record AtlasFrame(
    int epsg, boolean geographic, double west, double north, double step, int columns, int rows) {
  /** Width and height of a tile, cells. */
  public static final int TILE = 256;

  /** More cells than this would not fit into a classic TIFF file of 4 GB. */
  private static final long MOST_CELLS = 1_000_000_000L;

  public AtlasFrame {
    if (!(step > 0) || columns < 1 || rows < 1) {
      throw new IllegalArgumentException("an atlas needs a positive step and at least one cell");
    }
    if ((long) columns * rows > MOST_CELLS) {
      throw Refusal.outOfRange(
          "step", (long) columns * rows + " cells", "a step or box of at most 1,000,000,000 cells");
    }
  }

  /**
   * The frame of a box: as many whole cells as cover it.
   *
   * @param box west, south, east and north edge
   */
  public static AtlasFrame over(double[] box, double step, int epsg, boolean geographic) {
    return new AtlasFrame(
        epsg,
        geographic,
        box[0],
        box[3],
        step,
        cells(box[2] - box[0], step),
        cells(box[3] - box[1], step));
  }

  private static int cells(double length, double step) {
    // A hair less than a whole cell is rounding, not another cell.
    double cells = Math.max(1, Math.ceil(length / step - 1e-6));
    return (int) Math.min(cells, Integer.MAX_VALUE);
  }

  /** Middle of a column. */
  public double x(int column) {
    return west + (column + 0.5) * step;
  }

  /** Middle of a row. */
  public double y(int row) {
    return north - (row + 0.5) * step;
  }

  public int tilesAcross() {
    return (columns + TILE - 1) / TILE;
  }

  public int tilesDown() {
    return (rows + TILE - 1) / TILE;
  }

  public int tiles() {
    return tilesAcross() * tilesDown();
  }

  /** The frame with half as many cells each way, for an overview. */
  public AtlasFrame halved() {
    return new AtlasFrame(
        epsg, geographic, west, north, 2 * step, (columns + 1) / 2, (rows + 1) / 2);
  }
}
