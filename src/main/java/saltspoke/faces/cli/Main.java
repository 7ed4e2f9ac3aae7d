package saltspoke.faces.cli;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.HelpCommand;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import saltspoke.faces.json.Json;
import saltspoke.values.Refusal;

/** Entry point of the runnable jar: parses, runs, and maps what went wrong to an exit code. */
@Command(
    name = "saltspoke",
    description = {"How corrosive a place is, and when to look at metal spoke nipples there.", ""},
    subcommands = {
      AdviseCommand.class,
      AirCommand.class,
      PlacesCommand.class,
      PairingsCommand.class,
      CompareCommand.class,
      SensitivityCommand.class,
      StockCommand.class,
      RegionCommand.class,
      AtlasCommand.class,
      ServeCommand.class,
      IngestCommand.class,
      DatasetsCommand.class,
      AboutCommand.class,
      HelpCommand.class
    },
    footer = {
      "",
      "Examples:",
      "  saltspoke advise --place \"Kiel, DE\" --profile all-winter-commuter",
      "  saltspoke air --postcode 04101 --country US",
      "  saltspoke serve --port 8080"
    },
    exitCodeListHeading = "%nExit codes:%n",
    exitCodeList = {
      " 0:done",
      " 1:a fault of the program",
      " 2:the command was used wrongly",
      " 3:no such thing, or a number out of range",
      " 4:a data file is missing or damaged"
    },
    version = "saltspoke",
    mixinStandardHelpOptions = true)
public final class Main implements Runnable {
  @Spec private CommandSpec spec;

  public static void main(String[] args) {
    try {
      System.exit(run(args, utf8(System.out), utf8(System.err)));
    } catch (OutOfMemoryError e) {
      System.err.println("saltspoke: out of memory; give it more, such as java -Xmx256m -jar …");
      System.exit(ExitCode.BUG);
    }
  }

  /** Runs one command line; results go to {@code out}, complaints to {@code err}. */
  public static int run(String[] args, PrintWriter out, PrintWriter err) {
    CommandLine commandLine = new CommandLine(new Main());
    commandLine.setOut(out);
    commandLine.setErr(err);
    commandLine.setUsageHelpWidth(100);
    commandLine.setExecutionExceptionHandler(
        (exception, command, result) -> complain(exception, err, asksForJson(args)));
    int code = commandLine.execute(args);
    out.flush();
    err.flush();
    return code;
  }

  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }

  private static int complain(Exception exception, PrintWriter err, boolean json) {
    if (exception instanceof Refusal refusal) {
      if (json) {
        err.println(Json.compact(Json.error(refusal)));
      } else {
        err.println("saltspoke: " + sentence(refusal));
      }
      return ExitCode.of(refusal);
    }
    err.println("saltspoke: a fault of the program; please report what follows");
    exception.printStackTrace(err);
    return ExitCode.BUG;
  }

  static String sentence(Refusal refusal) {
    String was = refusal.was().isEmpty() ? "" : " (found: " + refusal.was() + ")";
    return refusal.field()
        + ": "
        + refusal.error().replace('-', ' ')
        + was
        + ". Give instead: "
        + refusal.allowed();
  }

  private static boolean asksForJson(String[] args) {
    return java.util.Arrays.asList(args).contains("--json");
  }

  private static PrintWriter utf8(java.io.PrintStream stream) {
    return new PrintWriter(stream, true, StandardCharsets.UTF_8);
  }
}
