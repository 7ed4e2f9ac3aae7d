package saltspoke.atlas;

import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.locationtech.jts.algorithm.InteriorPointArea;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import saltspoke.atmosphere.Category;
import saltspoke.places.Area;
import saltspoke.places.AreaIndex;

/** Sums the cells of an atlas by area. */
public final class AreaTally {
  private static final GeometryFactory GEOMETRIES = new GeometryFactory();
  private static final int CLASSES = Category.values().length;

  private final List<Area> areas;
  private final boolean ofClasses;
  private final long[] cells;
  private final double[] weight;
  private final double[] sum;
  private final double[] least;
  private final double[] most;
  private final double[][] byClass;

  private AreaTally(List<Area> areas, boolean ofClasses) {
    int n = areas.size();
    this.areas = areas;
    this.ofClasses = ofClasses;
    cells = new long[n];
    weight = new double[n];
    sum = new double[n];
    least = new double[n];
    most = new double[n];
    byClass = new double[n][ofClasses ? CLASSES : 0];
    Arrays.fill(least, Double.POSITIVE_INFINITY);
    Arrays.fill(most, Double.NEGATIVE_INFINITY);
  }

  /**
   * The areas that have a value, in their order.
   *
   * @param box west, south, east, north in degrees: areas wholly outside are left out
   * @param points for areas so small that no cell's middle lies inside
   */
  public static List<AreaValue> of(
      List<Area> areas,
      AtlasFrame frame,
      PlaneToEarth earth,
      TileStore tiles,
      boolean ofClasses,
      double[] box,
      PointValues points)
      throws IOException {
    List<Area> inside = areas.stream().filter(area -> meets(area.box(), box)).toList();
    AreaTally tally = new AreaTally(inside, ofClasses);
    AreaIndex index = new AreaIndex(inside);
    for (int tile = 0; tile < frame.tiles(); tile++) {
      int row0 = tile / frame.tilesAcross() * AtlasFrame.TILE;
      int column0 = tile % frame.tilesAcross() * AtlasFrame.TILE;
      float[] values = tiles.get(tile);
      for (int i = 0; i < values.length; i++) {
        if (!Float.isNaN(values[i])) {
          double x = frame.x(column0 + i % AtlasFrame.TILE);
          double[] at = earth.lonLat(x, frame.y(row0 + i / AtlasFrame.TILE));
          tally.add(index.at(at[1], at[0]), at[1], values[i], frame.geographic());
        }
      }
    }
    return tally.result(points);
  }

  private static boolean meets(double[] area, double[] box) {
    return area[0] <= box[2] && area[2] >= box[0] && area[1] <= box[3] && area[3] >= box[1];
  }

  /** Cells of a grid in degrees shrink towards the poles; those of a plane count alike. */
  private void add(int area, double latitudeDeg, float value, boolean geographic) {
    if (area < 0) {
      return;
    }
    double share = geographic ? Math.cos(Math.toRadians(latitudeDeg)) : 1;
    cells[area]++;
    weight[area] += share;
    sum[area] += share * value;
    least[area] = Math.min(least[area], value);
    most[area] = Math.max(most[area], value);
    if (ofClasses) {
      byClass[area][(int) value - 1] += share;
    }
  }

  private List<AreaValue> result(PointValues points) {
    List<AreaValue> result = new ArrayList<>();
    for (int i = 0; i < areas.size(); i++) {
      long counted = cells[i];
      if (counted == 0) {
        double[] at = pointInside(areas.get(i));
        float value = points.at(at[1], at[0]);
        if (Float.isNaN(value)) {
          continue;
        }
        add(i, 0, value, true);
      }
      double[] share = byClass[i].clone();
      for (int k = 0; k < share.length; k++) {
        share[k] /= weight[i];
      }
      result.add(
          new AreaValue(areas.get(i), counted, sum[i] / weight[i], least[i], most[i], share));
    }
    return result;
  }

  /** Longitude and latitude well inside the first polygon. */
  private static double[] pointInside(Area area) {
    double[] ring = area.polygons().get(0).get(0);
    Coordinate[] corners = new Coordinate[ring.length / 2];
    for (int i = 0; i < corners.length; i++) {
      corners[i] = new Coordinate(ring[2 * i], ring[2 * i + 1]);
    }
    Coordinate inside = InteriorPointArea.getInteriorPoint(GEOMETRIES.createPolygon(corners));
    return new double[] {inside.x, inside.y};
  }
}
