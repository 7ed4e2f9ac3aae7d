package saltspoke.faces.web;

import static java.nio.charset.StandardCharsets.US_ASCII;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.net.Socket;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicBoolean;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.faces.json.Json;
import saltspoke.values.Stopped;

/** Crowds, endless work and slow clients against a server with small limits. */
@Tag("law")
class FloodTest {
  private static final ServerLimits SMALL =
      new ServerLimits(
          50,
          2,
          4,
          Duration.ofMillis(400),
          Duration.ofMillis(600),
          Duration.ofMillis(1500),
          Duration.ofMillis(1000),
          Duration.ofSeconds(5));

  private final HttpClient client = HttpClient.newHttpClient();
  private final CountDownLatch open = new CountDownLatch(1);
  private final AtomicBoolean stopped = new AtomicBoolean();
  private WebServer server;
  private URI base;

  @BeforeEach
  void start() throws Exception {
    server =
        new WebServer(
            ServerSettings.local(0),
            SMALL,
            Map.of(
                "/ok", new ResourceHandler(Set.of("GET"), ask -> ok(), SMALL),
                "/door", new ResourceHandler(Set.of("GET"), ask -> door(), SMALL),
                "/endless", new ResourceHandler(Set.of("GET"), ask -> endless(), SMALL),
                "/echo", new ResourceHandler(Set.of("POST"), ask -> ok(), SMALL),
                "/big", new ResourceHandler(Set.of("GET"), ask -> big(), SMALL)),
            () -> true);
    base = URI.create(server.start());
  }

  @AfterEach
  void stop() throws Exception {
    open.countDown();
    server.close();
  }

  private static Reply ok() {
    return Reply.json(Json.object());
  }

  private Reply door() {
    try {
      open.await(400, TimeUnit.MILLISECONDS);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
    return ok();
  }

  private Reply endless() {
    try {
      while (true) {
        Stopped.check();
        Thread.onSpinWait();
      }
    } catch (Stopped e) {
      stopped.set(true);
      throw e;
    }
  }

  private static Reply big() {
    return Reply.kept("text/plain", new byte[64 << 20], 0);
  }

  private HttpRequest ask(String path) {
    return HttpRequest.newBuilder(base.resolve(path)).timeout(Duration.ofSeconds(20)).build();
  }

  private int status(String path) throws Exception {
    return client.send(ask(path), HttpResponse.BodyHandlers.discarding()).statusCode();
  }

  @Test
  void aCrowdIsTurnedAwayWithATimeToComeAgainAndTheServerRecovers() throws Exception {
    List<CompletableFuture<HttpResponse<String>>> crowd = new ArrayList<>();
    for (int i = 0; i < 40; i++) {
      crowd.add(client.sendAsync(ask("door"), HttpResponse.BodyHandlers.ofString()));
    }
    int served = 0;
    int turnedAway = 0;
    for (CompletableFuture<HttpResponse<String>> one : crowd) {
      HttpResponse<String> response = one.get(20, TimeUnit.SECONDS);
      if (response.statusCode() == 200) {
        served++;
      } else {
        turnedAway++;
        assertEquals(503, response.statusCode());
        assertEquals("2", response.headers().firstValue("Retry-After").orElse(""));
        assertEquals("busy", Json.MAPPER.readTree(response.body()).get("error").asText());
      }
    }
    assertTrue(served >= SMALL.mostAtOnce(), served + " served");
    assertTrue(turnedAway > 0);
    assertEquals(200, status("ok"));
  }

  @Test
  void probesAnswerWhileAllPlacesAreTaken() throws Exception {
    List<CompletableFuture<HttpResponse<String>>> crowd = new ArrayList<>();
    for (int i = 0; i < SMALL.mostAtOnce() + SMALL.mostWaiting(); i++) {
      crowd.add(client.sendAsync(ask("door"), HttpResponse.BodyHandlers.ofString()));
    }
    assertEquals(200, status("health"));
    assertEquals(200, status("ready"));
    String metrics = client.send(ask("metrics"), HttpResponse.BodyHandlers.ofString()).body();
    assertTrue(metrics.contains("saltspoke_requests_active "), metrics);
    open.countDown();
    for (var one : crowd) {
      one.get(20, TimeUnit.SECONDS);
    }
  }

  @Test
  void endlessWorkIsStopped() throws Exception {
    HttpResponse<String> response =
        client.send(ask("endless"), HttpResponse.BodyHandlers.ofString());
    assertEquals(503, response.statusCode());
    assertEquals("took-too-long", Json.MAPPER.readTree(response.body()).get("error").asText());
    assertTrue(stopped.get());
    for (int i = 0; i < 20; i++) {
      assertEquals(200, status("ok"), "no interrupt is left over");
    }
  }

  @Test
  void aHeadThatComesByteByByteIsCut() throws Exception {
    assertTrue(isCut("GET /ok HTTP/1.1\r\nHost: x\r\nX-Long: " + "a".repeat(400)));
    assertEquals(200, status("ok"));
  }

  @Test
  void aBodyThatComesByteByByteIsCutAndHoldsNoPlace() throws Exception {
    List<CompletableFuture<Boolean>> slow = new ArrayList<>();
    for (int i = 0; i < SMALL.mostAtOnce() + SMALL.mostWaiting() + 4; i++) {
      slow.add(
          CompletableFuture.supplyAsync(
              () ->
                  isCut(
                      "POST /echo HTTP/1.1\r\nHost: x\r\nContent-Length: 1000\r\n\r\n"
                          + "b".repeat(400))));
    }
    for (int i = 0; i < 5; i++) {
      assertEquals(200, status("ok"));
    }
    for (CompletableFuture<Boolean> one : slow) {
      assertTrue(one.get(30, TimeUnit.SECONDS));
    }
  }

  @Test
  void aReaderThatTakesNothingIsCut() throws Exception {
    try (Socket socket = new Socket()) {
      socket.setReceiveBufferSize(4096);
      socket.connect(new java.net.InetSocketAddress("127.0.0.1", base.getPort()));
      socket.getOutputStream().write("GET /big HTTP/1.1\r\nHost: x\r\n\r\n".getBytes(US_ASCII));
      long taken = 0;
      try {
        for (int i = 0; i < 40; i++) {
          taken += socket.getInputStream().readNBytes(100).length;
          Thread.sleep(100);
        }
        taken += socket.getInputStream().readAllBytes().length;
      } catch (IOException e) {
        taken = 0;
      }
      assertTrue(taken < 64 << 20, taken + " bytes came");
    }
    assertEquals(200, status("ok"));
  }

  @Test
  void aSilentConnectionIsCut() throws Exception {
    try (Socket socket = new Socket("127.0.0.1", base.getPort())) {
      socket.setSoTimeout(20_000);
      assertEquals(-1, socket.getInputStream().read());
    }
  }

  @Test
  void stoppingFinishesWhatRuns() throws Exception {
    var running = client.sendAsync(ask("door"), HttpResponse.BodyHandlers.ofString());
    while (!client
        .send(ask("metrics"), HttpResponse.BodyHandlers.ofString())
        .body()
        .contains("saltspoke_requests_active 2")) {
      Thread.onSpinWait();
    }
    server.close();
    assertEquals(200, running.get(20, TimeUnit.SECONDS).statusCode());
    assertFalse(stopped.get());
  }

  /** Sends a byte every 30 ms and tells whether the server cut the connection before the end. */
  private boolean isCut(String bytes) {
    try (Socket socket = new Socket("127.0.0.1", base.getPort())) {
      for (byte b : bytes.getBytes(US_ASCII)) {
        socket.getOutputStream().write(b);
        Thread.sleep(30);
      }
      return false;
    } catch (IOException e) {
      return true;
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      return false;
    }
  }
}
