package saltspoke.faces.web;

import java.util.Map;
import java.util.Set;
import java.util.concurrent.TimeoutException;
import java.util.function.BooleanSupplier;
import java.util.function.Function;
import org.eclipse.jetty.http.pathmap.PathSpec;
import org.eclipse.jetty.server.CustomRequestLog;
import org.eclipse.jetty.server.Handler;
import org.eclipse.jetty.server.HttpConfiguration;
import org.eclipse.jetty.server.HttpConnectionFactory;
import org.eclipse.jetty.server.NetworkConnectionLimit;
import org.eclipse.jetty.server.RequestLog;
import org.eclipse.jetty.server.RequestLogWriter;
import org.eclipse.jetty.server.SecureRequestCustomizer;
import org.eclipse.jetty.server.Server;
import org.eclipse.jetty.server.ServerConnector;
import org.eclipse.jetty.server.SizeLimitHandler;
import org.eclipse.jetty.server.SslConnectionFactory;
import org.eclipse.jetty.server.handler.EagerContentHandler;
import org.eclipse.jetty.server.handler.GracefulHandler;
import org.eclipse.jetty.server.handler.PathMappingsHandler;
import org.eclipse.jetty.server.handler.QoSHandler;
import org.eclipse.jetty.server.handler.StatisticsHandler;
import org.eclipse.jetty.server.handler.gzip.GzipHandler;
import org.eclipse.jetty.util.ssl.SslContextFactory;
import org.eclipse.jetty.util.thread.QueuedThreadPool;

/**
 * The HTTP server: its connector, its limits, and the map from paths to resources. Probes answer
 * even when all places at the counter are taken.
 */
public final class WebServer implements AutoCloseable {
  static final int MOST_HEADER_BYTES = 8 * 1024;

  /** Threads beside those at work: acceptor, selector, probes, refusals. */
  private static final int SPARE_THREADS = 12;

  /** An answer that the kernel takes whole does not keep a place at the counter. */
  private static final int SEND_BUFFER_BYTES = 512 * 1024;

  /** Room for a body as it came, with the unused ends of its buffers. */
  private static final long MOST_RETAINED_BYTES = 4L * ResourceHandler.MOST_BODY_BYTES;

  private static final String HEALTH = "/health";
  private static final String READY = "/ready";
  private static final String METRICS = "/metrics";
  private static final int IDLE_WHEN_CROWDED_MS = 1_000;

  private final ServerSettings settings;
  private final Server server;
  private final ServerConnector connector;
  private final StatisticsHandler statistics = new StatisticsHandler();
  private final QoSHandler counter = new QoSHandler();
  private final SlowClients clients;

  /**
   * @param resources path spec (such as {@code /api/air} or {@code /*}) → handler
   * @param ready whether all parts are made, for the readiness probe
   */
  WebServer(
      ServerSettings settings,
      ServerLimits limits,
      Map<String, ResourceHandler> resources,
      BooleanSupplier ready) {
    this.settings = settings;
    QueuedThreadPool threads = new QueuedThreadPool(limits.mostAtOnce() + SPARE_THREADS, 4);
    threads.setName("http");
    threads.setDaemon(true);
    server = new Server(threads);
    connector = connector(settings, limits);
    clients = new SlowClients(connector.getScheduler(), limits.longestExchange());
    connector.addBean(clients);
    NetworkConnectionLimit crowd = new NetworkConnectionLimit(limits.mostConnections(), connector);
    crowd.setEndPointIdleTimeout(IDLE_WHEN_CROWDED_MS);
    server.addBean(crowd);
    server.addConnector(connector);
    server.setHandler(
        handlers(limits, resources, new Operations(statistics, counter, clients, ready)));
    server.setErrorHandler(new JsonErrors());
    settings.accessLog().ifPresent(this::logTo);
    server.setStopTimeout(limits.longestStop().toMillis());
  }

  private ServerConnector connector(ServerSettings settings, ServerLimits limits) {
    HttpConfiguration configuration = new HttpConfiguration();
    configuration.setSendServerVersion(false);
    configuration.setSendDateHeader(true);
    configuration.setRequestHeaderSize(MOST_HEADER_BYTES);
    HttpConnectionFactory http = new HttpConnectionFactory(configuration);
    ServerConnector made =
        settings
            .tls()
            .map(
                tls -> {
                  configuration.addCustomizer(new SecureRequestCustomizer(false));
                  return new ServerConnector(server, 1, 1, encrypted(tls), http);
                })
            .orElseGet(() -> new ServerConnector(server, 1, 1, http));
    made.setHost(settings.address());
    made.setPort(settings.port());
    made.setIdleTimeout(limits.longestIdle().toMillis());
    made.setAcceptedSendBufferSize(SEND_BUFFER_BYTES);
    return made;
  }

  private static SslConnectionFactory encrypted(ServerSettings.Tls tls) {
    SslContextFactory.Server keys = new SslContextFactory.Server();
    keys.setKeyStorePath(tls.keystore().toUri().toString());
    keys.setKeyStorePassword(tls.password());
    return new SslConnectionFactory(keys, "http/1.1");
  }

  /** From the outside in: count, finish on stop, headers, read the body, wait, compress, answer. */
  private Handler handlers(
      ServerLimits limits, Map<String, ResourceHandler> resources, Operations operations) {
    PathMappingsHandler paths = new PathMappingsHandler();
    resources.forEach((spec, handler) -> paths.addMapping(PathSpec.from(spec), handler));
    paths.addMapping(PathSpec.from(HEALTH), probe(operations::health));
    paths.addMapping(PathSpec.from(READY), probe(operations::ready));
    paths.addMapping(PathSpec.from(METRICS), probe(operations::metrics));
    GzipHandler compressed = new GzipHandler();
    compressed.setMinGzipSize(1024);
    compressed.setHandler(paths);
    counter.setMaxRequestCount(limits.mostAtOnce());
    counter.setMaxSuspendedRequestCount(limits.mostWaiting());
    counter.setMaxSuspend(limits.longestWait());
    counter.excludePath(HEALTH, READY, METRICS);
    counter.setHandler(compressed);
    // The body is read without holding a thread, so that slow senders hold up nobody.
    EagerContentHandler read =
        new EagerContentHandler(
            counter,
            new EagerContentHandler.RetainedContentLoaderFactory(MOST_RETAINED_BYTES, -1, true));
    SizeLimitHandler small = new SizeLimitHandler(ResourceHandler.MOST_BODY_BYTES, -1);
    small.setHandler(read);
    statistics.setHandler(new GracefulHandler(new SafetyHeaders(small)));
    return statistics;
  }

  private static ResourceHandler probe(Function<Ask, Reply> answer) {
    return new ResourceHandler(Set.of("GET"), answer);
  }

  private void logTo(String file) {
    RequestLog.Writer writer = file.equals("-") ? new StandardOutput() : new RequestLogWriter(file);
    server.setRequestLog(new CustomRequestLog(writer, CustomRequestLog.NCSA_FORMAT));
  }

  /** Binds and starts; returns the address once requests are taken. */
  public String start() throws Exception {
    server.start();
    String host = settings.address();
    String written = host.contains(":") ? "[" + host + "]" : host;
    return settings.scheme() + "://" + written + ":" + connector.getLocalPort() + "/";
  }

  /** Waits until the server is stopped from another thread. */
  public void join() throws InterruptedException {
    server.join();
  }

  /** Takes no more requests, finishes those that run in their time, cuts the rest, and stops. */
  @Override
  public void close() throws Exception {
    try {
      server.stop();
    } catch (TimeoutException e) {
      // What still ran has had its time; all parts are stopped by now.
      if (!server.isStopped() && !server.isFailed()) {
        throw e;
      }
    }
  }
}
