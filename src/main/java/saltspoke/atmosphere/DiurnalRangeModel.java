package saltspoke.atmosphere;

/**
 * Mean daily range of temperature (mean maximum less mean minimum) from humidity, rain, warmth,
 * season, latitude, elevation and nearness of a windy sea. ln of the range is linear; least squares
 * with a ridge of 0.001 on 1500 stations of CRU CL 2.0 (New et al. 2002). Mean absolute error 1.5
 * K.
 */
final class DiurnalRangeModel {
  private static final double[] COEFFICIENTS = {
    2.4135, // constant
    2.0366, // RH / 100
    -2.6182, // its square
    -0.19015, // near the sea × annual marine wind / 10
    -0.13631, // rain
    0.063306, // annual rain
    0.088131, // rain × T
    -0.31839, // RH × T
    0.15589, // T / 20
    -0.029424, // its square
    0.21991, // near the sea × RH
    -0.24748, // near the sea
    0.047562, // near the sea × |latitude|
    0.034212, // RH × elevation
    0.0719, // seasonal range / 20
    0.02946, // winter phase
    -0.080943, // RH × winter phase
    -0.21603, // |latitude| / 90
  };

  private DiurnalRangeModel() {}

  /** Monthly means, K. */
  static double[] monthlyC(
      Site s, PlaceFields.At at, YearShape year, double[] relativeHumidityPct) {
    double meanWind = 0;
    for (double w : at.marineWindMPerS()) {
      meanWind += w / PlaceFields.MONTHS;
    }
    double wind = Site.hold(meanWind, 2, 10);
    double[] result = new double[PlaceFields.MONTHS];
    for (int m = 0; m < result.length; m++) {
      result[m] = Math.exp(lnRange(s, year, m, relativeHumidityPct[m] / 100, wind));
    }
    return result;
  }

  private static double lnRange(Site s, YearShape year, int m, double rh, double wind) {
    double t = year.warmth(m);
    double rain = year.rain(m);
    double yearRain = year.yearRain();
    double season = year.seasonalRangeK() / 20;
    double winter = s.winter(m);
    double[] terms = {
      1,
      rh,
      rh * rh,
      s.nearSea() * wind / 10,
      rain,
      yearRain,
      rain * t,
      rh * t,
      t,
      t * t,
      s.nearSea() * rh,
      s.nearSea(),
      s.nearSea() * s.latitude(),
      rh * s.elevationKm(),
      season,
      winter,
      rh * winter,
      s.latitude()
    };
    return Site.dot(COEFFICIENTS, terms);
  }
}
