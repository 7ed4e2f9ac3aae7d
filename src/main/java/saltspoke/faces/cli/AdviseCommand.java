package saltspoke.faces.cli;

import com.fasterxml.jackson.core.JsonProcessingException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
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
import saltspoke.faces.json.ProfileJson;
import saltspoke.values.Refusal;
import saltspoke.wheel.RidingProfile;

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
            : answers.advise(parameters, profile(wheel.profileFile, parameters));
    spec.commandLine()
        .getOut()
        .println(
            common.json ? Json.pretty(AdviceJson.of(advice, texts)) : AdviceText.of(advice, texts));
    return ExitCode.DONE;
  }

  private static RidingProfile profile(Path file, Parameters parameters) {
    if (parameters.has("profile")) {
      throw Refusal.wrongUse(
          "two-profiles", "profile", "", "either --profile or --profile-file, not both");
    }
    try {
      return ProfileJson.read(Json.MAPPER.readTree(Files.readAllBytes(file)));
    } catch (JsonProcessingException e) {
      throw Refusal.wrongUse(
          "not-json",
          file + ":" + e.getLocation().getLineNr(),
          "",
          "a JSON object with the fields of a profile");
    } catch (IOException e) {
      throw Refusal.notFound("unreadable-file", "profile-file", file, "a file that can be read");
    }
  }
}
