package saltspoke.advice;

/**
 * What a finding says of one draw: how likely it was, and how the worst nipple may stand given it.
 * All nipples of a draw are alike but for their own scatter z, so a finding cuts a slice out of z.
 */
final class Evidence {
  private final History history;
  private final double[] zeta;
  private final int nipples;
  private final double lnWeight;

  private Evidence(History history, double[] zeta, int nipples, double lnWeight) {
    this.history = history;
    this.zeta = zeta;
    this.nipples = nipples;
    this.lnWeight = lnWeight;
  }

  /**
   * @param zeta thresholds of the three states at the wheel's age
   */
  static Evidence of(History history, double[] zeta, int nipples) {
    double missed = 1 - history.chanceToSee();
    double lnWeight =
        switch (history.finding()) {
          case NOT_LOOKED -> lnAll(zeta[2], nipples);
          case CLEAN -> lnMix(lnAll(zeta[0], nipples), lnAll(zeta[1], nipples), missed);
          case POWDER -> lnLess(lnAll(zeta[1], nipples), lnAll(zeta[0], nipples));
          case ONE_STIFF ->
              Math.log(nipples)
                  + lnLess(Normal.lnCdf(zeta[2]), Normal.lnCdf(zeta[1]))
                  + lnAll(zeta[1], nipples - 1);
        };
    return new Evidence(history, zeta, nipples, lnWeight);
  }

  double lnWeight() {
    return lnWeight;
  }

  /**
   * Chance, given the finding, that the wheel is still free of a state whose threshold is now z.
   */
  double freeShare(State state, double z) {
    double missed = 1 - history.chanceToSee();
    double lnJoint =
        switch (history.finding()) {
          case NOT_LOOKED -> lnAll(Math.min(z, zeta[2]), nipples);
          case CLEAN ->
              lnMix(
                  lnAll(Math.min(z, zeta[0]), nipples),
                  lnAll(Math.min(z, zeta[1]), nipples),
                  missed);
          case POWDER ->
              lnLess(lnAll(Math.min(z, zeta[1]), nipples), lnAll(Math.min(z, zeta[0]), nipples));
          case ONE_STIFF -> lnJointStiff(state, z);
        };
    return Math.min(1, Math.exp(lnJoint - lnWeight));
  }

  /** One nipple is stiff already; "seized" then asks for a second one. */
  private double lnJointStiff(State state, double z) {
    double stiff =
        Math.log(nipples)
            + (state == State.LOST
                ? lnLess(Normal.lnCdf(Math.min(z, zeta[2])), Normal.lnCdf(zeta[1]))
                : lnLess(Normal.lnCdf(zeta[2]), Normal.lnCdf(zeta[1])));
    double others = state == State.LOST ? zeta[1] : Math.min(z, zeta[1]);
    return stiff + lnAll(others, nipples - 1);
  }

  private static double lnAll(double z, int nipples) {
    return nipples * Normal.lnCdf(z);
  }

  /** ln(seen·a + missed·b) for clean wheels a and wheels with nothing seized b. */
  private static double lnMix(double lnA, double lnB, double missed) {
    return missed <= 0 ? lnA : lnB + Math.log(missed + (1 - missed) * Math.exp(lnA - lnB));
  }

  /** ln(e^a − e^b) for a ≥ b; a very small number when they are equal. */
  private static double lnLess(double lnA, double lnB) {
    double gap = -Math.expm1(Math.min(0, lnB - lnA));
    return gap > 0 ? lnA + Math.log(gap) : lnA - 700;
  }
}
