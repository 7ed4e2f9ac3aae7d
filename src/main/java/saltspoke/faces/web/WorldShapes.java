package saltspoke.faces.web;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.awt.geom.Path2D;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.StreamSupport;
import saltspoke.values.Refusal;

/**
 * Land and borders for drawing, from a GeoJSON file of country polygons (RFC 7946). Edges that two
 * countries share are borders; those of one alone are coast. Held in Web Mercator world units (0..1
 * from the west and from the north).
 */
public final class WorldShapes {
  /** Latitude at which the Web Mercator square ends. */
  static final double MOST_LATITUDE_DEG = 85.0511;

  private static final double LEAST_MOVE_PX = 0.35;

  /** A ring or line with its box. */
  private record Line(
      double[] x, double[] y, double west, double east, double north, double south) {
    Line movedEast(double worlds) {
      double[] moved = Arrays.stream(x).map(each -> each + worlds).toArray();
      return new Line(moved, y, west + worlds, east + worlds, north, south);
    }
  }

  private final List<Line> land;
  private final List<Line> borders;

  private WorldShapes(List<Line> land, List<Line> borders) {
    this.land = land;
    this.borders = borders;
  }

  /**
   * @param countries GeoJSON FeatureCollection of country polygons whose common edges have the same
   *     vertices
   */
  public static WorldShapes ofCountries(InputStream countries) {
    List<double[][]> rings = rings(countries);
    List<Line> land = rings.stream().flatMap(ring -> onOneSheet(ring).stream()).toList();
    return new WorldShapes(land, borders(rings));
  }

  /** Land within a tile, as a filled shape in pixels. */
  Path2D land(TileFrame frame) {
    Path2D path = new Path2D.Double(Path2D.WIND_EVEN_ODD);
    land.forEach(ring -> append(path, ring, frame, true));
    return path;
  }

  /** Borders within a tile, as lines in pixels. */
  Path2D borders(TileFrame frame) {
    Path2D path = new Path2D.Double();
    borders.forEach(line -> append(path, line, frame, false));
    return path;
  }

  private static void append(Path2D path, Line line, TileFrame frame, boolean closed) {
    if (!frame.meets(line.west, line.east, line.north, line.south)) {
      return;
    }
    double lastX = frame.px(line.x[0]);
    double lastY = frame.py(line.y[0]);
    path.moveTo(lastX, lastY);
    for (int i = 1; i < line.x.length; i++) {
      double px = frame.px(line.x[i]);
      double py = frame.py(line.y[i]);
      boolean last = i == line.x.length - 1;
      if (last || Math.abs(px - lastX) + Math.abs(py - lastY) >= LEAST_MOVE_PX) {
        path.lineTo(px, py);
        lastX = px;
        lastY = py;
      }
    }
    if (closed) {
      path.closePath();
    }
  }

  /**
   * A ring as it lies on the flat map. One that crosses longitude 180° is unrolled and drawn at
   * both edges of the map; one that runs round a pole is closed along the map's edge there.
   */
  private static List<Line> onOneSheet(double[][] ring) {
    List<double[]> unrolled = new ArrayList<>();
    double turn = 0;
    for (int i = 0; i < ring.length; i++) {
      double step = i == 0 ? 0 : ring[i][0] - ring[i - 1][0];
      turn -= step > 180 ? 360 : step < -180 ? -360 : 0;
      unrolled.add(new double[] {ring[i][0] + turn, ring[i][1]});
    }
    if (turn != 0) {
      double pole = ring[0][1] < 0 ? -90 : 90;
      unrolled.add(new double[] {ring[0][0] + turn, pole});
      unrolled.add(new double[] {ring[0][0], pole});
      unrolled.add(ring[0]);
    }
    Line line = line(unrolled.toArray(double[][]::new));
    List<Line> sheets = new ArrayList<>(List.of(line));
    if (line.west < 0) {
      sheets.add(line.movedEast(1));
    }
    if (line.east > 1) {
      sheets.add(line.movedEast(-1));
    }
    return sheets;
  }

  /** Runs of edges that occur in two rings. */
  private static List<Line> borders(List<double[][]> rings) {
    Map<Edge, Integer> count = new HashMap<>();
    for (double[][] ring : rings) {
      for (int i = 1; i < ring.length; i++) {
        count.merge(Edge.of(ring[i - 1], ring[i]), 1, Integer::sum);
      }
    }
    List<Line> borders = new ArrayList<>();
    for (double[][] ring : rings) {
      List<double[]> run = new ArrayList<>();
      for (int i = 1; i < ring.length; i++) {
        Edge edge = Edge.of(ring[i - 1], ring[i]);
        if (count.get(edge) > 1) {
          count.put(edge, 0);
          if (run.isEmpty()) {
            run.add(ring[i - 1]);
          }
          run.add(ring[i]);
        } else if (!run.isEmpty()) {
          borders.add(line(run.toArray(double[][]::new)));
          run.clear();
        }
      }
      if (!run.isEmpty()) {
        borders.add(line(run.toArray(double[][]::new)));
      }
    }
    return borders;
  }

  private record Edge(double aLon, double aLat, double bLon, double bLat) {
    static Edge of(double[] a, double[] b) {
      boolean ordered = a[0] < b[0] || a[0] == b[0] && a[1] <= b[1];
      return ordered ? new Edge(a[0], a[1], b[0], b[1]) : new Edge(b[0], b[1], a[0], a[1]);
    }
  }

  private static Line line(double[][] lonLat) {
    double[] x = new double[lonLat.length];
    double[] y = new double[lonLat.length];
    double west = Double.MAX_VALUE;
    double east = -Double.MAX_VALUE;
    double north = Double.MAX_VALUE;
    double south = -Double.MAX_VALUE;
    for (int i = 0; i < lonLat.length; i++) {
      x[i] = (lonLat[i][0] + 180) / 360;
      y[i] = mercator(lonLat[i][1]);
      west = Math.min(west, x[i]);
      east = Math.max(east, x[i]);
      north = Math.min(north, y[i]);
      south = Math.max(south, y[i]);
    }
    return new Line(x, y, west, east, north, south);
  }

  /** Web Mercator: latitude to 0 (85.05° N) .. 1 (85.05° S). */
  static double mercator(double latitudeDeg) {
    double phi =
        Math.toRadians(Math.max(-MOST_LATITUDE_DEG, Math.min(MOST_LATITUDE_DEG, latitudeDeg)));
    return 0.5 - Math.log(Math.tan(Math.PI / 4 + phi / 2)) / (2 * Math.PI);
  }

  private static List<double[][]> rings(InputStream geoJson) {
    try (InputStream in = geoJson) {
      JsonNode root = new ObjectMapper().readTree(in);
      List<double[][]> rings = new ArrayList<>();
      for (JsonNode feature : root.path("features")) {
        collect(feature.path("geometry"), rings);
      }
      if (rings.isEmpty()) {
        throw Refusal.dataDamaged(
            "no-polygons", "countries", root.path("type").asText(), "a GeoJSON FeatureCollection");
      }
      return rings;
    } catch (IOException e) {
      throw Refusal.dataDamaged("unreadable-geojson", "countries", e.getMessage(), "GeoJSON");
    }
  }

  private static void collect(JsonNode geometry, List<double[][]> rings) {
    JsonNode coordinates = geometry.path("coordinates");
    switch (geometry.path("type").asText()) {
      case "Polygon" -> coordinates.forEach(ring -> rings.add(points(ring)));
      case "MultiPolygon" ->
          coordinates.forEach(polygon -> polygon.forEach(ring -> rings.add(points(ring))));
      case "GeometryCollection" ->
          geometry.path("geometries").forEach(part -> collect(part, rings));
      default -> {
        // Points and lines are not land.
      }
    }
  }

  private static double[][] points(JsonNode ring) {
    return StreamSupport.stream(ring.spliterator(), false)
        .map(point -> new double[] {point.get(0).asDouble(), point.get(1).asDouble()})
        .toArray(double[][]::new);
  }
}
