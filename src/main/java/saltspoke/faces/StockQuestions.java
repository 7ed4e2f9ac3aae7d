package saltspoke.faces;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import saltspoke.advice.AdviceRequest;
import saltspoke.atlas.stock.Pieces;
import saltspoke.atlas.stock.Preference;
import saltspoke.atlas.stock.StockQuestion;
import saltspoke.sources.CsvTable;
import saltspoke.values.Refusal;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.RidingProfile;

/** Reads what is asked of a customer list. */
public final class StockQuestions {
  /** Names that such a question may carry. */
  public static final Set<String> NAMES = names();

  /** Profile of rows that name none, unless the question does. */
  public static final String USUAL_PROFILE = "year-round-club";

  /** Wheels go into service before the winter, common practice. */
  private static final int USUAL_BUILD_MONTH = 10;

  private static final int USUAL_PACK = 100;
  private static final double USUAL_LEAD_WEEKS = 6;

  private StockQuestions() {}

  private static Set<String> names() {
    Set<String> names = new TreeSet<>(Questions.ATLAS);
    names.removeAll(List.of("age-months", "last-finding", "practice-limits", "units"));
    names.addAll(List.of("wanted-months", "pack", "lead-weeks"));
    return names;
  }

  /** The question, for a profile and an order of preference that are already known. */
  static StockQuestion question(
      Parameters parameters, RidingProfile profile, List<Preference> preference) {
    AdviceRequest wheel = Questions.wheel(parameters, profile);
    return new StockQuestion(
        profile,
        new Pairing(
            or(wheel.rim(), "carbon-bare"),
            or(wheel.nipple(), "aluminium-anodised-thin"),
            or(wheel.between(), "none"),
            or(wheel.spoke(), "stainless")),
        wheel.build(),
        wheel.risk(),
        parameters.whole("build-month", 1, 12, USUAL_BUILD_MONTH),
        parameters
            .number("wanted-months", 1, 24, "months")
            .orElse(StockQuestion.USUAL_WANTED_MONTHS),
        preference);
  }

  private static String or(String given, String otherwise) {
    return given == null ? otherwise : given;
  }

  /** How the shop buys, with what it has in hand. */
  public static Pieces.Buying buying(Parameters parameters, Map<Pieces.Article, Long> inHand) {
    return new Pieces.Buying(
        parameters.whole("pack", 1, 100_000, USUAL_PACK),
        parameters.number("lead-weeks", 0, 52, "weeks").orElse(USUAL_LEAD_WEEKS),
        inHand);
  }

  /**
   * What is in hand: columns kind (nipple or interface), id, pieces.
   *
   * @throws Refusal with file and row for an unknown kind or id, or a number that is none
   */
  public static Map<Pieces.Article, Long> inHand(List<CsvTable.Row> rows, Catalogue catalogue) {
    Map<Pieces.Article, Long> pieces = new TreeMap<>();
    for (CsvTable.Row row : rows) {
      String id = row.text("id");
      String kind = row.text("kind");
      switch (kind) {
        case "nipple" -> catalogue.nipple(id);
        case "interface" -> catalogue.between(id);
        default ->
            throw Refusal.wrongUse(
                "not-a-choice", row.where() + " kind", kind, "nipple, interface");
      }
      pieces.merge(
          new Pieces.Article(kind, id),
          (long) row.whole("pieces", 0, Integer.MAX_VALUE),
          Long::sum);
    }
    return pieces;
  }
}
