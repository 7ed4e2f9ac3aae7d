package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.faces.json.Json;
import saltspoke.values.Refusal;

/** The server's own behaviour, with resources made for the test. */
@Tag("law")
class WebServerTest {
  private static WebServer server;
  private static String base;
  private static final HttpClient CLIENT = HttpClient.newHttpClient();

  @BeforeAll
  static void start() throws Exception {
    server =
        new WebServer(
            ServerSettings.local(0),
            ServerLimits.USUAL,
            Map.of(
                "/ok", new ResourceHandler(Set.of("GET"), ask -> Reply.json(Json.object())),
                "/echo",
                    new ResourceHandler(
                        Set.of("POST"),
                        ask -> Reply.json(Json.object().put("length", ask.body().length()))),
                "/fault",
                    new ResourceHandler(
                        Set.of("GET"),
                        ask -> {
                          throw new IllegalStateException("secret of the inside");
                        }),
                "/range",
                    new ResourceHandler(
                        Set.of("GET"),
                        ask -> {
                          throw Refusal.outOfRange("latitudeDeg", 95, "-90..90");
                        }),
                "/damaged",
                    new ResourceHandler(
                        Set.of("GET"),
                        ask -> {
                          throw Refusal.dataDamaged("damaged", "a.tif", "", "fetch it again");
                        }),
                "/*", new ResourceHandler(Set.of("GET"), new StaticFiles()::serve)),
            () -> true);
    base = server.start();
  }

  @AfterAll
  static void stop() throws Exception {
    server.close();
  }

  private static HttpResponse<String> get(String path) throws Exception {
    return CLIENT.send(
        HttpRequest.newBuilder(URI.create(base + path)).build(),
        HttpResponse.BodyHandlers.ofString());
  }

  private static HttpResponse<String> post(String path, String body) throws Exception {
    return CLIENT.send(
        HttpRequest.newBuilder(URI.create(base + path))
            .POST(HttpRequest.BodyPublishers.ofString(body))
            .build(),
        HttpResponse.BodyHandlers.ofString());
  }

  @Test
  void bindsTheLoopbackAddress() {
    assertTrue(base.matches("http://127\\.0\\.0\\.1:\\d+/"), base);
  }

  @Test
  void aRefusalBecomesItsStatusAndTheOneErrorForm() throws Exception {
    HttpResponse<String> response = get("range");
    assertEquals(404, response.statusCode());
    assertEquals(
        "{\"error\":\"out-of-range\",\"field\":\"latitudeDeg\",\"was\":\"95\",\"allowed\":\"-90..90\"}",
        response.body());
    assertEquals(503, get("damaged").statusCode());
  }

  @Test
  void aQueryOfTenMegabytesIsRefusedAndTheServerGoesOn() throws Exception {
    try (java.net.Socket socket = new java.net.Socket("127.0.0.1", URI.create(base).getPort())) {
      socket.setSoTimeout(10_000);
      byte[] block = "a".repeat(1 << 16).getBytes(java.nio.charset.StandardCharsets.US_ASCII);
      String answer = "";
      try {
        socket
            .getOutputStream()
            .write("GET /ok?q=".getBytes(java.nio.charset.StandardCharsets.US_ASCII));
        for (int i = 0; i < 160; i++) {
          socket.getOutputStream().write(block);
        }
      } catch (java.io.IOException e) {
        answer = "cut";
      }
      try {
        byte[] head = socket.getInputStream().readNBytes(12);
        answer = new String(head, java.nio.charset.StandardCharsets.US_ASCII);
      } catch (java.io.IOException e) {
        answer = answer.isEmpty() ? "cut" : answer;
      }
      assertTrue(answer.equals("cut") || answer.matches("HTTP/1.1 4(14|31)"), answer);
    }
    assertEquals(200, get("ok").statusCode());
  }

  @Test
  void aQueryBeyondTheHeaderLimitGetsTheErrorFormToo() throws Exception {
    HttpResponse<String> response = get("ok?q=" + "a".repeat(20_000));
    assertTrue(response.statusCode() == 414 || response.statusCode() == 431);
    JsonNode error = Json.MAPPER.readTree(response.body());
    assertEquals("request", error.get("field").asText());
  }

  @Test
  void aBodyUpToTheLimitIsReadAndOneBeyondIsRefused() throws Exception {
    String most = "x".repeat(ResourceHandler.MOST_BODY_BYTES);
    assertEquals("{\"length\":" + most.length() + "}", post("echo", most).body());
    assertEquals(413, post("echo", most + "x").statusCode());
  }

  @Test
  void aBodyThatIsNotUtf8IsRefused() throws Exception {
    HttpResponse<String> response =
        CLIENT.send(
            HttpRequest.newBuilder(URI.create(base + "echo"))
                .POST(HttpRequest.BodyPublishers.ofByteArray(new byte[] {'"', (byte) 0xFF, '"'}))
                .build(),
            HttpResponse.BodyHandlers.ofString());
    assertEquals(400, response.statusCode());
    assertTrue(response.body().contains("unreadable-body"), response.body());
  }

  @Test
  void aMethodThatAResourceLacksIsRefusedWithTheOnesItHas() throws Exception {
    HttpResponse<String> response = post("ok", "{}");
    assertEquals(405, response.statusCode());
    assertEquals("GET", response.headers().firstValue("Allow").orElse(""));
  }

  @Test
  void aFaultTellsNothingOfTheInsideAndNothingIsReflected() throws Exception {
    HttpResponse<String> response = get("fault?q=%3Cscript%3Ealert(1)%3C/script%3E");
    assertEquals(500, response.statusCode());
    assertFalse(response.body().contains("secret"), response.body());
    for (String path :
        new String[] {
          "%3Cscript%3Ealert(1)%3C/script%3E", "ok/%3Cscript%3E", "no.js?%3Cscript%3E"
        }) {
      HttpResponse<String> missing = get(path);
      assertEquals(404, missing.statusCode(), path);
      assertFalse(missing.body().contains("script"), missing.body());
      assertTrue(
          missing.headers().firstValue("Content-Type").orElse("").startsWith("application/json"));
    }
  }

  @Test
  void noFolderIsListed() throws Exception {
    for (String path : new String[] {"css/", "js/", "css", "vendor/leaflet/", "texts/en/"}) {
      assertEquals(404, get(path).statusCode(), path);
    }
  }

  @Test
  void noPathLeadsOutOfThePage() throws Exception {
    for (String path :
        new String[] {
          "../pom.xml", "..%2f..%2fetc/passwd", "%2e%2e/saltspoke/openapi.json", "web/",
          "vendor/leaflet/../../x.js", "saltspoke/faces/cli/Main.class", "a//b.js", "x.js%00.html"
        }) {
      int status = get(path).statusCode();
      assertTrue(status == 400 || status == 404, path + " gave " + status);
    }
  }

  @Test
  void aParameterGivenTwiceIsRefused() throws Exception {
    assertEquals(400, get("ok?q=1&q=2").statusCode());
  }

  @Test
  void everyResponseCarriesTheSafetyHeaders() throws Exception {
    for (String path : new String[] {"ok", "range", "no-such.js"}) {
      HttpResponse<String> response = get(path);
      String policy = response.headers().firstValue("Content-Security-Policy").orElse("");
      assertTrue(policy.contains("default-src 'none'"), path);
      assertFalse(policy.contains("unsafe"), path);
      assertEquals("nosniff", response.headers().firstValue("X-Content-Type-Options").orElse(""));
      assertTrue(response.headers().firstValue("Set-Cookie").isEmpty());
      assertTrue(response.headers().firstValue("Server").isEmpty());
    }
  }
}
