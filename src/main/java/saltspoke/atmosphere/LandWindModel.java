package saltspoke.atmosphere;

/**
 * Monthly mean wind speed at 10 m on land, from the marine wind (COADS) of the nearest waters, the
 * distance to the sea, latitude, season, relief and rain (which stands for roughness). Least
 * squares with a ridge of 0.001 on 1500 stations of CRU CL 2.0 (New et al. 2002); mean absolute
 * error 0.75 m/s, about as much as the shelter of single stations differs.
 */
final class LandWindModel {
  private static final double[] COEFFICIENTS = {
    0.16605, // constant
    0.068458, // marine wind within about 200 km
    3.7647, // |latitude| / 90
    0.31095, // marine wind
    0.33058, // spring phase
    -0.80976, // vapour map's height above the place, km
    -0.21286, // annual rain
    -0.35511, // seasonal range / 20
    -0.032969, // daily range / 10
    0.26566, // T / 20
    0.076483, // marine wind within about 15 km
    -1.5116, // |latitude| squared
  };

  /** Stillest monthly mean, m/s: the lowest few stations. */
  private static final double LEAST_M_PER_S = 0.5;

  private LandWindModel() {}

  /** Monthly means, m/s, at least 0.5. */
  static double[] monthlyMPerS(Site s, PlaceFields.At at, YearShape year, double[] diurnalRangeC) {
    double near200 = Math.exp(-s.seaDistanceKm() / 200);
    double near15 = Math.exp(-s.seaDistanceKm() / 15);
    double yearRain = year.yearRain();
    double season = year.seasonalRangeK() / 20;
    double[] result = new double[PlaceFields.MONTHS];
    for (int m = 0; m < result.length; m++) {
      double sea = at.marineWindMPerS()[m];
      double spring = s.spring(m);
      double t = year.warmth(m);
      double rangeC = diurnalRangeC[m];
      double[] terms = {
        1,
        near200 * sea,
        s.latitude(),
        sea,
        spring,
        s.mapAboveKm(),
        yearRain,
        season,
        rangeC / 10,
        t,
        near15 * sea,
        s.latitude() * s.latitude()
      };
      result[m] = Math.max(LEAST_M_PER_S, Site.dot(COEFFICIENTS, terms));
    }
    return result;
  }
}
