package saltspoke.advice;

/**
 * Chances that a look may come too late by, per wheel, and the bounds of common practice.
 * ASSUMPTION: one wheel in fifty, twenty or ten stiff before its first look, and a lost head four
 * times rarer still, since it hurts people. A wheel that is looked at may be kept until one in
 * twenty, four or three would have lost a head unseen, since looks find most of them before.
 *
 * @param seized accepted chance that a nipple has seized before a look, 0..1
 * @param lost accepted chance that a head or rim bed is lost before a look, 0..1
 * @param replace chance of a lost head at which parts are replaced, 0..1
 */
record RiskLimits(double seized, double lost, double replace) {
  /** Nobody takes a wheel apart more often, months, common practice. */
  static final double PRACTICE_LEAST_MONTHS = 1;

  /** Nobody should look more rarely: true and tension once in two years, common practice. */
  static final double PRACTICE_MOST_MONTHS = 24;

  /** How far the model looks ahead, months. */
  static final double HORIZON_MONTHS = 240;

  static RiskLimits of(RiskLevel level) {
    return switch (level) {
      case CAUTIOUS -> new RiskLimits(0.02, 0.005, 0.05);
      case USUAL -> new RiskLimits(0.05, 0.0125, 0.25);
      case RELAXED -> new RiskLimits(0.10, 0.025, 0.35);
    };
  }
}
