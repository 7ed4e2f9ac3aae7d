package saltspoke.wheel;

/**
 * Finite volumes along the film from the anode outwards: first the wall of the hole (constant
 * circumference, fully active), then the ring around the hole (growing circumference, active
 * share). Cell widths grow geometrically from the anode.
 *
 * <p>{@code squares[j]} is the resistance between the centres of cells j−1 and j in squares of
 * film; that from the anode to the first centre is {@code squares[0]}.
 */
final class StripGrid {
  /** Last cell over first on each part. */
  private static final double GRADING = 60;

  private final double[] squares;
  private final double[] activeAreaCm2;
  private final double[] centreMm;

  /**
   * @param wallLengthMm length of the hole's wall, may be 0
   * @param cells cells on each part that has a length
   */
  StripGrid(
      double holeRadiusMm,
      double wallLengthMm,
      double activeShare,
      double outerRadiusMm,
      int cells) {
    boolean wall = wallLengthMm > 0;
    boolean ring = activeShare > 0 && outerRadiusMm > holeRadiusMm;
    int count = (wall ? cells : 0) + (ring ? cells : 0);
    squares = new double[count];
    activeAreaCm2 = new double[count];
    centreMm = new double[count];
    double circumferenceMm = 2 * Math.PI * holeRadiusMm;
    double pending = 0;
    int j = 0;
    if (wall) {
      double[] edges = edges(wallLengthMm, cells);
      for (int k = 0; k < cells; k++, j++) {
        double half = 0.5 * (edges[k + 1] - edges[k]) / circumferenceMm;
        squares[j] = pending + half;
        pending = half;
        activeAreaCm2[j] = 2 * half * circumferenceMm * circumferenceMm / 100;
        centreMm[j] = 0.5 * (edges[k + 1] + edges[k]);
      }
    }
    if (ring) {
      double[] edges = edges(outerRadiusMm - holeRadiusMm, cells);
      for (int k = 0; k < cells; k++, j++) {
        double inner = holeRadiusMm + edges[k];
        double outer = holeRadiusMm + edges[k + 1];
        double centre = 0.5 * (inner + outer);
        squares[j] = pending + Math.log(centre / inner) / (2 * Math.PI);
        pending = Math.log(outer / centre) / (2 * Math.PI);
        activeAreaCm2[j] = activeShare * Math.PI * (outer * outer - inner * inner) / 100;
        centreMm[j] = wallLengthMm + centre - holeRadiusMm;
      }
    }
  }

  static StripGrid of(CellSpec spec, int cells) {
    double wallMm = 100 * spec.edgeAreaCm2() / (2 * Math.PI * spec.holeRadiusMm());
    return new StripGrid(
        spec.holeRadiusMm(), wallMm, spec.activeShare(), spec.outerRadiusMm(), cells);
  }

  private static double[] edges(double lengthMm, int cells) {
    double[] edges = new double[cells + 1];
    for (int k = 0; k <= cells; k++) {
      edges[k] = lengthMm * Math.expm1(Math.log(GRADING) * k / cells) / (GRADING - 1);
    }
    return edges;
  }

  int size() {
    return squares.length;
  }

  double squares(int j) {
    return squares[j];
  }

  double activeAreaCm2(int j) {
    return activeAreaCm2[j];
  }

  double centreMm(int j) {
    return centreMm[j];
  }
}
