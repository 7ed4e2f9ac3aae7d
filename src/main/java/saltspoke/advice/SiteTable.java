package saltspoke.advice;

import saltspoke.wheel.damage.DoseCurve;

/**
 * ln dose of a site, over the scatter between nipples, at fixed times, so that a chance costs a
 * look-up and no power or logarithm.
 */
final class SiteTable {
  /** First time of the table, months. */
  static final double FIRST_MONTHS = 0.02;

  /** Last time: twice the horizon, so that an old wheel can be looked ahead from. */
  static final double LAST_MONTHS = 480;

  /** Points; neighbours are 8 % apart. */
  static final int POINTS = 132;

  private static final double STEP = Math.log(LAST_MONTHS / FIRST_MONTHS) / (POINTS - 1);

  /** ln of a dose in µm that is as good as none. */
  private static final double NOTHING = -50;

  private static final double[] MONTHS = new double[POINTS];

  static {
    for (int i = 0; i < POINTS; i++) {
      MONTHS[i] = FIRST_MONTHS * Math.exp(STEP * i);
    }
  }

  private final double[] lnDose = new double[POINTS];

  SiteTable(DoseCurve dose, double scatter) {
    for (int i = 0; i < POINTS; i++) {
      double um = dose.um(MONTHS[i]);
      lnDose[i] = (um > 0 ? Math.max(NOTHING, Math.log(um)) : NOTHING) / scatter;
    }
  }

  /** Place of a time in the table, as whole and part of a step. */
  static double place(double months) {
    double steps = Math.log(Math.max(months, FIRST_MONTHS) / FIRST_MONTHS) / STEP;
    return Math.min(steps, POINTS - 1);
  }

  /** Time of a place in the table, months. */
  static double months(double place) {
    return FIRST_MONTHS * Math.exp(STEP * place);
  }

  /** ln dose over scatter at a place. */
  double at(double place) {
    int i = Math.min((int) place, POINTS - 2);
    return lnDose[i] + (place - i) * (lnDose[i + 1] - lnDose[i]);
  }

  /** ln dose over scatter at the table's start. */
  double least() {
    return lnDose[0];
  }

  /** ln dose over scatter at the table's end. */
  double most() {
    return lnDose[POINTS - 1];
  }

  /** Months at which ln dose over scatter reaches a value; infinite when it does not. */
  double monthsAt(double wanted) {
    return wanted > most() ? Double.POSITIVE_INFINITY : months(placeOf(wanted));
  }

  /** Place at which ln dose over scatter reaches a value; the table's end when it does not. */
  double placeOf(double wanted) {
    if (wanted > lnDose[POINTS - 1]) {
      return POINTS - 1;
    }
    if (lnDose[0] >= wanted) {
      return 0;
    }
    int low = 0;
    int high = POINTS - 1;
    while (high - low > 1) {
      int middle = (low + high) >>> 1;
      if (lnDose[middle] >= wanted) {
        high = middle;
      } else {
        low = middle;
      }
    }
    double rise = lnDose[high] - lnDose[low];
    return low + (rise > 0 ? (wanted - lnDose[low]) / rise : 1);
  }
}
