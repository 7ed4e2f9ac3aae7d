package saltspoke.faces.web;

import java.util.Map;
import org.eclipse.jetty.http.pathmap.PathSpec;
import org.eclipse.jetty.server.HttpConfiguration;
import org.eclipse.jetty.server.HttpConnectionFactory;
import org.eclipse.jetty.server.Server;
import org.eclipse.jetty.server.ServerConnector;
import org.eclipse.jetty.server.handler.GracefulHandler;
import org.eclipse.jetty.server.handler.PathMappingsHandler;
import org.eclipse.jetty.server.handler.gzip.GzipHandler;
import org.eclipse.jetty.util.thread.QueuedThreadPool;

/** The HTTP server: its connector, its limits, and the map from paths to resources. */
public final class WebServer implements AutoCloseable {
  static final int MOST_HEADER_BYTES = 8 * 1024;
  private static final int MOST_THREADS = 32;
  private static final int IDLE_MS = 15_000;
  private static final int STOP_MS = 5_000;

  private final Server server;
  private final ServerConnector connector;

  /**
   * @param port TCP port on the loopback address, 0 for any free one
   * @param resources path spec (such as {@code /api/air} or {@code /*}) → handler
   */
  WebServer(int port, Map<String, ResourceHandler> resources) {
    QueuedThreadPool threads = new QueuedThreadPool(MOST_THREADS, 4);
    threads.setName("http");
    threads.setDaemon(true);
    server = new Server(threads);
    HttpConfiguration configuration = new HttpConfiguration();
    configuration.setSendServerVersion(false);
    configuration.setSendDateHeader(true);
    configuration.setRequestHeaderSize(MOST_HEADER_BYTES);
    connector = new ServerConnector(server, 1, 1, new HttpConnectionFactory(configuration));
    connector.setHost("127.0.0.1");
    connector.setPort(port);
    connector.setIdleTimeout(IDLE_MS);
    server.addConnector(connector);
    PathMappingsHandler paths = new PathMappingsHandler();
    resources.forEach((spec, handler) -> paths.addMapping(PathSpec.from(spec), handler));
    GzipHandler compressed = new GzipHandler();
    compressed.setMinGzipSize(1024);
    compressed.setHandler(paths);
    server.setHandler(new GracefulHandler(new SafetyHeaders(compressed)));
    server.setErrorHandler(new JsonErrors());
    server.setStopTimeout(STOP_MS);
  }

  /** Binds and starts; returns the address once requests are taken. */
  public String start() throws Exception {
    server.start();
    return "http://127.0.0.1:" + connector.getLocalPort() + "/";
  }

  /** Waits until the server is stopped from another thread. */
  public void join() throws InterruptedException {
    server.join();
  }

  @Override
  public void close() throws Exception {
    server.stop();
  }
}
