package saltspoke.atmosphere;

/**
 * What the fitted relations of the climate share about a place.
 *
 * @param latitudeDeg −90..90
 * @param longitudeDeg −180..180
 * @param seaDistanceKm at least 0
 * @param elevationKmUnheld height that the climate goes by, see {@link #of}
 * @param mapAboveKmUnheld height of the vapour map's topography above the place
 * @param aroundAboveKmUnheld height of the temperature map's ground above the place
 */
record Site(
    double latitudeDeg,
    double longitudeDeg,
    double seaDistanceKm,
    double elevationKmUnheld,
    double mapAboveKmUnheld,
    double aroundAboveKmUnheld) {
  /** Highest elevation of the stations of the fit, km. */
  private static final double HIGHEST_KM = 4.5;

  /** Largest difference between map and place in the fit, km. */
  private static final double MOST_ABOVE_KM = 2;

  /** The lapse is carried on to twice that, then held. */
  private static final double MOST_AROUND_KM = 4;

  /**
   * Departure from the 10′ map up to which it counts less, m; chosen on the stations of the fit.
   */
  private static final double SMALL_DEPARTURE_M = 400;

  /** Share of it that counts; chosen likewise among 0.3, 0.4, 0.5 and 1. */
  private static final double SMALL_DEPARTURE_SHARE = 0.4;

  /** ASSUMPTION: distance over which the sea's influence on land air falls to 1/e, km. */
  private static final double COAST_KM = 50;

  static Site of(
      double latitudeDeg,
      double longitudeDeg,
      double elevationM,
      double seaDistanceKm,
      PlaceFields.At at) {
    double heightM = heightForClimateM(elevationM, at.mapElevationM());
    return new Site(
        latitudeDeg,
        longitudeDeg,
        seaDistanceKm,
        heightM / 1000,
        (at.vapourTopographyM() - heightM) / 1000,
        (at.temperatureGroundM() - heightM) / 1000);
  }

  /**
   * The height that temperature and humidity go by: small departures of a place from the 10′ map
   * count less than in full, larger ones in full beyond that. A hill or a hollow of a few hundred
   * metres shares the air of its surroundings; a mountain does not.
   */
  private static double heightForClimateM(double elevationM, double mapElevationM) {
    double departure = elevationM - mapElevationM;
    double small = hold(departure, -SMALL_DEPARTURE_M, SMALL_DEPARTURE_M);
    return mapElevationM + SMALL_DEPARTURE_SHARE * small + (departure - small);
  }

  /** Elevation held to the range of the fit, 0..4.5 km. */
  double elevationKm() {
    return hold(elevationKmUnheld, 0, HIGHEST_KM);
  }

  /** Height of the vapour map's topography above the place, held to ±2 km. */
  double mapAboveKm() {
    return hold(mapAboveKmUnheld, -MOST_ABOVE_KM, MOST_ABOVE_KM);
  }

  /** Height of the temperature map's ground above the place, held to ±4 km. */
  double aroundAboveKm() {
    return hold(aroundAboveKmUnheld, -MOST_AROUND_KM, MOST_AROUND_KM);
  }

  /** Whether the place lies outside the heights on which the relations were fitted. */
  boolean outsideFittedHeights() {
    return elevationKm() != elevationKmUnheld
        || Math.abs(mapAboveKmUnheld) > MOST_ABOVE_KM
        || Math.abs(aroundAboveKmUnheld) > MOST_ABOVE_KM;
  }

  /** |latitude| over 90°. */
  double latitude() {
    return Math.abs(latitudeDeg) / 90;
  }

  /** 1 at the shore, falling to 0 inland. */
  double nearSea() {
    return Math.exp(-seaDistanceKm / COAST_KM);
  }

  /** +1 in the middle of local winter, −1 in summer, fading out towards the equator. */
  double winter(int month) {
    return PlaceFields.season(month)[0] * hemisphere();
  }

  /** +1 in local spring, −1 in autumn, fading out towards the equator. */
  double spring(int month) {
    return PlaceFields.season(month)[1] * hemisphere();
  }

  private double hemisphere() {
    return Math.tanh(latitudeDeg / 10);
  }

  static double hold(double value, double low, double high) {
    return Math.max(low, Math.min(high, value));
  }

  static double dot(double[] coefficients, double[] terms) {
    if (coefficients.length != terms.length) {
      throw new IllegalStateException("a fitted relation needs one coefficient per term");
    }
    double sum = 0;
    for (int i = 0; i < terms.length; i++) {
      sum += coefficients[i] * terms[i];
    }
    return sum;
  }
}
