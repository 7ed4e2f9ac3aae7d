package saltspoke.wheel;

import java.util.List;

/**
 * Penetration of a cell over a set of films and hours (a month, a year) as a smooth function of
 * ring width and cathode strength, for many cheap draws.
 *
 * <p>Solved on a grid of {@value #WIDTHS} widths × {@value #SCALES} strengths, evenly spaced in
 * logarithm, and interpolated linearly in the logarithms. Local attack is kept apart so that its
 * spread may be drawn too. Against {@link CellTable#rate} at each film the sum differs by under 3 %
 * inside the grid (tested); outside, the edge slope goes on. Immutable.
 */
public final class RateSurface {
  static final int WIDTHS = 6;
  static final int SCALES = 5;

  private final double lnWidthFirst;
  private final double lnWidthStep;
  private final double lnScaleFirst;
  private final double lnScaleStep;
  private final double[] lnBase;
  private final double[] lnLocal;

  /** Stands for ln 0: far below any depth, yet finite so that interpolation stays finite. */
  private static final double LN_NOTHING = Math.log(1e-12);

  private RateSurface(
      double lnWidthFirst,
      double lnWidthStep,
      double lnScaleFirst,
      double lnScaleStep,
      double[] lnBase,
      double[] lnLocal) {
    this.lnWidthFirst = lnWidthFirst;
    this.lnWidthStep = lnWidthStep;
    this.lnScaleFirst = lnScaleFirst;
    this.lnScaleStep = lnScaleStep;
    this.lnBase = lnBase;
    this.lnLocal = lnLocal;
  }

  /**
   * @param films films and their hours
   * @param leastWidthMm narrowest ring that will be asked for, &gt; 0
   * @param mostWidthMm widest ring, above the narrowest
   * @param leastScale weakest cathode that will be asked for, &gt; 0
   * @param mostScale strongest cathode, above the weakest
   */
  public static RateSurface of(
      CellTable table,
      List<WheelYear.FilmHours> films,
      double leastWidthMm,
      double mostWidthMm,
      double leastScale,
      double mostScale) {
    double lnWidth = Math.log(leastWidthMm);
    double widthStep = Math.log(mostWidthMm / leastWidthMm) / (WIDTHS - 1);
    double lnScale = Math.log(leastScale);
    double scaleStep = Math.log(mostScale / leastScale) / (SCALES - 1);
    double[] base = new double[WIDTHS * SCALES];
    double[] local = new double[WIDTHS * SCALES];
    double umPerUA = Kinetics.of(table.spec().anode()).umPerYearPerUAPerCm2();
    for (WheelYear.FilmHours part : films) {
      CellTable.InFilm in = table.in(part.film());
      double years = part.hours() / HOURS_PER_YEAR;
      for (int i = 0; i < WIDTHS; i++) {
        double width = Math.exp(lnWidth + i * widthStep);
        for (int j = 0; j < SCALES; j++) {
          CellCurrents c = in.currents(width, Math.exp(lnScale + j * scaleStep));
          double localUm = c.localUAPerCm2() * umPerUA;
          local[i * SCALES + j] += years * localUm;
          base[i * SCALES + j] += years * (c.penetrationUmPerYear() - localUm);
        }
      }
    }
    for (int k = 0; k < base.length; k++) {
      base[k] = base[k] > 0 ? Math.log(base[k]) : LN_NOTHING;
      local[k] = local[k] > 0 ? Math.log(local[k]) : LN_NOTHING;
    }
    return new RateSurface(lnWidth, widthStep, lnScale, scaleStep, base, local);
  }

  private static final double HOURS_PER_YEAR = 8766;

  /**
   * Depth gained over all the hours, µm.
   *
   * @param ringWidthMm width of the bare ring, &gt; 0
   * @param cathodeScale factor on the cathode's current density, &gt; 0
   * @param localScale factor on local attack, ≥ 0
   */
  public double um(double ringWidthMm, double cathodeScale, double localScale) {
    double w = (Math.log(ringWidthMm) - lnWidthFirst) / lnWidthStep;
    double s = (Math.log(cathodeScale) - lnScaleFirst) / lnScaleStep;
    int i = Math.max(0, Math.min(WIDTHS - 2, (int) Math.floor(w)));
    int j = Math.max(0, Math.min(SCALES - 2, (int) Math.floor(s)));
    double base = Math.exp(at(lnBase, i, j, w - i, s - j));
    double localLn = at(lnLocal, i, j, w - i, s - j);
    return localLn <= LN_NOTHING ? base : base + localScale * Math.exp(localLn);
  }

  private static double at(double[] table, int i, int j, double w, double s) {
    int k = i * SCALES + j;
    double a = table[k] + s * (table[k + 1] - table[k]);
    double b = table[k + SCALES] + s * (table[k + SCALES + 1] - table[k + SCALES]);
    return a + w * (b - a);
  }
}
