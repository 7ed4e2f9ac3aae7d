package saltspoke.faces.cli;

import picocli.CommandLine.Option;

/** What every answering command takes. */
final class CommonOptions {
  @Option(names = "--json", description = "Print the whole answer as JSON.")
  boolean json;

  @Option(
      names = "--lang",
      paramLabel = "LANG",
      description = "Language of sentences: en, de, fr, it or es (en).")
  String language;

  @Option(
      names = "--data",
      paramLabel = "DIR",
      description = "Climate data to use in place of the shipped data.")
  java.nio.file.Path data;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;
}
