package saltspoke.wheel;

/**
 * The geometry and contacts of the galvanic cell at one spoke hole.
 *
 * @param anode material that dissolves
 * @param cathode material that drives it
 * @param holeRadiusMm radius of the spoke hole
 * @param ringCircumferenceMm length of the bare ring on the anode
 * @param ringWidthMm width of the bare ring on the anode, exposed to the film
 * @param edgeAreaCm2 fully active cathode area right at the anode (cut edge of the hole)
 * @param activeShare active share of the cathode's surface beyond the edge, 0..1
 * @param outerRadiusMm radius to which the cathode's surface extends
 * @param contactResistanceOhm metallic path between anode and cathode (thread, seat, spoke)
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
    double skirtMm) {}
