package saltspoke.wheel;

/** Where the bicycle is kept when nobody rides it. */
public enum Storage {
  HEATED_ROOM("heated-room"),
  UNHEATED_SHED("unheated-shed"),
  COVERED_OUTDOORS("covered-outdoors"),
  OPEN("open");

  private final String id;

  Storage(String id) {
    this.id = id;
  }

  /** Name used in answers, options and profile files. */
  public String id() {
    return id;
  }

  /** The choice of that name; refused with the allowed names when there is none. */
  public static Storage of(String id) {
    return Choice.of("storage", id, values(), Storage::id);
  }
}
