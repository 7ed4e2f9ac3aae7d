package saltspoke.faces.web;

import org.eclipse.jetty.http.HttpHeader;
import org.eclipse.jetty.server.Response;

/** "Not now": answered with 503 and when to come again. */
final class Busy extends RuntimeException {
  /** The error code of a server that has no room for a request. */
  static final String CROWDED = "busy";

  static final String ALLOWED = "the same request some seconds later";

  private static final long serialVersionUID = 1L;
  private static final int RETRY_AFTER_SECONDS = 2;

  private final String error;

  /**
   * @param error code of the error form, such as {@code took-too-long}
   */
  Busy(String error) {
    super(error, null, false, false);
    this.error = error;
  }

  String error() {
    return error;
  }

  static void askAgainLater(Response response) {
    response.getHeaders().put(HttpHeader.RETRY_AFTER, RETRY_AFTER_SECONDS);
  }
}
