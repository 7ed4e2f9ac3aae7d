package saltspoke.faces.cli;

import java.nio.file.Path;
import picocli.CommandLine.Option;

/** Local measurements that answers are to go by: a file of corrections or a station data set. */
final class CorrectionsOption {
  @Option(
      names = "--corrections",
      paramLabel = "FILE",
      description = "Site corrections as compare --write-corrections writes them.")
  Path file;

  @Option(
      names = "--stations",
      paramLabel = "DIR",
      description = "Station data set as ingest stations writes it; not with --corrections.")
  Path stations;
}
