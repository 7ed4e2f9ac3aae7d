package saltspoke.wheel.damage;

import saltspoke.wheel.Material;

/**
 * One way in which one nipple hole goes bad: what is lost there over time, and how much is too
 * much. All figures are medians of one nipple; an infinite limit means that this site cannot bring
 * about that state.
 *
 * @param part {@code nipple}, {@code rim}, {@code interface} or {@code spoke}
 * @param cause code word: {@code seat}, {@code thread}, {@code wear} or {@code open-air}
 * @param metal what is eaten
 * @param dose loss in µm
 * @param monthlyUm loss of a settled year, January to December, µm
 * @param visibleUm dose at first visible attack
 * @param seizedUm dose at which the nipple no longer turns
 * @param lostUm dose at which head or rim bed is lost
 * @param lnShift change of ln dose for one spread of each {@link Assumption}, by ordinal; effects
 *     on limits stand in the limits' own assumptions
 */
public record Site(
    String part,
    String cause,
    Material metal,
    DoseCurve dose,
    double[] monthlyUm,
    double visibleUm,
    double seizedUm,
    double lostUm,
    double[] lnShift) {}
