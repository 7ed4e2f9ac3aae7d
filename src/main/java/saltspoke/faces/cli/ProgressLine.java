package saltspoke.faces.cli;

import java.io.PrintWriter;
import java.util.Locale;

/**
 * Says how far a long work is, how fast it goes and how long it will take: now and then on a line
 * of its own, or every second on the same line of a terminal.
 */
final class ProgressLine {
  private static final long TERMINAL_MS = 1_000;
  private static final long LOG_MS = 10_000;

  private final PrintWriter err;
  private final boolean terminal = System.console() != null;
  private final long startMs = now();
  private double startShare = Double.NaN;
  private long lastMs = now();

  ProgressLine(PrintWriter err) {
    this.err = err;
  }

  /**
   * @param cells worked out since the start
   * @param share of the whole that is done, 0..1; what was there before counts
   */
  synchronized void report(long cells, double share) {
    if (Double.isNaN(startShare)) {
      startShare = share;
    }
    long at = now();
    boolean done = share >= 1;
    if (!done && at - lastMs < (terminal ? TERMINAL_MS : LOG_MS)) {
      return;
    }
    lastMs = at;
    double seconds = Math.max(1e-3, (at - startMs) / 1000.0);
    double left = seconds * (1 - share) / Math.max(1e-9, share - startShare);
    err.printf(
        Locale.ROOT,
        "%s%3.0f %%  %,d land cells  %,.0f/s  %s%s",
        terminal ? "\r" : "",
        100 * share,
        cells,
        cells / seconds,
        done ? clock(seconds) + " in all" : clock(left) + " left   ",
        terminal && !done ? "" : System.lineSeparator());
    err.flush();
  }

  private static String clock(double seconds) {
    long whole = Math.min(359_999, Math.round(seconds));
    return whole >= 3600
        ? String.format("%d:%02d:%02d", whole / 3600, whole / 60 % 60, whole % 60)
        : String.format("%d:%02d", whole / 60, whole % 60);
  }

  private static long now() {
    return System.nanoTime() / 1_000_000;
  }
}
