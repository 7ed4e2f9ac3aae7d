package saltspoke.places;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;

/** Finds the point of the coast that is nearest to a place, by straight lines through the earth. */
final class NearestShore {
  private record Candidate(CoastBin bin, double leastM) {}

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

  /** Searches bins from the nearest outwards, until the rest cannot hold a nearer point. */
  void offerNearestFirst(Collection<CoastBin> bins) {
    List<Candidate> candidates = new ArrayList<>();
    for (CoastBin bin : bins) {
      candidates.add(new Candidate(bin, bin.leastM(from)));
    }
    candidates.sort(Comparator.comparingDouble(Candidate::leastM));
    for (Candidate candidate : candidates) {
      if (candidate.leastM >= bestM) {
        return;
      }
      offer(candidate.bin.shape());
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
