package saltspoke.sources;

import java.util.Optional;
import java.util.OptionalDouble;
import saltspoke.values.Refusal;

/**
 * Rows of the station files that the program judges itself by. The column names are the contract;
 * units stand in them. Months are January to December, {@code _01} to {@code _12}.
 */
public final class StationFiles {
  private static final int MONTHS = 12;

  private StationFiles() {}

  /**
   * A climate station: {@code latitude_deg, longitude_deg, elevation_m, temperature_c_01…12,
   * relative_humidity_pct_01…12} and, where the file has them, {@code station, diurnal_range_c_…,
   * precipitation_mm_…, wind_speed_m_s_…, frost_days_…}.
   *
   * @param name its name, or file and line where it has none
   */
  public record ClimateStation(
      String name,
      double latitudeDeg,
      double longitudeDeg,
      double elevationM,
      double[] temperatureC,
      double[] relativeHumidityPct,
      Optional<double[]> diurnalRangeC,
      Optional<double[]> rainMm,
      Optional<double[]> windMPerS,
      Optional<double[]> frostDays) {}

  public static ClimateStation climate(CsvTable.Row row) {
    return new ClimateStation(
        row.has("station") && !row.text("station").isEmpty() ? row.text("station") : row.where(),
        row.number("latitude_deg", -90, 90),
        row.number("longitude_deg", -180, 180),
        row.number("elevation_m", -500, 9000),
        months(row, "temperature_c", -90, 60),
        months(row, "relative_humidity_pct", 0, 100),
        monthsIfThere(row, "diurnal_range_c", 0, 60),
        monthsIfThere(row, "precipitation_mm", 0, 20_000),
        monthsIfThere(row, "wind_speed_m_s", 0, 60),
        monthsIfThere(row, "frost_days", 0, 31));
  }

  /**
   * One hour at a station: {@code station, latitude_deg, longitude_deg, elevation_m, month, hour,
   * temperature_c, relative_humidity_pct}. A station's rows of one month stand in order of time.
   */
  public record Hour(
      String where,
      String station,
      double latitudeDeg,
      double longitudeDeg,
      double elevationM,
      int month,
      double temperatureC,
      double relativeHumidityPct) {}

  public static Hour hour(CsvTable.Row row) {
    row.number("hour", 0, 24);
    return new Hour(
        row.where(),
        row.text("station"),
        row.number("latitude_deg", -90, 90),
        row.number("longitude_deg", -180, 180),
        row.number("elevation_m", -500, 9000),
        row.whole("month", 1, MONTHS),
        row.number("temperature_c", -90, 60),
        row.number("relative_humidity_pct", 0, 110));
  }

  /**
   * A chloride site: {@code programme, station_id, distance_to_coast_km, elevation_m,
   * wind_speed_m_s, saline_wind_fraction, roughness, chloride_mg_m2_day} and, where the file has
   * them, {@code latitude_deg, longitude_deg}. An empty elevation counts as 0 m.
   */
  public record ChlorideSite(
      String where,
      String name,
      OptionalDouble latitudeDeg,
      OptionalDouble longitudeDeg,
      double distanceKm,
      double elevationM,
      double windMPerS,
      double salineWindShare,
      double roughness,
      double chlorideMgPerM2Day) {}

  public static ChlorideSite chloride(CsvTable.Row row) {
    return new ChlorideSite(
        row.where(),
        row.text("programme") + " " + row.text("station_id"),
        numberIfThere(row, "latitude_deg", -90, 90),
        numberIfThere(row, "longitude_deg", -180, 180),
        row.number("distance_to_coast_km", 0, 5000),
        row.text("elevation_m").isEmpty() ? 0 : row.number("elevation_m", -500, 9000),
        row.number("wind_speed_m_s", 0, 40),
        row.number("saline_wind_fraction", 0, 1),
        row.number("roughness", 0, 1),
        above0(row, "chloride_mg_m2_day"));
  }

  /**
   * An exposure site: {@code site, temperature_c, relative_humidity_pct, so2_mg_m2_day,
   * chloride_mg_m2_day} (annual means) and the first-year losses {@code carbon_steel_um, zinc_um,
   * copper_um, aluminium_um}; a loss that was not measured is empty or its column left out.
   */
  public record CorrosionSite(
      String where,
      String name,
      double temperatureC,
      double relativeHumidityPct,
      double so2MgPerM2Day,
      double chlorideMgPerM2Day,
      OptionalDouble steelUm,
      OptionalDouble zincUm,
      OptionalDouble copperUm,
      OptionalDouble aluminiumUm) {}

  public static CorrosionSite corrosion(CsvTable.Row row) {
    return new CorrosionSite(
        row.where(),
        row.text("site"),
        row.number("temperature_c", -60, 45),
        row.number("relative_humidity_pct", 0, 100),
        row.number("so2_mg_m2_day", 0, 100_000),
        row.number("chloride_mg_m2_day", 0, 100_000),
        loss(row, "carbon_steel_um"),
        loss(row, "zinc_um"),
        loss(row, "copper_um"),
        loss(row, "aluminium_um"));
  }

  private static OptionalDouble loss(CsvTable.Row row, String column) {
    if (!row.has(column) || row.text(column).isEmpty()) {
      return OptionalDouble.empty();
    }
    return OptionalDouble.of(above0(row, column));
  }

  private static OptionalDouble numberIfThere(
      CsvTable.Row row, String column, double low, double high) {
    return row.has(column) && !row.text(column).isEmpty()
        ? OptionalDouble.of(row.number(column, low, high))
        : OptionalDouble.empty();
  }

  private static Optional<double[]> monthsIfThere(
      CsvTable.Row row, String stem, double low, double high) {
    return row.has(column(stem, 1)) ? Optional.of(months(row, stem, low, high)) : Optional.empty();
  }

  private static double[] months(CsvTable.Row row, String stem, double low, double high) {
    double[] values = new double[MONTHS];
    for (int m = 0; m < MONTHS; m++) {
      values[m] = row.number(column(stem, m + 1), low, high);
    }
    return values;
  }

  private static String column(String stem, int month) {
    return stem + (month < 10 ? "_0" : "_") + month;
  }

  private static double above0(CsvTable.Row row, String column) {
    double value = row.number(column);
    if (!(value > 0)) {
      throw Refusal.dataDamaged(
          "out-of-range", row.where() + " " + column, row.text(column), "a number above 0");
    }
    return value;
  }
}
