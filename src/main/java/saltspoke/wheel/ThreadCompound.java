package saltspoke.wheel;

/** What was put on the spoke thread at building. */
public enum ThreadCompound {
  NONE("none"),
  OIL("oil"),
  GREASE("grease"),
  ANTI_SEIZE("anti-seize");

  private final String id;

  ThreadCompound(String id) {
    this.id = id;
  }

  /** Name used in answers, options and profile files. */
  public String id() {
    return id;
  }

  /** The choice of that name; refused with the allowed names when there is none. */
  public static ThreadCompound of(String id) {
    return Choice.of("threadCompound", id, values(), ThreadCompound::id);
  }
}
