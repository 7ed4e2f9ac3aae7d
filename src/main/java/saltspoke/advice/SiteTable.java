package saltspoke.advice;

import saltspoke.wheel.damage.DoseCurve;
import saltspoke.wheel.damage.Site;

/** ln dose of a site at fixed times, so that a chance costs a look-up and no power or logarithm. */
final class SiteTable {
  /** First time of the table, months. */
  static final double FIRST_MONTHS = 0.02;

  /** Last time: twice the horizon, so that an old wheel can be looked ahead from. */
  static final double LAST_MONTHS = 480;

  /** Points; neighbours are 8 % apart. */
  static final int POINTS = 132;

  private static final double STEP = Math.log(LAST_MONTHS / FIRST_MONTHS) / (POINTS - 1);
  private static final double NOTHING = -50;
  private static final double[] MONTHS = new double[POINTS];

  static {
    for (int i = 0; i < POINTS; i++) {
      MONTHS[i] = FIRST_MONTHS * Math.exp(STEP * i);
    }
  }

  private final double[] lnUm = new double[POINTS];

  SiteTable(DoseCurve dose) {
    for (int i = 0; i < POINTS; i++) {
      double um = dose.um(MONTHS[i]);
      lnUm[i] = um > 0 ? Math.max(NOTHING, Math.log(um)) : NOTHING;
    }
  }

  static SiteTable of(Site site, boolean steady) {
    return new SiteTable(steady ? site.dose().steady() : site.dose());
  }

  /** Place of a time in the table, as whole and part of a step. */
  static double place(double months) {
    return Math.min(
        Math.max(Math.log(Math.max(months, 1e-9) / FIRST_MONTHS) / STEP, 0), POINTS - 1.000001);
  }

  /** Time of a place in the table, months. */
  static double months(double place) {
    return FIRST_MONTHS * Math.exp(STEP * place);
  }

  /** ln dose at a place. */
  double lnUmAt(double place) {
    int i = (int) place;
    return lnUm[i] + (place - i) * (lnUm[i + 1] - lnUm[i]);
  }

  /** Place at which ln dose reaches a value; the table's end when it does not. */
  double placeOf(double lnWanted) {
    if (lnWanted > lnUm[POINTS - 1]) {
      return POINTS - 1;
    }
    int low = 0;
    int high = POINTS - 1;
    if (lnUm[0] >= lnWanted) {
      return 0;
    }
    while (high - low > 1) {
      int middle = (low + high) >>> 1;
      if (lnUm[middle] >= lnWanted) {
        high = middle;
      } else {
        low = middle;
      }
    }
    double rise = lnUm[high] - lnUm[low];
    return low + (rise > 0 ? (lnWanted - lnUm[low]) / rise : 1);
  }
}
