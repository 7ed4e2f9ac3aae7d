package saltspoke.advice;

/**
 * What a finding says of one draw: how likely it was, and how the worst nipple may stand given it.
 * All nipples of a draw are alike but for their own scatter z, so a finding cuts a slice out of z.
 * ζ are the thresholds of the three states at the wheel's age.
 */
final class Evidence {
  private final History history;
  private final WorstOf worst;
  private final double one;

  Evidence(History history, WorstOf worst) {
    this.history = history;
    this.worst = worst;
    this.one = 1 - history.chanceToSee();
  }

  /** Likelihood of the finding. */
  double weight(double attacked, double seized, double lost) {
    return free(State.LOST, Double.POSITIVE_INFINITY, attacked, seized, lost);
  }

  /** Likelihood of the finding with the wheel still free of a state whose threshold is now z. */
  double free(State state, double z, double attacked, double seized, double lost) {
    return switch (history.finding()) {
      case NOT_LOOKED -> worst.none(Math.min(z, lost));
      case CLEAN ->
          (1 - one) * worst.none(Math.min(z, attacked)) + one * worst.none(Math.min(z, seized));
      case POWDER -> worst.none(Math.min(z, seized)) - worst.none(Math.min(z, attacked));
      case ONE_STIFF -> stiff(state, z, seized, lost);
    };
  }

  /** One nipple is stiff already; "seized" then asks for a second one. */
  private double stiff(State state, double z, double seized, double lost) {
    boolean head = state == State.LOST;
    double stiff = Normal.table(head ? Math.min(z, lost) : lost) - Normal.table(seized);
    double others = worst.noneOfOthers(head ? seized : Math.min(z, seized));
    return Math.max(0, stiff) * others;
  }
}
