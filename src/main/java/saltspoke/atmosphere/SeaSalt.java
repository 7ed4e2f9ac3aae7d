package saltspoke.atmosphere;

import java.util.List;
import saltspoke.places.SeaView;
import saltspoke.values.Quantiles;

/**
 * Chloride deposition from the sea, mg/(m² d) on the wet candle: over 36 directions, the wind that
 * comes from each times the salt that its shore gives. On a straight ocean coast with wind from all
 * sides alike this is exactly {@link ChlorideFromSite} with a saline-wind share of 1.
 */
public final class SeaSalt {
  /**
   * ln spread of the estimate, one standard deviation: 0.85 is the ln-RMSE on measured programmes
   * left out of the fit; wind and fetch from maps add 0.3 (ASSUMPTION), in quadrature.
   */
  public static final double LN_SPREAD = 0.90;

  /** Sums over the two halves of a straight coast, so that half of all winds counts as 1. */
  private static final double HALF_PLANE = 2;

  /** Coarse deposition not worth its exponentials, mg/(m² d). */
  private static final double NEGLIGIBLE_MG = 1e-6;

  private static final double SECTOR_RADIAN = 2 * Math.PI / SeaView.DIRECTIONS;
  private static final double[] SIN = new double[SeaView.DIRECTIONS];
  private static final double[] COS = new double[SeaView.DIRECTIONS];

  static {
    for (int k = 0; k < SeaView.DIRECTIONS; k++) {
      SIN[k] = Math.sin(k * SECTOR_RADIAN);
      COS[k] = Math.cos(k * SECTOR_RADIAN);
    }
  }

  /** All-sided wind of the reference speed, to which the kernel's amounts belong. */
  private static final double COARSE_UNIT =
      coarseCarried(WindMonth.fromAllSides(SaltKernel.REFERENCE_WIND_M_PER_S));

  private static final double FINE_UNIT =
      fineCarried(WindMonth.fromAllSides(SaltKernel.REFERENCE_WIND_M_PER_S));

  private final double[] coarseMg = new double[SeaView.DIRECTIONS];
  private final double[] fineMg = new double[SeaView.DIRECTIONS];
  private final double steadyMg;

  /**
   * @param sea shore, fetch and salinity in 36 directions
   * @param crestAboveLowAirM per direction, how far land up to the shore rises above the low marine
   *     air, m, ≥ 0
   * @param roughness 0 open water … 0.5 town or forest
   * @param elevationM height of the place, m
   * @param rainMmPerYear rain that washes salt out on the way, mm
   */
  public SeaSalt(
      SeaView sea,
      double[] crestAboveLowAirM,
      double roughness,
      double elevationM,
      double rainMmPerYear) {
    if (crestAboveLowAirM.length != SeaView.DIRECTIONS) {
      throw new IllegalArgumentException("crests are given for 36 directions");
    }
    double shelter = SaltKernel.shelter(roughness, elevationM);
    double background = 0;
    for (int k = 0; k < SeaView.DIRECTIONS; k++) {
      double shoreKm = sea.shoreKm()[k];
      if (Double.isInfinite(shoreKm)) {
        continue;
      }
      double reaching = sea.salinityRatio()[k] * SaltKernel.overCrest(crestAboveLowAirM[k]);
      double fetchKm = sea.fetchKm()[k];
      coarseMg[k] = HALF_PLANE * shelter * reaching * SaltKernel.coarseMg(shoreKm, fetchKm);
      fineMg[k] =
          HALF_PLANE * shelter * reaching * SaltKernel.fineMg(shoreKm, fetchKm, rainMmPerYear);
      background += reaching * SaltKernel.backgroundMg(shoreKm, rainMmPerYear);
    }
    steadyMg = SaltKernel.CONTINENTAL_MG + HALF_PLANE / SeaView.DIRECTIONS * background;
  }

  /** Median deposition of one month, mg/(m² d). */
  public double monthMgPerM2Day(WindMonth wind) {
    SectorWind sectors = new SectorWind(wind);
    double carried = 0;
    for (int k = 0; k < SeaView.DIRECTIONS; k++) {
      if (fineMg[k] > 0) {
        carried += fineMg[k] * fineShare(sectors, k) / FINE_UNIT;
      }
      if (coarseMg[k] > NEGLIGIBLE_MG) {
        carried += coarseMg[k] * coarseShare(sectors, k) / COARSE_UNIT;
      }
    }
    return steadyMg + carried;
  }

  /** Annual median with 10 % and 90 % from the spread of the estimate's logarithm. */
  static Quantiles annual(List<Double> monthlyMgPerM2Day, double lnSpread) {
    double mean =
        monthlyMgPerM2Day.stream().mapToDouble(Double::doubleValue).average().orElseThrow();
    return spread(mean, lnSpread);
  }

  /** Log-normal quantiles about a median. */
  static Quantiles spread(double median, double lnSpread) {
    double factor = Math.exp(NormalLaw.Z90 * lnSpread);
    return new Quantiles(median / factor, median, median * factor);
  }

  /** Coarse-carrying strength of wind from all sides over that of the reference wind. */
  static double coarseStrength(double meanSpeedMPerS) {
    return coarseCarried(WindMonth.fromAllSides(meanSpeedMPerS)) / COARSE_UNIT;
  }

  /** Fine-carrying strength of wind from all sides over that of the reference wind. */
  static double fineStrength(double meanSpeedMPerS) {
    return fineCarried(WindMonth.fromAllSides(meanSpeedMPerS)) / FINE_UNIT;
  }

  private static double coarseCarried(WindMonth wind) {
    return SeaView.DIRECTIONS * coarseShare(new SectorWind(wind), 0);
  }

  private static double fineCarried(WindMonth wind) {
    return SeaView.DIRECTIONS * fineShare(new SectorWind(wind), 0);
  }

  private static double coarseShare(SectorWind wind, int direction) {
    return SECTOR_RADIAN
        * wind.carriedPerRadian(
            SIN[direction],
            COS[direction],
            SaltKernel.COARSE_THRESHOLD_M_PER_S,
            SaltKernel.COARSE_GROWTH_S_PER_M,
            SaltKernel.REFERENCE_WIND_M_PER_S);
  }

  private static double fineShare(SectorWind wind, int direction) {
    return SECTOR_RADIAN
        * wind.carriedPerRadian(
            SIN[direction],
            COS[direction],
            SaltKernel.FINE_THRESHOLD_M_PER_S,
            0,
            SaltKernel.REFERENCE_WIND_M_PER_S);
  }
}
