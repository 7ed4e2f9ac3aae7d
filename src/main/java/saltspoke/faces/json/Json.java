package saltspoke.faces.json;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.SerializationFeature;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Collection;
import java.util.Map;
import saltspoke.faces.Texts;
import saltspoke.values.Note;
import saltspoke.values.Quantiles;
import saltspoke.values.Refusal;

/**
 * Building blocks of the JSON answers: numbers that are always finite, quantiles, notes, errors.
 */
public final class Json {
  /** The one mapper; its configuration never changes after class initialisation. */
  public static final ObjectMapper MAPPER =
      new ObjectMapper().configure(SerializationFeature.INDENT_OUTPUT, false);

  private static final JsonNodeFactory NODES = JsonNodeFactory.withExactBigDecimals(false);
  private static final MathContext SIX_DIGITS = new MathContext(6);

  private Json() {}

  public static ObjectNode object() {
    return NODES.objectNode();
  }

  public static ArrayNode array() {
    return NODES.arrayNode();
  }

  /**
   * Puts a number in six significant digits; one that is not finite is a bug and is thrown as such.
   */
  public static void number(ObjectNode node, String name, double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalStateException(name + " is not finite");
    }
    node.put(name, new BigDecimal(value).round(SIX_DIGITS).doubleValue());
  }

  /** Puts a number, or null where there is none. */
  public static void numberOrNull(ObjectNode node, String name, Double value) {
    if (value == null) {
      node.putNull(name);
    } else {
      number(node, name, value);
    }
  }

  public static ObjectNode quantiles(Quantiles quantiles) {
    ObjectNode node = object();
    number(node, "p10", quantiles.p10());
    number(node, "median", quantiles.median());
    number(node, "p90", quantiles.p90());
    return node;
  }

  public static ArrayNode notes(Collection<Note> notes, Texts texts) {
    ArrayNode array = array();
    notes.forEach(note -> array.add(note(note, texts)));
    return array;
  }

  /** A note as its code, its sentence in the asked-for language, and the values in it. */
  public static ObjectNode note(Note note, Texts texts) {
    ObjectNode node = object();
    node.put("code", note.code());
    node.put("text", texts.say(note));
    if (!note.args().isEmpty()) {
      ObjectNode args = node.putObject("args");
      for (Map.Entry<String, Object> arg : note.args().entrySet()) {
        if (arg.getValue() instanceof Number value) {
          number(args, arg.getKey(), value.doubleValue());
        } else {
          args.put(arg.getKey(), String.valueOf(arg.getValue()));
        }
      }
    }
    return node;
  }

  /** The one form of an error, for every face. */
  public static ObjectNode error(Refusal refusal) {
    return error(refusal.error(), refusal.field(), refusal.was(), refusal.allowed());
  }

  public static ObjectNode error(String error, String field, String was, String allowed) {
    ObjectNode node = object();
    node.put("error", error);
    node.put("field", field);
    node.put("was", was);
    node.put("allowed", allowed);
    return node;
  }

  public static String compact(ObjectNode node) {
    return write(node, false);
  }

  public static String pretty(ObjectNode node) {
    return write(node, true);
  }

  private static String write(ObjectNode node, boolean indented) {
    try {
      return indented
          ? MAPPER.writerWithDefaultPrettyPrinter().writeValueAsString(node)
          : MAPPER.writeValueAsString(node);
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("an answer could not be written as JSON", e);
    }
  }
}
