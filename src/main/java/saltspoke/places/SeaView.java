package saltspoke.places;

/**
 * What lies between a place and the open sea in 36 directions. Index k looks towards azimuth 10·k
 * degrees clockwise from north (the direction <em>from</em> which a wind would blow to the place).
 *
 * @param distanceKm geodesic distance to the nearest sea, 0 at or beyond the shore line
 * @param shoreKm per direction, distance to the first sea water of at least 1 km across; {@code
 *     +Infinity} when none within 1500 km
 * @param fetchKm per direction, length of water crossed beyond that shore before land again, capped
 *     at 500 km; 0 when {@code shoreKm} is infinite
 * @param salinityRatio per direction, salinity of that water over the ocean's (1 ocean, about 0.2
 *     Baltic, 0.5 Black Sea, 0.37 Caspian); 0 when {@code shoreKm} is infinite
 */
public record SeaView(
    double distanceKm, double[] shoreKm, double[] fetchKm, double[] salinityRatio) {
  public static final int DIRECTIONS = 36;

  public SeaView {
    if (shoreKm.length != DIRECTIONS
        || fetchKm.length != DIRECTIONS
        || salinityRatio.length != DIRECTIONS) {
      throw new IllegalArgumentException("a sea view has 36 directions");
    }
  }

  /**
   * The view from a place whose true distance to the sea is known better: in every direction the
   * shore comes nearer or goes farther by the same amount as the nearest one, never below 0. Fetch
   * and salinity stay.
   *
   * @param distanceKm true distance to the nearest sea, at least 0
   */
  public SeaView movedTo(double distanceKm) {
    double shiftKm = distanceKm - this.distanceKm;
    double[] moved = new double[DIRECTIONS];
    for (int k = 0; k < DIRECTIONS; k++) {
      moved[k] = Math.max(0, shoreKm[k] + shiftKm);
    }
    return new SeaView(distanceKm, moved, fetchKm, salinityRatio);
  }
}
