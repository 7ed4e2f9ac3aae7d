package saltspoke.atlas.stations;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import saltspoke.atmosphere.CorrectionFile;
import saltspoke.atmosphere.SiteCorrection;
import saltspoke.fields.DataSet;
import saltspoke.fields.Manifest;
import saltspoke.fields.PublishedFolder;
import saltspoke.sources.CsvTable;
import saltspoke.values.Note;
import saltspoke.values.Refusal;

/** A station data set as {@link StationIngest} makes it. */
public final class StationDataSet {
  private final String name;
  private final DataSet data;

  private StationDataSet(String name, DataSet data) {
    this.name = name;
    this.data = data;
  }

  /**
   * Opens one and checks all its files.
   *
   * @throws Refusal when the folder holds none, or naming every damaged file
   */
  public static StationDataSet open(Path folder) {
    if (!isOne(folder)) {
      throw Refusal.notFound(
          "no-station-data-set",
          "stations",
          folder,
          "a folder that `ingest stations ARCHIVE --into DIR` has written");
    }
    return new StationDataSet(
        folder.toAbsolutePath().normalize().getFileName().toString(), DataSet.in(folder));
  }

  private static boolean isOne(Path folder) {
    try (Stream<Path> listing = Files.isDirectory(folder) ? Files.list(folder) : Stream.empty()) {
      List<String> names = listing.map(path -> path.getFileName().toString()).toList();
      return names.contains(Manifest.FILE_NAME)
          && names.stream().anyMatch(n -> n.startsWith(StationTables.MONTHS + "-"));
    } catch (IOException e) {
      return false;
    }
  }

  /** Those among a folder and what lies in it, by name. */
  public static List<Path> in(Path folder) throws IOException {
    try (Stream<Path> walk = Files.walk(folder, 1)) {
      return walk.filter(StationDataSet::isOne).sorted().toList();
    }
  }

  /** Removes a data set; nothing else in the folder is touched. */
  public static void remove(Path folder) throws IOException {
    open(folder);
    PublishedFolder.remove(folder);
  }

  public String name() {
    return name;
  }

  public Manifest manifest() {
    return data.manifest();
  }

  /** How far its stations lie from the shipped fields. */
  public List<SiteCorrection> corrections() {
    return CorrectionFile.read(data.rows(StationTables.CORRECTIONS), name + "/corrections");
  }

  /** How well its stations foretell one another. */
  public List<StationJudgement> judgements() {
    return data.rows(StationTables.JUDGEMENT).stream().map(StationJudgement::read).toList();
  }

  /** Stations that have calendar months with enough years. */
  public int used() {
    return (int)
        data.rows(StationTables.STATIONS).stream()
            .filter(row -> row.text("used").equals("yes"))
            .count();
  }

  /** Station years that were read. */
  public int stationYears() {
    return data.rows(StationTables.QUALITY).size();
  }

  /** Files that could not be read. */
  public int setAside() {
    return data.rows(StationTables.SET_ASIDE).size();
  }

  /** What an answer says of the data set that moved it. */
  public Note provenance() {
    List<StationJudgement> judgements = judgements();
    Optional<StationJudgement> humidity = find(judgements, StationJudgement.HUMIDITY);
    Optional<StationJudgement> wet = find(judgements, StationJudgement.WET_HOURS);
    if (humidity.isEmpty() || wet.isEmpty()) {
      return Note.of("air-stations-unjudged", "dataSet", name, "stations", used());
    }
    return new Note(
        "air-stations-judged",
        Map.of(
            "dataSet",
            name,
            "stations",
            used(),
            "humidityBefore",
            short1(humidity.get().errorBefore()),
            "humidityAfter",
            short1(humidity.get().errorAfter()),
            "wetBefore",
            Math.round(wet.get().errorBefore()),
            "wetAfter",
            Math.round(wet.get().errorAfter())));
  }

  private static double short1(double value) {
    return Math.round(10 * value) / 10.0;
  }

  private static Optional<StationJudgement> find(
      List<StationJudgement> judgements, String quantity) {
    return judgements.stream().filter(j -> j.quantity().equals(quantity)).findFirst();
  }

  /**
   * How two data sets differ.
   *
   * @param inBoth station months in both
   * @param onlyFirst station months that only the first has
   * @param temperatureK mean of second less first over the months in both
   * @param humidityPct the same of relative humidity
   * @param wetHours the same of wet hours a month, over the months that have them in both
   */
  public record Difference(
      int inBoth,
      int onlyFirst,
      int onlySecond,
      double temperatureK,
      double humidityPct,
      double wetHours) {}

  /** Sets another data set against this one. */
  public Difference compare(StationDataSet other) {
    Map<String, CsvTable.Row> mine = months();
    Map<String, CsvTable.Row> theirs = other.months();
    int both = 0;
    int wet = 0;
    double[] sums = new double[3];
    for (Map.Entry<String, CsvTable.Row> entry : mine.entrySet()) {
      CsvTable.Row first = entry.getValue();
      CsvTable.Row second = theirs.get(entry.getKey());
      if (second == null) {
        continue;
      }
      both++;
      sums[0] += second.number("temperature_c") - first.number("temperature_c");
      sums[1] += second.number("relative_humidity_pct") - first.number("relative_humidity_pct");
      if (!first.text("wet_hours").isEmpty() && !second.text("wet_hours").isEmpty()) {
        wet++;
        sums[2] += second.number("wet_hours") - first.number("wet_hours");
      }
    }
    return new Difference(
        both,
        mine.size() - both,
        theirs.size() - both,
        sums[0] / both,
        sums[1] / both,
        sums[2] / wet);
  }

  private Map<String, CsvTable.Row> months() {
    Map<String, CsvTable.Row> rows = new HashMap<>();
    for (CsvTable.Row row : data.rows(StationTables.MONTHS)) {
      rows.put(
          String.format(
              Locale.ROOT, "%s %s %s", row.text("station"), row.text("kind"), row.text("month")),
          row);
    }
    return rows;
  }
}
