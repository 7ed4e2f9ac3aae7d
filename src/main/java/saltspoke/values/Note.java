package saltspoke.values;

import java.util.Collections;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Pattern;

/**
 * Something the program has to say to a person beside a number: a flag, a reason, a caution, an
 * assumption. It carries a code and the values for the gaps in that code's sentence; the sentences
 * stand in the text files under {@code web/texts}, one per language, and are filled in by the
 * faces.
 *
 * @param code lower-case words joined by hyphens, the room first: {@code air-chloride-below-range}
 * @param args gap name → number or text
 */
public record Note(String code, Map<String, Object> args) {
  private static final Pattern CODE = Pattern.compile("[a-z0-9]+(-[a-z0-9]+)+");

  public Note {
    if (!CODE.matcher(code).matches()) {
      throw new IllegalArgumentException("not a note code: " + code);
    }
    args = Collections.unmodifiableMap(new TreeMap<>(args));
  }

  /** A note whose sentence has no gaps. */
  public static Note of(String code) {
    return new Note(code, Map.of());
  }

  /** A note with one gap. */
  public static Note of(String code, String name, Object value) {
    return new Note(code, Map.of(name, value));
  }

  /** A note with two gaps. */
  public static Note of(String code, String name1, Object value1, String name2, Object value2) {
    return new Note(code, Map.of(name1, value1, name2, value2));
  }
}
