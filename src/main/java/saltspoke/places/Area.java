package saltspoke.places;

import java.util.List;

/**
 * A part of the world bounded by polygons: a region, several together, or one drawn by hand.
 *
 * @param name for people
 * @param countryCode ISO 3166-1 alpha-2, empty when it has none
 * @param code ISO 3166-2 where the source gives one, else empty
 * @param polygons per polygon its rings, outer first, each as longitude and latitude in turn,
 *     closed; none crosses the 180th meridian
 */
public record Area(String name, String countryCode, String code, List<List<double[]>> polygons) {
  public Area {
    polygons = List.copyOf(polygons);
  }

  /** Whether a point lies inside, holes left out. */
  public boolean contains(double latitudeDeg, double longitudeDeg) {
    for (List<double[]> rings : polygons) {
      boolean inside = false;
      for (double[] ring : rings) {
        inside ^= isInside(ring, latitudeDeg, longitudeDeg);
      }
      if (inside) {
        return true;
      }
    }
    return false;
  }

  /** West, south, east and north ends, degrees. */
  public double[] box() {
    double[] box = {180, 90, -180, -90};
    for (List<double[]> rings : polygons) {
      double[] outer = rings.get(0);
      for (int i = 0; i < outer.length; i += 2) {
        box[0] = Math.min(box[0], outer[i]);
        box[1] = Math.min(box[1], outer[i + 1]);
        box[2] = Math.max(box[2], outer[i]);
        box[3] = Math.max(box[3], outer[i + 1]);
      }
    }
    return box;
  }

  /** Even-odd rule: counts the edges that a line to the east crosses. */
  private static boolean isInside(double[] ring, double latitudeDeg, double longitudeDeg) {
    boolean inside = false;
    for (int i = 2; i < ring.length; i += 2) {
      double lat0 = ring[i - 1];
      double lat1 = ring[i + 1];
      if (lat0 > latitudeDeg != lat1 > latitudeDeg) {
        double share = (latitudeDeg - lat0) / (lat1 - lat0);
        inside ^= longitudeDeg < ring[i - 2] + share * (ring[i] - ring[i - 2]);
      }
    }
    return inside;
  }
}
