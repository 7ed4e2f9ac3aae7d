package saltspoke.sources;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.io.OutputStream;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Writes named polygons as a GeoJSON feature collection (RFC 7946), one feature a line. */
public final class GeoJsonText {
  private GeoJsonText() {}

  /**
   * A feature.
   *
   * @param properties written in their order
   * @param polygons per polygon its rings, each as longitude and latitude in turn, closed
   */
  public record Feature(Map<String, ?> properties, List<List<double[]>> polygons) {}

  static void write(OutputStream out, List<Feature> features, int decimals) throws IOException {
    write(out, Map.of(), features, decimals);
  }

  /**
   * Writes a collection.
   *
   * @param about members of the collection beside its features, in their order
   * @param decimals of longitude and latitude; rings that fold to nothing are left out
   */
  public static void write(
      OutputStream out, Map<String, String> about, List<Feature> features, int decimals)
      throws IOException {
    try (JsonGenerator json = new JsonFactory().createGenerator(out)) {
      json.writeStartObject();
      json.writeStringField("type", "FeatureCollection");
      for (Map.Entry<String, String> member : about.entrySet()) {
        json.writeStringField(member.getKey(), member.getValue());
      }
      json.writeArrayFieldStart("features");
      for (Feature feature : features) {
        json.writeRaw('\n');
        json.writeStartObject();
        json.writeStringField("type", "Feature");
        json.writeObjectFieldStart("properties");
        for (Map.Entry<String, ?> property : feature.properties().entrySet()) {
          json.writePOJOField(property.getKey(), property.getValue());
        }
        json.writeEndObject();
        json.writeObjectFieldStart("geometry");
        json.writeStringField("type", "MultiPolygon");
        json.writeArrayFieldStart("coordinates");
        for (List<double[]> polygon : feature.polygons()) {
          polygon(json, polygon, decimals);
        }
        json.writeEndArray();
        json.writeEndObject();
        json.writeEndObject();
      }
      json.writeEndArray();
      json.writeEndObject();
    }
  }

  private static void polygon(JsonGenerator json, List<double[]> rings, int decimals)
      throws IOException {
    List<List<String>> rounded = new ArrayList<>();
    for (double[] ring : rings) {
      List<String> points = points(ring, decimals);
      if (points.size() >= 4) {
        rounded.add(points);
      } else if (rounded.isEmpty()) {
        return;
      }
    }
    json.writeStartArray();
    for (List<String> ring : rounded) {
      json.writeRawValue("[" + String.join(",", ring) + "]");
    }
    json.writeEndArray();
  }

  private static List<String> points(double[] ring, int decimals) {
    List<String> points = new ArrayList<>();
    for (int i = 0; i < ring.length; i += 2) {
      String point = "[" + number(ring[i], decimals) + "," + number(ring[i + 1], decimals) + "]";
      if (points.isEmpty() || !point.equals(points.get(points.size() - 1))) {
        points.add(point);
      }
    }
    return points;
  }

  private static String number(double value, int decimals) {
    BigDecimal rounded =
        BigDecimal.valueOf(value).setScale(decimals, RoundingMode.HALF_EVEN).stripTrailingZeros();
    return rounded.signum() == 0 ? "0" : rounded.toPlainString();
  }
}
