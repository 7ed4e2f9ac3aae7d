package saltspoke.wheel;

/** Oxygen dissolved in water and brine in equilibrium with air at 101.3 kPa. */
public final class Oxygen {
  /** Faraday's constant, C/mol (CODATA). */
  public static final double FARADAY_C_PER_MOL = 96485.33;

  /**
   * Solubility in fresh water 457, 353, 258 µmol/L at 0, 10, 25 °C (published): exact through the
   * three as exp(a + bT + cT²); 40 °C gives 206, handbook 200.
   */
  private static final double LN_SOLUBILITY_A = Math.log(457);

  private static final double LN_SOLUBILITY_C =
      (Math.log(258.0 / 353) / 15 - Math.log(353.0 / 457) / 10) / 25;
  private static final double LN_SOLUBILITY_B = Math.log(353.0 / 457) / 10 - 10 * LN_SOLUBILITY_C;

  /**
   * Salting out, log10(C0/C) = k S/(1 + 0.038 S), k = 0.187 − 0.0013 T per mol/kg of chloride
   * strength S: fitted to sea water 349 and 275 µmol/L at 0 and 10 °C (published) and to one sixth
   * in saturated NaCl at 25 °C (from memory).
   */
  private static final double SALTING_AT_0C_PER_MOLAL = 0.187;

  private static final double SALTING_SLOPE_PER_MOLAL_K = -0.0013;
  private static final double SALTING_BEND_PER_MOLAL = 0.038;

  /** Salting strength per mol of chloride of sea salt's sodium part, with its sulfate; fitted. */
  static final double SEA_SODIUM_STRENGTH = 1.2;

  /** Salting strength per mol of chloride as MgCl2 or CaCl2 (2.1 per mol of salt), from memory. */
  static final double HYGROSCOPIC_STRENGTH = 1.05;

  private Oxygen() {}

  /** Solubility in fresh water, µmol/L; fitted 0..25 °C, extrapolated −50..50. */
  public static double freshUmolPerL(double temperatureC) {
    return Math.exp(
        LN_SOLUBILITY_A + temperatureC * (LN_SOLUBILITY_B + temperatureC * LN_SOLUBILITY_C));
  }

  /** Solubility in brine over that in fresh water, 0..1. */
  static double saltingOut(double strengthMolPerKg, double temperatureC) {
    double k = SALTING_AT_0C_PER_MOLAL + SALTING_SLOPE_PER_MOLAL_K * Math.min(temperatureC, 50);
    return Math.pow(10, -k * strengthMolPerKg / (1 + SALTING_BEND_PER_MOLAL * strengthMolPerKg));
  }

  /**
   * Diffusivity in water, cm²/s: Han and Bartels 1996, log10 D = −4.410 + 773.8/T − (506.4/T)², T
   * in K; measured 0..95 °C, extrapolated below 0.
   */
  public static double diffusivityCm2PerS(double temperatureC) {
    double kelvin = temperatureC + 273.15;
    double bend = 506.4 / kelvin;
    return Math.pow(10, -4.410 + 773.8 / kelvin - bend * bend);
  }

  /**
   * Diffusion-limited reduction of oxygen through a film, i = 4 F D C / δ, µA/cm².
   *
   * @param oxygenUmolPerL dissolved oxygen at the air side
   * @param thicknessUm thickness of the film, &gt; 0
   */
  public static double diffusionLimitUAPerCm2(
      double diffusivityCm2PerS, double oxygenUmolPerL, double thicknessUm) {
    double molPerCm3 = oxygenUmolPerL * 1e-9;
    double cm = thicknessUm * 1e-4;
    return 4 * FARADAY_C_PER_MOL * diffusivityCm2PerS * molPerCm3 / cm * 1e6;
  }
}
