package saltspoke.wheel;

/**
 * Faraday's law for corroding metals, ASTM G102: penetration mm/a = 3.27e-3 · i(µA/cm²) · EW/ρ.
 * Equivalent weights from memory except iron's (published), see each row.
 */
public enum Faraday {
  /** Al³⁺. */
  ALUMINIUM(8.99, 2.70),
  /** Alloy 7075, elements weighted by mass as in ASTM G102. */
  ALUMINIUM_7075(9.58, 2.81),
  /** Zn²⁺. */
  ZINC(32.68, 7.13),
  /** Fe²⁺, published. */
  IRON(27.92, 7.87),
  /** Cu²⁺. */
  COPPER_2(31.77, 8.94),
  /** Cu⁺. */
  COPPER_1(63.55, 8.94),
  /** Brass C26000 with copper dissolving as Cu²⁺. */
  BRASS_2(32.04, 8.53),
  /** Brass C26000 with copper dissolving as Cu⁺, as in strong chloride. */
  BRASS_1(49.6, 8.53),
  /** Ni²⁺. */
  NICKEL(29.36, 8.89),
  /** Type 304. */
  STAINLESS_304(25.12, 7.94),
  /** Ti⁴⁺. */
  TITANIUM_4(11.97, 4.506),
  /** Ti³⁺. */
  TITANIUM_3(15.96, 4.506);

  /** mm·g/(µA·cm·a), ASTM G102. */
  private static final double MM_G_PER_UA_CM_YEAR = 3.27e-3;

  private final double equivalentWeight;
  private final double gPerCm3;

  Faraday(double equivalentWeight, double gPerCm3) {
    this.equivalentWeight = equivalentWeight;
    this.gPerCm3 = gPerCm3;
  }

  /** Penetration per current density, µm/a per µA/cm². */
  public double umPerYearPerUAPerCm2() {
    return 1000 * MM_G_PER_UA_CM_YEAR * equivalentWeight / gPerCm3;
  }
}
