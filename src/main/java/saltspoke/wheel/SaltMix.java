package saltspoke.wheel;

/**
 * Salt lying on the rim bed, as chloride by kind, mg Cl per m². All parts ≥ 0.
 *
 * @param seaMgClPerM2 sea salt, which holds magnesium chloride
 * @param rockMgClPerM2 rock salt from roads, sodium chloride
 * @param brineMgClPerM2 road brine with magnesium or calcium chloride
 * @param sweatMgClPerM2 sweat, sodium chloride
 */
public record SaltMix(
    double seaMgClPerM2, double rockMgClPerM2, double brineMgClPerM2, double sweatMgClPerM2) {
  public SaltMix {
    if (!(seaMgClPerM2 >= 0 && rockMgClPerM2 >= 0 && brineMgClPerM2 >= 0 && sweatMgClPerM2 >= 0)) {
      throw new IllegalArgumentException("salt loads are numbers of at least 0");
    }
  }

  /** No salt at all. */
  public static final SaltMix NONE = new SaltMix(0, 0, 0, 0);

  public double totalMgClPerM2() {
    return seaMgClPerM2 + rockMgClPerM2 + brineMgClPerM2 + sweatMgClPerM2;
  }
}
