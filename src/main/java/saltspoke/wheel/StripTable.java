package saltspoke.wheel;

import java.util.concurrent.atomic.AtomicIntegerArray;

/**
 * The effective area of one cathode as the film's resistance leaves it: the current of the whole
 * strip over the current density right at the anode.
 *
 * <p>With currents and the film's conductance divided by the kinetic factor, the strip depends on
 * three numbers only: the potential at the anode, the oxygen limit and the sheet conductance. On a
 * grid of these (0.05 V, half a decade, a quarter decade) the logarithm of the effective area is
 * interpolated linearly. Grid points are solved when first asked for and kept as two floats: 13 860
 * points, 111 kB. Beyond the grid's ends the nearest value holds upwards (no limit, no resistance)
 * and the last slope goes on downwards. Safe for many threads: a point solved twice gives the same
 * bits.
 */
final class StripTable {
  /** Cells on each part when filling; against twice as many the current moves by under 0.05 %. */
  private static final int CELLS = 24;

  private static final double LOWEST_V = -1.3;
  private static final double STEP_V = 0.05;
  private static final int POTENTIALS = 33;
  private static final double LOWEST_LIMIT_DECADE = -1;
  private static final double LIMIT_STEP = 0.5;
  private static final int LIMITS = 12;
  private static final double LOWEST_SHEET_DECADE = -2;
  private static final double SHEET_STEP = 0.25;
  private static final int SHEETS = 35;

  /** A cathode at rest gives no current to divide by; it is asked beside that potential. */
  private static final double OFF_REST_V = 1e-4;

  private static final double AT_REST_UA_PER_CM2 = 1e-12;

  private final Kinetics kinetics;
  private final StripGrid grid;
  private final AtomicIntegerArray lnArea = new AtomicIntegerArray(POTENTIALS * LIMITS * SHEETS);
  private final AtomicIntegerArray reach = new AtomicIntegerArray(POTENTIALS * LIMITS * SHEETS);

  StripTable(CellSpec spec) {
    kinetics = Kinetics.of(spec.cathode());
    grid = StripGrid.of(spec, CELLS);
  }

  /** A place on the grid for one film: the lower neighbours and the shares of the upper ones. */
  record Place(int limit, double limitShare, int sheet, double sheetShare) {
    static Place of(double limitUAPerCm2, double sheetMicroS) {
      double l = (Math.log10(limitUAPerCm2) - LOWEST_LIMIT_DECADE) / LIMIT_STEP;
      double s = (Math.log10(sheetMicroS) - LOWEST_SHEET_DECADE) / SHEET_STEP;
      l = Math.min(l, LIMITS - 1.0);
      s = Math.min(s, SHEETS - 1.0);
      int i = Math.max(0, Math.min(LIMITS - 2, (int) Math.floor(l)));
      int j = Math.max(0, Math.min(SHEETS - 2, (int) Math.floor(s)));
      return new Place(i, l - i, j, s - j);
    }
  }

  /**
   * ln of the effective area in cm², and its derivative per V.
   *
   * @param out receives both
   */
  void lnArea(Place place, double potentialV, double[] out) {
    interpolate(lnArea, place, potentialV, out);
  }

  /** Distance within which half of the current arises, mm. */
  double reachMm(Place place, double potentialV) {
    double[] out = new double[2];
    interpolate(reach, place, potentialV, out);
    return out[0];
  }

  private void interpolate(AtomicIntegerArray table, Place place, double potentialV, double[] out) {
    double u = (potentialV - LOWEST_V) / STEP_V;
    int k = Math.max(0, Math.min(POTENTIALS - 2, (int) Math.floor(u)));
    double share = Math.max(0, Math.min(1, u - k));
    double low = plane(table, place, k);
    double high = plane(table, place, k + 1);
    out[0] = low + share * (high - low);
    out[1] = (high - low) / STEP_V;
  }

  private double plane(AtomicIntegerArray table, Place place, int k) {
    double a = line(table, k, place.limit, place);
    double b = line(table, k, place.limit + 1, place);
    return a + place.limitShare * (b - a);
  }

  private double line(AtomicIntegerArray table, int k, int limit, Place place) {
    double a = point(table, k, limit, place.sheet);
    double b = point(table, k, limit, place.sheet + 1);
    return a + place.sheetShare * (b - a);
  }

  private double point(AtomicIntegerArray table, int k, int limit, int sheet) {
    int index = (k * LIMITS + limit) * SHEETS + sheet;
    if (lnArea.get(index) == 0) {
      fill(index, k, limit, sheet);
    }
    return Float.intBitsToFloat(table.get(index));
  }

  private void fill(int index, int k, int limit, int sheet) {
    CathodeLaw law =
        new CathodeLaw(kinetics, Math.pow(10, LOWEST_LIMIT_DECADE + LIMIT_STEP * limit));
    double[] out = new double[2];
    double potentialV = LOWEST_V + STEP_V * k;
    law.at(potentialV, out);
    if (Math.abs(out[0]) < AT_REST_UA_PER_CM2) {
      potentialV += OFF_REST_V;
      law.at(potentialV, out);
    }
    FilmStrip strip =
        FilmStrip.held(
            grid, Math.pow(10, LOWEST_SHEET_DECADE + SHEET_STEP * sheet), law, potentialV);
    reach.set(index, Float.floatToRawIntBits((float) strip.reachMm()));
    lnArea.set(index, Float.floatToRawIntBits((float) Math.log(strip.currentUA() / out[0])));
  }
}
