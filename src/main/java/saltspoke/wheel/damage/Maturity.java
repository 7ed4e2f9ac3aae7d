package saltspoke.wheel.damage;

/**
 * How a new wheel grows into the settled year. It starts without salt, and a thread starts with its
 * compound. The rate of loss over its settled rate is
 *
 * <p>(1 − exp(−t/τ_salt))^e · (1 − exp(−t/τ_compound)),
 *
 * <p>the second factor for threads only. Its integral over time is tabulated once per compound.
 */
final class Maturity {
  /**
   * Months in which the salt at a seat settles. ASSUMPTION 9, a winter or two; spread x/÷ 2 moves
   * the first years by its power e only.
   */
  static final double SALT_MONTHS = 9;

  private static final double LN_FIRST = Math.log(1e-3);
  private static final double LN_STEP = 0.04;
  private static final int POINTS = 340;

  /** Whole months for which the integral is kept ready. */
  static final int MONTHS = 481;

  private static final double[] TABLED_MONTHS = new double[POINTS];

  static {
    for (int i = 0; i < POINTS; i++) {
      TABLED_MONTHS[i] = Math.exp(LN_FIRST + LN_STEP * i);
    }
  }

  private final double[] integral = new double[POINTS];
  private final double[] atMonth = new double[MONTHS + 1];
  private final double compoundMonths;

  /**
   * @param compoundMonths months in which the thread's compound washes out, 0 for none
   */
  Maturity(double compoundMonths) {
    this.compoundMonths = compoundMonths;
    double first = Math.exp(LN_FIRST);
    double power = 1 + Assumption.SALT_ELASTICITY + (compoundMonths > 0 ? 1 : 0);
    integral[0] = first * at(first) / power;
    for (int i = 1; i < POINTS; i++) {
      double a = months(i - 1);
      double b = months(i);
      integral[i] = integral[i - 1] + (b - a) / 6 * (at(a) + 4 * at((a + b) / 2) + at(b));
    }
    for (int m = 1; m <= MONTHS; m++) {
      atMonth[m] = settledMonths((double) m);
    }
  }

  /** Rate over the settled rate after a time in service. */
  double at(double months) {
    double salt = Math.pow(-Math.expm1(-months / SALT_MONTHS), Assumption.SALT_ELASTICITY);
    return compoundMonths > 0 ? salt * -Math.expm1(-months / compoundMonths) : salt;
  }

  /** Months of settled loss that a time in service is worth. */
  double settledMonths(double months) {
    if (months <= 0) {
      return 0;
    }
    double place = Math.max(0, (Math.log(months) - LN_FIRST) / LN_STEP);
    int i = Math.min((int) place, POINTS - 2);
    double a = months(i);
    double part = (months - a) / (months(i + 1) - a);
    return Math.max(0, integral[i] + part * (integral[i + 1] - integral[i]));
  }

  /** The same after whole months, 0..{@link #MONTHS}. */
  double settledMonths(int months) {
    return atMonth[months];
  }

  private static double months(int i) {
    return TABLED_MONTHS[i];
  }
}
