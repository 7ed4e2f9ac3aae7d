package saltspoke.sources;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.SequenceInputStream;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;

/**
 * Streams flat objects out of JSON (RFC 8259) without holding the whole. Text before the first
 * bracket, such as a script's assignment, is passed over.
 */
final class JsonRows {
  private static final JsonFactory FACTORY = new JsonFactory();

  private JsonRows() {}

  /**
   * Calls back with the scalar members of each object in the first array; nested ones are skipped.
   */
  static void forEach(InputStream in, Consumer<Map<String, String>> action) throws IOException {
    int c = in.read();
    while (c >= 0 && c != '[') {
      c = in.read();
    }
    InputStream array = new SequenceInputStream(new ByteArrayInputStream(new byte[] {'['}), in);
    try (JsonParser parser = FACTORY.createParser(array)) {
      parser.nextToken();
      while (parser.nextToken() == JsonToken.START_OBJECT) {
        action.accept(object(parser));
      }
    }
  }

  static Map<String, String> object(JsonParser parser) throws IOException {
    Map<String, String> members = new HashMap<>();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      String name = parser.currentName();
      JsonToken value = parser.nextToken();
      if (value == JsonToken.START_ARRAY || value == JsonToken.START_OBJECT) {
        parser.skipChildren();
      } else if (value != JsonToken.VALUE_NULL) {
        members.put(name, parser.getText());
      }
    }
    return members;
  }

  /** Reads an object whose members are arrays of strings. */
  static Map<String, List<String>> lists(InputStream in) throws IOException {
    Map<String, List<String>> lists = new HashMap<>();
    try (JsonParser parser = FACTORY.createParser(in)) {
      parser.nextToken();
      while (parser.nextToken() == JsonToken.FIELD_NAME) {
        List<String> list = new ArrayList<>();
        lists.put(parser.currentName(), list);
        parser.nextToken();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
          list.add(parser.getText());
        }
      }
    }
    return lists;
  }
}
