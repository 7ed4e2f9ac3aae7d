package saltspoke.wheel.damage;

/**
 * The loss of a settled year, month by month, repeated from the month in which the wheel goes into
 * service, while the wheel matures.
 *
 * <p>Damage of winter months in the first year counts more: pits grow 1.5 to 2.5 times deeper when
 * exposure starts in winter (Carter and Campbell). The weight of a month does not depend on the
 * damage in it, so that more hours of a film never lengthen a life.
 */
final class SeasonalDose implements DoseCurve {
  /** Longest time it is asked for, months; it goes on straight beyond. */
  private static final int MONTHS = Maturity.MONTHS - 1;

  /** Months of the start in which winter weighs more. ASSUMPTION: one season. */
  private static final int START_MONTHS = 3;

  /** Extra weight of the coldest month then: middle of the published 1.5 to 2.5, less one. */
  private static final double WINTER_EXTRA = 1;

  private final double[] pieceUm = new double[MONTHS + 1];
  private final double[] sumUm = new double[MONTHS + 1];
  private final Maturity maturity;
  private final double meanUm;

  /**
   * @param monthlyUm loss in January to December of a settled year, µm
   * @param buildMonth month of going into service, 1..12
   * @param winter weight of winter in each calendar month, 0..1
   * @param maturity how the wheel grows into the settled year
   */
  SeasonalDose(double[] monthlyUm, int buildMonth, double[] winter, Maturity maturity) {
    this.maturity = maturity;
    double year = 0;
    for (double um : monthlyUm) {
      year += um;
    }
    meanUm = year / 12;
    double before = 0;
    for (int i = 0; i <= MONTHS; i++) {
      int calendar = (buildMonth - 1 + i) % 12;
      double extra = i < START_MONTHS ? WINTER_EXTRA * winter[calendar] : 0;
      pieceUm[i] = monthlyUm[calendar] * (1 + extra);
      if (i < MONTHS) {
        double after = maturity.settledMonths(i + 1);
        sumUm[i + 1] = sumUm[i] + pieceUm[i] * (after - before);
        before = after;
      }
    }
  }

  @Override
  public double um(double months) {
    int whole = Math.min((int) months, MONTHS);
    return sumUm[whole]
        + pieceUm[whole] * (maturity.settledMonths(months) - maturity.settledMonths(whole));
  }

  @Override
  public DoseCurve steady() {
    return months -> meanUm * maturity.settledMonths(months);
  }
}
