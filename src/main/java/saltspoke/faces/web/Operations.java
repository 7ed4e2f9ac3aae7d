package saltspoke.faces.web;

import com.sun.management.OperatingSystemMXBean;
import java.lang.management.ManagementFactory;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.function.BooleanSupplier;
import org.eclipse.jetty.server.handler.QoSHandler;
import org.eclipse.jetty.server.handler.StatisticsHandler;
import saltspoke.faces.About;
import saltspoke.faces.json.Json;

/** What whoever runs the server asks: does it live, is it ready, how is it doing. */
final class Operations {
  private static final String PROMETHEUS = "text/plain;version=0.0.4;charset=utf-8";

  private final StatisticsHandler statistics;
  private final QoSHandler counter;
  private final SlowClients clients;
  private final BooleanSupplier ready;

  Operations(
      StatisticsHandler statistics,
      QoSHandler counter,
      SlowClients clients,
      BooleanSupplier ready) {
    this.statistics = statistics;
    this.counter = counter;
    this.clients = clients;
    this.ready = ready;
  }

  /** 200 as long as the process answers at all. */
  Reply health(Ask ask) {
    return Reply.json(Json.object().put("status", "up"));
  }

  /** 200 once places, air and advisor are made, 503 before. */
  Reply ready(Ask ask) {
    if (!ready.getAsBoolean()) {
      throw new Busy("not-ready");
    }
    return Reply.json(Json.object().put("status", "ready"));
  }

  /** Counters and gauges in Prometheus' text format. */
  Reply metrics(Ask ask) {
    StringBuilder out = new StringBuilder();
    family(out, "saltspoke_info", "gauge", "Version of the program.");
    out.append("saltspoke_info{version=\"").append(About.version()).append("\"} 1\n");
    family(out, "saltspoke_responses_total", "counter", "Answers by class of status.");
    int[] responses = {
      statistics.getResponses2xx(),
      statistics.getResponses3xx(),
      statistics.getResponses4xx(),
      statistics.getResponses5xx()
    };
    for (int i = 0; i < responses.length; i++) {
      out.append("saltspoke_responses_total{status=\"").append(i + 2).append("xx\"} ");
      out.append(responses[i]).append('\n');
    }
    one(out, "saltspoke_requests_active", "gauge", "Requests begun.", active());
    one(out, "saltspoke_requests_waiting", "gauge", "Requests in the queue.", waiting());
    one(
        out,
        "saltspoke_requests_refused_total",
        "counter",
        "Requests refused because the queue was full or the wait too long.",
        counter.getTotalExceededRequestCount() + counter.getTotalExpiredRequestCount());
    one(
        out,
        "saltspoke_request_seconds_total",
        "counter",
        "Time from request to end of answer, summed.",
        statistics.getRequestTimeTotal() / 1e9);
    one(
        out,
        "saltspoke_request_seconds_max",
        "gauge",
        "The longest of them.",
        statistics.getRequestTimeMax() / 1e9);
    one(
        out,
        "saltspoke_written_bytes_total",
        "counter",
        "Bytes of all answers' bodies.",
        statistics.getBytesWritten());
    one(out, "saltspoke_connections", "gauge", "Open connections.", clients.connections());
    process(out);
    return Reply.kept(PROMETHEUS, out.toString().getBytes(StandardCharsets.UTF_8), 0);
  }

  private static void process(StringBuilder out) {
    var memory = ManagementFactory.getMemoryMXBean().getHeapMemoryUsage();
    var runtime = ManagementFactory.getRuntimeMXBean();
    one(out, "jvm_heap_used_bytes", "gauge", "Heap in use, garbage included.", memory.getUsed());
    one(out, "jvm_heap_max_bytes", "gauge", "Heap at most.", memory.getMax());
    one(
        out,
        "jvm_threads",
        "gauge",
        "Threads.",
        ManagementFactory.getThreadMXBean().getThreadCount());
    one(
        out,
        "process_start_time_seconds",
        "gauge",
        "Start, seconds since 1970.",
        runtime.getStartTime() / 1e3);
    if (ManagementFactory.getOperatingSystemMXBean() instanceof OperatingSystemMXBean system) {
      one(
          out,
          "process_cpu_seconds_total",
          "counter",
          "Processor time of the process.",
          system.getProcessCpuTime() / 1e9);
    }
  }

  private long active() {
    return statistics.getRequestsActive();
  }

  private long waiting() {
    return counter.getSuspendedRequestCount();
  }

  private static void one(StringBuilder out, String name, String type, String help, double value) {
    family(out, name, type, help);
    out.append(name).append(' ');
    out.append(
        value == Math.rint(value)
            ? Long.toString((long) value)
            : String.format(Locale.ROOT, "%.6f", value));
    out.append('\n');
  }

  private static void family(StringBuilder out, String name, String type, String help) {
    out.append("# HELP ").append(name).append(' ').append(help).append('\n');
    out.append("# TYPE ").append(name).append(' ').append(type).append('\n');
  }
}
