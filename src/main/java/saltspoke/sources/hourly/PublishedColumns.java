package saltspoke.sources.hourly;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import saltspoke.sources.hourly.ColumnMap.Column;
import saltspoke.sources.hourly.ColumnMap.Unit;

/** Column maps of the separated files that agencies publish. */
final class PublishedColumns {
  private PublishedColumns() {}

  /**
   * Global Historical Climatology Network hourly, pipe-separated. Columns: NOAA NCEI, "GHCNh
   * Documentation" (2023): position and height, then for each quantity its value, a measurement
   * code, a quality code, report type, source code and source station; °C, %, degrees, m/s; times
   * in UTC. Early and late editions name the first columns differently; both are known here. An
   * empty cell is missing; wind from 999 is variable.
   */
  static SeparatedHours ghcnHourly() {
    Map<String, Column> columns = new LinkedHashMap<>();
    put(columns, "station", List.of("Station_ID", "STATION"), Unit.NONE);
    put(columns, "name", List.of("Station_name"), Unit.NONE);
    put(columns, "latitude_deg", List.of("Latitude"), Unit.NONE);
    put(columns, "longitude_deg", List.of("Longitude"), Unit.NONE);
    put(columns, "elevation_m", List.of("Elevation"), Unit.NONE);
    put(columns, "time", List.of("DATE"), Unit.NONE);
    for (String part : List.of("year", "month", "day", "hour", "minute")) {
      put(columns, part, List.of(part), Unit.NONE);
    }
    quality(columns, HourlyQuantity.TEMPERATURE, "temperature", Unit.C);
    quality(columns, HourlyQuantity.DEW_POINT, "dew_point_temperature", Unit.C);
    quality(columns, HourlyQuantity.RELATIVE_HUMIDITY, "relative_humidity", Unit.PCT);
    quality(columns, HourlyQuantity.WIND_DIRECTION, "wind_direction", Unit.DEG);
    quality(columns, HourlyQuantity.WIND_SPEED, "wind_speed", Unit.M_S);
    return new SeparatedHours(
        "GHCN hourly (pipe-separated, header with temperature and dew_point_temperature)",
        line -> line.startsWith("S") && line.contains("|temperature|"),
        new ColumnMap('|', "", HourlyStation.Kind.HOURLY, true, false, columns));
  }

  private static void quality(
      Map<String, Column> columns, HourlyQuantity quantity, String name, Unit unit) {
    List<String> missing =
        quantity == HourlyQuantity.WIND_DIRECTION ? List.of("999", "-9999") : List.of("-9999");
    columns.put(quantity.id(), new Column(List.of(name), unit, missing, name + "_Quality_Code"));
  }

  /**
   * Global Surface Summary of the Day, CSV. Columns: NOAA NCEI, "Global Surface Summary of Day
   * Product" (readme): day means of temperature and dew point, highest and lowest temperature in
   * °F, mean wind in knots; missing 9999.9, for wind 999.9. Days run in UTC.
   */
  static SeparatedHours gsodDaily() {
    Map<String, Column> columns = new LinkedHashMap<>();
    put(columns, "station", List.of("STATION"), Unit.NONE);
    put(columns, "name", List.of("NAME"), Unit.NONE);
    put(columns, "latitude_deg", List.of("LATITUDE"), Unit.NONE);
    put(columns, "longitude_deg", List.of("LONGITUDE"), Unit.NONE);
    put(columns, "elevation_m", List.of("ELEVATION"), Unit.NONE);
    put(columns, "time", List.of("DATE"), Unit.NONE);
    value(columns, HourlyQuantity.TEMPERATURE, "TEMP", Unit.F, "9999.9");
    value(columns, HourlyQuantity.DEW_POINT, "DEWP", Unit.F, "9999.9");
    value(columns, HourlyQuantity.WIND_SPEED, "WDSP", Unit.KNOTS, "999.9");
    value(columns, HourlyQuantity.DAY_MAXIMUM, "MAX", Unit.F, "9999.9");
    value(columns, HourlyQuantity.DAY_MINIMUM, "MIN", Unit.F, "9999.9");
    return new SeparatedHours(
        "GSOD daily summaries (CSV, header with STATION, DATE, TEMP, DEWP)",
        line -> line.contains("STATION") && line.contains("TEMP_ATTRIBUTES"),
        new ColumnMap(',', "", HourlyStation.Kind.DAILY, true, false, columns));
  }

  /**
   * EnergyPlus weather files. Layout: U.S. Department of Energy, "EnergyPlus Auxiliary Programs",
   * chapter "EnergyPlus Weather File (EPW) Data Dictionary": eight header lines, then year, month,
   * day, hour 1–24 that names its end, minute, flags, dry bulb (99.9 missing), dew point (99.9),
   * relative humidity (999), pressure, …, wind direction (21st, 999), wind speed (22nd, 999). Local
   * standard time. The columns here are those of its rows; {@link EpwWeather} reads the header.
   */
  static Map<String, Column> epw() {
    Map<String, Column> columns = new LinkedHashMap<>();
    put(columns, "month", List.of("#2"), Unit.NONE);
    put(columns, "day", List.of("#3"), Unit.NONE);
    put(columns, "hour", List.of("#4"), Unit.NONE);
    value(columns, HourlyQuantity.TEMPERATURE, "#7", Unit.C, "99.9");
    value(columns, HourlyQuantity.DEW_POINT, "#8", Unit.C, "99.9");
    value(columns, HourlyQuantity.RELATIVE_HUMIDITY, "#9", Unit.PCT, "999");
    value(columns, HourlyQuantity.WIND_DIRECTION, "#21", Unit.DEG, "999");
    value(columns, HourlyQuantity.WIND_SPEED, "#22", Unit.M_S, "999");
    return columns;
  }

  private static void put(Map<String, Column> columns, String part, List<String> names, Unit unit) {
    columns.put(part, new Column(names, unit, List.of(), ""));
  }

  private static void value(
      Map<String, Column> columns,
      HourlyQuantity quantity,
      String name,
      Unit unit,
      String missing) {
    columns.put(quantity.id(), new Column(List.of(name), unit, List.of(missing), ""));
  }
}
