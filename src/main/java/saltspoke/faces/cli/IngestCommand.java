package saltspoke.faces.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import saltspoke.fields.DataSet;
import saltspoke.fields.DefaultIngest;
import saltspoke.fields.Manifest;
import saltspoke.fields.build.RasterBuilders;
import saltspoke.sources.LayerBuilder;
import saltspoke.sources.PlaceBuilders;

/** {@code ingest}: builds data that answers are computed from. */
@Command(
    name = "ingest",
    description = "Build climate data from source packages, or take in your own.",
    subcommands = {IngestCommand.Default.class, IngestStationsCommand.class},
    mixinStandardHelpOptions = true)
final class IngestCommand implements Runnable {
  @Spec private CommandSpec spec;

  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }

  /** {@code ingest default}: the world that ships with the program. */
  @Command(
      name = "default",
      description = {
        "Build the world that ships with the program from the packages in SOURCES_DIR.",
        "The packages lie there as their registries serve them; a missing one is named with the"
            + " way to fetch it. The finished folder replaces the old one at the end."
      },
      footer = {"", "Example:", "  saltspoke ingest default packages --into climate-data"},
      mixinStandardHelpOptions = true)
  static final class Default implements Callable<Integer> {
    @Spec private CommandSpec spec;

    @Parameters(paramLabel = "SOURCES_DIR", description = "Folder that holds the packages.")
    private Path sources;

    @Option(
        names = "--into",
        paramLabel = "DIR",
        description = "Data folder to write or replace (climate-data).")
    private Path target = Path.of(DataSet.FOLDER_NAME);

    @Override
    public Integer call() throws IOException {
      List<LayerBuilder> builders = new ArrayList<>(RasterBuilders.all());
      builders.addAll(PlaceBuilders.all());
      PrintWriter err = spec.commandLine().getErr();
      Manifest manifest =
          new DefaultIngest(builders)
              .run(
                  sources,
                  target,
                  (done, total, what) -> {
                    err.printf("%d of %d  %s%n", done, total, what);
                    err.flush();
                  });
      spec.commandLine()
          .getOut()
          .printf(
              "%d files from %d packages in %s%n",
              manifest.files().size(), manifest.sources().size(), target);
      return ExitCode.DONE;
    }
  }
}
