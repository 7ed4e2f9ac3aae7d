package saltspoke.wheel;

/** Tyre sealant that may reach the rim cavity. */
public enum Sealant {
  NONE("none"),
  AMMONIA_FREE("ammonia-free"),
  AMMONIATED("ammoniated");

  private final String id;

  Sealant(String id) {
    this.id = id;
  }

  /** Name used in answers, options and profile files. */
  public String id() {
    return id;
  }

  /** The choice of that name; refused with the allowed names when there is none. */
  public static Sealant of(String id) {
    return Choice.of("sealant", id, values(), Sealant::id);
  }
}
