package saltspoke.atmosphere;

import java.util.Map;
import saltspoke.values.Note;

/**
 * How much sea salt one stretch of shore brings to a place, by distance: the one home of the sea
 * salt constants, used by the field form ({@link SeaSalt}) and the site form ({@link
 * ChlorideFromSite}) alike.
 *
 * <p>Shape: coarse surf droplets decay exponentially (Feliu, Morcillo and Chico 1999: within the
 * first 400–600 m); fine aerosol falls as an inverse power of distance (Gustafsson and Franzén
 * 2000) with wash-out; a thin marine background reaches farthest. Salt over water grows as
 * exp(0.16·u) (Lovett 1978), and only wind above about 3 m/s brings droplets ashore (Meira 2006;
 * Feliu 2001). Amounts marked FITTED were fitted by regularised least squares on ln deposition with
 * a free offset per programme, on 133 measured stations of three programmes of 1998–2019.
 */
final class SaltKernel {
  /** Wind needed to carry coarse droplets, m/s; Meira 2006, Feliu 2001. */
  static final double COARSE_THRESHOLD_M_PER_S = 3;

  /** Growth of salt over water with wind speed, s/m; Lovett 1978. */
  static final double COARSE_GROWTH_S_PER_M = 0.16;

  /** ASSUMPTION: slower wind than this carries no aerosol anywhere, m/s; spread 1.5–3. */
  static final double FINE_THRESHOLD_M_PER_S = 2;

  /** Mean wind speed at which the amounts below hold, m/s. */
  static final double REFERENCE_WIND_M_PER_S = 5;

  /** FITTED: coarse deposition at the water's edge, open ocean, mg/(m² d). */
  private static final double COARSE_MG = 70;

  /** FITTED, held near Feliu, Morcillo and Chico 1999: length of decay, km. */
  private static final double COARSE_KM = 0.2;

  /** FITTED: fine deposition at 1 km, mg/(m² d). */
  private static final double FINE_MG = 33;

  /** FITTED: exponent of distance. */
  private static final double FINE_POWER = 0.24;

  /** ASSUMPTION: no candle hangs nearer to the surf than this, km. */
  private static final double FINE_OFFSET_KM = 0.03;

  /** FITTED coarsely: length of wash-out of the fine part at 1000 mm rain a year, km. */
  private static final double FINE_WASHOUT_KM = 400;

  /** FITTED coarsely: the marine background at the coast, mg/(m² d). */
  private static final double BACKGROUND_MG = 5;

  /** ASSUMPTION: its length of decay at 1000 mm rain a year, km; spread 450–900. */
  private static final double BACKGROUND_KM = 600;

  /**
   * ASSUMPTION: half of wash-out is rain's at 1000 mm a year, half settles dry. Drier air keeps the
   * lengths of 1000 mm: it mixes salt over a deeper layer, which thins what missing rain spares.
   */
  private static final double RAIN_SHARE = 0.5;

  /** ASSUMPTION: rain a year for which the lengths above hold, mm. */
  static final double REFERENCE_RAIN_MM_PER_YEAR = 1000;

  /** ASSUMPTION: dust and other continental chloride, mg/(m² d); below the standard's floor. */
  static final double CONTINENTAL_MG = 0.1;

  /** FITTED: ln units lost per unit of roughness, 0 open water, 0.5 town or forest. */
  private static final double ROUGHNESS_LOSS = 0.65;

  /** FITTED coarsely: ln units lost per km of height of the place. */
  private static final double HEIGHT_LOSS_PER_KM = 0.3;

  /** ASSUMPTION: fetch by which surf is raised to 63 %, km; spread 5–20. */
  private static final double COARSE_FETCH_KM = 10;

  /** ASSUMPTION: fetch by which aerosol is raised to 63 %, km; spread 20–100. */
  private static final double FINE_FETCH_KM = 50;

  /**
   * ASSUMPTION: a crest that stands this much above the low marine air lets 37 % of the salt over,
   * km; spread 0.4–1.2.
   */
  private static final double CREST_KM = 0.7;

  /** Calmest and windiest station of the fit, m/s; beyond them the nearer is used, and flagged. */
  private static final double FITTED_WIND_FROM_M_PER_S = 1.6;

  private static final double FITTED_WIND_TO_M_PER_S = 8.5;

  private SaltKernel() {}

  /** A mean wind held within those of the fitted stations, m/s. */
  static double heldWind(double meanMPerS) {
    return Math.max(FITTED_WIND_FROM_M_PER_S, Math.min(FITTED_WIND_TO_M_PER_S, meanMPerS));
  }

  /** What to say when a wind was held. */
  static Note windHeld(double meanMPerS) {
    return new Note(
        "air-salt-wind-held",
        Map.of(
            "windMPerS", Math.round(10 * meanMPerS) / 10.0,
            "from", FITTED_WIND_FROM_M_PER_S,
            "to", FITTED_WIND_TO_M_PER_S));
  }

  /** Coarse droplets, mg/(m² d) at the reference wind, before shelter. */
  static double coarseMg(double shoreKm, double fetchKm) {
    return COARSE_MG * Math.exp(-shoreKm / COARSE_KM) * (1 - Math.exp(-fetchKm / COARSE_FETCH_KM));
  }

  /** Fine aerosol, mg/(m² d) at the reference wind, before shelter. */
  static double fineMg(double shoreKm, double fetchKm, double rainMmPerYear) {
    return FINE_MG
        * Math.pow(shoreKm + FINE_OFFSET_KM, -FINE_POWER)
        * Math.exp(-shoreKm * washout(rainMmPerYear) / FINE_WASHOUT_KM)
        * (1 - Math.exp(-fetchKm / FINE_FETCH_KM));
  }

  /** Marine background, mg/(m² d). */
  static double backgroundMg(double shoreKm, double rainMmPerYear) {
    return BACKGROUND_MG * Math.exp(-shoreKm * washout(rainMmPerYear) / BACKGROUND_KM);
  }

  /** Share of coarse and fine that roughness and height of the place leave, 0..1. */
  static double shelter(double roughness, double elevationM) {
    return Math.exp(
        -ROUGHNESS_LOSS * roughness - HEIGHT_LOSS_PER_KM * Math.max(0, elevationM) / 1000);
  }

  /** Share that a crest between sea and place lets over, 0..1. */
  static double overCrest(double crestAboveLowAirM) {
    return Math.exp(-Math.max(0, crestAboveLowAirM) / 1000 / CREST_KM);
  }

  private static double washout(double rainMmPerYear) {
    return 1 + RAIN_SHARE * Math.max(0, rainMmPerYear / REFERENCE_RAIN_MM_PER_YEAR - 1);
  }
}
