package saltspoke.wheel;

/** Whether the roads ridden in winter are salted. */
public enum SaltedRoads {
  BY_CLIMATE("by-climate"),
  YES("yes"),
  NO("no");

  private final String id;

  SaltedRoads(String id) {
    this.id = id;
  }

  /** Name used in answers, options and profile files. */
  public String id() {
    return id;
  }

  /** The choice of that name; refused with the allowed names when there is none. */
  public static SaltedRoads of(String id) {
    return Choice.of("saltedRoads", id, values(), SaltedRoads::id);
  }
}
