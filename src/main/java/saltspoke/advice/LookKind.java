package saltspoke.advice;

/**
 * How a wheel is looked at. Minutes and chances to see are common practice and ASSUMPTION: what
 * shows outside is what creeps out of the hole; a fine crack in a head hides even with the tape
 * off.
 */
enum LookKind {
  /** True, tension, powder at the holes, one nipple turned a quarter and back. */
  OUTSIDE("outside", 10, 0.7, 0.8, 0.5),
  /** Tyre and tape off, every head and the rim bed seen. */
  TAPE_OFF("tape-off", 40, 0.95, 0.95, 0.8);

  private final String id;
  private final int minutes;
  private final double seesAttack;
  private final double findsSeized;
  private final double findsLost;

  LookKind(String id, int minutes, double seesAttack, double findsSeized, double findsLost) {
    this.id = id;
    this.minutes = minutes;
    this.seesAttack = seesAttack;
    this.findsSeized = findsSeized;
    this.findsLost = findsLost;
  }

  String id() {
    return id;
  }

  /** Bench time for one wheel, minutes. */
  int minutes() {
    return minutes;
  }

  /** Chance to find a state that is there, 0..1. */
  double finds(State state) {
    return switch (state) {
      case ATTACKED -> seesAttack;
      case SEIZED -> findsSeized;
      case LOST -> findsLost;
    };
  }

  /** Hidden nipples, and rim beds or washers that go first, show only with the tape off. */
  static LookKind of(boolean hiddenNipples, String limitingPart) {
    boolean inside = limitingPart.equals("rim") || limitingPart.equals("interface");
    return hiddenNipples || inside ? TAPE_OFF : OUTSIDE;
  }
}
