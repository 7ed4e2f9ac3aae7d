package saltspoke.wheel;

import saltspoke.values.Quantiles;

/**
 * What covers a part, and how much of the part it leaves bare. The shares are assumptions of the
 * catalogue with their spread; none is fitted to a case.
 *
 * @param kind what it is made of
 * @param thicknessUm µm, 0 for none
 * @param seatBareShare share of the seat ring's length that is bare metal (or fibre) once the wheel
 *     is built: 1 for an uncoated part, the length worn through by turning the nipple for a coated
 *     one
 * @param defectShare share of the rest of the surface that is bare: pores and nicks of a coating;
 *     exposed fibre of a carbon rim; 1 for an uncoated metal
 */
public record Coating(
    Kind kind, double thicknessUm, Quantiles seatBareShare, Quantiles defectShare) {
  public Coating {
    if (!(thicknessUm >= 0) || (kind == Kind.NONE) != (thicknessUm == 0)) {
      throw new IllegalArgumentException("a coating has a thickness, and no coating has none");
    }
    requireShare(seatBareShare);
    requireShare(defectShare);
  }

  static void requireShare(Quantiles share) {
    if (!(share.p10() >= 0 && share.p90() <= 1)) {
      throw new IllegalArgumentException("a share lies between 0 and 1");
    }
  }

  /** Kinds of coating. */
  public enum Kind {
    NONE,
    /** Anodic oxide on aluminium, an insulator where whole. */
    ANODIC,
    /** Nickel plate, a noble conductor. */
    NICKEL,
    /** Zinc, which protects by dissolving first. */
    ZINC,
    /** A fabric ply without carbon between nipple and carbon, an insulator. */
    PLY
  }
}
