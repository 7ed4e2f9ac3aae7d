package saltspoke.atlas;

import java.util.ArrayList;
import java.util.List;
import saltspoke.places.Area;

/** Finds the area that a point lies in, among many that hardly overlap. */
public final class AreaIndex {
  private static final int NONE = -1;

  private record Part(int owner, Area polygon) {}

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

  /** Index of the area that holds a point, −1 when none does. */
  public int at(double latitudeDeg, double longitudeDeg) {
    for (Part part : squares.get(square(latitudeDeg, longitudeDeg))) {
      if (part.polygon.contains(latitudeDeg, longitudeDeg)) {
        return part.owner;
      }
    }
    return NONE;
  }

  private static int square(double latitudeDeg, double longitudeDeg) {
    int row = Math.max(0, Math.min(179, (int) Math.floor(latitudeDeg) + 90));
    return row * 360 + Math.floorMod((int) Math.floor(longitudeDeg) + 180, 360);
  }
}
