package saltspoke.sources.hourly;

import java.util.HashMap;
import java.util.Map;

/** The station of a row, told anew only when its cell differs from that of the row before. */
final class StationCells {
  private static final String[] POSITION = {"latitude_deg", "longitude_deg", "elevation_m"};

  private final ColumnMap map;
  private final Columns columns;
  private final LineReader lines;
  private final String fileName;
  private final StationList stations;
  private final int stationCell;
  private final int nameCell;
  private final boolean positionInFile;
  private final Map<String, Integer> positionCells = new HashMap<>();
  private byte[] before;

  StationCells(
      ColumnMap map, Columns columns, LineReader lines, String fileName, StationList stations) {
    this.map = map;
    this.columns = columns;
    this.lines = lines;
    this.fileName = fileName;
    this.stations = stations;
    ColumnMap.Column station = map.columns().get("station");
    boolean fixed = station != null && (station.isConstant() || station.isFileName());
    this.stationCell = fixed ? Columns.ABSENT : columns.required("station");
    this.nameCell = columns.index("name");
    this.positionInFile = map.columns().containsKey(POSITION[0]);
    if (positionInFile) {
      for (String part : POSITION) {
        if (map.constantNumber(part).isEmpty()) {
          positionCells.put(part, columns.required(part));
        }
      }
    }
  }

  /** Tells the sink when another station begins. */
  void read(HourlySink sink) {
    Cells cells = columns.cells();
    if (before != null && (stationCell == Columns.ABSENT || cells.equal(stationCell, before))) {
      return;
    }
    before = stationCell == Columns.ABSENT ? new byte[0] : cells.copy(stationCell);
    String id = stationCell == Columns.ABSENT ? fixedId() : cells.text(stationCell, "station");
    if (id.isEmpty() || id.length() > 80) {
      throw lines.refuse("out-of-range", "station", id, "a name of 1 to 80 letters");
    }
    sink.station(positionInFile ? here(id) : stations.get(id, lines).as(map.kind(), map.utc()));
  }

  private String fixedId() {
    ColumnMap.Column station = map.columns().get("station");
    if (station.isConstant()) {
      return station.constant();
    }
    int dot = fileName.indexOf('.');
    return dot > 0 ? fileName.substring(0, dot) : fileName;
  }

  private HourlyStation here(String id) {
    double latitudeDeg = number(POSITION[0], -90, 90);
    double longitudeDeg = number(POSITION[1], -180, 180);
    double elevationM = number(POSITION[2], -500, 9000);
    String name = nameCell == Columns.ABSENT ? id : columns.cells().text(nameCell, "name");
    return new HourlyStation(
        id,
        name.isEmpty() ? id : name,
        latitudeDeg,
        longitudeDeg,
        elevationM,
        map.kind(),
        map.utc());
  }

  private double number(String part, double low, double high) {
    Integer cell = positionCells.get(part);
    if (cell == null) {
      return map.constantNumber(part).orElseThrow();
    }
    Cells cells = columns.cells();
    double value = Decimal.parse(lines.bytes(), cells.from(cell), cells.to(cell));
    if (!(value >= low && value <= high)) {
      throw lines.refuse("out-of-range", part, cells.text(cell, part), low + ".." + high);
    }
    return value;
  }
}
