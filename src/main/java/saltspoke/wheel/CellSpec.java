package saltspoke.wheel;

import java.util.Objects;
import saltspoke.values.Refusal;

/**
 * The geometry and contacts of the galvanic cell at one spoke hole.
 *
 * @param anode material that dissolves
 * @param cathode material that drives it; null for none, then only self-corrosion is left
 * @param holeRadiusMm radius of the spoke hole, &gt; 0
 * @param ringCircumferenceMm length of the bare ring on the anode, &gt; 0
 * @param ringWidthMm width of the bare ring on the anode, exposed to the film, &gt; 0
 * @param edgeAreaCm2 fully active cathode area right at the anode (cut edge of the hole), ≥ 0; it
 *     is laid out as the hole's wall, of the hole's circumference, between anode and surface
 * @param activeShare active share of the cathode's surface beyond the edge, 0..1
 * @param outerRadiusMm radius to which the cathode's surface extends, at least the hole's
 * @param contactResistanceOhm metallic path between anode and cathode (thread, seat, spoke), ≥ 0
 * @param skirtMm width of an insulating skirt between anode and cathode, 0 for none
 */
public record CellSpec(
    Material anode,
    Material cathode,
    double holeRadiusMm,
    double ringCircumferenceMm,
    double ringWidthMm,
    double edgeAreaCm2,
    double activeShare,
    double outerRadiusMm,
    double contactResistanceOhm,
    double skirtMm) {
  public CellSpec {
    Objects.requireNonNull(anode, "anode");
    check(holeRadiusMm > 0, "holeRadiusMm", holeRadiusMm, "above 0");
    check(ringCircumferenceMm > 0, "ringCircumferenceMm", ringCircumferenceMm, "above 0");
    check(ringWidthMm > 0, "ringWidthMm", ringWidthMm, "above 0");
    check(edgeAreaCm2 >= 0, "edgeAreaCm2", edgeAreaCm2, "at least 0");
    check(activeShare >= 0 && activeShare <= 1, "activeShare", activeShare, "0..1");
    check(outerRadiusMm >= holeRadiusMm, "outerRadiusMm", outerRadiusMm, "at least the hole's");
    check(contactResistanceOhm >= 0, "contactResistanceOhm", contactResistanceOhm, "at least 0");
    check(skirtMm >= 0, "skirtMm", skirtMm, "at least 0");
  }

  private static void check(boolean holds, String field, double was, String allowed) {
    if (!holds || !Double.isFinite(was)) {
      throw Refusal.outOfRange(field, was, allowed);
    }
  }

  /** Area of the bare ring, cm². */
  public double ringAreaCm2() {
    return ringCircumferenceMm * ringWidthMm / 100;
  }

  /** The same cell with another width of the bare ring. */
  public CellSpec withRingWidthMm(double widthMm) {
    return new CellSpec(
        anode,
        cathode,
        holeRadiusMm,
        ringCircumferenceMm,
        widthMm,
        edgeAreaCm2,
        activeShare,
        outerRadiusMm,
        contactResistanceOhm,
        skirtMm);
  }
}
