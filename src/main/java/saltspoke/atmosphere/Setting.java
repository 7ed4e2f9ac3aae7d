package saltspoke.atmosphere;

/** Surroundings of a place as far as its SO2 goes. */
public enum Setting {
  REMOTE("remote"),
  RURAL("rural"),
  TOWN("town"),
  CITY("city"),
  INDUSTRIAL("industrial"),
  PORT("port");

  private final String id;

  Setting(String id) {
    this.id = id;
  }

  /** Name used in answers and options. */
  public String id() {
    return id;
  }
}
