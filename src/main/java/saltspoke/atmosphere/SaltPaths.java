package saltspoke.atmosphere;

import saltspoke.fields.FieldStack;
import saltspoke.places.Place;
import saltspoke.places.SeaView;

/** What lies between a place and the shore in each direction: crests and roughness. */
final class SaltPaths {
  /** Mean radius of the earth, km; IUGG. */
  private static final double EARTH_RADIUS_KM = 6371.0088;

  /** The elevation map shows 20′ means: nearer than this it knows nothing of crests, km. */
  private static final double NEAREST_KM = 20;

  /** Farther crests do not matter for what is left of the salt there, km. */
  private static final double FARTHEST_KM = 1000;

  private static final int SAMPLES = 14;

  /**
   * ASSUMPTION: roughness grows to that of the surroundings within this distance of the sea, km.
   */
  private static final double ROUGHNESS_FULL_KM = 0.5;

  private SaltPaths() {}

  /**
   * ASSUMPTION: marine air below this height spreads over land unhindered, m; spread 100–500. What
   * rises above it, the place itself included, holds salt back.
   */
  private static final double LOW_AIR_M = 300;

  /** Per direction of the sea view, how far land up to the shore rises above the low air, m. */
  static double[] crestsAboveLowAirM(Place place, FieldStack elevation) {
    double[] crest = new double[SeaView.DIRECTIONS];
    for (int k = 0; k < SeaView.DIRECTIONS; k++) {
      double shoreKm = place.sea().shoreKm()[k];
      double endKm = Math.min(shoreKm, FARTHEST_KM);
      if (Double.isInfinite(shoreKm) || endKm < NEAREST_KM) {
        continue;
      }
      crest[k] = Math.max(0, place.elevationM() - LOW_AIR_M);
      double azimuth = Math.toRadians(k * 360.0 / SeaView.DIRECTIONS);
      for (int i = 1; i <= SAMPLES; i++) {
        // Samples crowd near the place, where a crest is seen best.
        double share = i / (double) SAMPLES;
        double km = NEAREST_KM / 2 + (endKm - NEAREST_KM / 2) * share * share;
        crest[k] = Math.max(crest[k], heightAt(place, azimuth, km, elevation) - LOW_AIR_M);
      }
    }
    return crest;
  }

  /**
   * ASSUMPTION: roughness between shore and place by setting, on the scale 0 open water … 0.5 town
   * or forest of the stations that the sea-salt constants were fitted on; spread 0.1.
   */
  static double roughness(Setting setting, double distanceToSeaKm) {
    double full =
        switch (setting) {
          case REMOTE -> 0.15;
          case RURAL -> 0.2;
          case TOWN -> 0.3;
          case CITY -> 0.4;
          case INDUSTRIAL -> 0.35;
          case PORT -> 0.1;
        };
    return full * Math.min(1, distanceToSeaKm / ROUGHNESS_FULL_KM);
  }

  private static double heightAt(Place place, double azimuth, double km, FieldStack elevation) {
    double arc = km / EARTH_RADIUS_KM;
    double latitude = Math.toRadians(place.latitudeDeg());
    double sine =
        Math.sin(latitude) * Math.cos(arc) + Math.cos(latitude) * Math.sin(arc) * Math.cos(azimuth);
    double toLatitude = Math.asin(Math.max(-1, Math.min(1, sine)));
    double toLongitude =
        Math.toRadians(place.longitudeDeg())
            + Math.atan2(
                Math.sin(azimuth) * Math.sin(arc) * Math.cos(latitude),
                Math.cos(arc) - Math.sin(latitude) * sine);
    double longitudeDeg = Math.IEEEremainder(Math.toDegrees(toLongitude), 360);
    double height = elevation.sample(0, Math.toDegrees(toLatitude), longitudeDeg);
    return Double.isNaN(height) ? 0 : height;
  }
}
