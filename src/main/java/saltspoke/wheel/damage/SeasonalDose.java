package saltspoke.wheel.damage;

/**
 * The loss of a settled year, month by month, repeated from the month in which the wheel goes into
 * service.
 *
 * <p>Damage done in the first three months counts twice: pits grow 1.5 to 2.5 times deeper when
 * exposure starts in winter (Carter and Campbell). Whoever builds into a mild season so gains twice,
 * and more hours of a film never lengthen a life.
 */
public final class SeasonalDose implements DoseCurve {
  /** Months of the start that count more. ASSUMPTION: one season. */
  static final double START_MONTHS = 3;

  /** Extra weight of the start: middle of the published 1.5 to 2.5, less one. */
  static final double START_EXTRA = 1;

  private final double[] sumUm = new double[13];

  /**
   * @param monthlyUm loss in January to December, µm
   * @param buildMonth month of going into service, 1..12
   */
  public SeasonalDose(double[] monthlyUm, int buildMonth) {
    for (int i = 0; i < 12; i++) {
      sumUm[i + 1] = sumUm[i] + monthlyUm[(buildMonth - 1 + i) % 12];
    }
  }

  @Override
  public double um(double months) {
    return plainUm(months) + START_EXTRA * plainUm(Math.min(months, START_MONTHS));
  }

  @Override
  public DoseCurve steady() {
    double perMonthUm = sumUm[12] / 12;
    return months -> months * perMonthUm;
  }

  private double plainUm(double months) {
    double years = Math.floor(months / 12);
    double rest = months - 12 * years;
    int whole = (int) rest;
    double part = rest - whole;
    return years * sumUm[12] + sumUm[whole] + part * (sumUm[whole + 1] - sumUm[whole]);
  }
}
