package saltspoke.sources;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.BiConsumer;

/**
 * Streams the features of a GeoJSON collection of polygons: their properties and their polygons.
 */
public final class GeoJsonFeatures {
  private GeoJsonFeatures() {}

  /**
   * Calls back with each feature's scalar properties and its polygons: per polygon its rings, each
   * as longitude and latitude in turn.
   */
  public static void forEach(
      InputStream in, BiConsumer<Map<String, String>, List<List<double[]>>> action)
      throws IOException {
    try (JsonParser parser = new JsonFactory().createParser(in)) {
      parser.nextToken();
      while (parser.nextToken() == JsonToken.FIELD_NAME) {
        boolean features = parser.currentName().equals("features");
        parser.nextToken();
        if (!features) {
          parser.skipChildren();
          continue;
        }
        while (parser.nextToken() == JsonToken.START_OBJECT) {
          feature(parser, action);
        }
      }
    }
  }

  private static void feature(
      JsonParser parser, BiConsumer<Map<String, String>, List<List<double[]>>> action)
      throws IOException {
    Map<String, String> properties = Map.of();
    List<List<double[]>> polygons = new ArrayList<>();
    while (parser.nextToken() == JsonToken.FIELD_NAME) {
      String name = parser.currentName();
      parser.nextToken();
      if (name.equals("properties")) {
        properties = JsonRows.object(parser);
      } else if (name.equals("geometry")) {
        geometry(parser, polygons);
      } else {
        parser.skipChildren();
      }
    }
    action.accept(properties, polygons);
  }

  private static void geometry(JsonParser parser, List<List<double[]>> polygons)
      throws IOException {
    while (parser.nextToken() == JsonToken.FIELD_NAME) {
      boolean coordinates = parser.currentName().equals("coordinates");
      parser.nextToken();
      if (coordinates) {
        collect(parser, polygons);
      } else {
        parser.skipChildren();
      }
    }
  }

  /**
   * Descends to the rings: a ring is an array of arrays of numbers, a polygon an array of rings.
   */
  private static void collect(JsonParser parser, List<List<double[]>> polygons) throws IOException {
    int depth = 1;
    List<Double> ring = new ArrayList<>();
    List<double[]> rings = new ArrayList<>();
    JsonToken before = JsonToken.START_ARRAY;
    while (depth > 0) {
      JsonToken token = parser.nextToken();
      if (token == JsonToken.START_ARRAY) {
        depth++;
      } else if (token == JsonToken.END_ARRAY) {
        depth--;
        if (before == JsonToken.END_ARRAY && !ring.isEmpty()) {
          rings.add(ring.stream().mapToDouble(Double::doubleValue).toArray());
          ring.clear();
        } else if (before == JsonToken.END_ARRAY && !rings.isEmpty()) {
          polygons.add(List.copyOf(rings));
          rings.clear();
        }
      } else {
        ring.add(parser.getDoubleValue());
      }
      before = token;
    }
  }
}
