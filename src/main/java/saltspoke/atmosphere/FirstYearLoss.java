package saltspoke.atmosphere;

/** Metal lost in the first year of exposure, µm. Not a later loss, not a penetration. */
public record FirstYearLoss(double um) {}
