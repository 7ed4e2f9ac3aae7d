package saltspoke.wheel;

/**
 * The build of a wheel beyond its materials.
 *
 * @param spokeCount 12..48
 * @param tensionN mean spoke tension, 300..2000 N
 * @param tapeSound whether the rim tape keeps water and sealant out of the cavity
 * @param hiddenNipples whether the nipples sit inside the rim, out of sight
 */
public record WheelBuild(
    int spokeCount, double tensionN, boolean tapeSound, boolean hiddenNipples) {
  public WheelBuild {
    Choice.within("spokeCount", spokeCount, 12, 48, "");
    Choice.within("tensionN", tensionN, 300, 2000, " N");
  }

  /** A common build: 28 spokes at 1100 N (common practice), sound tape, nipples outside. */
  public static final WheelBuild USUAL = new WheelBuild(28, 1100, true, false);
}
