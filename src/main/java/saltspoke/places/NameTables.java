package saltspoke.places;

import java.util.HashMap;
import java.util.Map;
import saltspoke.fields.DataSet;
import saltspoke.sources.CsvTable;
import saltspoke.sources.FoldedName;

/** Names of countries and their first-level regions, read at first use. */
final class NameTables {
  /** Everyday names that the tables lack, folded. */
  private static final Map<String, String> EVERYDAY =
      Map.of(
          "uk",
          "GB",
          "great britain",
          "GB",
          "usa",
          "US",
          "america",
          "US",
          "czech republic",
          "CZ",
          "holland",
          "NL",
          "uae",
          "AE",
          "macedonia",
          "MK",
          "burma",
          "MM");

  private final DataSet data;
  private Map<String, String> regions;
  private Map<String, String> countries;

  NameTables(DataSet data) {
    this.data = data;
  }

  String country(String code) {
    return countries().getOrDefault(code, code);
  }

  String region(String countryCode, String regionCode) {
    return regions().getOrDefault(countryCode + "." + regionCode, "");
  }

  /** Whether a folded word is the country's code, full name or an everyday name. */
  boolean isCountry(String countryCode, String folded) {
    return folded.equalsIgnoreCase(countryCode)
        || countryCode.equals(EVERYDAY.get(folded))
        || FoldedName.of(country(countryCode)).equals(folded);
  }

  /** Whether a folded word names the country or region, by its code or the start of its name. */
  boolean isWithin(String countryCode, String regionCode, String folded) {
    return folded.equalsIgnoreCase(countryCode)
        || folded.equalsIgnoreCase(regionCode)
        || countryCode.equals(EVERYDAY.get(folded))
        || FoldedName.of(country(countryCode)).startsWith(folded)
        || FoldedName.of(region(countryCode, regionCode)).startsWith(folded);
  }

  private synchronized Map<String, String> regions() {
    if (regions == null) {
      regions = read("region-names", "region_code");
    }
    return regions;
  }

  private synchronized Map<String, String> countries() {
    if (countries == null) {
      countries = read("country-names", "country_code");
    }
    return countries;
  }

  private Map<String, String> read(String layer, String key) {
    Map<String, String> read = new HashMap<>();
    CsvTable.forEach(data.open(layer), layer, row -> read.put(row.text(key), row.text("name")));
    return read;
  }
}
