package saltspoke.faces.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import saltspoke.atlas.stations.StationDataSet;
import saltspoke.fields.Manifest;
import saltspoke.values.Refusal;

/** {@code datasets}: the station data sets beside the shipped world. */
@Command(
    name = "datasets",
    description = {
      "List, compare and remove station data sets. The shipped world is never touched.",
      ""
    },
    footer = {
      "",
      "Examples:",
      "  saltspoke datasets list .",
      "  saltspoke datasets compare north-sea north-sea-new",
      "  saltspoke datasets remove north-sea",
      "  saltspoke air --place \"Kiel, DE\" --stations north-sea"
    },
    mixinStandardHelpOptions = true)
final class DatasetsCommand implements Runnable {
  @Spec private CommandSpec spec;

  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }

  @Command(
      name = "list",
      description = "List the station data sets in a folder.",
      mixinStandardHelpOptions = true)
  int list(
      @Parameters(
              paramLabel = "FOLDER",
              arity = "0..1",
              defaultValue = ".",
              description = "Folder to look in (.).")
          Path folder)
      throws IOException {
    if (!Files.isDirectory(folder)) {
      throw Refusal.notFound("no-folder", "FOLDER", folder, "a folder that can be read");
    }
    PrintWriter out = spec.commandLine().getOut();
    List<Path> found = StationDataSet.in(folder);
    if (found.isEmpty()) {
      out.println("No station data set in " + folder);
    }
    for (Path path : found) {
      StationDataSet set = StationDataSet.open(path);
      out.printf(
          Locale.ROOT,
          "%s: %d stations in use, %d station years, %d files set aside, %,d bytes; %s%n",
          path,
          set.used(),
          set.stationYears(),
          set.setAside(),
          set.manifest().files().stream().mapToLong(Manifest.Entry::bytes).sum(),
          set.manifest().files().get(0).attribution());
      IngestStationsCommand.judged(set.judgements()).forEach(line -> out.println("  " + line));
    }
    return ExitCode.DONE;
  }

  @Command(
      name = "compare",
      description = "Set one station data set against another.",
      mixinStandardHelpOptions = true)
  int compare(
      @Parameters(paramLabel = "FIRST", description = "Folder of one.") Path first,
      @Parameters(paramLabel = "SECOND", description = "Folder of the other.") Path second) {
    StationDataSet.Difference difference =
        StationDataSet.open(first).compare(StationDataSet.open(second));
    PrintWriter out = spec.commandLine().getOut();
    out.printf(
        "%d station months in both, %d only in %s, %d only in %s%n",
        difference.inBoth(), difference.onlyFirst(), first, difference.onlySecond(), second);
    if (difference.inBoth() > 0) {
      out.printf(
          Locale.ROOT,
          "Second less first, mean: %+.3f K, %+.3f points of humidity, %+.2f wet hours a month%n",
          difference.temperatureK(),
          difference.humidityPct(),
          difference.wetHours());
    }
    return ExitCode.DONE;
  }

  @Command(
      name = "remove",
      description = "Remove a station data set.",
      mixinStandardHelpOptions = true)
  int remove(@Parameters(paramLabel = "DIR", description = "Its folder.") Path folder)
      throws IOException {
    StationDataSet.remove(folder);
    spec.commandLine().getOut().println("Removed " + folder);
    return ExitCode.DONE;
  }
}
