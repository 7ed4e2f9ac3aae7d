package saltspoke.atmosphere;

import saltspoke.values.Quantiles;

/**
 * Metal lost after some years by ISO 9224.
 *
 * @param years years of exposure
 * @param um total loss of thickness, µm
 */
public record LongTermLoss(int years, Quantiles um) {}
