package saltspoke.faces.web;

import java.time.Duration;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.eclipse.jetty.io.Connection;
import org.eclipse.jetty.io.ssl.SslConnection;
import org.eclipse.jetty.util.component.AbstractLifeCycle;
import org.eclipse.jetty.util.thread.Scheduler;

/**
 * Cuts connections whose exchange (head, body, answer) does not come to its end in time. The idle
 * timeout alone would let a client live for hours that sends or takes one byte now and then.
 */
final class SlowClients extends AbstractLifeCycle implements Connection.Listener {
  /** Looks per longest exchange. */
  private static final int LOOKS = 10;

  private static final int CUT_MS = 1;

  /** What a connection had done when last it moved on, and when that was. */
  private record Seen(long messagesIn, long messagesOut, long bytesIn, long atNanos) {}

  private final Scheduler scheduler;
  private final Duration longest;
  private final Map<Connection, Seen> seen = new ConcurrentHashMap<>();

  SlowClients(Scheduler scheduler, Duration longest) {
    this.scheduler = scheduler;
    this.longest = longest;
  }

  @Override
  protected void doStart() {
    scheduleLook();
  }

  @Override
  public void onOpened(Connection connection) {
    if (!(connection instanceof SslConnection)) {
      seen.put(connection, now(connection));
    }
  }

  @Override
  public void onClosed(Connection connection) {
    seen.remove(connection);
  }

  int connections() {
    return seen.size();
  }

  private void scheduleLook() {
    scheduler.schedule(this::look, longest.toMillis() / LOOKS, TimeUnit.MILLISECONDS);
  }

  private void look() {
    seen.forEach(this::look);
    if (isRunning() || isStarting()) {
      scheduleLook();
    }
  }

  private void look(Connection connection, Seen before) {
    Seen now = now(connection);
    boolean movedOn =
        now.messagesIn() != before.messagesIn() || now.messagesOut() != before.messagesOut();
    boolean atRest = now.messagesIn() == now.messagesOut() && now.bytesIn() == before.bytesIn();
    if (movedOn || atRest) {
      seen.replace(connection, before, now);
    } else if (now.atNanos() - before.atNanos() > 2 * longest.toNanos()) {
      connection.getEndPoint().close(new TimeoutException("an exchange that did not end"));
    } else if (now.atNanos() - before.atNanos() > longest.toNanos()) {
      // Closing it from here leaves a request now and then that never ends; the server's own way
      // out for silent connections ends both, but misses one whose bytes come close together.
      connection.getEndPoint().setIdleTimeout(CUT_MS);
    }
  }

  private static Seen now(Connection connection) {
    return new Seen(
        connection.getMessagesIn(),
        connection.getMessagesOut(),
        connection.getBytesIn(),
        System.nanoTime());
  }
}
