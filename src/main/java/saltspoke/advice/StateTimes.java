package saltspoke.advice;

/**
 * When a wheel (its weakest nipple or hole) reaches a state, in months of service from now.
 *
 * @param part the part that reaches it: {@code nipple}, {@code rim}, {@code interface} or {@code
 *     spoke}
 * @param p10 10 % quantile, null beyond 240 months or when not applicable
 * @param median likewise
 * @param p90 likewise
 * @param beyondHorizon whether any of the three lies beyond 240 months
 * @param notApplicable whether this state cannot occur with these materials
 */
public record StateTimes(
    String part,
    Double p10,
    Double median,
    Double p90,
    boolean beyondHorizon,
    boolean notApplicable) {}
