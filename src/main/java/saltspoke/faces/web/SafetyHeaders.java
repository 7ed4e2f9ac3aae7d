package saltspoke.faces.web;

import org.eclipse.jetty.http.HttpFields;
import org.eclipse.jetty.server.Handler;
import org.eclipse.jetty.server.Request;
import org.eclipse.jetty.server.Response;
import org.eclipse.jetty.util.Callback;

/** Puts the headers on every response that keep a browser from doing more than the page needs. */
final class SafetyHeaders extends Handler.Wrapper {
  static final String CONTENT_SECURITY_POLICY =
      "default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self' data:;"
          + " connect-src 'self'; font-src 'self'; manifest-src 'self'; base-uri 'none';"
          + " form-action 'self'; frame-ancestors 'none'";

  SafetyHeaders(Handler handler) {
    super(handler);
  }

  @Override
  public boolean handle(Request request, Response response, Callback callback) throws Exception {
    HttpFields.Mutable headers = response.getHeaders();
    headers.put("Content-Security-Policy", CONTENT_SECURITY_POLICY);
    headers.put("X-Content-Type-Options", "nosniff");
    headers.put("X-Frame-Options", "DENY");
    headers.put("Referrer-Policy", "no-referrer");
    headers.put("Cross-Origin-Opener-Policy", "same-origin");
    headers.put("Cross-Origin-Resource-Policy", "same-origin");
    headers.put("Permissions-Policy", "geolocation=(self), camera=(), microphone=()");
    return super.handle(request, response, callback);
  }
}
