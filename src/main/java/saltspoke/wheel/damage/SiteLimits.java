package saltspoke.wheel.damage;

import saltspoke.wheel.Material;
import saltspoke.wheel.Spoke;

/** How much loss is too much at a couple's site. */
final class SiteLimits {
  /** Loss of the rim bed over its thickness at which it cracks at the hole. ASSUMPTION. */
  private static final double BED_SHARE = 0.5;

  /** Tensile strength of spoke wire, MPa, common practice. */
  private static final double WIRE_MPA = 1000;

  private SiteLimits() {}

  /** Dose at which a couple's product holds the nipple fast, µm; infinite where it cannot. */
  static double seizedUm(Parts parts, Couple couple) {
    if (couple.where() == Couple.Where.THREAD) {
      return couple.metal() == Material.ZINC
          ? Double.POSITIVE_INFINITY
          : Products.metalToFillUm(couple.metal(), Products.THREAD_GAP_UM);
    }
    return Products.metalToFillUm(couple.metal(), seatGapUm(parts, couple));
  }

  /** Room round the nipple's body in the rim hole over the area of the ring that feeds it, µm. */
  private static double seatGapUm(Parts parts, Couple couple) {
    double holeMm = parts.rim().holeDiameterMm();
    double bodyMm = parts.nipple().bodyDiameterMm();
    double roomMm3 =
        Math.PI / 4 * (holeMm * holeMm - bodyMm * bodyMm) * parts.rim().bedThicknessMm();
    double ringMm2 = couple.wholeRing().ringCircumferenceMm() * couple.wholeRing().ringWidthMm();
    return 1000 * Products.SEAT_FILL * roomMm3 / ringMm2;
  }

  /** Dose at which head, rim bed or spoke gives way, µm; infinite where it cannot. */
  static double lostUm(Parts parts, Couple couple, double tensionN) {
    double widthUm = couple.spec().ringWidthMm() * 1000;
    boolean seat = couple.where() == Couple.Where.SEAT;
    if (couple.part().equals("nipple") && seat) {
      double depthMm =
          HeadSection.criticalDepthMm(
              parts.nipple().threadDiameterMm() / 2,
              parts.nipple().headWallMm(),
              tensionN,
              HeadSection.strengthMpa(couple.metal()));
      return GrooveGrowth.doseUm(depthMm * 1000, widthUm);
    }
    if (couple.part().equals("rim")) {
      return GrooveGrowth.doseUm(parts.rim().bedThicknessMm() * BED_SHARE * 1000, widthUm);
    }
    if (couple.part().equals("spoke") && couple.metal() == Material.CARBON_STEEL) {
      Spoke spoke = parts.spoke();
      double depthMm = HeadSection.criticalDepthMm(0, spoke.diameterMm() / 2, tensionN, WIRE_MPA);
      return GrooveGrowth.doseUm(depthMm * 1000, widthUm);
    }
    return Double.POSITIVE_INFINITY;
  }
}
