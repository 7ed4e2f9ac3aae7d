package saltspoke.faces.cli;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import java.util.zip.CRC32;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import saltspoke.atlas.stations.StationIngest;
import saltspoke.atlas.stations.StationJudgement;
import saltspoke.atlas.stations.StationWorld;
import saltspoke.atmosphere.MonthlyClimate;
import saltspoke.fields.DataSet;
import saltspoke.places.PlaceDirectory;
import saltspoke.sources.hourly.HourlyFormats;
import saltspoke.sources.hourly.StationList;
import saltspoke.values.Refusal;

/** {@code ingest stations}: hourly archives into a station data set. */
@Command(
    name = "stations",
    description = {
      "Take in station archives: hours are tested, counted by month and set against the shipped",
      "fields. Reads ISD-Lite, GHCN hourly (.psv), GSOD daily CSV, EPW typical years, and any table",
      "that a mapping file describes; plain, gzip or zip, files and whole folders.",
      "A run that was stopped goes on where it was when started again. The data set changes in one",
      "step at the end; a file that cannot be read is set aside with its reason.",
      ""
    },
    footer = {
      "",
      "A mapping file (CSV) for hourly.csv with the columns time, temp and dew in °F:",
      "  quantity,column,unit,missing",
      "  station,=Pier 4,,",
      "  latitude_deg,=54.32,,",
      "  longitude_deg,=10.13,,",
      "  elevation_m,=5,,",
      "  time,time,,",
      "  temperature,temp,f,NA",
      "  dew_point,dew,f,NA",
      "More settings: separator (comma, semicolon, tab, pipe, space), data_after, kind (hourly,",
      "daily, typical), clock (utc, local); a column may be #3, =text or @file. Units: c, tenth_c, f,",
      "k, pct, fraction, deg, m_s, tenth_m_s, km_h, knots, mph; hour may be ending (1-24).",
      "",
      "Examples:",
      "  saltspoke ingest stations isd-lite/2015 --station-list isd-history.csv --into north-sea",
      "  saltspoke ingest stations hourly.csv.gz --mapping mine.csv --least-years 1 --into mine",
      "  saltspoke air --place \"Kiel, DE\" --stations north-sea"
    },
    mixinStandardHelpOptions = true)
final class IngestStationsCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;

  @Parameters(paramLabel = "ARCHIVE", arity = "1..*", description = "Files, folders, zip files.")
  private List<Path> archives;

  @Option(
      names = "--into",
      paramLabel = "DIR",
      required = true,
      description = "Station data set to write or replace.")
  private Path target;

  @Option(
      names = "--station-list",
      paramLabel = "FILE",
      description =
          "isd-history.csv, or CSV with station, latitude_deg, longitude_deg, elevation_m.")
  private Path stationList;

  @Option(
      names = "--mapping",
      paramLabel = "FILE",
      description = "What the columns of tables mean.")
  private Path mapping;

  @Option(
      names = "--least-years",
      paramLabel = "N",
      description = "Years that a calendar month needs, 1..30 (3); typical years always do.")
  private int leastYears = 3;

  @Option(
      names = "--threads",
      paramLabel = "N",
      description = "Files read at once, 1..64 (as many as the machine has cores).")
  private int threads = Math.min(64, Runtime.getRuntime().availableProcessors());

  @Option(
      names = "--attribution",
      paramLabel = "TEXT",
      description = "Line to show with the data (the archives' names).")
  private String attribution;

  @Option(names = "--data", paramLabel = "DIR", description = "Data folder instead of the shipped.")
  private Path data;

  @Override
  public Integer call() throws IOException {
    CRC32 setting = new CRC32();
    HourlyFormats formats = formats(setting);
    String line =
        attribution == null
            ? String.join(", ", archives.stream().map(a -> a.getFileName().toString()).toList())
            : attribution;
    StationIngest.Request request =
        new StationIngest.Request(
            archives,
            target,
            formats,
            Long.toHexString(setting.getValue()),
            line,
            leastYears,
            threads);
    PrintWriter err = spec.commandLine().getErr();
    StationIngest ingest =
        new StationIngest(
            request,
            (done, total, what) -> {
              err.printf("%d of %d  %s%n", done, total, what);
              err.flush();
            });
    DataSet shipped = Opening.dataSet(data);
    PlaceDirectory places = PlaceDirectory.open(shipped);
    StationWorld world =
        new StationWorld(
            MonthlyClimate.from(shipped), (lat, lon) -> places.seaView(lat, lon).distanceKm());
    spec.commandLine().getOut().print(text(ingest.run(world)));
    return ExitCode.DONE;
  }

  private HourlyFormats formats(CRC32 setting) throws IOException {
    StationList list = StationList.NONE;
    if (stationList != null) {
      byte[] text = bytes(stationList, "station-list");
      setting.update(text);
      list = StationList.read(new ByteArrayInputStream(text), name(stationList));
    }
    HourlyFormats formats = HourlyFormats.published(list);
    if (mapping != null) {
      byte[] text = bytes(mapping, "mapping");
      setting.update(text);
      formats = formats.with(new ByteArrayInputStream(text), name(mapping));
    }
    return formats;
  }

  private static byte[] bytes(Path file, String option) throws IOException {
    if (!Files.isRegularFile(file)) {
      throw Refusal.notFound("unreadable-file", option, file, "a CSV file that can be read");
    }
    return Files.readAllBytes(file);
  }

  private static String name(Path file) {
    return file.getFileName().toString();
  }

  private String text(StationIngest.Result result) {
    List<String> lines = new ArrayList<>();
    lines.add(
        String.format(
            Locale.ROOT,
            "%d files, %,d rows, %d station years of %d stations in %s; %d stations with calendar"
                + " months of at least %d years (typical years count as such)",
            result.files(),
            result.rows(),
            result.stationYears(),
            result.stations(),
            target,
            result.used(),
            leastYears));
    if (result.resumed() > 0) {
      lines.add(result.resumed() + " files were done by the run before");
    }
    lines.addAll(judged(result.judgements()));
    if (result.setAsideCount() > 0) {
      lines.add(result.setAsideCount() + " files set aside:");
      result.setAside().stream()
          .limit(10)
          .forEach(refusal -> lines.add("  " + Main.sentence(refusal)));
      if (result.setAsideCount() > 10) {
        lines.add("  …; all of them stand in the data set's table station-set-aside");
      }
    }
    return String.join(System.lineSeparator(), lines) + System.lineSeparator();
  }

  /** Sentences of how well stations foretell one another. */
  static List<String> judged(List<StationJudgement> judgements) {
    if (judgements.isEmpty()) {
      return Arrays.asList("No station has others near enough to be judged by.");
    }
    List<String> lines = new ArrayList<>();
    lines.add("Each station left out in turn, mean absolute error:");
    for (StationJudgement one : judgements) {
      lines.add(
          String.format(
              Locale.ROOT,
              "  %-36s %9.2f from the shipped fields, %9.2f moved by the others (%d stations)",
              one.quantity(),
              one.errorBefore(),
              one.errorAfter(),
              one.stations()));
    }
    return lines;
  }
}
