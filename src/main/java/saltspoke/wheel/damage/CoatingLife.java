package saltspoke.wheel.damage;

import saltspoke.wheel.Coating;

/** How long a coating lasts where nothing has scratched it. */
public final class CoatingLife {
  /** Thinning of an anodic film in mild air, µm per year: low end of the published 0.2–0.4. */
  static final double ANODIC_MILD_UM_PER_YEAR = 0.2;

  /** Thinning of an anodic film at the worst published site, µm per year. */
  static final double ANODIC_WORST_UM_PER_YEAR = 1.2;

  /**
   * Loss of nickel plate under a film that never dries, µm per year. ASSUMPTION, spread in {@link
   * Assumption#COATING_LIFE}; nickel in marine air loses tenths of a µm a year.
   */
  static final double NICKEL_WET_UM_PER_YEAR = 2;

  /**
   * Loss of zinc under a salt film that never dries, µm per year. ASSUMPTION, same spread: some
   * times the C5 loss of ISO 9223, since the film there does dry.
   */
  static final double ZINC_WET_UM_PER_YEAR = 25;

  private CoatingLife() {}

  /**
   * Months until an unscratched coating is through; infinite for none or a ply.
   *
   * @param coating kind and thickness
   * @param wetShare share of the year in which a film lies on it, 0..1; the anodic rate goes
   *     straight from mild to worst with it (ASSUMPTION)
   */
  public static double months(Coating coating, double wetShare) {
    double umPerYear =
        switch (coating.kind()) {
          case ANODIC ->
              ANODIC_MILD_UM_PER_YEAR
                  + (ANODIC_WORST_UM_PER_YEAR - ANODIC_MILD_UM_PER_YEAR) * wetShare;
          case NICKEL -> NICKEL_WET_UM_PER_YEAR * wetShare;
          case ZINC -> ZINC_WET_UM_PER_YEAR * wetShare;
          case NONE, PLY -> 0;
        };
    return umPerYear > 0 ? 12 * coating.thicknessUm() / umPerYear : Double.POSITIVE_INFINITY;
  }
}
