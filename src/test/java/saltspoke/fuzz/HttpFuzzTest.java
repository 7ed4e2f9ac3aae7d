package saltspoke.fuzz;

import static java.nio.charset.StandardCharsets.ISO_8859_1;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import java.io.IOException;
import java.net.Socket;
import java.net.SocketTimeoutException;
import java.net.URI;
import java.util.List;
import java.util.Random;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.ShrinkingMode;
import net.jqwik.api.Tag;
import net.jqwik.api.lifecycle.AfterContainer;
import net.jqwik.api.lifecycle.BeforeContainer;
import saltspoke.faces.Answers;
import saltspoke.faces.web.Api;
import saltspoke.faces.web.WebServer;
import saltspoke.fields.DataSet;

/**
 * Damaged requests on the wire against the whole server: never a 5xx but the deliberate 503, never
 * five seconds without an answer, never a trace or a path of the inside in it.
 */
@Tag("law")
class HttpFuzzTest {
  private static final List<String> REQUESTS =
      new String(Parsers.seed("requests.txt"), ISO_8859_1).lines().toList();
  private static final String POSTED = new String(Parsers.seed("profile.json"), ISO_8859_1);
  private static final int PATIENCE_MS = 5_000;

  private static WebServer server;
  private static int port;

  @BeforeContainer
  static void start() throws Exception {
    server = Api.server(0, new Answers(DataSet.shipped()));
    port = URI.create(server.start()).getPort();
  }

  @AfterContainer
  static void stop() throws Exception {
    server.close();
  }

  @Provide
  Arbitrary<Long> any() {
    return Arbitraries.longs().withoutEdgeCases();
  }

  @Property(shrinking = ShrinkingMode.OFF)
  void aDamagedRequestGetsAnAnswerOrIsCut(@ForAll("any") long number) throws IOException {
    byte[] request = request(new Random(number));
    String answer = answer(request);
    if (answer.isEmpty()) {
      return;
    }
    String shown = new String(request, ISO_8859_1) + "\n→ " + answer.lines().findFirst().get();
    assertTrue(answer.startsWith("HTTP/1.1 "), shown);
    String status = answer.substring(9, 12);
    assertFalse(status.startsWith("5") && !status.matches("50[135]"), shown);
    assertFalse(answer.contains("Exception") || answer.contains("\tat "), shown);
    assertFalse(answer.contains("org.eclipse") || answer.contains(".java:"), shown);
  }

  private static byte[] request(Random random) {
    String line = REQUESTS.get(random.nextInt(REQUESTS.size()));
    String text;
    if (random.nextInt(5) == 0) {
      byte[] body = Mutant.of(POSTED.getBytes(ISO_8859_1), random);
      text =
          "POST /api/advice HTTP/1.1\r\nHost: a\r\nConnection: close\r\nContent-Length: "
              + body.length
              + "\r\n\r\n"
              + new String(body, ISO_8859_1);
      return text.getBytes(ISO_8859_1);
    }
    text = line + "\r\nHost: a\r\nAccept-Encoding: gzip\r\nConnection: close\r\n\r\n";
    byte[] bytes = text.getBytes(ISO_8859_1);
    if (random.nextInt(3) > 0) {
      // Only the line, so that most requests reach a handler.
      byte[] damaged = Mutant.of(line.substring(0, line.length() - 9).getBytes(ISO_8859_1), random);
      return (new String(damaged, ISO_8859_1).replace("\n", "")
              + " HTTP/1.1\r\nHost: a\r\nConnection: close\r\n\r\n")
          .getBytes(ISO_8859_1);
    }
    return Mutant.of(bytes, random);
  }

  /** All that comes back; empty when the server cuts the connection without a word. */
  private static String answer(byte[] request) throws IOException {
    try (Socket socket = new Socket("127.0.0.1", port)) {
      socket.setSoTimeout(PATIENCE_MS);
      socket.getOutputStream().write(request);
      socket.shutdownOutput();
      return new String(socket.getInputStream().readAllBytes(), ISO_8859_1);
    } catch (SocketTimeoutException e) {
      return fail("no answer within 5 s to " + new String(request, ISO_8859_1));
    } catch (IOException cut) {
      return "";
    }
  }

  @net.jqwik.api.Example
  void theSoundRequestsAreAnswered() throws IOException {
    String answer =
        answer((REQUESTS.get(0) + "\r\nHost: a\r\nConnection: close\r\n\r\n").getBytes(ISO_8859_1));
    assertEquals("HTTP/1.1 200 OK", answer.lines().findFirst().orElse(""));
  }
}
