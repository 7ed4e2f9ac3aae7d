package saltspoke.wheel;

import java.util.Arrays;

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
  private static final double SHORTEST_SHARE = 1e-3;

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
    Arrays.fill(potentialV, startV);
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
    double[] residual = new double[n + 1];
    double[] diagonal = new double[n + 1];
    double[] upper = new double[n + 1];
    double[] step = new double[n + 1];
    double lastDescent = Double.MAX_VALUE;
    double taken = 1;
    for (int iteration = 0; iteration < MOST_STEPS; iteration++) {
      evaluate(anode, anodeAreaCm2, conductance, residual, diagonal);
      double descent = dot(residual, step);
      if (descent < -lastDescent && taken > SHORTEST_SHARE) {
        // Overshot: further below the optimum along this direction than it was above it. Halve.
        taken *= 0.5;
        move(step, -taken);
        continue;
      }
      eliminate(conductance, residual, diagonal, upper, step);
      double largest = 0;
      for (int j = n; j >= 0; j--) {
        if (j < n) {
          step[j] -= upper[j] * step[j + 1];
        }
        largest = Math.max(largest, Math.abs(step[j]));
      }
      lastDescent = dot(residual, step);
      taken =
          Math.min(Math.min(1, LONGEST_STEP_V / largest), LONGEST_ANODE_STEP_V / Math.abs(step[0]));
      move(step, taken);
      if (largest < TOLERANCE_V) {
        currentUA = total();
        return;
      }
    }
    throw new IllegalStateException("the film's potentials did not settle");
  }

  private void move(double[] step, double share) {
    anodeV += share * step[0];
    for (int j = 0; j < potentialV.length; j++) {
      potentialV[j] += share * step[j + 1];
    }
  }

  private static double dot(double[] a, double[] b) {
    double sum = 0;
    for (int j = 0; j < a.length; j++) {
      sum += a[j] * b[j];
    }
    return sum;
  }

  /** Currents left over at the anode (row 0) and in the cells (rows 1..n), and their diagonal. */
  private void evaluate(
      Polarisation anode,
      double anodeAreaCm2,
      double[] conductance,
      double[] residual,
      double[] diagonal) {
    int n = conductance.length;
    double[] law = new double[2];
    if (anode == null) {
      residual[0] = 0;
      diagonal[0] = Double.NEGATIVE_INFINITY;
    } else {
      anode.at(anodeV, law);
      residual[0] = conductance[0] * (potentialV[0] - anodeV) - anodeAreaCm2 * law[0];
      diagonal[0] = -conductance[0] - anodeAreaCm2 * law[1];
    }
    for (int j = 0; j < n; j++) {
      double before = j == 0 ? anodeV : potentialV[j - 1];
      double outward = j + 1 < n ? conductance[j + 1] : 0;
      double after = j + 1 < n ? potentialV[j + 1] : potentialV[j];
      cathode.at(potentialV[j], law);
      residual[j + 1] =
          outward * (after - potentialV[j])
              - conductance[j] * (potentialV[j] - before)
              + grid.activeAreaCm2(j) * law[0];
      diagonal[j + 1] = -outward - conductance[j] + grid.activeAreaCm2(j) * law[1];
    }
  }

  /** Forward sweep of the tridiagonal system; a held anode has an infinite diagonal. */
  private static void eliminate(
      double[] conductance, double[] residual, double[] diagonal, double[] upper, double[] step) {
    int n = conductance.length;
    upper[0] = conductance[0] / diagonal[0];
    step[0] = -residual[0] / diagonal[0];
    for (int j = 0; j < n; j++) {
      double outward = j + 1 < n ? conductance[j + 1] : 0;
      double pivot = diagonal[j + 1] - conductance[j] * upper[j];
      upper[j + 1] = outward / pivot;
      step[j + 1] = (-residual[j + 1] - conductance[j] * step[j]) / pivot;
    }
  }

  /** Potential of the anode against the film beside it, V. */
  double anodeV() {
    return anodeV;
  }

  /** Current from anode to cathode, µA. */
  double currentUA() {
    return currentUA;
  }

  private double total() {
    double[] law = new double[2];
    double sum = 0;
    for (int j = 0; j < potentialV.length; j++) {
      cathode.at(potentialV[j], law);
      sum += grid.activeAreaCm2(j) * law[0];
    }
    return sum;
  }

  /** Distance from the anode within which half of the cathode's current arises, mm. */
  double reachMm() {
    double[] law = new double[2];
    double total = currentUA;
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
