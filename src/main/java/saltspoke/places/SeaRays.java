package saltspoke.places;

import java.util.Arrays;

/**
 * Looks from a place along 36 rays and notes where each crosses the coast. Rays are straight lines
 * in the place's own frame of east and north: great circles, within 0.5 % of the geodesic.
 */
final class SeaRays {
  /** Water narrower than this along a ray is passed over, m: the meaning of {@link SeaView}. */
  static final double LEAST_WATER_M = 1000;

  /**
   * ASSUMPTION: land narrower than this along a ray, m, does not end the open water: surf and spray
   * pass over spits, moles and islets. No source; 200–1000 m would serve as well.
   */
  static final double LEAST_LAND_M = 500;

  /** Longest way to the shore that counts, m. */
  static final double SHORE_LIMIT_M = 1_500_000;

  /** Cap of the fetch, m: waves are fully grown well before. */
  static final double FETCH_LIMIT_M = 500_000;

  private static final double TAN10 = Math.tan(Math.toRadians(10));
  private static final double TAN20 = Math.tan(Math.toRadians(20));
  private static final double TAN30 = Math.tan(Math.toRadians(30));
  private static final double TAN40 = Math.tan(Math.toRadians(40));
  private static final double[] SIN = new double[SeaView.DIRECTIONS];
  private static final double[] COS = new double[SeaView.DIRECTIONS];

  static {
    for (int k = 0; k < SeaView.DIRECTIONS; k++) {
      SIN[k] = Math.sin(Math.toRadians(10 * k));
      COS[k] = Math.cos(Math.toRadians(10 * k));
    }
  }

  private final Vantage from;
  private final double[][] crossing = new double[SeaView.DIRECTIONS][8];
  private final int[] count = new int[SeaView.DIRECTIONS];

  SeaRays(Vantage from) {
    this.from = from;
  }

  /** Notes the crossings of a bin's coast whose arc distance lies in a range, m. */
  void add(CoastBin.Shape shape, double fromM, double toM) {
    double chordStart = Vantage.chordOfArcM(fromM);
    double chordLimit = Vantage.chordOfArcM(toM);
    for (int c = 0; c < shape.chunks(); c++) {
      if (shape.leastM(c, from) < chordLimit && touchesRay(shape, c)) {
        add(shape, shape.chunk[2 * c], shape.chunk[2 * c + 1], chordStart, chordLimit);
      }
    }
  }

  /** Whether a chunk's sphere reaches a ray, or lies wholly between two. */
  private boolean touchesRay(CoastBin.Shape shape, int c) {
    double x = shape.sphere[4 * c];
    double y = shape.sphere[4 * c + 1];
    double e = from.east(x, y);
    double n = from.north(x, y, shape.sphere[4 * c + 2]);
    double radius = shape.sphere[4 * c + 3];
    int left = sector(e, n);
    int right = left == SeaView.DIRECTIONS - 1 ? 0 : left + 1;
    return Math.abs(e * COS[left] - n * SIN[left]) <= radius
        || Math.abs(e * COS[right] - n * SIN[right]) <= radius;
  }

  private void add(
      CoastBin.Shape shape, int first, int last, double chordStart, double chordLimit) {
    double e0 = from.east(shape.x[first], shape.y[first]);
    double n0 = from.north(shape.x[first], shape.y[first], shape.z[first]);
    int sector0 = sector(e0, n0);
    for (int i = first + 1; i <= last; i++) {
      double e1 = from.east(shape.x[i], shape.y[i]);
      double n1 = from.north(shape.x[i], shape.y[i], shape.z[i]);
      int sector1 = sector(e1, n1);
      if (sector0 != sector1) {
        boolean clockwise = e1 * n0 - n1 * e0 > 0;
        int rays = Math.floorMod(clockwise ? sector1 - sector0 : sector0 - sector1, 36);
        for (int r = 0; r < rays; r++) {
          int k = Math.floorMod(clockwise ? sector0 + 1 + r : sector0 - r, 36);
          double side0 = e0 * COS[k] - n0 * SIN[k];
          double side1 = e1 * COS[k] - n1 * SIN[k];
          double share = side0 / (side0 - side1);
          double px = shape.x[i - 1] + share * (shape.x[i] - shape.x[i - 1]);
          double py = shape.y[i - 1] + share * (shape.y[i] - shape.y[i - 1]);
          double pz = shape.z[i - 1] + share * (shape.z[i] - shape.z[i - 1]);
          double chord = from.chordM(px, py, pz);
          if (chord >= chordStart && chord < chordLimit) {
            note(k, clockwise ? chord : -chord);
          }
        }
      }
      e0 = e1;
      n0 = n1;
      sector0 = sector1;
    }
  }

  /** A chord; positive: land begins there; negative: water begins. */
  private void note(int k, double signed) {
    if (count[k] == crossing[k].length) {
      crossing[k] = Arrays.copyOf(crossing[k], 2 * count[k]);
    }
    crossing[k][count[k]++] = signed;
  }

  /**
   * The stretch of open water along a ray.
   *
   * @param land whether the place itself is on land
   * @return its start and end, m; null when there is none within the limit
   */
  double[] openWater(int k, boolean land) {
    double horizon = SHORE_LIMIT_M + FETCH_LIMIT_M;
    double[] sorted = Arrays.copyOf(crossing[k], count[k]);
    sortByDistance(sorted);
    double start = land ? Double.NaN : 0;
    double end = Double.NaN;
    for (double c : sorted) {
      // Crossings are kept as chords: few of them are ever needed as a distance.
      double at = Vantage.arcM(Math.abs(c));
      boolean waterBegins = c < 0;
      if (waterBegins && Double.isNaN(start)) {
        start = at;
      } else if (waterBegins && !Double.isNaN(end)) {
        if (at - end >= LEAST_LAND_M) {
          if (end - start >= LEAST_WATER_M) {
            break;
          }
          start = at;
        }
        end = Double.NaN;
      } else if (!waterBegins && !Double.isNaN(start) && Double.isNaN(end)) {
        end = at;
      }
    }
    end = Double.isNaN(end) ? horizon : end;
    if (Double.isNaN(start) || start >= SHORE_LIMIT_M || end - start < LEAST_WATER_M) {
      return null;
    }
    return new double[] {start, Math.min(end, start + FETCH_LIMIT_M)};
  }

  private static void sortByDistance(double[] values) {
    for (int i = 1; i < values.length; i++) {
      double v = values[i];
      int j = i - 1;
      while (j >= 0 && Math.abs(values[j]) > Math.abs(v)) {
        values[j + 1] = values[j];
        j--;
      }
      values[j + 1] = v;
    }
  }

  /** Number of the 10° sector, clockwise from north, that a direction lies in. */
  static int sector(double east, double north) {
    double e = Math.abs(east);
    double n = Math.abs(north);
    int q;
    if (e < n) {
      q = steps(e, n);
    } else {
      q = 8 - steps(n, e);
    }
    if (east >= 0) {
      return north >= 0 ? q : 17 - q;
    }
    return north < 0 ? 18 + q : 35 - q;
  }

  private static int steps(double small, double large) {
    if (small < TAN20 * large) {
      return small < TAN10 * large ? 0 : 1;
    }
    if (small < TAN30 * large) {
      return 2;
    }
    return small < TAN40 * large ? 3 : 4;
  }
}
