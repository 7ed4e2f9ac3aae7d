package saltspoke.bench;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.stream.Collectors;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;
import saltspoke.faces.Answers;
import saltspoke.fields.DataSet;

/**
 * Runs the load and the benchmarks and writes {@code benchmark.md} into the build folder, its
 * argument. Needs {@code saltspoke.jar} there, and Debian's {@code wrk}. With a second argument
 * {@code load} the JMH benchmarks are left out.
 */
public final class BenchmarkTable {
  private static final int[] CONNECTIONS = {1, 16, 64};
  private static final int SECONDS = 8;
  private static final int PLACES = 300;
  private static final String ONE_PAIRING =
      "&rim=carbon-bare&nipple=brass-nickel&interface=none&spoke=stainless";
  private static final String ADVICE = "/api/advice?profile=all-winter-commuter&at=";

  private final Path folder;
  private final Path jar;
  private final StringBuilder table = new StringBuilder();

  private BenchmarkTable(Path folder) {
    this.folder = folder;
    this.jar = folder.resolve("saltspoke.jar");
  }

  public static void main(String[] args) throws Exception {
    BenchmarkTable run = new BenchmarkTable(Path.of(args[0]));
    run.head();
    run.load();
    if (args.length < 2 || !args[1].equals("load")) {
      run.benchmarks();
    }
    Files.writeString(run.folder.resolve("benchmark.md"), run.table);
    System.out.println(run.table);
  }

  private void head() throws IOException {
    line(
        "Machine: %s, %d processors, %s %s, Java %s, %s. Jar %.1f MB.%n",
        processor(),
        Runtime.getRuntime().availableProcessors(),
        System.getProperty("os.name"),
        System.getProperty("os.arch"),
        Runtime.version(),
        LocalDate.now(),
        Files.size(jar) / 1e6);
  }

  private static String processor() throws IOException {
    Path info = Path.of("/proc/cpuinfo");
    return !Files.exists(info)
        ? "unknown processor"
        : Files.readAllLines(info).stream()
            .filter(row -> row.startsWith("model name"))
            .map(row -> row.substring(row.indexOf(':') + 2))
            .findFirst()
            .orElse("unknown processor");
  }

  private void load() throws Exception {
    double[] starts = new double[3];
    for (int i = 0; i < starts.length; i++) {
      try (ServerUnderTest server =
          new ServerUnderTest(jar, ADVICE + "54.32,10.13" + ONE_PAIRING)) {
        starts[i] = server.firstAnswerSeconds;
      }
    }
    Arrays.sort(starts);
    Path onePairing = script("one-pairing", ONE_PAIRING);
    Path whole = script("whole", "");
    Path file = folder.resolve("static.lua");
    Files.writeString(file, "wrk.path = '/index.html'\n");
    try (ServerUnderTest server = new ServerUnderTest(jar, ADVICE + "54.32,10.13")) {
      double atRest = server.heapMb();
      for (Path script : List.of(file, onePairing, whole)) {
        WrkRun.of(server, script, 16, SECONDS);
      }
      line("| asked | connections | answers | failed | server CPU µs | × file | p99 ms | × file |");
      line("|---|--:|--:|--:|--:|--:|--:|--:|");
      for (int connections : CONNECTIONS) {
        WrkRun base = WrkRun.of(server, file, connections, SECONDS);
        row("static file (index.html)", connections, base, base);
        row(
            "advice, one pairing",
            connections,
            WrkRun.of(server, onePairing, connections, SECONDS),
            base);
        row(
            "advice, whole catalogue",
            connections,
            WrkRun.of(server, whole, connections, SECONDS),
            base);
      }
      line(
          "%nStart to first answer (advice), median of three: %.2f s. Heap (-Xmx256m) after a full"
              + " collection: %.0f MB at rest, %.0f MB after the load.%n",
          starts[1], atRest, server.heapMb());
    }
  }

  private void row(String asked, int connections, WrkRun run, WrkRun base) {
    line(
        "| %s | %d | %d | %d | %.0f | %.1f | %.1f | %.1f |",
        asked,
        connections,
        run.answers(),
        run.failed(),
        run.cpuMicros(),
        run.cpuMicros() / base.cpuMicros(),
        run.p99Millis(),
        run.p99Millis() / base.p99Millis());
  }

  /** A script that asks about another place each time: a land point moved by up to 0.02°. */
  private Path script(String name, String parameters) throws IOException {
    Answers answers = new Answers(DataSet.shipped());
    Random random = new Random(1);
    List<String> points = new ArrayList<>();
    while (points.size() < PLACES) {
      double latitudeDeg = random.nextInt(-3800, 6500) / 100.0;
      double longitudeDeg = random.nextInt(-12500, 15000) / 100.0;
      if (answers.isLand(latitudeDeg, longitudeDeg)
          && answers.isLand(latitudeDeg + 0.02, longitudeDeg + 0.02)) {
        points.add("{" + latitudeDeg + "," + longitudeDeg + "}");
      }
    }
    String text =
        "local places = {%s}\nmath.randomseed(7)\nrequest = function()\n"
            + "  local p = places[math.random(#places)]\n"
            + "  return wrk.format('GET', string.format('%s%%.5f,%%.5f%s',\n"
            + "    p[1] + 0.02 * math.random(), p[2] + 0.02 * math.random()))\nend\n";
    Path file = folder.resolve(name + ".lua");
    Files.writeString(
        file,
        String.format(Locale.ROOT, text, String.join(",", points), ADVICE, parameters),
        StandardCharsets.UTF_8);
    return file;
  }

  private void benchmarks() throws RunnerException {
    Collection<RunResult> results =
        new Runner(
                new OptionsBuilder()
                    .include("saltspoke\\..*Bench(mark)?\\.")
                    .warmupIterations(3)
                    .measurementIterations(5)
                    .forks(1)
                    .build())
            .run();
    line("| benchmark | parameters | time | ± | unit |");
    line("|---|---|--:|--:|---|");
    for (RunResult result : results) {
      var score = result.getPrimaryResult();
      String name = result.getParams().getBenchmark();
      String parameters =
          result.getParams().getParamsKeys().stream()
              .map(key -> result.getParams().getParam(key))
              .collect(Collectors.joining(" "));
      line(
          "| %s | %s | %.3g | %.2g | %s |",
          name.substring(name.lastIndexOf('.', name.lastIndexOf('.') - 1) + 1),
          parameters,
          score.getScore(),
          score.getScoreError(),
          score.getScoreUnit());
    }
  }

  private void line(String format, Object... values) {
    table.append(String.format(Locale.ROOT, format, values)).append('\n');
  }
}
