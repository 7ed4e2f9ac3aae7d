package saltspoke.atlas;

import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleBinaryOperator;
import java.util.function.ToDoubleFunction;
import saltspoke.atmosphere.ClimateSpread;
import saltspoke.atmosphere.HourlyCount;
import saltspoke.atmosphere.MonthClimate;
import saltspoke.atmosphere.MonthMeans;
import saltspoke.atmosphere.MonthlyClimate;
import saltspoke.sources.StationFiles.Hour;
import saltspoke.values.Quantiles;

/**
 * Judges the modelled wet hours a year against hourly records, twice: from the record's own monthly
 * means (temperature, humidity, daily range), and from the shipped fields alone. The record's hours
 * are counted by definition; a month that lacks hours counts by its share.
 */
public final class WetnessComparison {
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
    StationRows<StationYear> stations = StationYear.read(in, fileName);
    List<Year> years = stations.rows().stream().map(this::year).toList();
    Comparison.Gather gather = new Comparison.Gather();
    addWetHours(gather, years);
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
    return gather.comparison("wetness", stations.refused());
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
      List<MonthClimate> fromFields,
      Quantiles wetHoursFromOwnMeans,
      Quantiles wetHoursFromFields) {}

  private static void addWetHours(Comparison.Gather gather, List<Year> years) {
    List<Pair> own = new ArrayList<>();
    List<Pair> fields = new ArrayList<>();
    for (Year year : years) {
      own.add(Pair.of(year.station(), year.wetHours(), year.wetHoursFromOwnMeans()));
      fields.add(Pair.of(year.station(), year.wetHours(), year.wetHoursFromFields()));
    }
    addBoth(gather, "wet hours a year", own, fields);
  }

  private static void addBoth(
      Comparison.Gather gather, String quantity, List<Pair> own, List<Pair> fields) {
    gather.add(quantity + ", from own monthly means", true, own);
    gather.add(quantity + ", from the shipped fields", true, fields);
  }

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
    addBoth(gather, quantity, own, fields);
  }

  private static double sum(List<MonthClimate> months, ToDoubleFunction<MonthClimate> quantity) {
    return months.stream().mapToDouble(quantity).sum();
  }

  private Year year(StationYear station) {
    Hour first = station.first();
    double[] totals = new double[6];
    for (int month = 1; month <= station.months().size(); month++) {
      HourlyCount count = station.months().get(month - 1);
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
    double latitudeDeg = first.latitudeDeg();
    MonthMeans fields =
        climate.means(
            latitudeDeg,
            first.longitudeDeg(),
            first.elevationM(),
            seaDistanceKm.applyAsDouble(latitudeDeg, first.longitudeDeg()));
    MonthMeans own =
        new MonthMeans(
            station.monthly(HourlyCount::temperatureC),
            station.monthly(HourlyCount::relativeHumidityPct),
            station.monthly(HourlyCount::diurnalRangeC),
            fields.rainMm(),
            fields.windMPerS());
    return new Year(
        first.station(),
        totals[0],
        totals[1],
        totals[2],
        totals[3],
        totals[4],
        totals[5],
        own.climate(latitudeDeg),
        fields.climate(latitudeDeg),
        ClimateSpread.wetHoursOfExactMeans(own, latitudeDeg),
        ClimateSpread.wetHoursOfModelledMeans(fields, latitudeDeg, first.elevationM()));
  }
}
