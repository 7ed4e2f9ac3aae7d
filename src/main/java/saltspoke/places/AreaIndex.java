package saltspoke.places;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * Finds the area that a point lies in, among many that hardly overlap; a point beside them, on a
 * shore or islet that simplified outlines leave out, belongs to the nearest close by.
 */
public final class AreaIndex {
  private static final int NONE = -1;

  /** Outlines lie within this of the shore; ASSUMPTION: farther out it is another place. */
  private static final double REACH_KM = 10;

  /** Kilometres to a degree of latitude, rounded down so that the reach is never cut. */
  private static final double KM_PER_DEG = 111;

  private static final double REACH_DEG = REACH_KM / 110;

  private static final class Part {
    final int owner;
    final Area polygon;

    Part(int owner, Area polygon) {
      this.owner = owner;
      this.polygon = polygon;
    }
  }

  /** Parts whose box meets a square degree, by {@link #square}. */
  private final List<List<Part>> squares = new ArrayList<>();

  /** An index over areas; of several at one point the first counts. */
  public AreaIndex(List<Area> areas) {
    for (int i = 0; i < 360 * 180; i++) {
      squares.add(List.of());
    }
    for (int owner = 0; owner < areas.size(); owner++) {
      Area area = areas.get(owner);
      for (List<double[]> rings : area.polygons()) {
        add(new Part(owner, new Area(area.name(), "", "", List.of(rings))));
      }
    }
  }

  private void add(Part part) {
    double[] box = part.polygon.box();
    for (int lat = (int) Math.floor(box[1]); lat <= box[3]; lat++) {
      for (int lon = (int) Math.floor(box[0]); lon <= box[2]; lon++) {
        int square = square(lat, lon);
        if (squares.get(square).isEmpty()) {
          squares.set(square, new ArrayList<>());
        }
        squares.get(square).add(part);
      }
    }
  }

  /** Index of the area that holds a point, else of the nearest within 10 km, else −1. */
  public int at(double latitudeDeg, double longitudeDeg) {
    for (Part part : squares.get(square(latitudeDeg, longitudeDeg))) {
      if (part.polygon.contains(latitudeDeg, longitudeDeg)) {
        return part.owner;
      }
    }
    int nearest = NONE;
    double least = REACH_KM;
    Set<Part> tried = new HashSet<>();
    for (int i = -1; i <= 1; i++) {
      for (int j = -1; j <= 1; j++) {
        double lat = latitudeDeg + i * REACH_DEG;
        double lon = longitudeDeg + j * REACH_DEG / Math.max(0.05, cosine(latitudeDeg));
        for (Part part : squares.get(square(lat, lon))) {
          if (tried.add(part)) {
            double km = outlineKm(part.polygon, latitudeDeg, longitudeDeg, least);
            if (km < least) {
              least = km;
              nearest = part.owner;
            }
          }
        }
      }
    }
    return nearest;
  }

  /** Distance to the outer ring in a plane that touches the earth at the point, km. */
  private static double outlineKm(
      Area polygon, double latitudeDeg, double longitudeDeg, double most) {
    double[] ring = polygon.polygons().get(0).get(0);
    double across = KM_PER_DEG * cosine(latitudeDeg);
    double least = most;
    for (int i = 2; i < ring.length; i += 2) {
      double x0 = (ring[i - 2] - longitudeDeg) * across;
      double y0 = (ring[i - 1] - latitudeDeg) * KM_PER_DEG;
      double dx = (ring[i] - ring[i - 2]) * across;
      double dy = (ring[i + 1] - ring[i - 1]) * KM_PER_DEG;
      double square = dx * dx + dy * dy;
      double share = square == 0 ? 0 : Math.max(0, Math.min(1, -(x0 * dx + y0 * dy) / square));
      least = Math.min(least, Math.hypot(x0 + share * dx, y0 + share * dy));
    }
    return least;
  }

  private static double cosine(double latitudeDeg) {
    return Math.cos(Math.toRadians(latitudeDeg));
  }

  private static int square(double latitudeDeg, double longitudeDeg) {
    int row = Math.max(0, Math.min(179, (int) Math.floor(latitudeDeg) + 90));
    return row * 360 + Math.floorMod((int) Math.floor(longitudeDeg) + 180, 360);
  }
}
