package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.net.Socket;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import saltspoke.faces.Answers;
import saltspoke.faces.json.Json;
import saltspoke.fields.DataSet;

/** What goes wrong around a running server, and that it goes on. */
@Tag("law")
class FaultsTest {
  private static final HttpClient CLIENT = HttpClient.newHttpClient();

  @TempDir Path temp;

  private static HttpResponse<String> get(String base, String path) throws Exception {
    return CLIENT.send(
        HttpRequest.newBuilder(URI.create(base + path)).build(),
        HttpResponse.BodyHandlers.ofString());
  }

  @Test
  void aDataFileLostOrDamagedWhileServingCostsOnlyWhatNeedsIt() throws Exception {
    Path data = temp.resolve("data");
    copy(Path.of("climate-data"), data);
    try (WebServer server = Api.server(0, new Answers(DataSet.in(data)))) {
      String base = server.start();
      Path france = data.resolve("postcodes/postcodes-fr.csv.gz");
      byte[] sound = Files.readAllBytes(france);
      String asked = "api/air?postcode=75001&country=FR";

      Files.delete(france);
      HttpResponse<String> gone = get(base, asked);
      assertEquals(503, gone.statusCode(), gone.body());
      assertEquals("damaged-data", Json.MAPPER.readTree(gone.body()).get("error").asText());

      byte[] damaged = sound.clone();
      damaged[damaged.length / 2] ^= 1;
      Files.write(france, damaged);
      assertEquals(503, get(base, asked).statusCode());

      assertEquals(200, get(base, "api/air?at=54.32,10.13").statusCode());
      Files.write(france, sound);
      assertEquals(200, get(base, asked).statusCode());
      assertEquals(200, get(base, "health").statusCode());
    }
  }

  private static void copy(Path from, Path to) throws IOException {
    try (Stream<Path> files = Files.walk(from)) {
      for (Path file : (Iterable<Path>) files::iterator) {
        Files.copy(file, to.resolve(from.relativize(file).toString()));
      }
    }
  }

  private static WebServer server(ServerSettings settings, ServerLimits limits) {
    return new WebServer(
        settings,
        limits,
        Map.of(
            "/ok", new ResourceHandler(Set.of("GET"), ask -> Reply.json(Json.object())),
            "/heavy",
                new ResourceHandler(
                    Set.of("GET"),
                    ask -> {
                      throw new OutOfMemoryError("for the test");
                    })),
        () -> true);
  }

  @Test
  void anAnswerThatFindsNoMemoryIsPutOffAndTheServerGoesOn() throws Exception {
    try (WebServer server = server(ServerSettings.local(0), ServerLimits.USUAL)) {
      String base = server.start();
      HttpResponse<String> response = get(base, "heavy");
      assertEquals(503, response.statusCode());
      assertTrue(response.headers().firstValue("Retry-After").isPresent());
      assertEquals(200, get(base, "ok").statusCode());
    }
  }

  @Test
  void moreIdleConnectionsThanAllowedKeepNobodyOut() throws Exception {
    ServerLimits usual = ServerLimits.USUAL;
    ServerLimits few =
        new ServerLimits(
            40,
            usual.mostAtOnce(),
            usual.mostWaiting(),
            usual.longestWait(),
            usual.longestAnswer(),
            usual.longestExchange(),
            usual.longestIdle(),
            Duration.ofSeconds(2));
    List<Socket> idle = new ArrayList<>();
    try (WebServer server = server(ServerSettings.local(0), few)) {
      String base = server.start();
      for (int i = 0; i < 200; i++) {
        idle.add(new Socket("127.0.0.1", URI.create(base).getPort()));
      }
      assertEquals(200, get(base, "ok").statusCode());
    } finally {
      for (Socket socket : idle) {
        socket.close();
      }
    }
  }

  @Test
  void aLogThatCannotBeWrittenStopsNoAnswer() throws Exception {
    Path log = temp.resolve("access.log");
    ServerSettings logged =
        new ServerSettings(
            ServerSettings.LOOPBACK, 0, Optional.empty(), Optional.of(log.toString()));
    try (WebServer server = server(logged, ServerLimits.USUAL)) {
      String base = server.start();
      assertEquals(200, get(base, "ok").statusCode());
      Files.delete(log);
      assertEquals(200, get(base, "ok").statusCode());
    }
  }

  @Test
  void theAccessLogHasTheCommonForm() throws Exception {
    Path log = temp.resolve("common.log");
    ServerSettings logged =
        new ServerSettings(
            ServerSettings.LOOPBACK, 0, Optional.empty(), Optional.of(log.toString()));
    try (WebServer server = server(logged, ServerLimits.USUAL)) {
      get(server.start(), "ok?a=%22b");
    }
    String line = Files.readString(log);
    assertTrue(
        line.matches(
            "127\\.0\\.0\\.1 - - \\[\\d\\d/\\w{3}/\\d{4}:[\\d:]{8} [+-]\\d{4}\\]"
                + " \"GET /ok\\?a=%22b HTTP/1\\.1\" 200 2\\R"),
        line);
  }
}
