package saltspoke.places;

import java.io.BufferedReader;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import saltspoke.values.Refusal;

/**
 * Reads a GeoNames postal-code file: tab-separated UTF-8 without a header, 12 columns in the order
 * of its readme (country code, postal code, place name, admin name 1, code 1, name 2, code 2, name
 * 3, code 3, latitude, longitude, accuracy). A code with several places gets their median point.
 */
final class PostalFile {
  private static final String FORMAT =
      "a GeoNames postal file: 12 tab-separated columns, country, code, place, …, latitude,"
          + " longitude, accuracy";

  /** Median points farther apart than this from a place of the code are called approximate, deg. */
  private static final double WIDE_DEG = 0.1;

  private record Row(String name, String region, double latitudeDeg, double longitudeDeg) {}

  private PostalFile() {}

  /** Country → code → point. */
  static Map<String, Map<String, PostalPoint>> read(Path file) {
    Map<String, Map<String, List<Row>>> rows = new TreeMap<>();
    int number = 0;
    try (BufferedReader in = Files.newBufferedReader(file, StandardCharsets.UTF_8)) {
      for (String line = in.readLine(); line != null; line = in.readLine()) {
        number++;
        if (!line.isBlank()) {
          row(file.getFileName() + ":" + number, line, rows);
        }
      }
    } catch (NoSuchFileException e) {
      throw Refusal.notFound("no-such-file", "postal-file", file, FORMAT);
    } catch (IOException e) {
      throw Refusal.wrongUse(
          "unreadable-file", file.getFileName() + ":" + (number + 1), e.getMessage(), FORMAT);
    }
    if (rows.isEmpty()) {
      throw Refusal.wrongUse("empty-file", "postal-file", file.getFileName(), FORMAT);
    }
    Map<String, Map<String, PostalPoint>> points = new HashMap<>();
    rows.forEach(
        (country, codes) -> {
          Map<String, PostalPoint> byCode = new HashMap<>();
          codes.forEach((code, places) -> byCode.put(code, median(places)));
          points.put(country, byCode);
        });
    return points;
  }

  private static void row(String where, String line, Map<String, Map<String, List<Row>>> rows) {
    String[] c = line.split("\t", -1);
    if (c.length < 11) {
      throw Refusal.wrongUse("short-row", where, c.length + " columns", FORMAT);
    }
    double latitude = degrees(where, "latitude", c[9], 90);
    double longitude = degrees(where, "longitude", c[10], 180);
    rows.computeIfAbsent(c[0].strip().toUpperCase(Locale.ROOT), k -> new TreeMap<>())
        .computeIfAbsent(
            c[1].strip().toUpperCase(Locale.ROOT).replace(" ", ""), k -> new ArrayList<>())
        .add(new Row(c[2].strip(), c[3].strip(), latitude, longitude));
  }

  private static double degrees(String where, String name, String text, double limit) {
    try {
      double value = Double.parseDouble(text.strip());
      if (Math.abs(value) <= limit) {
        return value;
      }
    } catch (NumberFormatException e) {
      // Falls through to the refusal below, which says where and what.
    }
    throw Refusal.wrongUse(
        "not-a-" + name,
        where + " " + name,
        text,
        String.format(Locale.ROOT, "-%.0f..%.0f", limit, limit));
  }

  private static PostalPoint median(List<Row> places) {
    double latitude = median(places.stream().mapToDouble(Row::latitudeDeg).sorted().toArray());
    double longitude = median(places.stream().mapToDouble(Row::longitudeDeg).sorted().toArray());
    boolean wide =
        places.stream()
            .anyMatch(
                p ->
                    Math.abs(p.latitudeDeg - latitude) > WIDE_DEG
                        || Math.abs(p.longitudeDeg - longitude) > WIDE_DEG);
    return new PostalPoint(places.get(0).name, places.get(0).region, latitude, longitude, wide);
  }

  private static double median(double[] sorted) {
    int n = sorted.length;
    return n % 2 == 1 ? sorted[n / 2] : (sorted[n / 2 - 1] + sorted[n / 2]) / 2;
  }
}
