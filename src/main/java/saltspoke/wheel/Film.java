package saltspoke.wheel;

/**
 * The liquid film on the rim bed in one state.
 *
 * @param thicknessUm µm; 0 means dry, and the other values are then those of pure water
 * @param temperatureC film temperature
 * @param chlorideMolPerKg chloride molality of the brine, mol per kg water
 * @param conductivityMSPerCm electrical conductivity at the film's temperature, mS/cm
 * @param oxygenUmolPerL dissolved oxygen in equilibrium with air, µmol/L
 * @param oxygenDiffusivityCm2PerS diffusivity of oxygen in the brine, cm²/s
 */
public record Film(
    double thicknessUm,
    double temperatureC,
    double chlorideMolPerKg,
    double conductivityMSPerCm,
    double oxygenUmolPerL,
    double oxygenDiffusivityCm2PerS) {}
