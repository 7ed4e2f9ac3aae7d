package saltspoke.advice;

/** What the last look at a wheel in service found. */
public enum Finding {
  NOT_LOOKED("not-looked"),
  CLEAN("clean"),
  POWDER("powder"),
  ONE_STIFF("one-stiff");

  private final String id;

  Finding(String id) {
    this.id = id;
  }

  /** Name used in answers and options. */
  public String id() {
    return id;
  }
}
