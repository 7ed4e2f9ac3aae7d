package saltspoke.sources.hourly;

import java.io.InputStream;
import java.util.HashMap;
import java.util.Map;
import saltspoke.sources.CsvTable;
import saltspoke.values.Refusal;

/**
 * Where the stations lie that an archive only names. Read from NOAA's {@code isd-history.csv}
 * (columns {@code USAF, WBAN, STATION NAME, LAT, LON, ELEV(M)}), which goes with ISD-Lite, or from
 * a table of one's own with {@code station, latitude_deg, longitude_deg, elevation_m} and maybe
 * {@code name}. Rows without a usable position are passed over: the history has thousands of them.
 */
public final class StationList {
  /** No list: only archives that hold their own positions can be read. */
  public static final StationList NONE = new StationList(Map.of());

  private static final String MEND =
      "a station list (--station-list) with a row for it: isd-history.csv, or a table with station,"
          + " latitude_deg, longitude_deg, elevation_m";

  private final Map<String, HourlyStation> byId;

  private StationList(Map<String, HourlyStation> byId) {
    this.byId = byId;
  }

  /** Reads a list; closes the stream. */
  public static StationList read(InputStream in, String fileName) {
    Map<String, HourlyStation> byId = new HashMap<>();
    CsvTable.forEach(
        in,
        fileName,
        row -> {
          if (row.has("USAF")) {
            history(row, byId);
          } else {
            String id = row.text("station");
            put(byId, id, row, row.has("name") ? row.text("name") : id, OWN);
          }
        });
    return new StationList(byId);
  }

  private static final String[] OWN = {"latitude_deg", "longitude_deg", "elevation_m"};
  private static final String[] HISTORY = {"LAT", "LON", "ELEV(M)"};

  /** ISD-Lite files are named USAF-WBAN; older tools leave WBAN out, so both are known. */
  private static void history(CsvTable.Row row, Map<String, HourlyStation> byId) {
    String usaf = row.text("USAF");
    String name = row.text("STATION NAME");
    put(byId, usaf + "-" + row.text("WBAN"), row, name, HISTORY);
    if (!usaf.equals("999999")) {
      put(byId, usaf, row, name, HISTORY);
    }
  }

  private static void put(
      Map<String, HourlyStation> byId, String id, CsvTable.Row row, String name, String[] columns) {
    if (row.text(columns[0]).isEmpty() || row.text(columns[1]).isEmpty()) {
      return;
    }
    double latitudeDeg = row.number(columns[0]);
    double longitudeDeg = row.number(columns[1]);
    double elevationM = row.optionalNumber(columns[2]).orElse(Double.NaN);
    if (possible(latitudeDeg, longitudeDeg, elevationM)) {
      byId.put(
          id,
          new HourlyStation(
              id,
              name.isEmpty() ? id : name,
              latitudeDeg,
              longitudeDeg,
              elevationM,
              HourlyStation.Kind.HOURLY,
              true));
    }
  }

  /** The history marks unknown positions by 0/0 and unknown heights by −999.9. */
  static boolean possible(double latitudeDeg, double longitudeDeg, double elevationM) {
    return Math.abs(latitudeDeg) <= 90
        && Math.abs(longitudeDeg) <= 180
        && !(latitudeDeg == 0 && longitudeDeg == 0)
        && elevationM >= -500
        && elevationM <= 9000;
  }

  /**
   * The station of that name.
   *
   * @throws Refusal when the list has none with a usable position
   */
  HourlyStation get(String id, LineReader lines) {
    HourlyStation found = byId.get(id);
    if (found == null) {
      throw lines.refuse("unknown-station", "station", id, MEND);
    }
    return found;
  }
}
