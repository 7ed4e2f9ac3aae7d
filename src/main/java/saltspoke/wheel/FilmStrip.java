package saltspoke.wheel;

/**
 * The coupled potentials along the film by Newton's method with a tridiagonal solve.
 *
 * <p>d/ds(σδ p dU/ds) = −p a i(U), U the cathode's potential against the film beside it, p the
 * circumference, a the active share, i the net cathodic current density; no current leaves at the
 * outer end. At s = 0 the current is σδ p dU/ds, and equals the net anodic current of the bare
 * ring, A · i_a(E), with U(0) − E = I · R the loss in the metallic contact. All laws are monotone,
 * so the matrix is an M-matrix and the solution unique.
 */
final class FilmStrip {
  private static final int MOST_STEPS = 400;
  private static final double TOLERANCE_V = 1e-10;
  private static final double LONGEST_STEP_V = 0.3;
  private static final double LONGEST_ANODE_STEP_V = 0.05;

  private final StripGrid grid;
  private final double sheetMicroS;
  private final Polarisation cathode;
  private final double[] potentialV;
  private double anodeV;
  private double currentUA;

  private FilmStrip(StripGrid grid, double sheetMicroS, Polarisation cathode, double startV) {
    this.grid = grid;
    this.sheetMicroS = sheetMicroS;
    this.cathode = cathode;
    potentialV = new double[grid.size()];
    java.util.Arrays.fill(potentialV, startV);
    anodeV = startV;
  }

  /** The cathode's current when the film at the anode is held so that U(0) is given. */
  static FilmStrip held(StripGrid grid, double sheetMicroS, Polarisation cathode, double atV) {
    FilmStrip strip = new FilmStrip(grid, sheetMicroS, cathode, atV);
    strip.solve(null, 0, 0);
    return strip;
  }

  /**
   * Joined to an anode.
   *
   * @param startV potential to start from, that of the anode alone
   */
  static FilmStrip joined(
      StripGrid grid,
      double sheetMicroS,
      Polarisation cathode,
      Polarisation anode,
      double anodeAreaCm2,
      double contactOhm,
      double startV) {
    FilmStrip strip = new FilmStrip(grid, sheetMicroS, cathode, startV);
    strip.solve(anode, anodeAreaCm2, contactOhm);
    return strip;
  }

  private void solve(Polarisation anode, double anodeAreaCm2, double contactOhm) {
    int n = grid.size();
    double[] conductance = new double[n];
    for (int j = 0; j < n; j++) {
      double contact = j == 0 ? contactOhm * 1e-6 : 0;
      conductance[j] = 1 / (grid.squares(j) / sheetMicroS + contact);
    }
    double[] upper = new double[n + 1];
    double[] step = new double[n + 1];
    for (int iteration = 0; iteration < MOST_STEPS; iteration++) {
      eliminate(anode, anodeAreaCm2, conductance, upper, step);
      double largest = 0;
      for (int j = n; j >= 0; j--) {
        if (j < n) {
          step[j] -= upper[j] * step[j + 1];
        }
        largest = Math.max(largest, Math.abs(step[j]));
      }
      anodeV += limited(step[0], LONGEST_ANODE_STEP_V);
      for (int j = 0; j < n; j++) {
        potentialV[j] += limited(step[j + 1], LONGEST_STEP_V);
      }
      if (largest < TOLERANCE_V) {
        currentUA = conductance[0] * (potentialV[0] - anodeV);
        return;
      }
    }
    throw new IllegalStateException("the film's potentials did not settle");
  }

  /** Forward sweep over anode (row 0) and cells (rows 1..n) of the Newton system. */
  private void eliminate(
      Polarisation anode,
      double anodeAreaCm2,
      double[] conductance,
      double[] upper,
      double[] step) {
    int n = conductance.length;
    double[] law = new double[2];
    if (anode == null) {
      upper[0] = 0;
      step[0] = 0;
    } else {
      anode.at(anodeV, law);
      double diagonal = -conductance[0] - anodeAreaCm2 * law[1];
      double residual = conductance[0] * (potentialV[0] - anodeV) - anodeAreaCm2 * law[0];
      upper[0] = conductance[0] / diagonal;
      step[0] = -residual / diagonal;
    }
    for (int j = 0; j < n; j++) {
      double before = j == 0 ? anodeV : potentialV[j - 1];
      double outward = j + 1 < n ? conductance[j + 1] : 0;
      double after = j + 1 < n ? potentialV[j + 1] : potentialV[j];
      cathode.at(potentialV[j], law);
      double residual =
          outward * (after - potentialV[j])
              - conductance[j] * (potentialV[j] - before)
              + grid.activeAreaCm2(j) * law[0];
      double diagonal =
          -outward - conductance[j] + grid.activeAreaCm2(j) * law[1] - conductance[j] * upper[j];
      upper[j + 1] = outward / diagonal;
      step[j + 1] = (-residual - conductance[j] * step[j]) / diagonal;
    }
  }

  private static double limited(double stepV, double mostV) {
    return Math.max(-mostV, Math.min(mostV, stepV));
  }

  /** Potential of the anode against the film beside it, V. */
  double anodeV() {
    return anodeV;
  }

  /** Current from anode to cathode, µA. */
  double currentUA() {
    return currentUA;
  }

  /** Distance from the anode within which half of the cathode's current arises, mm. */
  double reachMm() {
    double[] law = new double[2];
    double total = 0;
    for (int j = 0; j < potentialV.length; j++) {
      cathode.at(potentialV[j], law);
      total += grid.activeAreaCm2(j) * law[0];
    }
    double sum = 0;
    double lastMm = 0;
    for (int j = 0; j < potentialV.length; j++) {
      cathode.at(potentialV[j], law);
      double part = grid.activeAreaCm2(j) * law[0];
      double edgeMm =
          j + 1 < potentialV.length
              ? 0.5 * (grid.centreMm(j) + grid.centreMm(j + 1))
              : 2 * grid.centreMm(j) - lastMm;
      if (Math.abs(sum + part) >= 0.5 * Math.abs(total)) {
        double share = part == 0 ? 0 : (0.5 * total - sum) / part;
        return lastMm + share * (edgeMm - lastMm);
      }
      sum += part;
      lastMm = edgeMm;
    }
    return lastMm;
  }
}
