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

  /** The choice of that name; refused with the allowed names when there is none. */
  public static Rinsing of(String id) {
    return Choice.of("rinsing", id, values(), Rinsing::id);
  }
}
