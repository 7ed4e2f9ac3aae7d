package saltspoke.atlas;

import java.io.InputStream;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.DoubleBinaryOperator;
import java.util.function.ToDoubleFunction;
import saltspoke.atmosphere.HourlyCount;
import saltspoke.atmosphere.MonthClimate;
import saltspoke.atmosphere.MonthMeans;
import saltspoke.atmosphere.MonthlyClimate;
import saltspoke.sources.StationFiles;
import saltspoke.sources.StationFiles.Hour;
import saltspoke.values.Refusal;

/**
 * Judges the modelled wet hours a year against hourly records, twice: from the record's own monthly
 * means (temperature, humidity, daily range), and from the shipped fields alone. The record's hours
 * are counted by definition; a month that lacks hours counts by its share.
 */
public final class WetnessComparison {
  private static final int MONTHS = 12;
  private static final int HOURS_OF_A_DAY = 24;

  private final MonthlyClimate climate;
  private final DoubleBinaryOperator seaDistanceKm;

  /**
   * @param seaDistanceKm distance to the sea, km, from latitude and longitude in degrees
   */
  public WetnessComparison(MonthlyClimate climate, DoubleBinaryOperator seaDistanceKm) {
    this.climate = climate;
    this.seaDistanceKm = seaDistanceKm;
  }

  /** Compares a file with the columns of {@link Hour}; closes the stream. */
  public Comparison run(InputStream in, String fileName) {
    StationRows<Hour> hours = StationRows.read(in, fileName, StationFiles::hour);
    Map<String, List<Hour>> byStation = new LinkedHashMap<>();
    for (Hour hour : hours.rows()) {
      byStation.computeIfAbsent(hour.station(), k -> new ArrayList<>()).add(hour);
    }
    List<Refusal> refused = new ArrayList<>(hours.refused());
    List<Year> years = new ArrayList<>();
    for (List<Hour> station : byStation.values()) {
      try {
        years.add(year(station));
      } catch (Refusal refusal) {
        refused.add(refusal);
      }
    }
    Comparison.Gather gather = new Comparison.Gather();
    add(gather, "wet hours a year", years, Year::wetHours, MonthClimate::wetHours);
    add(
        gather,
        "hours a year above 75 % RH",
        years,
        Year::hoursAbove75Pct,
        MonthClimate::hoursAbove75Pct);
    add(
        gather,
        "hours a year above 33 % RH",
        years,
        Year::hoursAbove33Pct,
        MonthClimate::hoursAbove33Pct);
    add(gather, "hours a year below 0 °C", years, Year::hoursBelow0C, MonthClimate::hoursBelow0C);
    add(gather, "frost days a year", years, Year::frostDays, MonthClimate::frostDays);
    add(
        gather,
        "near-freezing days a year",
        years,
        Year::nearFreezingDays,
        MonthClimate::nearFreezingDays);
    return gather.comparison("wetness", refused);
  }

  private record Year(
      String station,
      double wetHours,
      double hoursAbove75Pct,
      double hoursAbove33Pct,
      double hoursBelow0C,
      double frostDays,
      double nearFreezingDays,
      List<MonthClimate> fromOwnMeans,
      List<MonthClimate> fromFields) {}

  private static void add(
      Comparison.Gather gather,
      String quantity,
      List<Year> years,
      ToDoubleFunction<Year> counted,
      ToDoubleFunction<MonthClimate> modelled) {
    List<Pair> own = new ArrayList<>();
    List<Pair> fields = new ArrayList<>();
    for (Year year : years) {
      double hours = counted.applyAsDouble(year);
      own.add(Pair.of(year.station(), hours, sum(year.fromOwnMeans(), modelled)));
      fields.add(Pair.of(year.station(), hours, sum(year.fromFields(), modelled)));
    }
    gather.add(quantity + ", from own monthly means", true, own);
    gather.add(quantity + ", from the shipped fields", true, fields);
  }

  private static double sum(List<MonthClimate> months, ToDoubleFunction<MonthClimate> quantity) {
    return months.stream().mapToDouble(quantity).sum();
  }

  private Year year(List<Hour> station) {
    Hour first = station.get(0);
    double[] temperatureC = new double[MONTHS];
    double[] humidityPct = new double[MONTHS];
    double[] rangeC = new double[MONTHS];
    double[] totals = new double[6];
    for (int month = 1; month <= MONTHS; month++) {
      HourlyCount count = count(station, month);
      temperatureC[month - 1] = count.temperatureC();
      humidityPct[month - 1] = count.relativeHumidityPct();
      rangeC[month - 1] = count.diurnalRangeC();
      double days = MonthMeans.daysIn(month);
      double perHour = days * HOURS_OF_A_DAY / count.hours();
      double perDay = days / (count.hours() / HOURS_OF_A_DAY);
      totals[0] += perHour * count.wetHours();
      totals[1] += perHour * count.hoursAbove75Pct();
      totals[2] += perHour * count.hoursAbove33Pct();
      totals[3] += perHour * count.hoursBelow0C();
      totals[4] += perDay * count.frostDays();
      totals[5] += perDay * count.nearFreezingDays();
    }
    MonthMeans fields =
        climate.means(
            first.latitudeDeg(),
            first.longitudeDeg(),
            first.elevationM(),
            seaDistanceKm.applyAsDouble(first.latitudeDeg(), first.longitudeDeg()));
    MonthMeans own =
        new MonthMeans(temperatureC, humidityPct, rangeC, fields.rainMm(), fields.windMPerS());
    return new Year(
        first.station(),
        totals[0],
        totals[1],
        totals[2],
        totals[3],
        totals[4],
        totals[5],
        own.climate(first.latitudeDeg()),
        fields.climate(first.latitudeDeg()));
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
