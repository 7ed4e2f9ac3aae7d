package saltspoke.faces.web;

import saltspoke.values.Refusal;

/**
 * Where a map tile lies: zoom, column from the west and row from the north of the usual Web
 * Mercator pyramid of 256-pixel tiles.
 */
record TileFrame(int zoom, int column, int row) {
  static final int SIZE_PX = 256;
  static final int MOST_ZOOM = 11;
  private static final double MARGIN_PX = 4;

  TileFrame {
    if (zoom < 0 || zoom > MOST_ZOOM) {
      throw Refusal.outOfRange("z", zoom, "0.." + MOST_ZOOM);
    }
    int most = (1 << zoom) - 1;
    if (column < 0 || column > most) {
      throw Refusal.outOfRange("x", column, "0.." + most);
    }
    if (row < 0 || row > most) {
      throw Refusal.outOfRange("y", row, "0.." + most);
    }
  }

  /** Pixel column of a world x (0..1). */
  double px(double worldX) {
    return (worldX * (1 << zoom) - column) * SIZE_PX;
  }

  /** Pixel row of a world y (0..1 from the north). */
  double py(double worldY) {
    return (worldY * (1 << zoom) - row) * SIZE_PX;
  }

  /** Longitude at the middle of a pixel column. */
  double longitudeDeg(double pixelX) {
    return ((column + (pixelX + 0.5) / SIZE_PX) / (1 << zoom)) * 360 - 180;
  }

  /** Latitude at the middle of a pixel row. */
  double latitudeDeg(double pixelY) {
    double worldY = (row + (pixelY + 0.5) / SIZE_PX) / (1 << zoom);
    return Math.toDegrees(Math.atan(Math.sinh(Math.PI * (1 - 2 * worldY))));
  }

  /** Whether a box in world units reaches into the tile, drawing margin included. */
  boolean meets(double west, double east, double north, double south) {
    return px(east) >= -MARGIN_PX
        && px(west) <= SIZE_PX + MARGIN_PX
        && py(south) >= -MARGIN_PX
        && py(north) <= SIZE_PX + MARGIN_PX;
  }
}
