package saltspoke.advice;

/**
 * Shares of like wheels that nobody looks at, by what has become of their weakest nipple; they add
 * to 1.
 *
 * @param sound nothing to see, 0..1
 * @param attacked attack is visible, every nipple still turns, 0..1
 * @param seized a nipple no longer turns, no head is lost, 0..1
 * @param lost a head, or the rim bed under it, is lost, 0..1
 */
public record StateShares(double sound, double attacked, double seized, double lost) {}
