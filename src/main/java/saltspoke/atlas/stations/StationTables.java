package saltspoke.atlas.stations;

import java.io.Closeable;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import saltspoke.atmosphere.stations.MonthNormal;
import saltspoke.atmosphere.stations.MonthSums;
import saltspoke.atmosphere.stations.MonthSums.Sum;
import saltspoke.atmosphere.stations.YearStatistics.Quality;
import saltspoke.sources.CsvWriter;
import saltspoke.sources.LayerFile;
import saltspoke.sources.LayerSink;
import saltspoke.sources.hourly.HourlyStation;
import saltspoke.values.Refusal;

/** The tables of a station data set; their columns are named here alone. */
final class StationTables implements Closeable {
  static final String STATIONS = "stations";
  static final String MONTHS = "station-months";
  static final String WIND = "station-wind";
  static final String QUALITY = "station-quality";
  static final String SET_ASIDE = "station-set-aside";
  static final String CORRECTIONS = "station-corrections";
  static final String JUDGEMENT = "station-judgement";

  private static final int CLASS_PCT = 100 / MonthSums.HUMIDITY_CLASSES;
  private static final int SECTOR_DEG = 360 / MonthSums.SECTORS;

  private final LayerSink sink;
  private final String attribution;
  private final CsvWriter.Rows stations;
  private final CsvWriter.Rows months;
  private final CsvWriter.Rows wind;
  private final CsvWriter.Rows quality;
  private final CsvWriter.Rows setAside;

  /** Begins the tables of counted stations. */
  StationTables(LayerSink sink, String attribution) throws IOException {
    this.sink = sink;
    this.attribution = attribution;
    stations =
        begin(
            STATIONS,
            "Stations that were read",
            "used: it has calendar months with enough years",
            List.of(
                "station",
                "name",
                "latitude_deg",
                "longitude_deg",
                "elevation_m",
                "kind",
                "first_year",
                "last_year",
                "years",
                "calendar_months",
                "used"));
    months = begin(MONTHS, "Monthly statistics", monthRemark(), monthColumns());
    wind =
        begin(
            WIND,
            "Wind roses: reports and mean speed by direction",
            "share of calm in %; reports and m/s from 36 directions, each 10 degrees wide",
            windColumns());
    quality =
        begin(
            QUALITY,
            "What was struck out and dropped, by station and year",
            "year 0 is a typical year; rhythm_h: hours from one report to the next",
            List.of(
                "station",
                "file",
                "year",
                "rows",
                "impossible",
                "spikes",
                "stuck",
                "dew_point_above",
                "duplicates",
                "reports",
                "gaps",
                "rhythm_h",
                "months_kept",
                "months_too_few",
                "months_long_gap",
                "months_elsewhere"));
    setAside =
        begin(
            SET_ASIDE,
            "Files that could not be read, each with its reason",
            "",
            List.of("file", "where", "error", "found", "allowed"));
  }

  private CsvWriter.Rows begin(String layer, String title, String remark, List<String> columns)
      throws IOException {
    return CsvWriter.rows(sink.file(describe(layer, title, remark)), columns);
  }

  private LayerFile describe(String layer, String title, String remark) {
    return new LayerFile(
        layer,
        layer + ".csv.gz",
        title,
        "",
        "",
        List.of(),
        "as the archives that were read",
        attribution,
        remark);
  }

  private static String monthRemark() {
    return "hours and days brought to a whole month (February 28.25 days); rh_NN: share of hours in"
        + " % with relative humidity from NN, 5 points wide; empty: not counted";
  }

  private static List<String> monthColumns() {
    List<String> columns =
        new ArrayList<>(
            List.of(
                "station",
                "kind",
                "month",
                "years",
                "reports",
                "temperature_c",
                "relative_humidity_pct",
                "diurnal_range_k",
                "wet_hours",
                "hours_above_33_pct",
                "hours_above_75_pct",
                "hours_above_80_pct",
                "hours_below_0_c",
                "frost_days",
                "near_freezing_days"));
    for (int c = 0; c < MonthSums.HUMIDITY_CLASSES; c++) {
      columns.add(String.format(Locale.ROOT, "rh_%02d", c * CLASS_PCT));
    }
    return columns;
  }

  private static List<String> windColumns() {
    List<String> columns = new ArrayList<>(List.of("station", "kind", "month", "reports", "calm"));
    for (String stem : List.of("reports", "speed_m_s")) {
      for (int s = 0; s < MonthSums.SECTORS; s++) {
        columns.add(String.format(Locale.ROOT, "%s_%03d", stem, s * SECTOR_DEG));
      }
    }
    return columns;
  }

  void add(StationSummary summary) throws IOException {
    HourlyStation station = summary.station();
    int first = summary.years().get(0).year().year();
    int last = summary.years().get(summary.years().size() - 1).year().year();
    stations.add(
        List.of(
            station.id(),
            station.name(),
            decimals(station.latitudeDeg(), 5),
            decimals(station.longitudeDeg(), 5),
            decimals(station.elevationM(), 1),
            kind(station),
            first == 0 ? "" : Integer.toString(first),
            last == 0 ? "" : Integer.toString(last),
            Long.toString(summary.years().stream().map(y -> y.year().year()).distinct().count()),
            Integer.toString(summary.normals().size()),
            summary.normals().isEmpty() ? "no" : "yes"));
    for (MonthNormal normal : summary.normals()) {
      months.add(month(station, normal));
      if (normal.sums().get(Sum.WIND) > 0) {
        wind.add(wind(station, normal));
      }
    }
    for (StationSummary.Year year : summary.years()) {
      quality.add(quality(station, year));
    }
  }

  void add(FileOutcome setAsideFile, Refusal refusal) throws IOException {
    setAside.add(
        List.of(
            setAsideFile.file(),
            refusal.field(),
            refusal.error(),
            refusal.was(),
            refusal.allowed()));
  }

  /** A finished text as one more layer. */
  void text(String layer, String title, String text) throws IOException {
    try (var out = sink.file(describe(layer, title, ""))) {
      out.write(text.getBytes(java.nio.charset.StandardCharsets.UTF_8));
    }
  }

  private static List<String> month(HourlyStation station, MonthNormal normal) {
    MonthSums sums = normal.sums();
    boolean byHour = station.kind() != HourlyStation.Kind.DAILY;
    List<String> cells =
        new ArrayList<>(
            List.of(
                station.id(),
                kind(station),
                Integer.toString(normal.month()),
                Long.toString(sums.get(Sum.YEARS)),
                Long.toString(sums.get(Sum.REPORTS)),
                decimals(normal.temperatureC(), 3),
                decimals(normal.relativeHumidityPct(), 3),
                decimals(normal.diurnalRangeK(), 3)));
    for (Sum hours : List.of(Sum.WET, Sum.ABOVE_33, Sum.ABOVE_75, Sum.ABOVE_80, Sum.BELOW_0)) {
      cells.add(byHour ? decimals(normal.hours(hours), 2) : "");
    }
    cells.add(decimals(normal.days(Sum.FROST_DAYS), 3));
    cells.add(decimals(normal.days(Sum.NEAR_FREEZING_DAYS), 3));
    for (int c = 0; c < MonthSums.HUMIDITY_CLASSES; c++) {
      cells.add(byHour ? decimals(100.0 * sums.humidityClass(c) / sums.get(Sum.REPORTS), 3) : "");
    }
    return cells;
  }

  private static List<String> wind(HourlyStation station, MonthNormal normal) {
    MonthSums sums = normal.sums();
    List<String> cells =
        new ArrayList<>(
            List.of(
                station.id(),
                kind(station),
                Integer.toString(normal.month()),
                Long.toString(sums.get(Sum.WIND)),
                decimals(100.0 * sums.get(Sum.CALM) / sums.get(Sum.WIND), 3)));
    for (int s = 0; s < MonthSums.SECTORS; s++) {
      cells.add(Long.toString(sums.sector(s)));
    }
    for (int s = 0; s < MonthSums.SECTORS; s++) {
      cells.add(decimals(sums.sectorMmPerS(s) / 1000.0 / sums.sector(s), 2));
    }
    return cells;
  }

  private static List<String> quality(HourlyStation station, StationSummary.Year year) {
    Quality q = year.year().quality();
    List<String> cells = new ArrayList<>(List.of(station.id(), year.file()));
    for (long number :
        new long[] {
          year.year().year(),
          q.rows(),
          q.impossible(),
          q.spikes(),
          q.stuck(),
          q.dewPointAbove(),
          q.duplicates(),
          q.reports(),
          q.gaps(),
          q.rhythm(),
          year.kept(),
          q.tooFew(),
          q.longGap(),
          year.elsewhere()
        }) {
      cells.add(Long.toString(number));
    }
    return cells;
  }

  private static String kind(HourlyStation station) {
    return station.kind().name().toLowerCase(Locale.ROOT);
  }

  /** Empty where there is no value. */
  private static String decimals(double value, int digits) {
    return Double.isNaN(value) ? "" : String.format(Locale.ROOT, "%." + digits + "f", value);
  }

  /** Ends the tables of counted stations; texts may follow. */
  @Override
  public void close() throws IOException {
    for (CsvWriter.Rows rows : List.of(stations, months, wind, quality, setAside)) {
      rows.close();
    }
  }
}
