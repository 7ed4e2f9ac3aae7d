package saltspoke.advice;

import java.util.List;
import saltspoke.values.Note;
import saltspoke.wheel.Pairing;

/**
 * What to expect of one pairing and when to look at it.
 *
 * @param firstAttackMonths first visible attack
 * @param seizedMonths a nipple that will not turn
 * @param headLossMonths loss of a head, or of the rim bed under it
 * @param firstLookMonths months from now to the first look
 * @param everyMonths months between later looks
 * @param replaceByMonths months from now by which to replace; null beyond 240
 * @param lookKind {@code outside} or {@code tape-off}
 * @param lookMinutes bench time of one look, minutes, common practice
 * @param limitedBy code of what sets the interval, such as {@code seized-risk} or {@code
 *     practice-upper}
 * @param meanPenetrationUmPerYear median penetration rate in the first year at the part that limits
 * @param reasons why, most important first
 */
public record PairingAdvice(
    Pairing pairing,
    StateTimes firstAttackMonths,
    StateTimes seizedMonths,
    StateTimes headLossMonths,
    double firstLookMonths,
    double everyMonths,
    Double replaceByMonths,
    String lookKind,
    int lookMinutes,
    String limitedBy,
    double meanPenetrationUmPerYear,
    List<Note> reasons) {
  /** How far the model looks ahead, months: later dates are not told apart. */
  public static final double HORIZON_MONTHS = RiskLimits.HORIZON_MONTHS;

  public PairingAdvice {
    reasons = List.copyOf(reasons);
  }
}
