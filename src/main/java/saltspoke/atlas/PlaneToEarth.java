package saltspoke.atlas;

/** From the plane of a coordinate system to the earth. Safe for use by many threads. */
@FunctionalInterface
public interface PlaneToEarth {
  /**
   * Longitude and latitude in degrees of a point, or null where the plane is no part of the map.
   */
  double[] lonLat(double x, double y);

  /** The plane of longitude and latitude itself. */
  static double[] degrees(double x, double y) {
    return y < -90 || y > 90 ? null : new double[] {x - 360 * Math.floor((x + 180) / 360), y};
  }
}
