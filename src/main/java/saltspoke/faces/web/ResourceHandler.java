package saltspoke.faces.web;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.Set;
import java.util.function.Function;
import org.eclipse.jetty.http.HttpHeader;
import org.eclipse.jetty.http.HttpStatus;
import org.eclipse.jetty.io.Content;
import org.eclipse.jetty.server.Handler;
import org.eclipse.jetty.server.Request;
import org.eclipse.jetty.server.Response;
import org.eclipse.jetty.util.Callback;
import saltspoke.faces.json.Json;
import saltspoke.values.Refusal;

/**
 * One resource of the API: reads the request, asks, and writes the reply or the refusal as JSON
 * with its status. A bug becomes a 500 that tells nothing of the inside.
 */
final class ResourceHandler extends Handler.Abstract {
  static final int MOST_BODY_BYTES = 64 * 1024;

  private final Set<String> methods;
  private final Function<Ask, Reply> resource;
  private final Deadline deadline;

  ResourceHandler(Set<String> methods, Function<Ask, Reply> resource) {
    this(methods, resource, ServerLimits.USUAL);
  }

  ResourceHandler(Set<String> methods, Function<Ask, Reply> resource, ServerLimits limits) {
    this.methods = methods;
    this.resource = resource;
    this.deadline = new Deadline(limits.longestAnswer());
  }

  @Override
  public boolean handle(Request request, Response response, Callback callback) {
    String method = request.getMethod();
    boolean head = method.equals("HEAD");
    try {
      if (!methods.contains(head ? "GET" : method)) {
        response.getHeaders().put(HttpHeader.ALLOW, String.join(", ", methods));
        write(
            response,
            HttpStatus.METHOD_NOT_ALLOWED_405,
            error("method-not-allowed", "method", "", String.join(", ", methods)),
            callback);
        return true;
      }
      String body = method.equals("POST") ? body(request) : "";
      Ask ask = new Ask(method, request.getHttpURI().getDecodedPath(), Ask.queryOf(request), body);
      Reply reply = deadline.within(() -> resource.apply(ask));
      write(response, HttpStatus.OK_200, reply, callback);
    } catch (Refusal refusal) {
      write(response, status(refusal), Reply.json(Json.error(refusal)), callback);
    } catch (Busy busy) {
      Busy.askAgainLater(response);
      write(
          response,
          HttpStatus.SERVICE_UNAVAILABLE_503,
          error(busy.error(), "request", "", Busy.ALLOWED),
          callback);
    } catch (RuntimeException | LinkageError e) {
      System.err.println(
          "saltspoke: a bug while answering " + request.getHttpURI().getDecodedPath());
      e.printStackTrace();
      write(
          response,
          HttpStatus.INTERNAL_SERVER_ERROR_500,
          error("internal", "", "", "this is a fault of the program; its log says more"),
          callback);
    }
    return true;
  }

  static int status(Refusal refusal) {
    return switch (refusal.kind()) {
      case WRONG_USE -> HttpStatus.BAD_REQUEST_400;
      case NOT_FOUND, OUT_OF_RANGE -> HttpStatus.NOT_FOUND_404;
      case DATA_DAMAGED -> HttpStatus.SERVICE_UNAVAILABLE_503;
    };
  }

  static Reply error(String error, String field, String was, String allowed) {
    return Reply.json(Json.error(error, field, was, allowed));
  }

  private static void write(Response response, int status, Reply reply, Callback callback) {
    response.setStatus(status);
    response.getHeaders().put(HttpHeader.CONTENT_TYPE, reply.contentType());
    response
        .getHeaders()
        .put(
            HttpHeader.CACHE_CONTROL,
            reply.maxAgeSeconds() > 0 ? "public, max-age=" + reply.maxAgeSeconds() : "no-store");
    reply
        .fileName()
        .ifPresent(
            name ->
                response
                    .getHeaders()
                    .put(HttpHeader.CONTENT_DISPOSITION, "attachment; filename=\"" + name + "\""));
    response.getHeaders().put(HttpHeader.CONTENT_LENGTH, reply.body().length);
    response.write(true, ByteBuffer.wrap(reply.body()), callback);
  }

  /** The body, which the server has read before and found within {@link #MOST_BODY_BYTES}. */
  private static String body(Request request) {
    try {
      return Content.Source.asString(request, StandardCharsets.UTF_8);
    } catch (IOException | IllegalArgumentException e) {
      throw Refusal.wrongUse("unreadable-body", "body", "", "a JSON object in UTF-8");
    }
  }
}
