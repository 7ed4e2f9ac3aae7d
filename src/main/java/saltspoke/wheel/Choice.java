package saltspoke.wheel;

import java.util.Arrays;
import java.util.function.Function;
import java.util.stream.Collectors;
import saltspoke.values.Refusal;

/** Turns the text of a choice into the choice, or refuses it and lists what may stand there. */
final class Choice {
  private Choice() {}

  static <E extends Enum<E>> E of(String field, String text, E[] choices, Function<E, String> id) {
    for (E choice : choices) {
      if (id.apply(choice).equals(text)) {
        return choice;
      }
    }
    String allowed = Arrays.stream(choices).map(id).collect(Collectors.joining(", "));
    throw Refusal.wrongUse("unknown-choice", field, text, allowed);
  }

  /** The number, unless it is outside the range or no number at all. */
  static void within(String field, double was, double least, double most, String unit) {
    if (!(was >= least && was <= most)) {
      throw Refusal.outOfRange(field, was, plain(least) + ".." + plain(most) + unit);
    }
  }

  private static String plain(double bound) {
    return bound == Math.rint(bound) ? Long.toString((long) bound) : Double.toString(bound);
  }
}
