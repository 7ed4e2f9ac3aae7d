package saltspoke.faces.cli;

import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import saltspoke.atmosphere.AirClimate;
import saltspoke.faces.Answers;
import saltspoke.faces.Parameters;
import saltspoke.faces.PlaceQuestion;
import saltspoke.faces.Questions;
import saltspoke.faces.Texts;
import saltspoke.faces.json.AirJson;
import saltspoke.faces.json.Json;

/** {@code air}: the outside air at a place and what it does to the four standard metals. */
@Command(
    name = "air",
    description = "The outside air at a place: climate by month, salt, SO2, ISO 9223 corrosivity.",
    footer = {
      "",
      "Examples:",
      "  saltspoke air --place Valparaiso",
      "  saltspoke air --at 57.05,9.92 --sea-distance 3 --setting port --json"
    })
final class AirCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;
  @Mixin private PlaceOptions place;
  @Mixin private CorrectionsOption corrections;
  @Mixin private CommonOptions common;

  @Override
  public Integer call() {
    Map<String, String> values = place.values();
    PlaceOptions.put(values, "lang", common.language);
    Parameters parameters = new Parameters(values, Questions.AIR);
    Texts texts = Answers.textsFor(parameters);
    PlaceQuestion question = PlaceQuestion.from(parameters);
    AirClimate air = Opening.answers(common.data, corrections).prepare().air(question);
    spec.commandLine()
        .getOut()
        .println(common.json ? Json.pretty(AirJson.of(air, texts)) : AirText.of(air, texts));
    return ExitCode.DONE;
  }
}
