package saltspoke.faces.cli;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.PrintWriter;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import saltspoke.advice.Tornado;
import saltspoke.faces.Parameters;
import saltspoke.faces.Questions;
import saltspoke.faces.json.Json;
import saltspoke.values.Refusal;

/** {@code sensitivity}: how far one pairing's interval moves with each assumption. */
@Command(
    name = "sensitivity",
    description = "How far the first look of one pairing moves if each assumption is off.",
    footer = {
      "",
      "Example:",
      "  saltspoke sensitivity --place \"Kiel, DE\" --profile all-winter-commuter \\",
      "      --rim carbon-bare --nipple brass-nickel --interface none --spoke stainless"
    })
final class SensitivityCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;
  @Mixin private PlaceOptions place;
  @Mixin private WheelOptions wheel;
  @Mixin private CorrectionsOption corrections;
  @Mixin private CommonOptions common;

  @Override
  public Integer call() {
    if (wheel.profileFile != null) {
      throw Refusal.wrongUse(
          "not-here", "profile-file", wheel.profileFile, "--profile with a ready profile's name");
    }
    Map<String, String> values = place.values();
    values.putAll(wheel.values());
    Parameters parameters = new Parameters(values, Questions.ADVICE);
    Tornado tornado = Opening.answers(common.data, corrections).prepare().sensitivity(parameters);
    PrintWriter out = spec.commandLine().getOut();
    if (common.json) {
      out.println(Json.pretty(json(tornado)));
      return ExitCode.DONE;
    }
    out.printf(
        Locale.ROOT,
        "First look with nothing moved, limits of practice off: %.2f months%n%n",
        tornado.firstLookMonths());
    out.println("assumption                           low     high   factor  spread");
    for (Tornado.Bar bar : tornado.bars()) {
      out.printf(
          Locale.ROOT,
          "%-32s %7.2f  %7.2f  × %5.2f  %s%n",
          bar.assumption(),
          bar.lowMonths(),
          bar.highMonths(),
          bar.factor(),
          bar.spread());
    }
    return ExitCode.DONE;
  }

  private static ObjectNode json(Tornado tornado) {
    ObjectNode node = Json.object();
    Json.number(node, "firstLookMonths", tornado.firstLookMonths());
    ArrayNode bars = node.putArray("bars");
    for (Tornado.Bar bar : tornado.bars()) {
      ObjectNode entry = bars.addObject();
      entry.put("assumption", bar.assumption());
      entry.put("room", bar.room());
      entry.put("spread", bar.spread());
      Json.number(entry, "lowMonths", bar.lowMonths());
      Json.number(entry, "highMonths", bar.highMonths());
      Json.number(entry, "factor", bar.factor());
    }
    return node;
  }
}
