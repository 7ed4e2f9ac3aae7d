package saltspoke.faces.web;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.locationtech.jts.algorithm.construct.MaximumInscribedCircle;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Polygon;
import saltspoke.faces.json.Json;

/**
 * Where the names of countries go on the map: in the middle of the largest circle that fits into
 * the largest part.
 */
final class CountryNames {
  /** About the width of a letter on the map, pixels. */
  private static final double LETTER_PX = 6.5;

  private static final double TOLERANCE_DEG = 0.2;
  private static final GeometryFactory FACTORY = new GeometryFactory();

  /**
   * @param countryCode ISO 3166-1 alpha-2, empty when the name is not a country's in English
   * @param fromZoom zoom from which the name has room
   */
  record Name(
      String name, String countryCode, double latitudeDeg, double longitudeDeg, int fromZoom) {
    ObjectNode json() {
      ObjectNode node = Json.object();
      node.put("name", name);
      node.put("countryCode", countryCode);
      Json.number(node, "latitudeDeg", latitudeDeg);
      Json.number(node, "longitudeDeg", longitudeDeg);
      node.put("fromZoom", fromZoom);
      return node;
    }
  }

  private CountryNames() {}

  /** Names from a GeoJSON FeatureCollection whose features carry a {@code name}; largest first. */
  static List<Name> read(InputStream geoJson) throws IOException {
    Map<String, String> codes = codes();
    List<Name> names = new ArrayList<>();
    for (JsonNode feature : Json.MAPPER.readTree(geoJson).path("features")) {
      String name = feature.path("properties").path("name").asText();
      Polygon largest = largest(feature.path("geometry"));
      if (name.isBlank() || largest == null) {
        continue;
      }
      MaximumInscribedCircle circle = new MaximumInscribedCircle(largest, TOLERANCE_DEG);
      Coordinate centre = circle.getCenter().getCoordinate();
      double widthDeg = 2.6 * circle.getRadiusLine().getLength();
      int zoom = 2;
      while (zoom < TileFrame.MOST_ZOOM
          && widthDeg / 360 * TileFrame.SIZE_PX * (1 << zoom) < name.length() * LETTER_PX) {
        zoom++;
      }
      names.add(new Name(name, codes.getOrDefault(name, ""), centre.y, centre.x, zoom));
    }
    names.sort(Comparator.comparingInt(Name::fromZoom).thenComparing(Name::name));
    return names;
  }

  private static Polygon largest(JsonNode geometry) {
    JsonNode polygons =
        geometry.path("type").asText().equals("Polygon")
            ? Json.array().add(geometry.path("coordinates"))
            : geometry.path("coordinates");
    Polygon largest = null;
    for (JsonNode polygon : polygons) {
      Coordinate[] ring = ring(polygon.path(0));
      if (ring.length >= 4) {
        Polygon candidate = FACTORY.createPolygon(ring);
        if (largest == null || candidate.getArea() > largest.getArea()) {
          largest = candidate;
        }
      }
    }
    if (largest == null || largest.isValid()) {
      return largest;
    }
    Geometry mended = largest.buffer(0);
    return mended instanceof Polygon polygon && !polygon.isEmpty() ? polygon : null;
  }

  private static Coordinate[] ring(JsonNode points) {
    Coordinate[] ring = new Coordinate[points.size()];
    for (int i = 0; i < ring.length; i++) {
      ring[i] = new Coordinate(points.get(i).get(0).asDouble(), points.get(i).get(1).asDouble());
    }
    return ring;
  }

  private static Map<String, String> codes() {
    Map<String, String> codes = new HashMap<>();
    for (String code : Locale.getISOCountries()) {
      codes.put(
          new Locale.Builder().setRegion(code).build().getDisplayCountry(Locale.ENGLISH), code);
    }
    codes.put("United States of America", "US");
    codes.put("Dem. Rep. Congo", "CD");
    codes.put("Congo", "CG");
    codes.put("Central African Rep.", "CF");
    codes.put("S. Sudan", "SS");
    codes.put("W. Sahara", "EH");
    codes.put("Dominican Rep.", "DO");
    codes.put("Bosnia and Herz.", "BA");
    codes.put("Macedonia", "MK");
    codes.put("Turkey", "TR");
    codes.put("Czechia", "CZ");
    return codes;
  }
}
