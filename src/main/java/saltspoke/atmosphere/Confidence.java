package saltspoke.atmosphere;

/** How far a hand-kept figure may be trusted. */
public enum Confidence {
  /** Within a factor 1.5 two times in three. */
  HIGH("high", Math.log(1.5)),
  /** Within a factor 2 two times in three. */
  MEDIUM("medium", Math.log(2)),
  /** Within a factor 3 two times in three. */
  LOW("low", Math.log(3));

  private final String id;
  private final double lnSpread;

  Confidence(String id, double lnSpread) {
    this.id = id;
    this.lnSpread = lnSpread;
  }

  /** Name used in tables and answers. */
  public String id() {
    return id;
  }

  /** One standard deviation of the figure's logarithm. */
  public double lnSpread() {
    return lnSpread;
  }
}
