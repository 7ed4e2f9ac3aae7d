package saltspoke.atmosphere;

/**
 * Monthly mean temperature at a place: the map's value plus a correction for the height difference
 * between map and place, for the coast, and for the difference in period (map 1979–2014, ITU-R
 * P.1510-1; stations 1961–1990: the map is about 0.4 K warmer, so the answer stands for 1961–1990).
 *
 * <p>Linear least squares with a ridge of 0.001 on CRU CL 2.0 stations (New et al. 2002), 1500 of
 * them; see the notes for the error on stations left out by 10° cells.
 */
final class TemperatureModel {
  private static final double[] COEFFICIENTS = {
    1.5097, // constant
    3.0876, // map's ground above the place, km
    -0.062769, // map temperature / 20
    -0.61627, // its square
    -3.5626, // |latitude| / 90
    -0.51025, // winter phase
    -0.025294, // elevation, km
    -0.33317, // spring phase × |latitude|
    0.61156, // near the sea: (marine − map temperature) / 10
    0.21951, // near the sea × spring phase
    -0.13627, // near the sea × winter phase
    1.0781, // surroundings above the place × map temperature / 20
  };

  private TemperatureModel() {}

  /** Monthly means, °C. */
  static double[] monthlyC(Site s, PlaceFields.At at) {
    double[] result = new double[PlaceFields.MONTHS];
    for (int m = 0; m < result.length; m++) {
      result[m] = at.temperatureC()[m] + correction(s, at, m);
    }
    return result;
  }

  private static double correction(Site s, PlaceFields.At at, int m) {
    double grid = at.temperatureC()[m];
    double t = Site.hold(grid, -40, 36);
    double winter = s.winter(m);
    double spring = s.spring(m);
    double marine = Site.hold(at.marineTemperatureC()[m] - grid, -10, 10);
    double[] terms = {
      1,
      s.aroundAboveKm(),
      t / 20,
      t * t / 400,
      s.latitude(),
      winter,
      s.elevationKm(),
      spring * s.latitude(),
      s.nearSea() * marine / 10,
      s.nearSea() * spring,
      s.nearSea() * winter,
      s.aroundAboveKm() * t / 20
    };
    return Site.dot(COEFFICIENTS, terms);
  }
}
