package saltspoke.atmosphere;

/**
 * Monthly mean relative humidity at a place. Two estimates of the saturation ratio lead: the annual
 * distribution of vapour density (ITU-R P.836-6) read at the month's rank in warmth and brought to
 * the place's height, and the seasonal harmonic of vapour pressure (ITU-R P.834). Rain, frost, the
 * sea and the season correct them. The result is a logistic function of a linear sum, so it stays
 * between 0 and 100 % anywhere.
 *
 * <p>Non-linear least squares with a ridge of 0.001 on 1500 stations of CRU CL 2.0 (New et al.
 * 2002).
 *
 * <p>ASSUMPTION on Australia: stations there read 10 points lower than the same relation elsewhere,
 * most in summer, which fits readings at 9 h and 15 h only rather than day and night (from memory);
 * an hourly year at Sydney lies between the two. Four fifths of the difference are taken over, with
 * soft edges at the continent's borders.
 */
final class HumidityModel {
  private static final double[] COEFFICIENTS = {
    1.9793, // constant
    0.44533, // ln saturation ratio, P.836
    0.12921, // rain against evaporation
    -0.28196, // vapour map's height above the place, km
    -0.1896, // elevation, km
    0.086602, // seasonal range / 20 × rain
    -0.38043, // spring phase × |latitude|
    0.61764, // annual mean of ln ratio, P.836
    -0.15317, // frost squared
    -0.52086, // near the sea: (marine − land temperature) / 10
    0.096967, // last month's rain
    0.19675, // ln ratio P.836 × annual rain
    -0.092416, // ln ratio P.836 × rain
    -0.67645, // frost: T / 20 below 0
    -0.073292, // ln ratio P.836 × T
    0.083851, // ln ratio P.836 squared
    -0.0037016, // near the sea × spring phase
    -0.1221, // near the sea × winter phase
    0.19014, // ln saturation ratio, P.834
    0.043455, // its square
    -0.11995, // ln of 10 % over 90 % exceeded vapour density
    0.0071083, // that × anomaly / 10
    -0.44213, // anomaly of the month / 10
    -0.43252, // vapour spread × winter phase
    0.060978, // annual rain
    1.6653, // |latitude| squared
    -1.2212, // |latitude| / 90
    -0.16269, // rain
    0.12334, // near the sea
    0.01587, // near the sea × ln ratio P.836
    -0.2355, // seasonal range / 20
    -0.47868, // T / 20
    0.009954, // rain squared
    0.63229, // winter phase × |latitude|
    0.12164, // rain × T
    0.011946, // annual mean of ln ratio, P.834
    -0.073784, // elevation × winter phase
    -0.45265, // Australia, see AUSTRALIA
    0.15598, // Australia × winter phase
  };

  /** Vapour density of the driest air that the fit is asked about, g/m³. */
  private static final double LEAST_DENSITY_G_PER_M3 = 1e-3;

  /** Least vapour pressure of the harmonic over saturation; it can fall below 0 in dry winters. */
  private static final double LEAST_RATIO = 0.02;

  /**
   * Height over which the vapour pressure falls to 1/e for the harmonic, km (from memory, 2.0–2.5).
   */
  private static final double HARMONIC_SCALE_KM = 2.3;

  /** Gas constant in ρ = 216.7 e/T, g K/(m³ hPa) (ITU-R P.453). */
  private static final double DENSITY_FACTOR = 216.7;

  /** Kelvin at 0 °C. */
  private static final double ZERO_C_K = 273.15;

  private static final double DRIEST_LN_RATIO = -3.5;
  private static final double MOISTEST_LN_RATIO = 0.25;

  /** Soft width of the month's rank in warmth, K: months closer than this share a rank. */
  private static final double RANK_WIDTH_K = Math.sqrt(2);

  private HumidityModel() {}

  /**
   * @param temperatureC monthly means at the place
   * @return monthly means of hourly relative humidity, %
   */
  static double[] monthlyPct(Site s, PlaceFields.At at, double[] temperatureC) {
    int months = PlaceFields.MONTHS;
    double[] ranked = new double[months];
    double[] seasonal = new double[months];
    double rankedMean = 0;
    double seasonalMean = 0;
    double[] lnDensity = at.vapourDensityGPerM3().clone();
    for (int i = 0; i < lnDensity.length; i++) {
      lnDensity[i] = Math.log(Math.max(LEAST_DENSITY_G_PER_M3, lnDensity[i]));
    }
    for (int m = 0; m < months; m++) {
      double grid = at.temperatureC()[m];
      double lnSaturation = Math.log(SaturationPressure.overWaterHpa(temperatureC[m]));
      double lnRanked =
          readLn(lnDensity, shareWarmerPct(at.temperatureC(), m))
              + Math.log((grid + ZERO_C_K) / DENSITY_FACTOR)
              + s.mapAboveKmUnheld() / at.scaleHeightKm();
      double harmonic =
          Math.max(at.seasonalVapourHpa()[m], LEAST_RATIO * SaturationPressure.overWaterHpa(grid));
      double lnSeasonal = Math.log(harmonic) + s.aroundAboveKmUnheld() / HARMONIC_SCALE_KM;
      ranked[m] = Site.hold(lnRanked - lnSaturation, DRIEST_LN_RATIO, MOISTEST_LN_RATIO);
      seasonal[m] = Site.hold(lnSeasonal - lnSaturation, DRIEST_LN_RATIO, MOISTEST_LN_RATIO);
      rankedMean += ranked[m] / months;
      seasonalMean += seasonal[m] / months;
    }
    double spread = lnDensity[PlaceFields.EXCEEDED_10] - lnDensity[PlaceFields.EXCEEDED_90];
    YearShape year = YearShape.of(temperatureC, at.rainMm());
    double[] result = new double[months];
    for (int m = 0; m < months; m++) {
      result[m] =
          100
              / (1
                  + Math.exp(
                      -logit(
                          s,
                          year,
                          m,
                          ranked[m],
                          rankedMean,
                          seasonal[m],
                          seasonalMean,
                          spread,
                          at.marineTemperatureC()[m])));
    }
    return result;
  }

  private static double logit(
      Site s,
      YearShape year,
      int m,
      double a,
      double aMean,
      double b,
      double bMean,
      double spread,
      double marineTemperatureC) {
    double winter = s.winter(m);
    double spring = s.spring(m);
    double t = year.warmth(m);
    double frost = Math.min(0, t);
    double anomaly = year.anomalyK(m) / 10;
    double season = year.seasonalRangeK() / 20;
    double rain = year.rain(m);
    double rainBefore = year.rain((m + 11) % PlaceFields.MONTHS);
    double yearRain = year.yearRain();
    double wet = year.wetness(m);
    double marine = Site.hold(marineTemperatureC - year.temperatureC()[m], -10, 10);
    double australia = australia(s.latitudeDeg(), s.longitudeDeg());
    double[] terms = {
      1,
      a,
      wet,
      s.mapAboveKm(),
      s.elevationKm(),
      season * rain,
      spring * s.latitude(),
      aMean,
      frost * frost,
      s.nearSea() * marine / 10,
      rainBefore,
      a * yearRain,
      rain * a,
      frost,
      a * t,
      a * a,
      s.nearSea() * spring,
      s.nearSea() * winter,
      b,
      b * b,
      spread,
      spread * anomaly,
      anomaly,
      spread * winter,
      yearRain,
      s.latitude() * s.latitude(),
      s.latitude(),
      rain,
      s.nearSea(),
      s.nearSea() * a,
      season,
      t,
      rain * rain,
      winter * s.latitude(),
      rain * t,
      bMean,
      s.elevationKm() * winter,
      australia,
      australia * winter
    };
    return Site.dot(COEFFICIENTS, terms);
  }

  /** Soft box around Australia: 1 inside, 0 outside, edges a few degrees wide. */
  static double australia(double latitudeDeg, double longitudeDeg) {
    double east = Math.tanh((longitudeDeg - 110) / 3) - Math.tanh((longitudeDeg - 156) / 3);
    double north = Math.tanh((latitudeDeg + 45) / 3) - Math.tanh((latitudeDeg + 9) / 3);
    return east * north / 4;
  }

  /** Share of the year's months that are warmer than this one, half of itself counted, %. */
  private static double shareWarmerPct(double[] temperatureC, int month) {
    double sum = 0;
    for (double t : temperatureC) {
      sum += Normal.below((t - temperatureC[month]) / RANK_WIDTH_K);
    }
    return 100 * sum / temperatureC.length;
  }

  /** ln density at a share exceeded, linear in the logit of the share. */
  private static double readLn(double[] lnDensity, double exceededPct) {
    double[] levels = PlaceFields.EXCEEDED_PCT;
    double x = logitPct(exceededPct);
    for (int i = 1; i < levels.length; i++) {
      double high = logitPct(levels[i]);
      if (x <= high || i == levels.length - 1) {
        double low = logitPct(levels[i - 1]);
        double share = Site.hold((x - low) / (high - low), 0, 1);
        return lnDensity[i - 1] + share * (lnDensity[i] - lnDensity[i - 1]);
      }
    }
    throw new IllegalStateException("unreachable: the last level ends the search");
  }

  private static double logitPct(double pct) {
    return Math.log(pct / (100 - pct));
  }
}
