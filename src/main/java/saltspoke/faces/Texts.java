package saltspoke.faces;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.ConcurrentHashMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import saltspoke.values.Note;
import saltspoke.values.Refusal;

/**
 * The sentences of one language, by code, with gaps in braces. A code that a language lacks falls
 * back to English.
 */
public final class Texts {
  /** Languages that ship, English first. */
  public static final List<String> LANGUAGES = List.of("en", "de", "fr", "it", "es");

  /** Text files of a language, one per room. */
  public static final List<String> ROOMS =
      List.of("places", "air", "air-climate", "wheel", "cell", "advice", "page", "atlas", "cli");

  private static final Pattern GAP = Pattern.compile("\\{([A-Za-z0-9]+)\\}");
  private static final Map<String, Texts> LOADED = new ConcurrentHashMap<>();

  private final String language;
  private final Map<String, String> sentences;

  private Texts(String language, Map<String, String> sentences) {
    this.language = language;
    this.sentences = Collections.unmodifiableMap(sentences);
  }

  /** The texts of a language of {@link #LANGUAGES}; refused otherwise. */
  public static Texts in(String language) {
    if (!LANGUAGES.contains(language)) {
      throw Refusal.wrongUse(
          "not-a-choice", "lang", Parameters.shortened(language), String.join(", ", LANGUAGES));
    }
    return LOADED.computeIfAbsent(language, Texts::load);
  }

  private static Texts load(String language) {
    Map<String, String> sentences = new TreeMap<>();
    ObjectMapper mapper = new ObjectMapper();
    for (String tongue : List.of("en", language)) {
      for (String room : ROOMS) {
        String path = "web/texts/" + tongue + "/" + room + ".json";
        try (InputStream in = Texts.class.getClassLoader().getResourceAsStream(path)) {
          if (in != null) {
            JsonNode node = mapper.readTree(in);
            node.properties().forEach(e -> sentences.put(e.getKey(), e.getValue().asText()));
          }
        } catch (IOException e) {
          throw Refusal.dataDamaged("unreadable-texts", path, e.getMessage(), "a flat JSON object");
        }
      }
    }
    return new Texts(language, sentences);
  }

  public String language() {
    return language;
  }

  /** All sentences by code. */
  public Map<String, String> all() {
    return sentences;
  }

  /** The sentence of a code without gaps; the code itself where no sentence is known. */
  public String say(String code) {
    return sentences.getOrDefault(code, code);
  }

  /** The sentence of a note with its gaps filled; the code itself where no sentence is known. */
  public String say(Note note) {
    Matcher matcher = GAP.matcher(say(note.code()));
    StringBuilder text = new StringBuilder();
    while (matcher.find()) {
      Object value = note.args().get(matcher.group(1));
      String filled = value == null ? matcher.group() : fill(matcher.group(1), value);
      matcher.appendReplacement(text, Matcher.quoteReplacement(filled));
    }
    matcher.appendTail(text);
    return text.toString();
  }

  /** A value for a gap; the id of a part or choice gives way to its title on the page. */
  private String fill(String gap, Object value) {
    String title =
        sentences.get(gap.equals("part") ? "part-" + value : "page-" + gap + "-" + value);
    return value instanceof String && title != null ? title : format(value);
  }

  /** A number in few digits with this language's decimal sign; other values as they are. */
  public String format(Object value) {
    if (value instanceof Double || value instanceof Float) {
      double number = ((Number) value).doubleValue();
      double size = Math.abs(number);
      String pattern =
          size >= 100 || number == Math.rint(number) ? "%.0f" : size >= 10 ? "%.1f" : "%.2f";
      if (size > 0 && size < 0.01) {
        pattern = "%.1e";
      }
      return String.format(Locale.forLanguageTag(language), pattern, number);
    }
    if (value instanceof String text && sentences.containsKey(text)) {
      return sentences.get(text);
    }
    return String.valueOf(value);
  }
}
