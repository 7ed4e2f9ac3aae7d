package saltspoke.wheel;

import saltspoke.values.Quantiles;

/**
 * A rim's spoke bed.
 *
 * @param id catalogue id
 * @param title short human title
 * @param material carbon fibre or wrought aluminium
 * @param coating what covers the bed
 * @param edgeBareShare share of the cut wall of the spoke hole that is bare fibre or metal
 * @param bedThicknessMm thickness of the bed at the spoke hole
 * @param bedWidthMm width of the bed inside the cavity
 * @param holeDiameterMm spoke hole
 * @param ringWidthMm width of the ring at the hole that dissolves when the rim is the anode
 * @param source where the numbers come from
 */
public record Rim(
    String id,
    String title,
    Material material,
    Coating coating,
    Quantiles edgeBareShare,
    double bedThicknessMm,
    double bedWidthMm,
    double holeDiameterMm,
    double ringWidthMm,
    String source) {
  public Rim {
    Coating.requireShare(edgeBareShare);
  }

  /** Whether the bed is of carbon fibre. */
  public boolean carbon() {
    return material == Material.CARBON_FIBRE;
  }

  /** Area of the cut wall of one spoke hole, cm². */
  public double holeWallCm2() {
    return Math.PI * holeDiameterMm * bedThicknessMm / 100;
  }
}
