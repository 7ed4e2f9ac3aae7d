package saltspoke.faces.web;

import java.time.Duration;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import java.util.function.Supplier;
import saltspoke.values.Stopped;

/**
 * Stops work that takes too long, by interrupting its thread; the work looks out for that through
 * {@link Stopped#check()}.
 */
final class Deadline {
  private static final ScheduledExecutorService WATCH =
      Executors.newSingleThreadScheduledExecutor(
          work -> {
            Thread thread = new Thread(work, "deadline");
            thread.setDaemon(true);
            return thread;
          });

  private final Duration longest;

  Deadline(Duration longest) {
    this.longest = longest;
  }

  /**
   * Does the work on this thread.
   *
   * @throws Busy when it took too long or the server is stopping
   */
  <T> T within(Supplier<T> work) {
    Interruption interruption = new Interruption(Thread.currentThread());
    var alarm = WATCH.schedule(interruption::come, longest.toMillis(), TimeUnit.MILLISECONDS);
    try {
      return work.get();
    } catch (Stopped e) {
      throw new Busy("took-too-long");
    } finally {
      alarm.cancel(false);
      interruption.over();
    }
  }

  /** Interrupts the thread at most once, and never after its work is over. */
  private static final class Interruption {
    private final Thread thread;
    private boolean over;
    private boolean came;

    Interruption(Thread thread) {
      this.thread = thread;
    }

    synchronized void come() {
      if (!over) {
        came = true;
        thread.interrupt();
      }
    }

    synchronized void over() {
      over = true;
      if (came) {
        // The flag was ours, and the next request on this thread has its own time.
        Thread.interrupted();
      }
    }
  }
}
