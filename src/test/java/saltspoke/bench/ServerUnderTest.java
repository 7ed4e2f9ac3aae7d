package saltspoke.bench;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;

/** The finished jar as a process of its own, in a heap of 256 MB. */
final class ServerUnderTest implements AutoCloseable {
  private static final String JAVA_BIN = Path.of(System.getProperty("java.home"), "bin").toString();

  final URI base;

  /** From the start of the process to the end of its first answer, s. */
  final double firstAnswerSeconds;

  private final Process process;
  private final HttpClient client = HttpClient.newHttpClient();

  ServerUnderTest(Path jar, String firstPath) throws IOException, InterruptedException {
    long start = System.nanoTime();
    process =
        new ProcessBuilder(
                Path.of(JAVA_BIN, "java").toString(),
                "-Xmx256m",
                "-jar",
                jar.toString(),
                "serve",
                "--port",
                "0")
            .redirectError(ProcessBuilder.Redirect.INHERIT)
            .start();
    BufferedReader out =
        new BufferedReader(new InputStreamReader(process.getInputStream(), StandardCharsets.UTF_8));
    base = URI.create(out.readLine());
    get(firstPath);
    firstAnswerSeconds = (System.nanoTime() - start) / 1e9;
  }

  String get(String path) throws IOException, InterruptedException {
    HttpResponse<String> response =
        client.send(
            HttpRequest.newBuilder(base.resolve(path)).build(),
            HttpResponse.BodyHandlers.ofString());
    if (response.statusCode() != 200) {
      throw new IOException(path + " gave " + response.statusCode());
    }
    return response.body();
  }

  /** A figure of the server's own metrics. */
  double metric(String name) throws IOException, InterruptedException {
    return get("/metrics")
        .lines()
        .filter(line -> line.startsWith(name + " "))
        .mapToDouble(line -> Double.parseDouble(line.substring(name.length() + 1)))
        .findFirst()
        .orElseThrow();
  }

  /** Heap in use after a full collection, MB. */
  double heapMb() throws IOException, InterruptedException {
    new ProcessBuilder(Path.of(JAVA_BIN, "jcmd").toString(), process.pid() + "", "GC.run")
        .redirectOutput(ProcessBuilder.Redirect.DISCARD)
        .start()
        .waitFor();
    return metric("jvm_heap_used_bytes") / 1e6;
  }

  @Override
  public void close() throws InterruptedException {
    process.destroy();
    process.waitFor(30, TimeUnit.SECONDS);
  }
}
