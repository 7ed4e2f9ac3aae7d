package saltspoke.faces.cli;

import com.fasterxml.jackson.core.JsonProcessingException;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import picocli.CommandLine.Option;
import saltspoke.faces.Parameters;
import saltspoke.faces.Texts;
import saltspoke.faces.json.Json;
import saltspoke.faces.json.ProfileJson;
import saltspoke.values.Refusal;
import saltspoke.wheel.RidingProfile;

/** The options that say how the bicycle is ridden and what its wheel is made of. */
final class WheelOptions {
  @Option(
      names = "--profile",
      paramLabel = "NAME",
      description = "A ready riding profile; 'saltspoke pairings' lists them.")
  private String profile;

  @Option(
      names = "--profile-file",
      paramLabel = "FILE",
      description = "A riding profile of your own, as JSON (see 'saltspoke pairings --json').")
  Path profileFile;

  @Option(names = "--rim", paramLabel = "R", description = "Rim id; all rims when left out.")
  private String rim;

  @Option(names = "--nipple", paramLabel = "N", description = "Nipple id; all when left out.")
  private String nipple;

  @Option(
      names = "--interface",
      paramLabel = "I",
      description = "What lies between nipple and rim; all when left out.")
  private String between;

  @Option(names = "--spoke", paramLabel = "S", description = "Spoke id; all when left out.")
  private String spoke;

  @Option(
      names = "--risk",
      paramLabel = "LEVEL",
      description = "cautious, usual or relaxed (usual when left out).")
  private String risk;

  @Option(
      names = "--build-month",
      paramLabel = "1..12",
      description = "Month in which the wheel goes or went into service (1 when left out).")
  private String buildMonth;

  @Option(
      names = "--age-months",
      paramLabel = "N",
      description = "Months a wheel has been in service already (0 when left out).")
  private String ageMonths;

  @Option(
      names = "--last-finding",
      paramLabel = "F",
      description = "What the last look found: not-looked, clean, powder or one-stiff.")
  private String lastFinding;

  @Option(
      names = "--practice-limits",
      paramLabel = "true|false",
      description = "Hold intervals within the limits of common practice (true when left out).")
  private String practiceLimits;

  @Option(names = "--spokes", paramLabel = "N", description = "Spokes in the wheel (28).")
  private String spokes;

  @Option(names = "--tension", paramLabel = "N", description = "Mean spoke tension, newton (1100).")
  private String tension;

  @Option(
      names = "--tape-sound",
      paramLabel = "true|false",
      description = "Whether the rim tape is tight (true).")
  private String tapeSound;

  @Option(
      names = "--hidden-nipples",
      paramLabel = "true|false",
      description = "Whether the nipples sit inside the rim (false).")
  private String hiddenNipples;

  Map<String, String> values() {
    Map<String, String> values = new LinkedHashMap<>();
    PlaceOptions.put(values, "profile", profile);
    PlaceOptions.put(values, "rim", rim);
    PlaceOptions.put(values, "nipple", nipple);
    PlaceOptions.put(values, "interface", between);
    PlaceOptions.put(values, "spoke", spoke);
    PlaceOptions.put(values, "risk", risk);
    PlaceOptions.put(values, "build-month", buildMonth);
    PlaceOptions.put(values, "age-months", ageMonths);
    PlaceOptions.put(values, "last-finding", lastFinding);
    PlaceOptions.put(values, "practice-limits", practiceLimits);
    PlaceOptions.put(values, "spokes", spokes);
    PlaceOptions.put(values, "tension", tension);
    PlaceOptions.put(values, "tape-sound", tapeSound);
    PlaceOptions.put(values, "hidden-nipples", hiddenNipples);
    return values;
  }

  /** Parts and profile as people call them; empty when none is named. */
  String title(Texts texts) {
    Map<String, String> titles = new LinkedHashMap<>(values());
    titles.keySet().retainAll(List.of("profile", "rim", "nipple", "interface", "spoke"));
    return titles.entrySet().stream()
        .map(part -> texts.say("page-" + part.getKey() + "-" + part.getValue()))
        .collect(Collectors.joining(" · "));
  }

  /** The profile in the file that was named. */
  RidingProfile ownProfile(Parameters parameters) {
    if (parameters.has("profile")) {
      throw Refusal.wrongUse(
          "two-profiles", "profile", "", "either --profile or --profile-file, not both");
    }
    try {
      return ProfileJson.read(Json.MAPPER.readTree(Files.readAllBytes(profileFile)));
    } catch (JsonProcessingException e) {
      throw Refusal.wrongUse(
          "not-json",
          profileFile + ":" + e.getLocation().getLineNr(),
          "",
          "a JSON object with the fields of a profile");
    } catch (IOException e) {
      throw Refusal.notFound(
          "unreadable-file", "profile-file", profileFile, "a file that can be read");
    }
  }
}
