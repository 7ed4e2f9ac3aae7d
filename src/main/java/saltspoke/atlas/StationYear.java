package saltspoke.atlas;

import java.io.InputStream;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import saltspoke.atmosphere.HourlyCount;
import saltspoke.sources.StationFiles;
import saltspoke.sources.StationFiles.Hour;
import saltspoke.values.Refusal;

/**
 * The hourly record of a station, counted month by month.
 *
 * @param first its first row, for name and coordinates
 * @param months January to December
 */
record StationYear(Hour first, List<HourlyCount> months) {
  private static final int MONTHS = 12;
  private static final int HOURS_OF_A_DAY = 24;

  /** Reads the stations of a file; one that lacks a month is refused, the rest stays. */
  static StationRows<StationYear> read(InputStream in, String fileName) {
    StationRows<Hour> hours = StationRows.read(in, fileName, StationFiles::hour);
    Map<String, List<Hour>> byStation = new LinkedHashMap<>();
    for (Hour hour : hours.rows()) {
      byStation.computeIfAbsent(hour.station(), k -> new ArrayList<>()).add(hour);
    }
    List<Refusal> refused = new ArrayList<>(hours.refused());
    List<StationYear> years = new ArrayList<>();
    for (List<Hour> station : byStation.values()) {
      try {
        years.add(of(station));
      } catch (Refusal refusal) {
        refused.add(refusal);
      }
    }
    return new StationRows<>(years, refused);
  }

  double[] monthly(ToDoubleFunction<HourlyCount> quantity) {
    return months.stream().mapToDouble(quantity).toArray();
  }

  private static StationYear of(List<Hour> station) {
    List<HourlyCount> months = new ArrayList<>(MONTHS);
    for (int month = 1; month <= MONTHS; month++) {
      months.add(count(station, month));
    }
    return new StationYear(station.get(0), months);
  }

  private static HourlyCount count(List<Hour> station, int month) {
    List<Hour> hours = station.stream().filter(h -> h.month() == month).toList();
    if (hours.size() < HOURS_OF_A_DAY) {
      throw Refusal.dataDamaged(
          "month-too-short",
          station.get(0).where() + " " + station.get(0).station() + " month " + month,
          hours.size() + " hours",
          "at least 24 hours in each month of a station");
    }
    return HourlyCount.of(
        hours.stream().mapToDouble(Hour::temperatureC).toArray(),
        hours.stream().mapToDouble(Hour::relativeHumidityPct).toArray());
  }
}
