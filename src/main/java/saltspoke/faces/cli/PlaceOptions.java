package saltspoke.faces.cli;

import java.util.LinkedHashMap;
import java.util.Map;
import picocli.CommandLine.Option;

/** The options that say where. Each has the name of the HTTP parameter. */
final class PlaceOptions {
  @Option(
      names = "--place",
      paramLabel = "NAME",
      description = "A town, with its country or region behind a comma if there are several.")
  private String place;

  @Option(
      names = "--postcode",
      paramLabel = "CODE",
      description = "A postcode, with --country (shipped: US, IN, FR, IT, DE).")
  private String postcode;

  @Option(
      names = "--country",
      paramLabel = "CC",
      description = "Two-letter country of the postcode.")
  private String country;

  @Option(
      names = "--at",
      paramLabel = "LAT,LON",
      description = "Coordinates in degrees, south and west negative.")
  private String at;

  @Option(
      names = "--elevation",
      paramLabel = "M",
      description = "Metres above the sea, in place of the map's.")
  private String elevation;

  @Option(
      names = "--sea-distance",
      paramLabel = "KM",
      description = "Kilometres to the sea, in place of the map's.")
  private String seaDistance;

  @Option(
      names = "--setting",
      paramLabel = "S",
      description = "remote, rural, town, city, industrial or port, in place of the guess.")
  private String setting;

  Map<String, String> values() {
    Map<String, String> values = new LinkedHashMap<>();
    put(values, "place", place);
    put(values, "postcode", postcode);
    put(values, "country", country);
    put(values, "at", at);
    put(values, "elevation", elevation);
    put(values, "sea-distance", seaDistance);
    put(values, "setting", setting);
    return values;
  }

  static void put(Map<String, String> values, String name, String value) {
    if (value != null) {
      values.put(name, value);
    }
  }
}
