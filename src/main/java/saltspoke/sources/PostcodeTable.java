package saltspoke.sources;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.Consumer;

/** A table of postcodes with a point each, the same columns for every country. */
final class PostcodeTable {
  private record Row(String name, String region, double lat, double lon, boolean approximate) {}

  private final SortedMap<String, Row> rows = new TreeMap<>();

  boolean has(String code) {
    return rows.containsKey(code);
  }

  int size() {
    return rows.size();
  }

  void put(String code, String name, String region, double lat, double lon, boolean approximate) {
    rows.put(code, new Row(name, region, lat, lon, approximate));
  }

  void write(LayerSink out, LayerFile file) throws IOException {
    StringBuilder text =
        new StringBuilder("postcode,name,region,latitude_deg,longitude_deg,approximate\n");
    rows.forEach(
        (code, r) ->
            text.append(
                String.format(
                    Locale.ROOT,
                    "%s,%s,%s,%.3f,%.3f,%s\n",
                    code,
                    GazetteerBuilder.cell(r.name),
                    GazetteerBuilder.cell(r.region),
                    r.lat,
                    r.lon,
                    r.approximate ? "yes" : "no")));
    try (OutputStream stream = out.file(file)) {
      stream.write(text.toString().getBytes(StandardCharsets.UTF_8));
    }
  }

  /** A layer description for a country's postcodes. */
  static LayerFile about(
      String country, String folder, String licence, String attribution, String remark) {
    String lower = country.toLowerCase(Locale.ROOT);
    return new LayerFile(
        "postcodes-" + lower,
        folder + "/postcodes-" + lower + ".csv.gz",
        "Postcodes of " + country,
        "",
        "",
        List.of(),
        licence,
        attribution,
        remark);
  }

  /** Names of regions by country and region code, from GeoNames. */
  static Map<String, String> regionNames(SourcePackages in) throws IOException {
    Map<String, String> names = new HashMap<>();
    try (InputStream json = in.open("cities-json", "admin1.json")) {
      JsonRows.forEach(json, row -> names.put(row.get("code"), row.get("name")));
    }
    return names;
  }

  /** The tab-separated lines of a GeoNames postal file. */
  static void postalLines(InputStream in, Consumer<String[]> action) throws IOException {
    try (BufferedReader reader =
        new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
      for (String line = reader.readLine(); line != null; line = reader.readLine()) {
        String[] cells = line.split("\t", -1);
        if (cells.length >= 11 && !cells[9].isBlank() && !cells[10].isBlank()) {
          action.accept(cells);
        }
      }
    }
  }

  static double median(List<Double> values) {
    double[] sorted = values.stream().mapToDouble(Double::doubleValue).toArray();
    Arrays.sort(sorted);
    int n = sorted.length;
    return n % 2 == 1 ? sorted[n / 2] : (sorted[n / 2 - 1] + sorted[n / 2]) / 2;
  }
}
