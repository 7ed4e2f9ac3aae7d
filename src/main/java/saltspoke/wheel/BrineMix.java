package saltspoke.wheel;

/**
 * Salt on the rim bed as moles of chloride per m² in each {@link Brine}.
 *
 * @param naMolPerM2 chloride as sodium chloride
 * @param mgMolPerM2 chloride as magnesium chloride
 * @param caMolPerM2 chloride as calcium chloride
 * @param seaShareOfNa share of the sodium chloride that came with sea salt, 0..1
 */
record BrineMix(double naMolPerM2, double mgMolPerM2, double caMolPerM2, double seaShareOfNa) {
  /**
   * Share of sea salt's chloride that crystallises with magnesium: (Mg 0.0967 − sulfate held by Ca
   * and K) mol per mol Cl, doubled, about 0.20; from the composition of standard sea water, from
   * memory.
   */
  static final double MAGNESIUM_SHARE_OF_SEA_CHLORIDE = 0.20;

  /** ASSUMPTION: a road brine's chloride is half magnesium's and half calcium's; spread 0..1. */
  static final double MAGNESIUM_SHARE_OF_ROAD_BRINE = 0.5;

  /** A salt below this share of the chloride does not set the onset of wetness; ASSUMPTION. */
  static final double TRACE_SHARE = 0.01;

  private static final double MG_PER_MOL_CHLORIDE = 35453;

  static BrineMix of(SaltMix salt) {
    double sea = salt.seaMgClPerM2() / MG_PER_MOL_CHLORIDE;
    double plain = (salt.rockMgClPerM2() + salt.sweatMgClPerM2()) / MG_PER_MOL_CHLORIDE;
    double road = salt.brineMgClPerM2() / MG_PER_MOL_CHLORIDE;
    double seaNa = sea * (1 - MAGNESIUM_SHARE_OF_SEA_CHLORIDE);
    double na = seaNa + plain;
    return new BrineMix(
        na,
        sea * MAGNESIUM_SHARE_OF_SEA_CHLORIDE + road * MAGNESIUM_SHARE_OF_ROAD_BRINE,
        road * (1 - MAGNESIUM_SHARE_OF_ROAD_BRINE),
        na > 0 ? seaNa / na : 0);
  }

  double molPerM2() {
    return naMolPerM2 + mgMolPerM2 + caMolPerM2;
  }

  double molPerM2(Brine brine) {
    return switch (brine) {
      case NACL -> naMolPerM2;
      case MGCL2 -> mgMolPerM2;
      case CACL2 -> caMolPerM2;
    };
  }

  /** Whether a salt is more than a trace of the mixture. */
  boolean holds(Brine brine) {
    return molPerM2(brine) > TRACE_SHARE * molPerM2();
  }

  /** The mixture without its sodium chloride, which lies there as dry crystals. */
  BrineMix withoutSodium() {
    return new BrineMix(0, mgMolPerM2, caMolPerM2, 0);
  }

  /** Water held where its activity is exp(−x), kg/m², x &gt; 0; Zdanovskii's rule of mixtures. */
  double waterKgPerM2(double x) {
    double kg = 0;
    for (Brine brine : Brine.values()) {
      if (molPerM2(brine) > 0) {
        kg += molPerM2(brine) / brine.chlorideMolPerKg(x);
      }
    }
    return kg;
  }

  /** Mass of the salt, g/m². */
  double saltGPerM2() {
    double g = 0;
    for (Brine brine : Brine.values()) {
      g += molPerM2(brine) * brine.gPerMolChloride();
    }
    return g;
  }

  /** −ln of the water activity when the mixture is dissolved to this chloride molality. */
  double minusLnActivity(double chlorideMolPerKg) {
    double low = 1e-9;
    double high = 3;
    for (int i = 0; i < 60; i++) {
      double middle = Math.sqrt(low * high);
      if (molPerM2() / waterKgPerM2(middle) < chlorideMolPerKg) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return Math.sqrt(low * high);
  }
}
