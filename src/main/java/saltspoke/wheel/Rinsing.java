package saltspoke.wheel;

/** How often the wheel is rinsed with fresh water. */
public enum Rinsing {
  NEVER("never"),
  MONTHLY("monthly"),
  WEEKLY("weekly"),
  AFTER_WET_RIDES("after-wet-rides");

  private final String id;

  Rinsing(String id) {
    this.id = id;
  }

  /** Name used in answers, options and profile files. */
  public String id() {
    return id;
  }
}
