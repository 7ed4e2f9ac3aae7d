package saltspoke.atlas;

import java.io.InputStream;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.DoubleBinaryOperator;
import java.util.function.ToDoubleFunction;
import saltspoke.atmosphere.ClimateSpread;
import saltspoke.atmosphere.MonthClimate;
import saltspoke.atmosphere.MonthlyClimate;
import saltspoke.sources.StationFiles;
import saltspoke.sources.StationFiles.ClimateStation;

/** Judges the modelled monthly climate against climate stations. */
public final class ClimateComparison {
  private static final int MONTHS = 12;

  private final MonthlyClimate climate;
  private final DoubleBinaryOperator seaDistanceKm;

  /**
   * @param seaDistanceKm distance to the sea, km, from latitude and longitude in degrees
   */
  public ClimateComparison(MonthlyClimate climate, DoubleBinaryOperator seaDistanceKm) {
    this.climate = climate;
    this.seaDistanceKm = seaDistanceKm;
  }

  /** Compares a file with the columns of {@link ClimateStation}; closes the stream. */
  public Comparison run(InputStream in, String fileName) {
    StationRows<ClimateStation> stations = StationRows.read(in, fileName, StationFiles::climate);
    Tally tally = new Tally();
    for (ClimateStation station : stations.rows()) {
      tally.add(
          station,
          climate.at(
              station.latitudeDeg(),
              station.longitudeDeg(),
              station.elevationM(),
              seaDistanceKm.applyAsDouble(station.latitudeDeg(), station.longitudeDeg())));
    }
    return tally.gather().comparison("climate", stations.refused());
  }

  /** The pairs of all quantities. */
  private static final class Tally {
    private final List<Pair> monthlyTemperature = new ArrayList<>();
    private final List<Pair> annualTemperature = new ArrayList<>();
    private final List<Pair> monthlyHumidity = new ArrayList<>();
    private final List<Pair> annualHumidity = new ArrayList<>();
    private final Map<Continent, List<Pair>> humidityByContinent = new EnumMap<>(Continent.class);
    private final List<Pair> frostDays = new ArrayList<>();
    private final List<Pair> diurnalRange = new ArrayList<>();
    private final List<Pair> rain = new ArrayList<>();
    private final List<Pair> wind = new ArrayList<>();

    void add(ClimateStation s, List<MonthClimate> months) {
      double heightM = s.elevationM();
      Estimate temperature =
          new Estimate(
              MonthClimate::temperatureC,
              ClimateSpread.monthlyTemperatureK(heightM),
              ClimateSpread.annualTemperatureK(heightM),
              -100,
              100);
      Estimate relativeHumidity =
          new Estimate(
              MonthClimate::relativeHumidityPct,
              ClimateSpread.monthlyHumidityPct(heightM),
              ClimateSpread.annualHumidityPct(heightM),
              0,
              100);
      monthly(monthlyTemperature, s.name(), s.temperatureC(), months, temperature);
      annualTemperature.add(annual(s.name(), s.temperatureC(), months, temperature));
      monthly(monthlyHumidity, s.name(), s.relativeHumidityPct(), months, relativeHumidity);
      Pair humidity = annual(s.name(), s.relativeHumidityPct(), months, relativeHumidity);
      annualHumidity.add(humidity);
      humidityByContinent
          .computeIfAbsent(Continent.at(s.latitudeDeg(), s.longitudeDeg()), k -> new ArrayList<>())
          .add(humidity);
      sums(frostDays, s, s.frostDays(), months, MonthClimate::frostDays);
      sums(rain, s, s.rainMm(), months, MonthClimate::rainMm);
      s.diurnalRangeC()
          .ifPresent(v -> monthly(diurnalRange, s.name(), v, months, MonthClimate::diurnalRangeC));
      s.windMPerS().ifPresent(v -> monthly(wind, s.name(), v, months, MonthClimate::windMPerS));
    }

    Comparison.Gather gather() {
      Comparison.Gather gather = new Comparison.Gather();
      gather.add("temperature, monthly, °C", false, monthlyTemperature);
      gather.add("temperature, annual, °C", false, annualTemperature);
      gather.add("relative humidity, monthly, %", false, monthlyHumidity);
      gather.add("relative humidity, annual, %", false, annualHumidity);
      humidityByContinent.forEach(
          (continent, pairs) ->
              gather.add("relative humidity, annual, %, " + continent.title(), false, pairs));
      gather.add("frost days a year", false, frostDays);
      gather.add("diurnal range, monthly, °C", true, diurnalRange);
      gather.add("rain, annual, mm", true, rain);
      gather.add("wind speed, monthly, m/s", true, wind);
      return gather;
    }

    /** A modelled quantity with its spreads and the limits of its band. */
    private record Estimate(
        ToDoubleFunction<MonthClimate> quantity,
        double monthlySpread,
        double annualSpread,
        double least,
        double most) {}

    private static void monthly(
        List<Pair> to, String where, double[] measured, List<MonthClimate> months, Estimate e) {
      for (int m = 0; m < MONTHS; m++) {
        double estimated = e.quantity().applyAsDouble(months.get(m));
        to.add(
            Pair.of(
                where + " month " + (m + 1),
                measured[m],
                ClimateSpread.band(estimated, e.monthlySpread(), e.least(), e.most())));
      }
    }

    private static Pair annual(
        String where, double[] measured, List<MonthClimate> months, Estimate e) {
      Pair mean = mean(where, measured, months, e.quantity());
      return Pair.of(
          where,
          mean.measured(),
          ClimateSpread.band(mean.estimated(), e.annualSpread(), e.least(), e.most()));
    }

    private static void monthly(
        List<Pair> to,
        String where,
        double[] measured,
        List<MonthClimate> months,
        ToDoubleFunction<MonthClimate> quantity) {
      for (int m = 0; m < MONTHS; m++) {
        to.add(
            Pair.of(
                where + " month " + (m + 1), measured[m], quantity.applyAsDouble(months.get(m))));
      }
    }

    private static Pair mean(
        String where,
        double[] measured,
        List<MonthClimate> months,
        ToDoubleFunction<MonthClimate> quantity) {
      double sum = 0;
      double estimated = 0;
      for (int m = 0; m < MONTHS; m++) {
        sum += measured[m];
        estimated += quantity.applyAsDouble(months.get(m));
      }
      return Pair.of(where, sum / MONTHS, estimated / MONTHS);
    }

    private static void sums(
        List<Pair> to,
        ClimateStation s,
        Optional<double[]> measured,
        List<MonthClimate> months,
        ToDoubleFunction<MonthClimate> quantity) {
      measured.ifPresent(
          values -> {
            Pair mean = mean(s.name(), values, months, quantity);
            to.add(Pair.of(s.name(), MONTHS * mean.measured(), MONTHS * mean.estimated()));
          });
    }
  }
}
