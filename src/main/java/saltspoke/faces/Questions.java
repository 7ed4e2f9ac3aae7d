package saltspoke.faces;

import java.util.Set;
import java.util.TreeSet;
import saltspoke.advice.AdviceRequest;
import saltspoke.advice.Finding;
import saltspoke.advice.RiskLevel;
import saltspoke.values.Refusal;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.WheelBuild;

/** The parameter names of each question and how a wheel question is read from them. */
public final class Questions {
  /** Names that a question about the air may carry. */
  public static final Set<String> AIR =
      Set.of("at", "place", "postcode", "country", "elevation", "sea-distance", "setting", "lang");

  private static final Set<String> WHEEL =
      Set.of(
          "profile",
          "rim",
          "nipple",
          "interface",
          "spoke",
          "risk",
          "build-month",
          "age-months",
          "last-finding",
          "practice-limits",
          "spokes",
          "tension",
          "tape-sound",
          "hidden-nipples",
          "units");

  /** Names that a question about a wheel may carry. */
  public static final Set<String> ADVICE = union(AIR, WHEEL);

  /** Names that an atlas of the first look may carry. */
  public static final Set<String> ATLAS = union(WHEEL, Set.of("lang"));

  /** Names that a question about a region may carry. */
  public static final Set<String> REGION = union(ATLAS, Set.of("region", "sample"));

  /** Names that a search for places may carry. */
  public static final Set<String> PLACES = Set.of("q", "limit", "lang");

  private Questions() {}

  /** Reads the wheel part of a question, for a profile that is already known. */
  public static AdviceRequest wheel(Parameters parameters, RidingProfile profile) {
    WheelBuild usual = WheelBuild.USUAL;
    WheelBuild build =
        new WheelBuild(
            parameters.whole("spokes", 12, 48, usual.spokeCount()),
            parameters.number("tension", 300, 2000, "N").orElse(usual.tensionN()),
            parameters.flag("tape-sound", usual.tapeSound()),
            parameters.flag("hidden-nipples", usual.hiddenNipples()));
    double ageMonths = parameters.number("age-months", 0, 240, "months").orElse(0);
    Finding finding =
        parameters.choice("last-finding", Finding.values(), Finding::id).orElse(Finding.NOT_LOOKED);
    if (finding != Finding.NOT_LOOKED && ageMonths == 0) {
      throw Refusal.wrongUse(
          "finding-without-age",
          "last-finding",
          finding.id(),
          "age-months with it: how long the wheel has been in service");
    }
    return new AdviceRequest(
        profile,
        build,
        parameters.text("rim").orElse(null),
        parameters.text("nipple").orElse(null),
        parameters.text("interface").orElse(null),
        parameters.text("spoke").orElse(null),
        parameters.choice("risk", RiskLevel.values(), RiskLevel::id).orElse(RiskLevel.USUAL),
        parameters.whole("build-month", 1, 12, 1),
        ageMonths,
        finding,
        parameters.flag("practice-limits", true));
  }

  private static Set<String> union(Set<String> one, Set<String> other) {
    Set<String> all = new TreeSet<>(one);
    all.addAll(other);
    return Set.copyOf(all);
  }
}
