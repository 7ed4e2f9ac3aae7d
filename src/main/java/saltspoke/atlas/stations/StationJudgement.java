package saltspoke.atlas.stations;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.ToDoubleFunction;
import saltspoke.atlas.SiteDepartures;
import saltspoke.atmosphere.CorrectionSpot;
import saltspoke.atmosphere.LeaveOneOut;
import saltspoke.atmosphere.MonthClimate;
import saltspoke.atmosphere.MonthMeans;
import saltspoke.atmosphere.MovedClimate;
import saltspoke.atmosphere.SiteCorrection;
import saltspoke.atmosphere.SiteCorrections;
import saltspoke.sources.CsvTable;
import saltspoke.sources.CsvWriter;

/**
 * How well the stations of a data set foretell one another: each in turn is left out, and answers
 * at its spot from the shipped fields alone are set against those that the others move.
 *
 * @param quantity name and unit
 * @param stations those judged: with all twelve months and others in reach
 * @param errorBefore mean absolute error of the shipped fields
 * @param errorAfter the same, moved by the others
 */
public record StationJudgement(
    String quantity, int stations, double errorBefore, double errorAfter) {
  public static final String HUMIDITY = "relative humidity of the year, points";
  public static final String MONTHLY_HUMIDITY = "relative humidity of a month, points";
  public static final String TEMPERATURE = "temperature of a month, K";
  public static final String WET_HOURS = "wet hours of the year, h";
  public static final String MONTHLY_WET_HOURS = "wet hours of a month, h";

  private static final List<String> COLUMNS =
      List.of("quantity", "stations", "error_before", "error_after");

  /** Leaving out more stations than this would take long and say little more. */
  private static final int MOST_JUDGED = 400;

  private static final int MONTHS = 12;

  /**
   * Judges the stations of a data set.
   *
   * @param drafted corrections of all stations, with their spreads
   */
  static List<StationJudgement> of(
      StationWorld world, List<SiteDepartures.Counted> stations, LeaveOneOut.Drafted drafted) {
    List<Gather> gathers =
        List.of(
            new Gather(
                HUMIDITY,
                true,
                MonthClimate::relativeHumidityPct,
                s -> s.relativeHumidityPct(),
                MONTHS),
            new Gather(
                MONTHLY_HUMIDITY,
                false,
                MonthClimate::relativeHumidityPct,
                s -> s.relativeHumidityPct(),
                1),
            new Gather(TEMPERATURE, false, MonthClimate::temperatureC, s -> s.temperatureC(), 1),
            new Gather(WET_HOURS, true, MonthClimate::wetHours, s -> s.wetHours(), 1),
            new Gather(MONTHLY_WET_HOURS, false, MonthClimate::wetHours, s -> s.wetHours(), 1));
    int step = Math.max(1, (stations.size() + MOST_JUDGED - 1) / MOST_JUDGED);
    for (int i = 0; i < stations.size(); i += step) {
      SiteDepartures.Counted station = stations.get(i);
      List<SiteCorrection> others =
          drafted.rows().stream()
              .filter(
                  row -> !row.site().equals(station.site()) || !row.spot().equals(station.spot()))
              .toList();
      CorrectionSpot spot = station.spot();
      MonthMeans means =
          world
              .climate()
              .means(
                  spot.latitudeDeg(), spot.longitudeDeg(), spot.elevationM(), spot.seaDistanceKm());
      MovedClimate before = MovedClimate.of(means, SiteCorrections.NONE, spot);
      MovedClimate after = MovedClimate.of(means, SiteCorrections.of(others), spot);
      if (after.isMoved()) {
        for (Gather gather : gathers) {
          gather.add(station, before.months(), after.months());
        }
      }
    }
    return gathers.stream().filter(g -> g.stations > 0).map(Gather::judgement).toList();
  }

  /** One quantity over the stations. */
  private static final class Gather {
    private final String quantity;
    private final boolean ofYear;
    private final ToDoubleFunction<MonthClimate> modelled;
    private final java.util.function.Function<SiteDepartures.Counted, double[]> measured;
    private final double divisor;
    private int stations;
    private int errors;
    private double before;
    private double after;

    Gather(
        String quantity,
        boolean ofYear,
        ToDoubleFunction<MonthClimate> modelled,
        java.util.function.Function<SiteDepartures.Counted, double[]> measured,
        double divisor) {
      this.quantity = quantity;
      this.ofYear = ofYear;
      this.modelled = modelled;
      this.measured = measured;
      this.divisor = divisor;
    }

    void add(SiteDepartures.Counted station, List<MonthClimate> plain, List<MonthClimate> moved) {
      double[] truth = measured.apply(station);
      double plainYear = 0;
      double movedYear = 0;
      for (int m = 0; m < MONTHS; m++) {
        if (Double.isNaN(truth[m])) {
          return;
        }
        plainYear += modelled.applyAsDouble(plain.get(m)) - truth[m];
        movedYear += modelled.applyAsDouble(moved.get(m)) - truth[m];
      }
      stations++;
      if (ofYear) {
        errors++;
        before += Math.abs(plainYear) / divisor;
        after += Math.abs(movedYear) / divisor;
        return;
      }
      for (int m = 0; m < MONTHS; m++) {
        errors++;
        before += Math.abs(modelled.applyAsDouble(plain.get(m)) - truth[m]);
        after += Math.abs(modelled.applyAsDouble(moved.get(m)) - truth[m]);
      }
    }

    StationJudgement judgement() {
      return new StationJudgement(quantity, stations, before / errors, after / errors);
    }
  }

  static String write(List<StationJudgement> judgements) {
    List<List<String>> rows = new ArrayList<>();
    for (StationJudgement one : judgements) {
      rows.add(
          List.of(
              one.quantity(),
              Integer.toString(one.stations()),
              String.format(Locale.ROOT, "%.3f", one.errorBefore()),
              String.format(Locale.ROOT, "%.3f", one.errorAfter())));
    }
    return CsvWriter.write(
        List.of(
            "Each station left out in turn: mean absolute error of the shipped fields, and moved by"
                + " the other stations."),
        COLUMNS,
        rows);
  }

  static StationJudgement read(CsvTable.Row row) {
    return new StationJudgement(
        row.text("quantity"),
        row.whole("stations", 1, Integer.MAX_VALUE),
        row.number("error_before"),
        row.number("error_after"));
  }
}
