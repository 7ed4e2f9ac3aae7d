package saltspoke.sources;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;

/**
 * Reads the polygons of one object of a TopoJSON file (format specification 1.0.0: quantised,
 * delta-encoded arcs that neighbours share).
 */
final class TopoJson {
  /**
   * A named shape.
   *
   * @param polygons per polygon its rings, each as longitude and latitude in turn, closed
   */
  record Shape(String name, List<List<double[]>> polygons) {}

  private record Raw(String name, List<List<List<Integer>>> polygons) {}

  private final List<Raw> raw = new ArrayList<>();
  private final List<double[]> arcs = new ArrayList<>();
  private double[] scale = {1, 1};
  private double[] translate = {0, 0};

  private TopoJson() {}

  /** All polygon shapes of an object, in file order. */
  static List<Shape> read(InputStream in, String objectName) throws IOException {
    TopoJson topo = new TopoJson();
    try (JsonParser parser = new JsonFactory().createParser(in)) {
      parser.nextToken();
      while (parser.nextToken() == JsonToken.FIELD_NAME) {
        String name = parser.currentName();
        parser.nextToken();
        switch (name) {
          case "objects" -> topo.objects(parser, objectName);
          case "arcs" -> topo.arcs(parser);
          case "transform" -> topo.transform(parser);
          default -> parser.skipChildren();
        }
      }
    }
    return topo.raw.stream().map(topo::shape).toList();
  }

  private void transform(JsonParser parser) throws IOException {
    while (parser.nextToken() == JsonToken.FIELD_NAME) {
      String name = parser.currentName();
      parser.nextToken();
      parser.nextToken();
      double first = parser.getDoubleValue();
      parser.nextToken();
      double second = parser.getDoubleValue();
      parser.nextToken();
      if (name.equals("scale")) {
        scale = new double[] {first, second};
      } else {
        translate = new double[] {first, second};
      }
    }
  }

  private void objects(JsonParser parser, String wanted) throws IOException {
    while (parser.nextToken() == JsonToken.FIELD_NAME) {
      String name = parser.currentName();
      parser.nextToken();
      if (!name.equals(wanted)) {
        parser.skipChildren();
        continue;
      }
      while (parser.nextToken() == JsonToken.FIELD_NAME) {
        boolean list = parser.currentName().equals("geometries");
        parser.nextToken();
        if (list) {
          while (parser.nextToken() == JsonToken.START_OBJECT) {
            geometry(parser);
          }
        } else {
          parser.skipChildren();
        }
      }
    }
  }

  private void geometry(JsonParser parser) throws IOException {
    String name = "";
    boolean multi = false;
    Object nested = List.of();
    while (parser.nextToken() == JsonToken.FIELD_NAME) {
      String member = parser.currentName();
      parser.nextToken();
      switch (member) {
        case "type" -> multi = parser.getText().equals("MultiPolygon");
        case "arcs" -> nested = nested(parser);
        case "properties" -> name = JsonRows.object(parser).getOrDefault("name", "");
        default -> parser.skipChildren();
      }
    }
    raw.add(new Raw(name, polygons(nested, multi)));
  }

  @SuppressWarnings("unchecked")
  private static List<List<List<Integer>>> polygons(Object nested, boolean multi) {
    return multi ? (List<List<List<Integer>>>) nested : List.of((List<List<Integer>>) nested);
  }

  private static Object nested(JsonParser parser) throws IOException {
    if (parser.currentToken() != JsonToken.START_ARRAY) {
      return parser.getIntValue();
    }
    List<Object> list = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      list.add(nested(parser));
    }
    return list;
  }

  private void arcs(JsonParser parser) throws IOException {
    while (parser.nextToken() == JsonToken.START_ARRAY) {
      List<Integer> deltas = new ArrayList<>();
      while (parser.nextToken() == JsonToken.START_ARRAY) {
        parser.nextToken();
        deltas.add(parser.getIntValue());
        parser.nextToken();
        deltas.add(parser.getIntValue());
        parser.nextToken();
      }
      double[] points = new double[deltas.size()];
      long x = 0;
      long y = 0;
      for (int i = 0; i < points.length; i += 2) {
        x += deltas.get(i);
        y += deltas.get(i + 1);
        points[i] = x;
        points[i + 1] = y;
      }
      arcs.add(points);
    }
  }

  private Shape shape(Raw from) {
    List<List<double[]>> polygons = new ArrayList<>();
    for (List<List<Integer>> polygon : from.polygons()) {
      List<double[]> rings = new ArrayList<>();
      for (List<Integer> ring : polygon) {
        rings.add(ring(ring));
      }
      polygons.add(rings);
    }
    return new Shape(from.name(), polygons);
  }

  private double[] ring(List<Integer> indices) {
    List<Double> ring = new ArrayList<>();
    for (int index : indices) {
      double[] arc = arcs.get(index < 0 ? ~index : index);
      int n = arc.length / 2;
      for (int i = ring.isEmpty() ? 0 : 1; i < n; i++) {
        int at = index < 0 ? n - 1 - i : i;
        ring.add(arc[2 * at] * scale[0] + translate[0]);
        ring.add(arc[2 * at + 1] * scale[1] + translate[1]);
      }
    }
    return ring.stream().mapToDouble(Double::doubleValue).toArray();
  }
}
