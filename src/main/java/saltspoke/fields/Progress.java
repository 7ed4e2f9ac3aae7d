package saltspoke.fields;

/** Tells the person who waits for a long piece of work how far it is. */
public interface Progress {
  /**
   * @param done parts finished
   * @param total parts in all
   * @param what the part that begins now, or what there is to say about it
   */
  void report(int done, int total, String what);
}
