package saltspoke.wheel;

/**
 * The three chloride brines of which every salt load here is made: activity, solubility, density,
 * viscosity and conductivity of their solutions in water.
 *
 * <p>Osmotic coefficients at 25 °C: Robinson and Stokes, <i>Electrolyte Solutions</i>, 2nd ed.,
 * from memory; they are used at every temperature here, which moves an equilibrium molality by less
 * than 5 % between 0 and 25 °C for sodium chloride (from memory). Conductivity at 20 °C: CRC
 * Handbook, published, for MgCl2 and CaCl2 up to 25 mass %; NaCl from memory; beyond 25 mass %
 * ASSUMPTION by continuing the curvature, ±20 %.
 */
enum Brine {
  NACL(
      58.44,
      1,
      -21.1,
      new double[] {0.1, 0.2, 0.3, 0.5, 0.7, 1, 1.4, 2, 2.5, 3, 3.5, 4, 4.5, 5, 6, 6.144},
      new double[] {
        0.9324, 0.9245, 0.9215, 0.9209, 0.9257, 0.9355, 0.9513, 0.9833, 1.0108, 1.0453, 1.0783,
        1.1158, 1.1534, 1.1916, 1.2706, 1.2820
      },
      new double[] {0, 0.5, 1, 2, 5, 10, 15, 20, 25, 26.4},
      new double[] {0, 8.2, 16, 30.2, 70.1, 126, 171, 204, 222, 224},
      0.70,
      0.21,
      0.0775,
      0.0054),
  MGCL2(
      95.21,
      2,
      -33.0,
      new double[] {0.1, 0.2, 0.3, 0.5, 0.7, 1, 1.4, 1.8, 2, 2.5, 3, 3.5, 4, 4.5, 5, 5.81},
      new double[] {
        0.861, 0.877, 0.895, 0.947, 1.004, 1.108, 1.264, 1.434, 1.523, 1.762, 2.010, 2.264, 2.521,
        2.783, 3.048, 3.552
      },
      new double[] {0, 0.5, 1, 2, 5, 10, 15, 20, 25, 30, 36},
      new double[] {0, 8.6, 16.6, 31.2, 66.9, 108, 129, 134, 122, 100, 70},
      0.80,
      0.38,
      0.33,
      0.020),
  CACL2(
      110.98,
      2,
      -49.8,
      new double[] {
        0.1, 0.2, 0.3, 0.5, 0.7, 1, 1.4, 1.8, 2, 2.5, 3, 3.5, 4, 4.5, 5, 5.5, 6, 7, 7.4
      },
      new double[] {
        0.854, 0.862, 0.876, 0.917, 0.963, 1.046, 1.171, 1.305, 1.376, 1.568, 1.779, 1.981, 2.182,
        2.383, 2.574, 2.743, 2.891, 3.081, 3.115
      },
      new double[] {0, 0.5, 1, 2, 5, 10, 15, 20, 25, 30, 35, 40, 45},
      new double[] {0, 8.1, 15.7, 29.4, 67, 117, 157, 177, 183, 178, 163, 140, 110},
      0.83,
      0.40,
      0.26,
      0.016);

  /** Mass of one mole of water, kg. */
  static final double WATER_KG_PER_MOL = 0.018015;

  /** Density of water at 20 °C, g/cm³, published (CRC Handbook). */
  static final double WATER_G_PER_CM3 = 0.998;

  private final double gPerMol;
  private final int chloridesPerFormula;
  private final double eutecticC;
  private final double[] molality;
  private final double[] minusLnActivity;
  private final double[] massPercent;
  private final double[] conductivityMSPerCm;
  private final double densityLinear;
  private final double densityQuadratic;
  private final double lnViscosityLinear;
  private final double lnViscosityQuadratic;

  /**
   * Eutectics from memory. Relative density 1 + linear·w + quadratic·w² of the mass fraction w, and
   * ln of the relative viscosity linear·m + quadratic·m² of the molality m: both fitted to CRC
   * Handbook values recalled from memory, ±2 % and ±15 %.
   */
  Brine(
      double gPerMol,
      int chloridesPerFormula,
      double eutecticC,
      double[] molality,
      double[] osmotic,
      double[] massPercent,
      double[] conductivityMSPerCm,
      double densityLinear,
      double densityQuadratic,
      double lnViscosityLinear,
      double lnViscosityQuadratic) {
    this.gPerMol = gPerMol;
    this.chloridesPerFormula = chloridesPerFormula;
    this.eutecticC = eutecticC;
    this.molality = molality;
    this.massPercent = massPercent;
    this.conductivityMSPerCm = conductivityMSPerCm;
    this.densityLinear = densityLinear;
    this.densityQuadratic = densityQuadratic;
    this.lnViscosityLinear = lnViscosityLinear;
    this.lnViscosityQuadratic = lnViscosityQuadratic;
    minusLnActivity = new double[molality.length];
    for (int i = 0; i < molality.length; i++) {
      minusLnActivity[i] = particles() * molality[i] * osmotic[i] * WATER_KG_PER_MOL;
    }
  }

  private int particles() {
    return 1 + chloridesPerFormula;
  }

  double gPerMolChloride() {
    return gPerMol / chloridesPerFormula;
  }

  /** Temperature at which ice, salt and brine coexist, °C, from memory. */
  double eutecticC() {
    return eutecticC;
  }

  /** Chloride molality of the saturated solution at 25 °C, the last row of the table. */
  double saturatedMolPerKg() {
    return molality[molality.length - 1] * chloridesPerFormula;
  }

  /**
   * Chloride molality (mol/kg) at which water has the activity exp(−x). The ratio m/x is
   * interpolated in x; it tends to the ideal solution at 0. Beyond the last row (a supersaturated
   * brine) the last ratio holds.
   */
  double chlorideMolPerKg(double x) {
    double ideal = 1 / (particles() * WATER_KG_PER_MOL);
    int last = molality.length - 1;
    double ratio;
    if (x >= minusLnActivity[last]) {
      ratio = molality[last] / minusLnActivity[last];
    } else {
      int i = 0;
      while (x > minusLnActivity[i]) {
        i++;
      }
      double x0 = i == 0 ? 0 : minusLnActivity[i - 1];
      double r0 = i == 0 ? ideal : molality[i - 1] / x0;
      double r1 = molality[i] / minusLnActivity[i];
      ratio = r0 + (r1 - r0) * (x - x0) / (minusLnActivity[i] - x0);
    }
    return chloridesPerFormula * ratio * x;
  }

  /** Conductivity at 20 °C of a solution of this salt, mS/cm; the last row holds beyond it. */
  double conductivityAt20CMSPerCm(double massFraction) {
    double percent = 100 * massFraction;
    int last = massPercent.length - 1;
    if (percent >= massPercent[last]) {
      return conductivityMSPerCm[last];
    }
    int i = 1;
    while (percent > massPercent[i]) {
      i++;
    }
    double share = (percent - massPercent[i - 1]) / (massPercent[i] - massPercent[i - 1]);
    return conductivityMSPerCm[i - 1]
        + share * (conductivityMSPerCm[i] - conductivityMSPerCm[i - 1]);
  }

  /** Density over that of water, of a solution with this mass fraction of salt. */
  double relativeDensity(double massFraction) {
    return 1 + massFraction * (densityLinear + densityQuadratic * massFraction);
  }

  /** Natural logarithm of viscosity over that of water. */
  double lnRelativeViscosity(double chlorideMolPerKg) {
    double m = chlorideMolPerKg / chloridesPerFormula;
    return m * (lnViscosityLinear + lnViscosityQuadratic * m);
  }
}
