package saltspoke.faces.cli;

import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import saltspoke.advice.Advice;
import saltspoke.faces.Answers;
import saltspoke.faces.Parameters;
import saltspoke.faces.Questions;
import saltspoke.faces.Texts;
import saltspoke.faces.json.AdviceJson;
import saltspoke.faces.json.Json;

/** {@code advise}: when to look at a wheel at a place, for one pairing or all of them. */
@Command(
    name = "advise",
    description = "When to look at a wheel: inspection intervals per pairing of rim and nipple.",
    footer = {
      "",
      "Examples:",
      "  saltspoke advise --place \"Kiel, DE\" --profile all-winter-commuter",
      "  saltspoke advise --postcode 98101 --country US --profile weekend-gravel \\",
      "      --rim carbon-bare --nipple aluminium-anodised-thin --interface none --spoke stainless",
      "  saltspoke advise --at 54.32,10.13 --profile-file mine.json --age-months 14 \\",
      "      --last-finding powder --json"
    })
final class AdviseCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;
  @Mixin private PlaceOptions place;
  @Mixin private WheelOptions wheel;
  @Mixin private CorrectionsOption corrections;
  @Mixin private CommonOptions common;

  @Override
  public Integer call() {
    Map<String, String> values = place.values();
    values.putAll(wheel.values());
    PlaceOptions.put(values, "lang", common.language);
    Parameters parameters = new Parameters(values, Questions.ADVICE);
    Texts texts = Answers.textsFor(parameters);
    Answers answers = Opening.answers(common.data, corrections).prepare();
    Advice advice =
        wheel.profileFile == null
            ? answers.advise(parameters)
            : answers.advise(parameters, wheel.ownProfile(parameters));
    spec.commandLine()
        .getOut()
        .println(
            common.json ? Json.pretty(AdviceJson.of(advice, texts)) : AdviceText.of(advice, texts));
    return ExitCode.DONE;
  }
}
