package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.concurrent.ConcurrentLinkedQueue;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.faces.Answers;
import saltspoke.faces.Parameters;
import saltspoke.faces.Questions;
import saltspoke.faces.json.AdviceJson;
import saltspoke.faces.json.Json;
import saltspoke.fields.DataSet;
import saltspoke.values.Refusal;

/**
 * Many connections with ever new places: every answer is what the library itself says, none fails.
 * Two seconds in the gate; {@code -Plong} runs five minutes on 64 connections in a heap of 256 MB.
 */
@Tag("law")
class LoadTest {
  private static final int SECONDS = Integer.getInteger("saltspoke.load.seconds", 2);
  private static final int CONNECTIONS = Integer.getInteger("saltspoke.load.connections", 16);

  /** Every so many questions are about the whole catalogue. */
  private static final int WHOLE_EVERY = 50;

  private final Answers answers = new Answers(DataSet.shipped());
  private final ConcurrentLinkedQueue<String> faults = new ConcurrentLinkedQueue<>();
  private final AtomicInteger asked = new AtomicInteger();
  private final AtomicInteger refused = new AtomicInteger();

  @Test
  void everyAnswerUnderLoadIsTheLibrarysOwn() throws Exception {
    ExecutorService clients = Executors.newFixedThreadPool(CONNECTIONS);
    try (WebServer server = Api.server(0, answers)) {
      URI base = URI.create(server.start());
      long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(SECONDS);
      List<Future<?>> running = new ArrayList<>();
      for (int i = 0; i < CONNECTIONS; i++) {
        int seed = i;
        running.add(clients.submit(() -> ask(base, new Random(seed), end)));
      }
      for (Future<?> one : running) {
        one.get();
      }
    } finally {
      clients.shutdownNow();
    }
    assertEquals("", String.join("\n", faults.stream().limit(5).toList()));
    assertTrue(asked.get() - refused.get() > 0);
    System.out.println(
        "load: " + asked + " answers compared, of them " + refused + " refusals, none differed");
  }

  private void ask(URI base, Random random, long end) {
    // One client each: one connection each.
    HttpClient client = HttpClient.newBuilder().version(HttpClient.Version.HTTP_1_1).build();
    while (System.nanoTime() < end) {
      Map<String, String> question = question(random);
      try {
        StringBuilder query = new StringBuilder("api/advice?");
        question.forEach((name, value) -> query.append(name).append('=').append(value).append('&'));
        HttpResponse<String> response =
            client.send(
                HttpRequest.newBuilder(base.resolve(query.toString()))
                    .timeout(Duration.ofSeconds(30))
                    .build(),
                HttpResponse.BodyHandlers.ofString());
        compare(question, response);
      } catch (Exception e) {
        faults.add(question + ": " + e);
      }
      asked.incrementAndGet();
    }
  }

  private void compare(Map<String, String> question, HttpResponse<String> response) {
    String expected;
    int status = 200;
    try {
      Parameters parameters = new Parameters(question, Questions.ADVICE);
      expected =
          Json.compact(AdviceJson.of(answers.advise(parameters), Answers.textsFor(parameters)));
    } catch (Refusal refusal) {
      refused.incrementAndGet();
      expected = Json.compact(Json.error(refusal));
      status = ResourceHandler.status(refusal);
    }
    if (response.statusCode() != status || !response.body().equals(expected)) {
      faults.add(
          question + " got " + response.statusCode() + ", another answer than the library's");
    }
  }

  private static Map<String, String> question(Random random) {
    Map<String, String> question = new TreeMap<>();
    question.put("at", random.nextInt(-550, 700) / 10.0 + "," + random.nextInt(-1800, 1800) / 10.0);
    question.put("profile", "all-winter-commuter");
    if (random.nextInt(WHOLE_EVERY) > 0) {
      question.put("rim", "carbon-bare");
      question.put("nipple", random.nextBoolean() ? "brass-nickel" : "aluminium-bare");
      question.put("interface", "none");
      question.put("spoke", "stainless");
    }
    return question;
  }
}
