package saltspoke.faces.web;

import java.io.IOException;
import java.io.InputStream;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import saltspoke.values.Refusal;

/**
 * The page's own files and the map library's, from the class path: only plain names below two known
 * folders, so that no path can lead elsewhere.
 */
final class StaticFiles {
  private static final String LEAFLET = "META-INF/resources/webjars/leaflet/1.9.4/dist/";
  private static final int MAX_AGE_SECONDS = 3600;
  private static final Map<String, String> TYPES =
      Map.of(
          "html", "text/html;charset=utf-8",
          "css", "text/css;charset=utf-8",
          "js", "text/javascript;charset=utf-8",
          "json", "application/json;charset=utf-8",
          "svg", "image/svg+xml",
          "png", "image/png",
          "webmanifest", "application/manifest+json",
          "txt", "text/plain;charset=utf-8");

  private final Map<String, byte[]> kept = new ConcurrentHashMap<>();

  Reply serve(Ask ask) {
    String path = ask.path().equals("/") ? "/index.html" : ask.path();
    String name = path.substring(1);
    String type = TYPES.get(name.substring(name.lastIndexOf('.') + 1));
    if (type == null || !name.matches("[a-z0-9-]+(/[a-z0-9-]+)*(\\.[a-z0-9-]+)+")) {
      throw unknown();
    }
    String resource =
        name.startsWith("vendor/leaflet/")
            ? LEAFLET + name.substring("vendor/leaflet/".length())
            : "web/" + name;
    byte[] body = kept.containsKey(resource) ? kept.get(resource) : load(resource);
    return Reply.kept(type, body, MAX_AGE_SECONDS);
  }

  private byte[] load(String resource) {
    try (InputStream in = StaticFiles.class.getClassLoader().getResourceAsStream(resource)) {
      if (in == null) {
        throw unknown();
      }
      byte[] body = in.readAllBytes();
      kept.put(resource, body);
      return body;
    } catch (IOException e) {
      throw Refusal.dataDamaged("unreadable-page", "page", "", "install the program anew");
    }
  }

  private static Refusal unknown() {
    return Refusal.notFound(
        "no-such-resource", "path", "", "/ or /api/openapi.json lists them all");
  }
}
