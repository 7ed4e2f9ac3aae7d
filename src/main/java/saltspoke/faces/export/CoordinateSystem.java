package saltspoke.faces.export;

import java.util.Arrays;
import org.geotools.api.geometry.MismatchedDimensionException;
import org.geotools.api.referencing.FactoryException;
import org.geotools.api.referencing.crs.CoordinateReferenceSystem;
import org.geotools.api.referencing.crs.GeographicCRS;
import org.geotools.api.referencing.operation.MathTransform;
import org.geotools.api.referencing.operation.TransformException;
import org.geotools.geometry.jts.JTS;
import org.geotools.geometry.jts.ReferencedEnvelope;
import org.geotools.referencing.CRS;
import saltspoke.atlas.AtlasFrame;
import saltspoke.atlas.PlaneToEarth;
import saltspoke.values.Refusal;

/**
 * A coordinate system by its EPSG code, easting or longitude first. GeoTools and its database are
 * touched only for others than WGS 84 in degrees.
 */
public final class CoordinateSystem {
  /** WGS 84, longitude and latitude in degrees. */
  public static final int WGS84 = 4326;

  /** Points along each edge of a box by which its extent in the other plane is found. */
  private static final int EDGE_POINTS = 200;

  /** A point that does not come back to within this, degrees, lies off the map. */
  private static final double ROUND_TRIP_DEG = 1e-4;

  private final int epsg;
  private final boolean geographic;
  private final MathTransform toPlane;
  private final MathTransform toEarth;

  private CoordinateSystem(
      int epsg, boolean geographic, MathTransform toPlane, MathTransform toEarth) {
    this.epsg = epsg;
    this.geographic = geographic;
    this.toPlane = toPlane;
    this.toEarth = toEarth;
  }

  /**
   * The system of a code.
   *
   * @param text {@code EPSG:n}
   */
  public static CoordinateSystem of(String text) {
    if (!text.matches("(?i)EPSG:\\d{4,6}")) {
      throw Refusal.wrongUse("not-a-crs", "crs", text, "EPSG:n, such as EPSG:4326 or EPSG:3035");
    }
    int epsg = Integer.parseInt(text.substring("EPSG:".length()));
    if (epsg == WGS84) {
      return new CoordinateSystem(epsg, true, null, null);
    }
    try {
      CoordinateReferenceSystem earth = CRS.decode("EPSG:" + WGS84, true);
      CoordinateReferenceSystem plane = CRS.decode("EPSG:" + epsg, true);
      return new CoordinateSystem(
          epsg,
          plane instanceof GeographicCRS,
          CRS.findMathTransform(earth, plane, true),
          CRS.findMathTransform(plane, earth, true));
    } catch (FactoryException e) {
      throw Refusal.notFound("unknown-crs", "crs", text, "a two-dimensional system of EPSG");
    }
  }

  /** Unit of the step. */
  public boolean inDegrees() {
    return geographic;
  }

  /**
   * The cells that cover a box.
   *
   * @param box west, south, east and north in degrees
   * @param step in the unit of the plane
   */
  public AtlasFrame frame(double[] box, double step) {
    return AtlasFrame.over(toPlane == null ? box : inPlane(box), step, epsg, geographic);
  }

  private double[] inPlane(double[] box) {
    try {
      ReferencedEnvelope degrees =
          new ReferencedEnvelope(box[0], box[2], box[1], box[3], CRS.decode("EPSG:4326", true));
      ReferencedEnvelope plane =
          new ReferencedEnvelope(JTS.transform(degrees, null, toPlane, EDGE_POINTS), null);
      double[] edges = {plane.getMinX(), plane.getMinY(), plane.getMaxX(), plane.getMaxY()};
      for (double edge : edges) {
        if (!Double.isFinite(edge)) {
          throw offTheMap(box);
        }
      }
      return edges;
    } catch (TransformException | FactoryException | MismatchedDimensionException e) {
      throw offTheMap(box);
    }
  }

  private Refusal offTheMap(double[] box) {
    return Refusal.outOfRange(
        "box",
        String.join(",", Arrays.stream(box).mapToObj(String::valueOf).toList()),
        "a box that EPSG:" + epsg + " can show");
  }

  /** From the plane to the earth; cells outside the box have no value in a curved plane. */
  public PlaneToEarth toEarth(double[] box) {
    if (toPlane == null) {
      return PlaneToEarth::degrees;
    }
    return (x, y) -> {
      double[] point = {x, y};
      double[] back = new double[2];
      try {
        toEarth.transform(point, 0, point, 0, 1);
        toPlane.transform(point, 0, back, 0, 1);
        toEarth.transform(back, 0, back, 0, 1);
      } catch (TransformException | RuntimeException e) {
        return null;
      }
      boolean inside =
          point[0] >= box[0] && point[0] <= box[2] && point[1] >= box[1] && point[1] <= box[3];
      boolean sound =
          Math.abs(back[0] - point[0]) < ROUND_TRIP_DEG
              && Math.abs(back[1] - point[1]) < ROUND_TRIP_DEG;
      return inside && sound ? point : null;
    };
  }
}
