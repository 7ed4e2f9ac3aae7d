package saltspoke.advice;

/** How much risk of missing trouble the person asking accepts. */
public enum RiskLevel {
  CAUTIOUS("cautious"),
  USUAL("usual"),
  RELAXED("relaxed");

  private final String id;

  RiskLevel(String id) {
    this.id = id;
  }

  /** Name used in answers and options. */
  public String id() {
    return id;
  }
}
