package saltspoke.atmosphere;

import saltspoke.places.Place;

/**
 * Where a correction was measured or is wanted.
 *
 * @param latitudeDeg −90..90
 * @param longitudeDeg −180..180
 * @param elevationM metres above sea level
 * @param seaDistanceKm at least 0
 */
public record CorrectionSpot(
    double latitudeDeg, double longitudeDeg, double elevationM, double seaDistanceKm) {
  /** Mean radius of the earth, km (Moritz 1980); a sphere is good to 0.5 % here. */
  private static final double EARTH_KM = 6371.0088;

  static CorrectionSpot of(Place place) {
    return new CorrectionSpot(
        place.latitudeDeg(), place.longitudeDeg(), place.elevationM(), place.sea().distanceKm());
  }

  /** Straight through the earth: within 1 % of the way over it up to 1500 km. */
  double chordKm(CorrectionSpot other) {
    double up = Math.toRadians(other.latitudeDeg - latitudeDeg) / 2;
    double across = Math.toRadians(other.longitudeDeg - longitudeDeg) / 2;
    double sinUp = Math.sin(up);
    double sinAcross = Math.sin(across);
    return 2
        * EARTH_KM
        * Math.sqrt(
            sinUp * sinUp
                + Math.cos(Math.toRadians(latitudeDeg))
                    * Math.cos(Math.toRadians(other.latitudeDeg))
                    * sinAcross
                    * sinAcross);
  }
}
