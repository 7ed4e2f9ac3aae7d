package saltspoke.faces.cli;

import java.nio.file.Path;
import picocli.CommandLine.Option;

/** Local measurements that answers are to go by. */
final class CorrectionsOption {
  @Option(
      names = "--corrections",
      paramLabel = "FILE",
      description = "Site corrections as compare --write-corrections writes them.")
  Path file;
}
