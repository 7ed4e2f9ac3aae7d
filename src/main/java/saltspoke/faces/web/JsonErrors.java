package saltspoke.faces.web;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.ByteBuffer;
import org.eclipse.jetty.http.HttpHeader;
import org.eclipse.jetty.http.HttpStatus;
import org.eclipse.jetty.server.Request;
import org.eclipse.jetty.server.Response;
import org.eclipse.jetty.server.handler.ErrorHandler;
import org.eclipse.jetty.util.Callback;
import saltspoke.faces.json.Json;

/** What the server itself refuses (a request line too long, a bad header), as the same JSON. */
final class JsonErrors extends ErrorHandler {
  @Override
  public boolean handle(Request request, Response response, Callback callback) {
    int status = response.getStatus();
    if (status == HttpStatus.SERVICE_UNAVAILABLE_503) {
      Busy.askAgainLater(response);
      return write(response, Json.error(Busy.CROWDED, "request", "", Busy.ALLOWED), callback);
    }
    if (status == HttpStatus.PAYLOAD_TOO_LARGE_413) {
      String most = "at most " + ResourceHandler.MOST_BODY_BYTES + " bytes";
      return write(response, Json.error("too-large", "body", "", most), callback);
    }
    String error =
        HttpStatus.getMessage(status).toLowerCase(java.util.Locale.ROOT).replace(' ', '-');
    String allowed =
        status == HttpStatus.URI_TOO_LONG_414
                || status == HttpStatus.REQUEST_HEADER_FIELDS_TOO_LARGE_431
            ? "a query and headers of at most " + WebServer.MOST_HEADER_BYTES + " bytes"
            : "a plain HTTP request";
    return write(response, Json.error(error, "request", "", allowed), callback);
  }

  private static boolean write(Response response, ObjectNode error, Callback callback) {
    response.getHeaders().put(HttpHeader.CONTENT_TYPE, Reply.JSON);
    response.write(true, ByteBuffer.wrap(Reply.json(error).body()), callback);
    return true;
  }
}
