package saltspoke.atmosphere;

/** The four standard metals of ISO 9223. */
public enum Metal {
  CARBON_STEEL("carbon-steel"),
  ZINC("zinc"),
  COPPER("copper"),
  ALUMINIUM("aluminium");

  private final String id;

  Metal(String id) {
    this.id = id;
  }

  /** Name used in answers and files. */
  public String id() {
    return id;
  }
}
