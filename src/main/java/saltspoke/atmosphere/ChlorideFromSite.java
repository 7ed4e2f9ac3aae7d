package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import saltspoke.values.Note;
import saltspoke.values.Quantiles;
import saltspoke.values.Refusal;

/**
 * Chloride deposition at a measuring site from what its station list says: distance to the coast,
 * wind, share of months with saline wind, roughness and height. A straight ocean coast stands in
 * for the map, and the sea-salt constants are those of {@link SaltKernel}.
 */
public final class ChlorideFromSite {
  /** FITTED with the kernel: onshore wind left where no month counts as one of saline wind. */
  private static final double SHARE_WITHOUT_SALINE_MONTHS = 0.67;

  /** ln spread, one standard deviation: ln-RMSE with each measured programme left out in turn. */
  public static final double LN_SPREAD = 0.85;

  /** Directions of the seaward half-plane, as angles from the shore's normal. */
  private static final int HALF_DIRECTIONS = 18;

  /** Fetch of the stand-in ocean, km: the cap of {@link saltspoke.places.SeaView}. */
  private static final double OCEAN_FETCH_KM = 500;

  /** Farthest station of the fit, km. */
  private static final double FITTED_TO_KM = 351;

  private ChlorideFromSite() {}

  /**
   * @param distanceKm to the coast, km, 0..5000
   * @param windMPerS mean wind speed at 10 m, m/s, 0..40; held within the winds of the fitted
   *     stations
   * @param salineWindShare share of months with wind from the sea above some 3 m/s, 0..1
   * @param roughness 0 open water … 0.5 town or forest, at most 10
   * @param elevationM height above sea level, m; 0 when unknown
   * @return p10, median, p90, mg Cl/(m² d), wet candle
   */
  public static Quantiles predict(
      double distanceKm,
      double windMPerS,
      double salineWindShare,
      double roughness,
      double elevationM) {
    check("distance_to_coast_km", distanceKm, 0, 5000);
    check("wind_speed_m_s", windMPerS, 0, 40);
    check("saline_wind_fraction", salineWindShare, 0, 1);
    check("roughness", roughness, 0, 10);
    check("elevation_m", elevationM, -500, 9000);
    double speed = SaltKernel.heldWind(windMPerS);
    double coarse = 0;
    double fine = 0;
    double background = 0;
    double rain = SaltKernel.REFERENCE_RAIN_MM_PER_YEAR;
    for (int k = 0; k < HALF_DIRECTIONS; k++) {
      double fromNormal = Math.toRadians(-85 + 10 * k);
      double shoreKm = distanceKm / Math.cos(fromNormal);
      coarse += SaltKernel.coarseMg(shoreKm, OCEAN_FETCH_KM) / HALF_DIRECTIONS;
      fine += SaltKernel.fineMg(shoreKm, OCEAN_FETCH_KM, rain) / HALF_DIRECTIONS;
      background += SaltKernel.backgroundMg(shoreKm, rain) / HALF_DIRECTIONS;
    }
    double share =
        SHARE_WITHOUT_SALINE_MONTHS + (1 - SHARE_WITHOUT_SALINE_MONTHS) * salineWindShare;
    double carried = SeaSalt.coarseStrength(speed) * coarse + SeaSalt.fineStrength(speed) * fine;
    double median =
        SaltKernel.CONTINENTAL_MG
            + background
            + share * SaltKernel.shelter(roughness, elevationM) * carried;
    return SeaSalt.spread(median, LN_SPREAD);
  }

  /** What the prediction stands outside of: the stations that the constants were fitted on. */
  public static List<Note> flags(double distanceKm, double windMPerS) {
    List<Note> flags = new ArrayList<>();
    distanceFlag(distanceKm).ifPresent(flags::add);
    if (SaltKernel.heldWind(windMPerS) != windMPerS) {
      flags.add(SaltKernel.windHeld(windMPerS));
    }
    return flags;
  }

  /** A flag when the place lies farther from the sea than any station of the fit. */
  static Optional<Note> distanceFlag(double distanceKm) {
    return distanceKm > FITTED_TO_KM
        ? Optional.of(
            Note.of(
                "air-salt-beyond-fit",
                "distanceKm",
                Math.round(distanceKm),
                "limitKm",
                Math.round(FITTED_TO_KM)))
        : Optional.empty();
  }

  private static void check(String field, double value, double low, double high) {
    if (!(value >= low && value <= high)) {
      throw Refusal.outOfRange(field, value, low + ".." + high);
    }
  }
}
