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

  private static final double[] SIN = new double[SeaView.DIRECTIONS];
  private static final double[] COS = new double[SeaView.DIRECTIONS];

  static {
    for (int k = 0; k < SeaView.DIRECTIONS; k++) {
      double azimuth = Math.toRadians(k * 360.0 / SeaView.DIRECTIONS);
      SIN[k] = Math.sin(azimuth);
      COS[k] = Math.cos(azimuth);
    }
  }

  private SaltPaths() {}

  /**
   * ASSUMPTION: marine air below this height spreads over land unhindered, m; spread 100–500. What
   * rises above it, the place itself included, holds salt back.
   */
  private static final double LOW_AIR_M = 300;

  /** Per direction of the sea view, how far land up to the shore rises above the low air, m. */
  static double[] crestsAboveLowAirM(Place place, FieldStack elevation) {
    double[] crest = new double[SeaView.DIRECTIONS];
    double latitude = Math.toRadians(place.latitudeDeg());
    double sinLatitude = Math.sin(latitude);
    double cosLatitude = Math.cos(latitude);
    for (int k = 0; k < SeaView.DIRECTIONS; k++) {
      double shoreKm = place.sea().shoreKm()[k];
      double endKm = Math.min(shoreKm, FARTHEST_KM);
      if (Double.isInfinite(shoreKm) || endKm < NEAREST_KM) {
        continue;
      }
      crest[k] = Math.max(0, place.elevationM() - LOW_AIR_M);
      for (int i = 1; i <= SAMPLES; i++) {
        // Samples crowd near the place, where a crest is seen best.
        double share = i / (double) SAMPLES;
        double km = NEAREST_KM / 2 + (endKm - NEAREST_KM / 2) * share * share;
        double arc = km / EARTH_RADIUS_KM;
        double sinArc = Math.sin(arc);
        double cosArc = Math.cos(arc);
        double sine = sinLatitude * cosArc + cosLatitude * sinArc * COS[k];
        // Not by asin, which costs three times as much.
        double toLatitude = Math.atan2(sine, Math.sqrt(Math.max(0, 1 - sine * sine)));
        double east = Math.atan2(SIN[k] * sinArc * cosLatitude, cosArc - sinLatitude * sine);
        double height =
            elevation.sample(
                0,
                Math.toDegrees(toLatitude),
                wrapped(place.longitudeDeg() + Math.toDegrees(east)));
        crest[k] = Math.max(crest[k], Double.isNaN(height) ? 0 : height - LOW_AIR_M);
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

  private static double wrapped(double longitudeDeg) {
    return longitudeDeg - 360 * Math.floor((longitudeDeg + 180) / 360);
  }
}
