package saltspoke.wheel.damage;

import saltspoke.wheel.Material;

/** How much of a nipple's head may go before the spoke's tension pulls through. */
public final class HeadSection {
  /**
   * Peak stress in the fillet over the mean stress, with the swing of each turn of the wheel.
   * ASSUMPTION 1.2, spread ×/÷ 1.3: a blunt fillet in ductile metal under mostly steady load.
   */
  public static final double NOTCH = 1.2;

  private HeadSection() {}

  /**
   * Depth at which the rest of the ring no longer bears the spoke: the ring from the bore outwards
   * of area π((r0 + w − d)² − r0²) carries tension × {@link #NOTCH} at the material's strength.
   *
   * @param boreRadiusMm bore at the thread, 0.5..3 mm
   * @param wallMm metal between bore and seat, mm
   * @param tensionN spoke tension, N
   * @param strengthMpa tensile strength, MPa
   * @return mm, between 5 % of the wall (a head that would hardly bear the load when new) and the
   *     wall
   */
  public static double criticalDepthMm(
      double boreRadiusMm, double wallMm, double tensionN, double strengthMpa) {
    double neededMm2 = tensionN * NOTCH / strengthMpa;
    double leftRadiusMm = Math.sqrt(boreRadiusMm * boreRadiusMm + neededMm2 / Math.PI);
    return Math.max(0.05 * wallMm, boreRadiusMm + wallMm - leftRadiusMm);
  }

  /** Tensile strength of bar stock, MPa, from memory of handbook tables; 10 % either way. */
  static double strengthMpa(Material material) {
    return switch (material) {
      case ALUMINIUM_WROUGHT -> 310;
      case ALUMINIUM_HIGH_STRENGTH -> 540;
      case BRASS, NICKEL_ALUMINIUM_BRONZE -> 420;
      case CARBON_STEEL -> 450;
      case STAINLESS, STAINLESS_PH -> 700;
      case TITANIUM -> 900;
      case NICKEL -> 450;
      case ZINC, POLYMER, CARBON_FIBRE, PLATINUM -> 100;
    };
  }
}
