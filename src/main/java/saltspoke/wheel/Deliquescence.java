package saltspoke.wheel;

/**
 * When salt takes up water from the air, when it lets go of it, and when its brine freezes.
 *
 * <p>At 25 °C (published: Greenspan 1977): NaCl 75.3 %, MgCl2 33 %, CaCl2 29 %. Pure functions;
 * temperatures −60..60 °C.
 */
public final class Deliquescence {
  /** NaCl, % RH at 25 °C, published (Greenspan 1977). */
  static final double NACL_ONSET_RH_PCT = 75.3;

  /** NaCl, %/K: 75.5 % at 0 °C, from memory of Greenspan 1977. */
  static final double NACL_ONSET_PCT_PER_K = -0.008;

  /** MgCl2·6H2O, % RH at 25 °C, published (Greenspan 1977: 32.8). */
  static final double MGCL2_ONSET_RH_PCT = 33.0;

  /** MgCl2, %/K: 33.7 % at 0 °C, from memory of Greenspan 1977. */
  static final double MGCL2_ONSET_PCT_PER_K = -0.035;

  /** CaCl2·6H2O, % RH at 25 °C, published. */
  static final double CACL2_ONSET_RH_PCT = 29.0;

  /** CaCl2·6H2O, %/K: about 40 % at 0 °C, from memory. */
  static final double CACL2_ONSET_PCT_PER_K = -0.44;

  /** Sea salt is partly wet from here at 25 °C, % RH; follows MgCl2 with temperature. */
  static final double SEA_SALT_ONSET_RH_PCT = 35.0;

  /** NaCl brine crystallises on drying at 45–50 %, from memory; the middle. */
  static final double NACL_DRYING_RH_PCT = 47.5;

  /**
   * ASSUMPTION: magnesium and calcium brines stay liquid on drying down to this % RH; spread 5..20.
   */
  static final double HYGROSCOPIC_DRYING_RH_PCT = 12;

  private static final double REFERENCE_C = 25;

  private Deliquescence() {}

  /**
   * Relative humidity at which the first of the salt goes into solution, %, 100 without salt. A
   * salt below 1 % of the chloride is taken as a trace that does not count.
   */
  public static double onsetRhPct(SaltMix salt, double temperatureC) {
    BrineMix mix = BrineMix.of(salt);
    if (mix.molPerM2() == 0) {
      return 100;
    }
    double onset = mix.holds(Brine.NACL) ? sodiumOnsetRhPct(temperatureC) : 100;
    if (mix.holds(Brine.MGCL2)) {
      boolean road = salt.brineMgClPerM2() > BrineMix.TRACE_SHARE * salt.totalMgClPerM2();
      double at25C = road ? MGCL2_ONSET_RH_PCT : SEA_SALT_ONSET_RH_PCT;
      onset = Math.min(onset, at25C + MGCL2_ONSET_PCT_PER_K * (temperatureC - REFERENCE_C));
    }
    if (mix.holds(Brine.CACL2)) {
      onset =
          Math.min(
              onset, CACL2_ONSET_RH_PCT + CACL2_ONSET_PCT_PER_K * (temperatureC - REFERENCE_C));
    }
    return onset;
  }

  /** Relative humidity at which sodium chloride itself goes into solution, %. */
  static double sodiumOnsetRhPct(double temperatureC) {
    return NACL_ONSET_RH_PCT + NACL_ONSET_PCT_PER_K * (temperatureC - REFERENCE_C);
  }

  /**
   * Relative humidity below which a wet film of this salt dries out, %, 100 without salt. Lower
   * than the onset: between the two a film is there only if it was there before.
   */
  public static double dryingRhPct(SaltMix salt, double temperatureC) {
    BrineMix mix = BrineMix.of(salt);
    if (mix.molPerM2() == 0) {
      return 100;
    }
    double drying =
        mix.holds(Brine.MGCL2) || mix.holds(Brine.CACL2)
            ? HYGROSCOPIC_DRYING_RH_PCT
            : NACL_DRYING_RH_PCT;
    return Math.min(drying, onsetRhPct(salt, temperatureC));
  }

  /** Temperature below which none of the mixture is liquid, °C; 0 without salt. From memory. */
  public static double eutecticC(SaltMix salt) {
    BrineMix mix = BrineMix.of(salt);
    double lowest = 0;
    for (Brine brine : Brine.values()) {
      if (mix.molPerM2() > 0 && mix.holds(brine)) {
        lowest = Math.min(lowest, brine.eutecticC());
      }
    }
    return lowest;
  }

  /**
   * Temperature at which ice begins to form in the brine, °C: where the brine's water activity is
   * that of ice. Not below the eutectic; 0 without salt.
   *
   * @param chlorideMolPerKg chloride molality, ≥ 0
   */
  public static double freezingC(SaltMix salt, double chlorideMolPerKg) {
    BrineMix mix = BrineMix.of(salt);
    if (mix.molPerM2() == 0 || chlorideMolPerKg <= 0) {
      return 0;
    }
    double x = mix.minusLnActivity(chlorideMolPerKg);
    double low = eutecticC(salt);
    double high = 0;
    if (-lnIceActivity(low) <= x) {
      return low;
    }
    for (int i = 0; i < 50; i++) {
      double middle = 0.5 * (low + high);
      if (-lnIceActivity(middle) > x) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return high;
  }

  /**
   * Natural logarithm of the vapour pressure of ice over that of supercooled water, ≤ 0: Magnus
   * form with the coefficients of WMO (2008), 17.62 and 243.12 °C, 22.46 and 272.62 °C, from
   * memory. At 0 °C and above 0.
   */
  static double lnIceActivity(double temperatureC) {
    if (temperatureC >= 0) {
      return 0;
    }
    return 22.46 * temperatureC / (272.62 + temperatureC)
        - 17.62 * temperatureC / (243.12 + temperatureC);
  }
}
