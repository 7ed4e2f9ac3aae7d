package saltspoke.faces.web;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import saltspoke.faces.json.Json;

/**
 * What a resource answers.
 *
 * @param contentType media type with charset
 * @param body whole body
 * @param maxAgeSeconds how long a client may keep it; 0 for not at all
 * @param fileName name under which a browser should save it, if it is for saving
 */
record Reply(String contentType, byte[] body, int maxAgeSeconds, Optional<String> fileName) {
  static final String JSON = "application/json;charset=utf-8";

  static Reply json(ObjectNode node) {
    return new Reply(
        JSON, Json.compact(node).getBytes(StandardCharsets.UTF_8), 0, Optional.empty());
  }

  static Reply kept(String contentType, byte[] body, int maxAgeSeconds) {
    return new Reply(contentType, body, maxAgeSeconds, Optional.empty());
  }

  static Reply file(String contentType, byte[] body, String fileName) {
    return new Reply(contentType, body, 0, Optional.of(fileName));
  }
}
