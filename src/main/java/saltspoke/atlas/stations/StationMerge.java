package saltspoke.atlas.stations;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import saltspoke.atlas.SiteDepartures;
import saltspoke.atmosphere.CorrectionFile;
import saltspoke.atmosphere.CorrectionSpot;
import saltspoke.atmosphere.LeaveOneOut;
import saltspoke.atmosphere.stations.MonthNormal;
import saltspoke.atmosphere.stations.MonthSums;
import saltspoke.fields.PublishedFolder;
import saltspoke.sources.LayerSink;
import saltspoke.sources.hourly.HourlyStation;
import saltspoke.values.Refusal;

/**
 * Brings the outcomes of all files together, station by station in the order of their names, and
 * publishes the tables. Holds the names of all stations and the years of one; stations that are
 * used also leave three times twelve numbers for the corrections.
 */
final class StationMerge {
  private static final int SHOWN_REFUSALS = 100;
  private static final int LONGEST_SITE = 80;

  private final StationIngest.Request request;
  private final StationWorld world;
  private final IngestJournal journal;
  private final List<String> keys;
  private final int resumed;
  private final List<SiteDepartures.Counted> counted = new ArrayList<>();
  private final List<Refusal> setAside = new ArrayList<>();
  private List<StationJudgement> judgements = List.of();
  private int setAsideCount;
  private int stationYears;
  private long rows;
  private String lastKey = "";
  private FileOutcome lastOutcome;

  /**
   * @param keys of the files in their order; the journal has them all
   */
  StationMerge(
      StationIngest.Request request,
      StationWorld world,
      IngestJournal journal,
      List<String> keys,
      int resumed) {
    this.request = request;
    this.world = world;
    this.journal = journal;
    this.keys = keys;
    this.resumed = resumed;
  }

  StationIngest.Result publish(Path aside) throws IOException {
    Map<String, List<Integer>> filesOf = filesOfStations();
    if (filesOf.isEmpty()) {
      throw setAside.get(0);
    }
    PublishedFolder.publish(request.target(), aside, sink -> write(sink, filesOf));
    return new StationIngest.Result(
        keys.size(),
        resumed,
        rows,
        stationYears,
        filesOf.size(),
        counted.size(),
        setAsideCount,
        setAside,
        judgements);
  }

  /** Hourly before daily before typical, then by name: the first of two alike is kept. */
  private static String sortKey(HourlyStation station) {
    return station.kind().ordinal() + station.id();
  }

  private Map<String, List<Integer>> filesOfStations() throws IOException {
    Map<String, List<Integer>> filesOf = new TreeMap<>();
    for (int f = 0; f < keys.size(); f++) {
      FileOutcome outcome = journal.get(keys.get(f));
      if (outcome.refusal().isPresent()) {
        setAsideCount++;
        if (setAside.size() < SHOWN_REFUSALS) {
          setAside.add(outcome.refusal().get());
        }
      }
      rows += outcome.rows();
      stationYears += outcome.years().size();
      for (StationYearRecord year : outcome.years()) {
        List<Integer> files =
            filesOf.computeIfAbsent(sortKey(year.station()), k -> new ArrayList<>(1));
        if (files.isEmpty() || files.get(files.size() - 1) != f) {
          files.add(f);
        }
      }
    }
    return filesOf;
  }

  private void write(LayerSink sink, Map<String, List<Integer>> filesOf) throws IOException {
    StationTables tables = new StationTables(sink, request.attribution());
    try (tables) {
      for (Map.Entry<String, List<Integer>> entry : filesOf.entrySet()) {
        StationSummary summary = summary(entry.getKey(), entry.getValue());
        tables.add(summary);
        counted(summary).ifPresent(counted::add);
      }
      for (String key : keys) {
        FileOutcome outcome = outcome(key);
        if (outcome.refusal().isPresent()) {
          tables.add(outcome, outcome.refusal().get());
        }
      }
    }
    LeaveOneOut.Drafted drafted =
        LeaveOneOut.draft(SiteDepartures.counted(world.climate(), counted).rows());
    judgements = StationJudgement.of(world, counted, drafted);
    tables.text(
        StationTables.CORRECTIONS,
        "How far the stations lie from the shipped fields",
        CorrectionFile.write(drafted));
    tables.text(
        StationTables.JUDGEMENT,
        "How well the stations foretell one another",
        StationJudgement.write(judgements));
  }

  private FileOutcome outcome(String key) throws IOException {
    if (!key.equals(lastKey)) {
      lastOutcome = journal.get(key);
      lastKey = key;
    }
    return lastOutcome;
  }

  private StationSummary summary(String station, List<Integer> files) throws IOException {
    List<StationSummary.Told> told = new ArrayList<>();
    for (int file : files) {
      FileOutcome outcome = outcome(keys.get(file));
      for (StationYearRecord year : outcome.years()) {
        if (sortKey(year.station()).equals(station)) {
          told.add(new StationSummary.Told(outcome.file(), year));
        }
      }
    }
    told.sort(Comparator.comparingInt(t -> t.entry().year().year()));
    return StationSummary.of(told, request.leastYears());
  }

  private Optional<SiteDepartures.Counted> counted(StationSummary summary) {
    if (summary.normals().isEmpty()) {
      return Optional.empty();
    }
    HourlyStation station = summary.station();
    double[][] values = new double[3][12];
    for (double[] months : values) {
      Arrays.fill(months, Double.NaN);
    }
    for (MonthNormal normal : summary.normals()) {
      int m = normal.month() - 1;
      values[0][m] = normal.temperatureC();
      values[1][m] = normal.relativeHumidityPct();
      if (station.kind() != HourlyStation.Kind.DAILY) {
        values[2][m] = normal.hours(MonthSums.Sum.WET);
      }
    }
    String name = station.name();
    return Optional.of(
        new SiteDepartures.Counted(
            name.substring(0, Math.min(LONGEST_SITE, name.length())),
            new CorrectionSpot(
                station.latitudeDeg(),
                station.longitudeDeg(),
                station.elevationM(),
                world.seaDistanceKm().applyAsDouble(station.latitudeDeg(), station.longitudeDeg())),
            values[0],
            values[1],
            values[2]));
  }
}
