package saltspoke.places;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.concurrent.ConcurrentHashMap;
import java.util.stream.Collectors;
import saltspoke.fields.DataSet;
import saltspoke.values.Refusal;

/** Postcodes of the countries that ship, and of postal files that a user adds. */
final class PostcodeBook {
  /**
   * Countries with a shipped table and the number of digits of their codes (postal authorities).
   */
  private static final Map<String, Integer> DIGITS =
      new TreeMap<>(Map.of("US", 5, "IN", 6, "FR", 5, "IT", 5, "DE", 5));

  private static final String INSTEAD =
      "give a town (with its country), or coordinates, or load a GeoNames postal file";

  /** A code as found, mended where zeros had been eaten, and its point. */
  record Found(String code, boolean zerosAdded, String countryCode, PostalPoint point) {}

  private final DataSet data;
  private final Map<String, Map<String, PostalPoint>> shipped = new ConcurrentHashMap<>();
  private final Map<String, Map<String, PostalPoint>> added = new ConcurrentHashMap<>();

  PostcodeBook(DataSet data) {
    this.data = data;
  }

  /** Adds the codes of a postal file; they go before shipped ones. */
  void add(Map<String, Map<String, PostalPoint>> byCountry) {
    byCountry.forEach(
        (country, codes) ->
            added.merge(
                country,
                codes,
                (old, more) -> {
                  Map<String, PostalPoint> both = new HashMap<>(old);
                  both.putAll(more);
                  return both;
                }));
  }

  Iterable<String> countries() {
    TreeSet<String> all = new TreeSet<>(DIGITS.keySet());
    all.addAll(added.keySet());
    return all;
  }

  Found find(String code, String countryCode) {
    String country = countryCode == null ? "" : countryCode.strip().toUpperCase(Locale.ROOT);
    String known = String.join(", ", countries());
    if (country.isEmpty()) {
      throw Refusal.wrongUse("missing-country", "country", "", "one of " + known);
    }
    if (!DIGITS.containsKey(country) && !added.containsKey(country)) {
      throw Refusal.notFound(
          "unknown-country",
          "country",
          shorten(countryCode),
          "one of " + known + "; else " + INSTEAD);
    }
    String tidy = tidy(code, country);
    if (tidy.isEmpty()) {
      throw Refusal.wrongUse(
          "empty-postcode", "postcode", code == null ? "" : shorten(code), example(country));
    }
    PostalPoint point = look(country, tidy);
    if (point != null) {
      return new Found(tidy, false, country, point);
    }
    String padded = padded(tidy, country);
    point = look(country, padded);
    if (point != null) {
      return new Found(padded, true, country, point);
    }
    throw Refusal.notFound(
        "unknown-postcode", "postcode", shorten(code), example(country) + "; else " + INSTEAD);
  }

  private PostalPoint look(String country, String code) {
    PostalPoint own = added.getOrDefault(country, Map.of()).get(code);
    if (own != null || !DIGITS.containsKey(country)) {
      return own;
    }
    return shipped.computeIfAbsent(country, this::read).get(code);
  }

  private Map<String, PostalPoint> read(String country) {
    String layer = "postcodes-" + country.toLowerCase(Locale.ROOT);
    Map<String, PostalPoint> codes = new HashMap<>();
    try (BufferedReader in =
        new BufferedReader(new InputStreamReader(data.open(layer), StandardCharsets.UTF_8))) {
      in.readLine();
      for (String line = in.readLine(); line != null; line = in.readLine()) {
        CsvLine row = new CsvLine(line);
        codes.put(
            row.next(),
            new PostalPoint(
                row.next(),
                row.next(),
                Double.parseDouble(row.next()),
                Double.parseDouble(row.next()),
                row.next().equals("yes")));
      }
    } catch (IOException e) {
      throw Refusal.dataDamaged(
          "unreadable-layer", layer, e.getMessage(), "a fresh copy of the data folder");
    }
    return codes;
  }

  /** Takes blanks, a leading country letter and the last four of a ZIP+4 away. */
  private static String tidy(String code, String country) {
    if (code == null) {
      return "";
    }
    String tidy = code.strip().toUpperCase(Locale.ROOT).replace(" ", "");
    if (DIGITS.containsKey(country)) {
      tidy = tidy.replaceFirst("^[A-Z]{1,2}-(?=\\d)", "");
      tidy = country.equals("US") ? tidy.replaceFirst("-\\d{4}$", "") : tidy;
    }
    return tidy;
  }

  private static String padded(String code, String country) {
    int digits = DIGITS.getOrDefault(country, code.length());
    return code.chars().allMatch(Character::isDigit) && code.length() < digits
        ? "0".repeat(digits - code.length()) + code
        : code;
  }

  private static String example(String country) {
    Integer digits = DIGITS.get(country);
    return digits == null ? "a postcode of " + country : digits + " digits";
  }

  private static String shorten(String text) {
    return text.codePoints()
        .limit(40)
        .mapToObj(Character::toString)
        .collect(Collectors.joining("", "", text.length() > 40 ? "…" : ""));
  }
}
