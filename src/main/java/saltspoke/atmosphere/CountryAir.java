package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import saltspoke.sources.CsvTable;
import saltspoke.values.Refusal;

/**
 * The hand-kept table of SO2 level and road-salt practice by country, layer {@code country-air}.
 */
public final class CountryAir {
  /** Layer id in the data set. */
  public static final String LAYER = "country-air";

  /**
   * @param countryCode ISO 3166-1 alpha-2
   * @param so2CityUgPerM3 typical annual mean SO2 of city background air, µg/m³
   * @param roadSaltPractice {@code none}, {@code rare}, {@code usual} or {@code heavy}
   * @param treatmentsPerMoistDay treatments of a salted main road on a near-freezing day with
   *     moisture
   * @param magnesiumShare share of treatments with magnesium or calcium chloride, 0..1
   */
  public record Country(
      String countryCode,
      double so2CityUgPerM3,
      Confidence so2Confidence,
      String roadSaltPractice,
      Confidence roadSaltConfidence,
      double treatmentsPerMoistDay,
      double magnesiumShare) {}

  private static final List<String> PRACTICES = List.of("none", "rare", "usual", "heavy");

  private final Map<String, Country> byCode;

  private CountryAir(Map<String, Country> byCode) {
    this.byCode = byCode;
  }

  /** Reads the table; a cell that is not as described is refused with its place in the file. */
  public static CountryAir read(List<CsvTable.Row> rows) {
    Map<String, Country> byCode = new HashMap<>();
    for (CsvTable.Row row : rows) {
      Country country =
          new Country(
              row.text("country_code"),
              atLeast0(row, "so2_city_ug_per_m3", 1000),
              confidence(row, "so2_confidence"),
              oneOf(row, "road_salt_practice", PRACTICES),
              confidence(row, "road_salt_confidence"),
              atLeast0(row, "treatments_per_moist_near_freezing_day", 5),
              atLeast0(row, "magnesium_calcium_share", 1));
      if (byCode.put(country.countryCode(), country) != null) {
        throw Refusal.dataDamaged(
            "duplicate-row",
            row.where() + " country_code",
            country.countryCode(),
            "one row for each country");
      }
    }
    return new CountryAir(byCode);
  }

  public Optional<Country> find(String countryCode) {
    return Optional.ofNullable(byCode.get(countryCode));
  }

  /** All countries, in the order of their codes. */
  public List<Country> list() {
    List<Country> all = new ArrayList<>(byCode.values());
    all.sort((a, b) -> a.countryCode().compareTo(b.countryCode()));
    return all;
  }

  private static double atLeast0(CsvTable.Row row, String column, double most) {
    double value = row.number(column);
    if (!(value >= 0 && value <= most)) {
      throw Refusal.dataDamaged(
          "out-of-range", row.where() + " " + column, value, "a number from 0 to " + most);
    }
    return value;
  }

  private static Confidence confidence(CsvTable.Row row, String column) {
    List<String> ids = Arrays.stream(Confidence.values()).map(Confidence::id).toList();
    return Confidence.values()[ids.indexOf(oneOf(row, column, ids))];
  }

  private static String oneOf(CsvTable.Row row, String column, List<String> allowed) {
    String text = row.text(column);
    if (!allowed.contains(text)) {
      throw Refusal.dataDamaged(
          "unknown-word", row.where() + " " + column, text, "one of " + allowed);
    }
    return text;
  }
}
