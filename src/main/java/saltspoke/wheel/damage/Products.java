package saltspoke.wheel.damage;

import saltspoke.wheel.Material;

/** What corrosion makes of a metal: how much room its product takes, and when one sees it. */
public final class Products {
  /**
   * Radial room between the flanks of spoke and nipple thread that product must fill before the
   * nipple will not turn, µm. ASSUMPTION 40: an eleventh of the pitch of 0.454 mm, as fits of fine
   * threads leave; spread in {@link Assumption#SEIZING_GAP}.
   */
  public static final double THREAD_GAP_UM = 40;

  /**
   * Share of the room between nipple body and rim hole that product must fill before the nipple
   * jams in the rim: powder packs loosely. ASSUMPTION 0.5, same spread.
   */
  public static final double SEAT_FILL = 0.5;

  /**
   * Share of the seizing loss at which a thread already turns stiff and shows product at its mouth.
   * ASSUMPTION 0.25, half its spread in {@link Assumption#VISIBLE_DEPTH}.
   */
  public static final double STIFF_SHARE = 0.25;

  private Products() {}

  /**
   * Volume of product over volume of metal, from molar volumes (computed from densities recalled
   * from memory): Al(OH)3 32 over 10.0 cm³; iron oxyhydroxide 21 over 7.1; brass in chloride:
   * Cu2(OH)3Cl 28.3 per copper over 7.1 and Zn5(OH)8Cl2·H2O 33 per zinc over 9.2, together 3.9.
   */
  static double volumeRatio(Material material) {
    return switch (material) {
      case ALUMINIUM_WROUGHT, ALUMINIUM_HIGH_STRENGTH -> 3.2;
      case CARBON_STEEL -> 3.0;
      case BRASS, NICKEL, NICKEL_ALUMINIUM_BRONZE -> 3.9;
      case ZINC -> 3.6;
      case STAINLESS, STAINLESS_PH, TITANIUM, PLATINUM, CARBON_FIBRE, POLYMER -> 1;
    };
  }

  /** Metal in µm whose product fills a gap in µm; infinite where no product grows. */
  public static double metalToFillUm(Material material, double gapUm) {
    double growth = volumeRatio(material) - 1;
    return growth > 0 ? gapUm / growth : Double.POSITIVE_INFINITY;
  }

  /**
   * Mean loss over the seat ring at which a mechanic sees it, µm: white powder of aluminium and
   * zinc, green or dark crust of brass, rust of steel. ASSUMPTION, spread in {@link
   * Assumption#VISIBLE_DEPTH}: a deposit of two to three sheets of paper; rust shows sooner.
   */
  public static double visibleAtSeatUm(Material material) {
    return switch (material) {
      case ALUMINIUM_WROUGHT, ALUMINIUM_HIGH_STRENGTH -> 30;
      case CARBON_STEEL -> 10;
      case BRASS, NICKEL, NICKEL_ALUMINIUM_BRONZE -> 15;
      case ZINC -> 10;
      case STAINLESS, STAINLESS_PH, TITANIUM, PLATINUM, CARBON_FIBRE, POLYMER ->
          Double.POSITIVE_INFINITY;
    };
  }

  /**
   * Uniform loss of an open surface at which it looks attacked, µm: dull brass, bloom on aluminium,
   * rust. ASSUMPTION, same spread.
   */
  public static double visibleInOpenUm(Material material) {
    return switch (material) {
      case ALUMINIUM_WROUGHT, ALUMINIUM_HIGH_STRENGTH -> 2;
      case CARBON_STEEL -> 5;
      case BRASS, NICKEL_ALUMINIUM_BRONZE -> 0.7;
      case ZINC -> 2;
      case NICKEL, STAINLESS, STAINLESS_PH, TITANIUM, PLATINUM, CARBON_FIBRE, POLYMER ->
          Double.POSITIVE_INFINITY;
    };
  }
}
