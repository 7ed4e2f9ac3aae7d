package saltspoke.faces.cli;

import java.io.PrintWriter;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import saltspoke.faces.About;
import saltspoke.faces.json.Json;
import saltspoke.fields.DataSet;

/** {@code about}: version, data set, sources, licences. */
@Command(
    name = "about",
    description = "Version, data set with its sources and licences, libraries with theirs.",
    footer = {"", "Example:", "  saltspoke about --licences"})
final class AboutCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;
  @Mixin private CommonOptions common;

  @Option(names = "--licences", description = "Print the notice of every library and data layer.")
  private boolean licences;

  @Override
  public Integer call() {
    DataSet dataSet = Opening.dataSet(common.data);
    PrintWriter out = spec.commandLine().getOut();
    if (licences) {
      out.println(About.notices(dataSet));
      return ExitCode.DONE;
    }
    out.println(common.json ? Json.pretty(About.json(dataSet)) : About.text(dataSet));
    return ExitCode.DONE;
  }
}
