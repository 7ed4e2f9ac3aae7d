package saltspoke.sources;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import saltspoke.values.Refusal;

/**
 * Reads the polygons that a person drew: any GeoJSON object (RFC 7946) that holds Polygons or
 * MultiPolygons, in longitude and latitude. Whatever else it holds is passed over.
 */
public final class DrawnPolygons {
  private static final String ALLOWED =
      "GeoJSON with a Polygon or MultiPolygon, closed rings of [longitude, latitude]";

  /** More points than any hand draws. */
  private static final int MOST_POINTS = 1_000_000;

  private final String file;
  private final List<List<double[]>> polygons = new ArrayList<>();
  private int points;

  private DrawnPolygons(String file) {
    this.file = file;
  }

  /**
   * Per polygon its rings, outer first, each as longitude and latitude in turn.
   *
   * @param file name for messages
   * @throws Refusal when it is no GeoJSON, holds no polygon, or coordinates out of range
   */
  public static List<List<double[]>> read(InputStream in, String file) throws IOException {
    DrawnPolygons drawn = new DrawnPolygons(file);
    try (JsonParser parser = new JsonFactory().createParser(in)) {
      if (parser.nextToken() != JsonToken.START_OBJECT) {
        throw Refusal.wrongUse("not-geojson", file, "", ALLOWED);
      }
      drawn.object(parser);
    } catch (JsonProcessingException e) {
      throw Refusal.wrongUse("not-geojson", file + ":" + e.getLocation().getLineNr(), "", ALLOWED);
    }
    if (drawn.polygons.isEmpty()) {
      throw Refusal.wrongUse("no-polygons", file, "", ALLOWED);
    }
    return drawn.polygons;
  }

  private void object(JsonParser parser) throws IOException {
    String type = "";
    Object coordinates = List.of();
    while (parser.nextToken() == JsonToken.FIELD_NAME) {
      String name = parser.currentName();
      JsonToken value = parser.nextToken();
      if (name.equals("type")) {
        type = parser.getValueAsString("");
      } else if (name.equals("coordinates")) {
        coordinates = nested(parser);
      } else if (name.equals("geometry") && value == JsonToken.START_OBJECT) {
        object(parser);
      } else if ((name.equals("features") || name.equals("geometries"))
          && value == JsonToken.START_ARRAY) {
        while (parser.nextToken() == JsonToken.START_OBJECT) {
          object(parser);
        }
      } else {
        parser.skipChildren();
      }
    }
    if (type.equals("Polygon")) {
      polygon(list(coordinates));
    } else if (type.equals("MultiPolygon")) {
      list(coordinates).forEach(polygon -> polygon(list(polygon)));
    }
  }

  private Object nested(JsonParser parser) throws IOException {
    if (parser.currentToken() != JsonToken.START_ARRAY) {
      return parser.getValueAsDouble(Double.NaN);
    }
    List<Object> list = new ArrayList<>();
    while (parser.nextToken() != JsonToken.END_ARRAY) {
      if (++points > 4 * MOST_POINTS) {
        throw Refusal.wrongUse("too-large", file, "", "at most " + MOST_POINTS + " points");
      }
      list.add(nested(parser));
    }
    return list;
  }

  private void polygon(List<?> rings) {
    List<double[]> read = new ArrayList<>();
    for (Object ring : rings) {
      read.add(ring(list(ring)));
    }
    if (read.isEmpty()) {
      throw Refusal.wrongUse("bad-ring", file, "a polygon without a ring", ALLOWED);
    }
    polygons.add(read);
  }

  private double[] ring(List<?> positions) {
    double[] ring = new double[2 * positions.size()];
    for (int i = 0; i < positions.size(); i++) {
      List<?> position = list(positions.get(i));
      boolean sound = position.size() >= 2 && position.get(0) instanceof Double;
      double lon = sound ? (Double) position.get(0) : Double.NaN;
      double lat = sound && position.get(1) instanceof Double y ? y : Double.NaN;
      if (!(Math.abs(lon) <= 180 && Math.abs(lat) <= 90)) {
        throw Refusal.outOfRange(file, lon + "," + lat, "longitude -180..180, latitude -90..90");
      }
      ring[2 * i] = lon;
      ring[2 * i + 1] = lat;
    }
    int n = ring.length;
    if (n < 8 || ring[0] != ring[n - 2] || ring[1] != ring[n - 1]) {
      throw Refusal.wrongUse("bad-ring", file, n / 2 + " points", ALLOWED);
    }
    return ring;
  }

  private List<?> list(Object nested) {
    if (nested instanceof List<?> list) {
      return list;
    }
    throw Refusal.wrongUse("bad-ring", file, "a number where a list belongs", ALLOWED);
  }
}
