package saltspoke.bench;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * One run of Debian's wrk against a server.
 *
 * @param answers complete answers
 * @param failed answers with another status than 2xx or 3xx, and broken connections
 * @param cpuMicros processor time of the server per answer, µs
 * @param p99Millis time within which 99 of 100 answers came, ms
 */
record WrkRun(long answers, long failed, double cpuMicros, double p99Millis) {
  private static final Pattern ANSWERS = Pattern.compile("(\\d+) requests in");
  private static final Pattern P99 = Pattern.compile("99%\\s+([0-9.]+)(us|ms|s)");
  private static final Pattern NOT_OK = Pattern.compile("Non-2xx or 3xx responses: (\\d+)");
  private static final Pattern BROKEN =
      Pattern.compile("connect (\\d+), read (\\d+), write (\\d+), timeout (\\d+)");

  static WrkRun of(ServerUnderTest server, Path script, int connections, int seconds)
      throws IOException, InterruptedException {
    double before = server.metric("process_cpu_seconds_total");
    Process wrk =
        new ProcessBuilder(
                "wrk",
                "-t1",
                "-c" + connections,
                "-d" + seconds + "s",
                "--timeout",
                "20s",
                "--latency",
                "-s",
                script.toString(),
                server.base.toString())
            .redirectErrorStream(true)
            .start();
    String out = new String(wrk.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    if (wrk.waitFor() != 0) {
      throw new IOException(out);
    }
    double cpuSeconds = server.metric("process_cpu_seconds_total") - before;
    long answers = Long.parseLong(found(ANSWERS, out).group(1));
    Matcher p99 = found(P99, out);
    double unit = p99.group(2).equals("us") ? 1e-3 : p99.group(2).equals("ms") ? 1 : 1e3;
    Matcher notOk = NOT_OK.matcher(out);
    long failed = notOk.find() ? Long.parseLong(notOk.group(1)) : 0;
    Matcher broken = BROKEN.matcher(out);
    if (broken.find()) {
      for (int i = 1; i <= 4; i++) {
        failed += Long.parseLong(broken.group(i));
      }
    }
    return new WrkRun(
        answers, failed, 1e6 * cpuSeconds / answers, Double.parseDouble(p99.group(1)) * unit);
  }

  private static Matcher found(Pattern pattern, String text) throws IOException {
    Matcher matcher = pattern.matcher(text);
    if (!matcher.find()) {
      throw new IOException("wrk said: " + text);
    }
    return matcher;
  }
}
