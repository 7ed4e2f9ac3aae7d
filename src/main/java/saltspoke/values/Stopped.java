package saltspoke.values;

/**
 * Thrown by long work whose thread was interrupted: nobody waits for the answer any more. The work
 * keeps nothing of what it had begun.
 */
public final class Stopped extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private Stopped() {
    super("stopped before its end");
  }

  /**
   * To be called between the steps of long work (each at most some milliseconds); cheap.
   *
   * @throws Stopped when this thread was interrupted; the flag stays set
   */
  public static void check() {
    if (Thread.currentThread().isInterrupted()) {
      throw new Stopped();
    }
  }
}
