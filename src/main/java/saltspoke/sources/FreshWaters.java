package saltspoke.sources;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.io.ParseException;
import org.locationtech.jts.io.WKTReader;
import org.locationtech.jts.operation.union.UnaryUnionOp;
import saltspoke.values.Refusal;

/** Adds lakes behind dams, which the shoreline source draws as sea, to the land of a bin. */
final class FreshWaters {
  private static final String FILE = "fresh-waters.csv";
  private static final GeometryFactory FACTORY = new GeometryFactory();

  private final List<Geometry> waters = new ArrayList<>();

  FreshWaters() {
    CsvTable.forEach(
        FreshWaters.class.getResourceAsStream(FILE),
        FILE,
        row -> {
          try {
            waters.add(new WKTReader(FACTORY).read(row.text("wkt")));
          } catch (ParseException e) {
            throw Refusal.dataDamaged("not-wkt", row.where(), row.text("wkt"), "a polygon");
          }
        });
  }

  /** The bin with its fresh waters as land; the bin itself when it has none. */
  GshhgBins.Bin addTo(GshhgBins.Bin bin) {
    Envelope box =
        new Envelope(
            bin.westDeg(),
            bin.westDeg() + bin.sizeDeg(),
            bin.southDeg(),
            bin.southDeg() + bin.sizeDeg());
    Geometry square = FACTORY.toGeometry(box);
    Geometry land = null;
    for (Geometry water : waters) {
      if (water.getEnvelopeInternal().intersects(box)) {
        Geometry part = water.intersection(square);
        if (!part.isEmpty()) {
          land = (land == null ? polygons(bin.rings()) : land).union(part);
        }
      }
    }
    return land == null
        ? bin
        : new GshhgBins.Bin(bin.westDeg(), bin.southDeg(), bin.sizeDeg(), rings(land));
  }

  private static Geometry polygons(List<double[]> rings) {
    List<Geometry> all = new ArrayList<>();
    for (double[] ring : rings) {
      Coordinate[] points = new Coordinate[ring.length / 2];
      for (int i = 0; i < points.length; i++) {
        points[i] = new Coordinate(ring[2 * i], ring[2 * i + 1]);
      }
      // A buffer of nothing heals rings that touch themselves.
      all.add(FACTORY.createPolygon(points).buffer(0));
    }
    return UnaryUnionOp.union(all, FACTORY);
  }

  private static List<double[]> rings(Geometry land) {
    List<double[]> rings = new ArrayList<>();
    for (int g = 0; g < land.getNumGeometries(); g++) {
      if (land.getGeometryN(g) instanceof Polygon polygon) {
        // Holes would be waters without a way to the sea: lakes, and so land.
        rings.add(counterClockwise(polygon.getExteriorRing()));
      }
    }
    return rings;
  }

  private static double[] counterClockwise(LinearRing ring) {
    Coordinate[] points = ring.getCoordinates();
    boolean ccw = Orientation.isCCW(points);
    double[] flat = new double[2 * points.length];
    for (int i = 0; i < points.length; i++) {
      Coordinate c = points[ccw ? i : points.length - 1 - i];
      flat[2 * i] = c.x;
      flat[2 * i + 1] = c.y;
    }
    return flat;
  }
}
