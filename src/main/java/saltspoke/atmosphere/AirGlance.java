package saltspoke.atmosphere;

/**
 * What the corrosivity class of a place follows from, and nothing else: for maps of many places.
 *
 * @param exposure annual means
 * @param spread how sure they are
 */
public record AirGlance(Exposure exposure, InputSpread spread) {
  /** Median first-year loss of a metal. */
  public FirstYearLoss loss(Metal metal) {
    return Corrosion.firstYearMedian(metal, exposure, spread);
  }

  /** The category of that loss. */
  public Category category(Metal metal) {
    return CategoryLimits.categoryOf(metal, loss(metal));
  }
}
