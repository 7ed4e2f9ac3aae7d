package saltspoke.faces.web;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
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
    String error =
        HttpStatus.getMessage(status).toLowerCase(java.util.Locale.ROOT).replace(' ', '-');
    String allowed =
        status == HttpStatus.URI_TOO_LONG_414
                || status == HttpStatus.REQUEST_HEADER_FIELDS_TOO_LARGE_431
            ? "a query and headers of at most " + WebServer.MOST_HEADER_BYTES + " bytes"
            : "a plain HTTP request";
    byte[] body =
        Json.compact(Json.error(error, "request", "", allowed)).getBytes(StandardCharsets.UTF_8);
    response.getHeaders().put(HttpHeader.CONTENT_TYPE, Reply.JSON);
    response.write(true, ByteBuffer.wrap(body), callback);
    return true;
  }
}
