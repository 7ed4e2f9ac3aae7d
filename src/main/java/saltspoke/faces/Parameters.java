package saltspoke.faces;

import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.function.Function;
import java.util.stream.Collectors;
import saltspoke.values.Refusal;

/**
 * The named texts of a question, from the command line's options, a query string or a JSON body
 * alike. Every getter refuses what it cannot read and says what may stand there.
 */
public final class Parameters {
  private static final int LONGEST_SHOWN = 80;
  private final Map<String, String> values;

  /**
   * @param values name → text as the user wrote it
   * @param known all names that may occur; any other is refused
   */
  public Parameters(Map<String, String> values, Set<String> known) {
    this.values = new TreeMap<>(values);
    for (String name : this.values.keySet()) {
      if (!known.contains(name)) {
        throw Refusal.wrongUse(
            "unknown-parameter",
            "parameter",
            shortened(name),
            String.join(", ", new TreeSet<>(known)));
      }
    }
  }

  /** Whether the name was given at all, be it empty. */
  public boolean has(String name) {
    return values.containsKey(name);
  }

  /** The text, or nothing when the name was not given; an empty text is refused. */
  public Optional<String> text(String name) {
    String value = values.get(name);
    if (value == null) {
      return Optional.empty();
    }
    if (value.isBlank()) {
      throw Refusal.wrongUse("empty", name, "", "a text that is not empty, or leave it out");
    }
    return Optional.of(value.trim());
  }

  /** A finite number within limits, or nothing when the name was not given. */
  public OptionalDouble number(String name, double least, double most, String unit) {
    Optional<String> text = text(name);
    if (text.isEmpty()) {
      return OptionalDouble.empty();
    }
    String allowed = "a number, " + plain(least) + ".." + plain(most) + unitSuffix(unit);
    double value = parse(name, text.get(), allowed);
    if (!(value >= least && value <= most)) {
      throw Refusal.outOfRange(name, shortened(text.get()), allowed);
    }
    return OptionalDouble.of(value);
  }

  /** A whole number within limits, or the default when the name was not given. */
  public int whole(String name, int least, int most, int otherwise) {
    OptionalDouble value = number(name, least, most, "");
    if (value.isEmpty()) {
      return otherwise;
    }
    if (value.getAsDouble() != Math.rint(value.getAsDouble())) {
      throw Refusal.wrongUse(
          "not-a-whole-number", name, value.getAsDouble(), least + ".." + most + ", whole");
    }
    return (int) value.getAsDouble();
  }

  /** {@code true} or {@code false} (also yes and no), or the default when not given. */
  public boolean flag(String name, boolean otherwise) {
    Optional<String> text = text(name);
    if (text.isEmpty()) {
      return otherwise;
    }
    return switch (text.get()) {
      case "true", "yes" -> true;
      case "false", "no" -> false;
      default ->
          throw Refusal.wrongUse("not-a-choice", name, shortened(text.get()), "true or false");
    };
  }

  /** One of an enum's values by its id, or nothing when not given. */
  public <E extends Enum<E>> Optional<E> choice(
      String name, E[] choices, Function<E, String> idOf) {
    return text(name).map(text -> choose(name, text, choices, idOf));
  }

  /** The enum value with this id; refused with the list of ids otherwise. */
  public static <E extends Enum<E>> E choose(
      String name, String text, E[] choices, Function<E, String> idOf) {
    return Arrays.stream(choices)
        .filter(choice -> idOf.apply(choice).equals(text))
        .findFirst()
        .orElseThrow(
            () ->
                Refusal.wrongUse(
                    "not-a-choice",
                    name,
                    shortened(text),
                    Arrays.stream(choices).map(idOf).collect(Collectors.joining(", "))));
  }

  /** Reads {@code LAT,LON} in degrees. */
  public static double[] latitudeLongitude(String name, String text) {
    String allowed = "LAT,LON in degrees, such as 54.32,10.13";
    String[] parts = text.split(",", -1);
    if (parts.length != 2) {
      throw Refusal.wrongUse("not-coordinates", name, shortened(text), allowed);
    }
    double latitudeDeg = parse("latitudeDeg", parts[0].trim(), allowed);
    double longitudeDeg = parse("longitudeDeg", parts[1].trim(), allowed);
    if (!(Math.abs(latitudeDeg) <= 90)) {
      throw Refusal.outOfRange("latitudeDeg", shortened(parts[0].trim()), "-90..90");
    }
    if (!(Math.abs(longitudeDeg) <= 180)) {
      throw Refusal.outOfRange("longitudeDeg", shortened(parts[1].trim()), "-180..180");
    }
    return new double[] {latitudeDeg, longitudeDeg};
  }

  /** A text cut to a length that is safe to repeat in an error. */
  public static String shortened(String text) {
    return text.length() <= LONGEST_SHOWN ? text : text.substring(0, LONGEST_SHOWN) + "…";
  }

  private static double parse(String name, String text, String allowed) {
    try {
      double value = Double.parseDouble(text);
      if (Double.isFinite(value) && !text.matches(".*[dDfFxX]$")) {
        return value;
      }
    } catch (NumberFormatException e) {
      // Refused below with the text found and what may stand there.
    }
    throw Refusal.wrongUse("not-a-number", name, shortened(text), allowed);
  }

  private static String plain(double value) {
    return value == Math.rint(value) ? Long.toString((long) value) : Double.toString(value);
  }

  private static String unitSuffix(String unit) {
    return unit.isEmpty() ? "" : " " + unit;
  }
}
