package saltspoke.wheel;

/**
 * What the galvanic cell at one spoke hole does in one film, while that film is there.
 *
 * @param galvanicCurrentUA current from anode to cathode, µA
 * @param galvanicUAPerCm2 that current over the bare ring, µA/cm²
 * @param selfUAPerCm2 corrosion of the bare ring that needs no cathode elsewhere, µA/cm²
 * @param localUAPerCm2 local attack beyond the galvanic current (alkali of the cathode, pits),
 *     µA/cm², an assumption with its own spread
 * @param couplePotentialVSce potential of the anode in the couple, V against the saturated calomel
 *     electrode
 * @param reachMm distance along the cathode within which half of its current arises
 * @param penetrationUmPerYear total of the three over the ring as thickness, µm per year of wetness
 */
public record CellCurrents(
    double galvanicCurrentUA,
    double galvanicUAPerCm2,
    double selfUAPerCm2,
    double localUAPerCm2,
    double couplePotentialVSce,
    double reachMm,
    double penetrationUmPerYear) {}
