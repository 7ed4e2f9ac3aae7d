package saltspoke.fuzz;

import static org.junit.jupiter.api.Assertions.assertFalse;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.ShrinkingMode;
import net.jqwik.api.Tag;
import saltspoke.faces.Answers;
import saltspoke.faces.Parameters;
import saltspoke.faces.PlaceQuestion;
import saltspoke.faces.Questions;
import saltspoke.faces.json.AdviceJson;
import saltspoke.faces.json.Json;
import saltspoke.fields.DataSet;
import saltspoke.values.Refusal;

/** Questions from sound and broken values: each gets an answer in finite numbers or a refusal. */
@Tag("law")
class QueryFuzzTest {
  /** An answer costs a thousand times what reading a question does. */
  private static final int ANSWERED_ONE_IN = 32;

  private static final Answers ANSWERS = new Answers(DataSet.shipped());
  private static final List<String> NAMES = List.copyOf(Questions.ADVICE);
  private static final Map<String, List<String>> SOUND =
      Map.ofEntries(
          Map.entry("at", List.of("54.32,10.13", "-33.9,18.4", "89.9,0", "-90,180", "0,-180")),
          Map.entry("place", List.of("Kiel, DE", "Springfield", "St", "Łódź", "'s-Hertogenbosch")),
          Map.entry("postcode", List.of("24103", "SW1A 1AA", "0", "00-001")),
          Map.entry("country", List.of("DE", "US", "fr", "XX", "GB")),
          Map.entry("elevation", List.of("0", "-400", "5000")),
          Map.entry("sea-distance", List.of("0", "0.001", "3000")),
          Map.entry("setting", List.of("urban", "rural", "industrial")),
          Map.entry("lang", List.of("en", "de", "xx")),
          Map.entry("profile", List.of("all-winter-commuter", "trainer-only", "nobody")),
          Map.entry("rim", List.of("carbon-bare", "wood")),
          Map.entry("nipple", List.of("brass-nickel", "aluminium-bare")),
          Map.entry("interface", List.of("none")),
          Map.entry("spoke", List.of("stainless")),
          Map.entry("risk", List.of("cautious", "usual", "relaxed")),
          Map.entry("build-month", List.of("1", "12", "13")),
          Map.entry("age-months", List.of("0", "0.0001", "14", "240")),
          Map.entry("last-finding", List.of("clean", "powder", "one-stiff", "not-looked")),
          Map.entry("practice-limits", List.of("true", "no")),
          Map.entry("spokes", List.of("12", "28", "48")),
          Map.entry("tension", List.of("300", "2000")),
          Map.entry("tape-sound", List.of("yes")),
          Map.entry("hidden-nipples", List.of("true")),
          Map.entry("units", List.of("metric", "us")));

  @Provide
  Arbitrary<Long> any() {
    return Arbitraries.longs().withoutEdgeCases();
  }

  @Property(shrinking = ShrinkingMode.OFF)
  void aQuestionIsAnsweredOrRefused(@ForAll("any") long number) {
    Random random = new Random(number);
    Map<String, String> asked = question(random);
    boolean toTheEnd = random.nextInt(ANSWERED_ONE_IN) == 0;
    try {
      Parameters parameters = new Parameters(asked, Questions.ADVICE);
      if (toTheEnd && asked.containsKey("rim") && asked.containsKey("nipple")) {
        var advice = ANSWERS.advise(parameters);
        String json = Json.compact(AdviceJson.of(advice, Answers.textsFor(parameters)));
        assertFalse(json.contains("NaN") || json.contains("Infinity"), asked.toString());
      } else {
        PlaceQuestion.from(parameters);
        Questions.wheel(parameters, ANSWERS.profiles().get("trainer-only"));
      }
    } catch (Refusal expected) {
      // A refusal is an answer.
    }
  }

  /** Mostly sound, so that it gets past the first check. */
  private static Map<String, String> question(Random random) {
    Map<String, String> asked = new TreeMap<>();
    asked.put(pick(List.of("at", "at", "place", "postcode"), random), "");
    asked.put("profile", "");
    for (String name : List.of("rim", "nipple", "interface", "spoke")) {
      if (random.nextInt(8) > 0) {
        asked.put(name, "");
      }
    }
    for (int i = random.nextInt(5); i > 0; i--) {
      asked.put(pick(NAMES, random), "");
    }
    for (String name : new ArrayList<>(asked.keySet())) {
      String value = pick(SOUND.get(name), random);
      asked.put(name, random.nextInt(12) == 0 ? damaged(value, random) : value);
    }
    if (random.nextInt(3) == 0 && asked.containsKey("at")) {
      asked.put("at", random.nextDouble() * 180 - 90 + "," + (random.nextDouble() * 360 - 180));
    }
    return asked;
  }

  private static String damaged(String value, Random random) {
    byte[] bytes = value.getBytes(java.nio.charset.StandardCharsets.UTF_8);
    return new String(Mutant.of(bytes, random), java.nio.charset.StandardCharsets.UTF_8);
  }

  private static String pick(List<String> from, Random random) {
    return from.get(random.nextInt(from.size()));
  }
}
