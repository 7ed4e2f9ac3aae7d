package saltspoke.faces.web;

import java.util.LinkedHashMap;
import java.util.Map;
import org.eclipse.jetty.server.Request;
import org.eclipse.jetty.util.Fields;
import saltspoke.faces.Parameters;
import saltspoke.values.Refusal;

/**
 * A request as a resource sees it.
 *
 * @param method GET or POST
 * @param path decoded path below the context
 * @param query each name once
 * @param body text of a POST, empty otherwise
 */
record Ask(String method, String path, Map<String, String> query, String body) {

  /** Reads the query; a name given twice is refused. */
  static Map<String, String> queryOf(Request request) {
    Fields fields;
    try {
      fields = Request.extractQueryParameters(request);
    } catch (RuntimeException e) {
      throw Refusal.wrongUse("bad-query", "query", "", "a query string in UTF-8, percent-encoded");
    }
    Map<String, String> query = new LinkedHashMap<>();
    for (Fields.Field field : fields) {
      if (field.getValues().size() > 1) {
        throw Refusal.wrongUse(
            "given-twice", Parameters.shortened(field.getName()), "", "each parameter once");
      }
      query.put(field.getName(), field.getValue());
    }
    return query;
  }
}
