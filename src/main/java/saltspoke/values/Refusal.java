package saltspoke.values;

/**
 * A question or an input that the program will not answer, with what a person needs to mend it. The
 * faces turn its kind into an exit code or an HTTP status; nothing else does.
 */
public final class Refusal extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** What went wrong; each kind has one exit code and one HTTP status. */
  public enum Kind {
    /** The question itself is malformed: exit 2, HTTP 400. */
    WRONG_USE,
    /** Well formed, but there is no such thing: exit 3, HTTP 404. */
    NOT_FOUND,
    /** A number outside its allowed range: exit 3, HTTP 404. */
    OUT_OF_RANGE,
    /** A shipped or loaded data file is missing or damaged: exit 4, HTTP 503. */
    DATA_DAMAGED
  }

  private final Kind kind;
  private final String error;
  private final String field;
  private final String was;
  private final String allowed;

  /**
   * @param kind decides the exit code and status
   * @param error short code in lower-case words joined by hyphens, such as {@code out-of-range}
   * @param field the field, option, file or file:line the refusal is about
   * @param was the text found there
   * @param allowed what may stand there instead, and the mend
   */
  public Refusal(Kind kind, String error, String field, String was, String allowed) {
    super(error + ": " + field + " was \"" + was + "\"; allowed: " + allowed);
    this.kind = kind;
    this.error = error;
    this.field = field;
    this.was = was;
    this.allowed = allowed;
  }

  public static Refusal wrongUse(String error, String field, Object was, String allowed) {
    return new Refusal(Kind.WRONG_USE, error, field, String.valueOf(was), allowed);
  }

  public static Refusal notFound(String error, String field, Object was, String allowed) {
    return new Refusal(Kind.NOT_FOUND, error, field, String.valueOf(was), allowed);
  }

  public static Refusal outOfRange(String field, Object was, String allowed) {
    return new Refusal(Kind.OUT_OF_RANGE, "out-of-range", field, String.valueOf(was), allowed);
  }

  /** A file that cannot be read as what it should be; {@code where} is file or file:line. */
  public static Refusal dataDamaged(String error, String where, Object was, String mend) {
    return new Refusal(Kind.DATA_DAMAGED, error, where, String.valueOf(was), mend);
  }

  public Kind kind() {
    return kind;
  }

  public String error() {
    return error;
  }

  public String field() {
    return field;
  }

  public String was() {
    return was;
  }

  public String allowed() {
    return allowed;
  }
}
