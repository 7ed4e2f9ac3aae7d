package saltspoke.faces.web;

import java.time.Duration;

/**
 * How much the server takes on, so that no crowd and no slow or hostile client can break it.
 *
 * @param mostConnections open connections; beyond, idle ones are cut and new ones wait
 * @param mostAtOnce requests in work at the same time
 * @param mostWaiting requests that may wait for their turn; beyond, 503
 * @param longestWait wait for one's turn; beyond, 503
 * @param longestAnswer work on one request; beyond, it is stopped and answered with 503
 * @param longestExchange from the first byte of a request to the last of its answer; beyond, the
 *     connection is cut
 * @param longestIdle silence on a connection; beyond, it is cut
 * @param longestStop time that running requests get when the server stops
 */
record ServerLimits(
    int mostConnections,
    int mostAtOnce,
    int mostWaiting,
    Duration longestWait,
    Duration longestAnswer,
    Duration longestExchange,
    Duration longestIdle,
    Duration longestStop) {

  /** More than this many per core at once only costs memory: answering is all arithmetic. */
  private static final int AT_ONCE_PER_CORE = 4;

  static final ServerLimits USUAL =
      new ServerLimits(
          2000,
          Math.max(8, AT_ONCE_PER_CORE * Runtime.getRuntime().availableProcessors()),
          256,
          Duration.ofSeconds(5),
          Duration.ofSeconds(10),
          Duration.ofSeconds(30),
          Duration.ofSeconds(15),
          Duration.ofSeconds(12));
}
