package saltspoke.places;

import java.util.List;

/** Finds the point of the coast that is nearest to a place, by straight lines through the earth. */
final class NearestShore {
  private final Vantage from;
  private double bestM = Double.POSITIVE_INFINITY;
  private double latitudeDeg = Double.NaN;
  private double longitudeDeg = Double.NaN;

  NearestShore(Vantage from) {
    this.from = from;
  }

  double bestM() {
    return bestM;
  }

  double latitudeDeg() {
    return latitudeDeg;
  }

  double longitudeDeg() {
    return longitudeDeg;
  }

  /** Searches the bin that may hold the nearest coast, then those that may still hold a nearer. */
  void offer(List<CoastBin> bins) {
    double[] leastM = new double[bins.size()];
    int nearest = -1;
    for (int b = 0; b < leastM.length; b++) {
      leastM[b] = bins.get(b).leastM(from);
      if (nearest < 0 || leastM[b] < leastM[nearest]) {
        nearest = b;
      }
    }
    if (nearest >= 0) {
      offer(bins.get(nearest).shape());
    }
    for (int b = 0; b < leastM.length; b++) {
      if (b != nearest && leastM[b] < bestM) {
        offer(bins.get(b).shape());
      }
    }
  }

  /** Searches bins from near to far until none can hold a nearer coast. */
  void offer(CoarseCoast.Order order) {
    for (int b = 0; b < order.bins().length && order.leastM()[b] < bestM; b++) {
      if (order.bins()[b].leastM(from) < bestM) {
        offer(order.bins()[b].shape());
      }
    }
  }

  private void offer(CoastBin.Shape shape) {
    for (int c = 0; c < shape.chunks(); c++) {
      if (shape.leastM(c, from) < bestM) {
        for (int i = shape.chunk[2 * c]; i < shape.chunk[2 * c + 1]; i++) {
          offerEdge(shape, i);
        }
      }
    }
  }

  private void offerEdge(CoastBin.Shape s, int i) {
    double ax = s.x[i] - from.x;
    double ay = s.y[i] - from.y;
    double az = s.z[i] - from.z;
    double dx = s.x[i + 1] - s.x[i];
    double dy = s.y[i + 1] - s.y[i];
    double dz = s.z[i + 1] - s.z[i];
    double square = dx * dx + dy * dy + dz * dz;
    double share = square == 0 ? 0 : -(ax * dx + ay * dy + az * dz) / square;
    share = Math.max(0, Math.min(1, share));
    double x = ax + share * dx;
    double y = ay + share * dy;
    double z = az + share * dz;
    double distance = Math.sqrt(x * x + y * y + z * z);
    if (distance < bestM) {
      bestM = distance;
      latitudeDeg = s.lat[i] + share * (s.lat[i + 1] - s.lat[i]);
      longitudeDeg = s.lon[i] + share * (s.lon[i + 1] - s.lon[i]);
    }
  }
}
