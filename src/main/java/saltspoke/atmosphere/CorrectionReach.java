package saltspoke.atmosphere;

/**
 * How alike the model's errors are at two spots, from 1 (the same spot) to 0 (beyond the reach). A
 * local and a regional part, each the compact function (1 − h)⁵(5h + 1) of Wendland (1995), h being
 * the distance over the reach joined with the differences in height and in shore distance over
 * theirs. It is positive definite in the five dimensions used (three of space, height, shore), so
 * that the weights of any set of sites can be solved for.
 *
 * @param localShare share of the error's variance that only near neighbours have in common, 0..1
 * @param localKm reach of that part
 * @param regionalKm reach of the rest: beyond it nothing is moved
 * @param heightM difference in height beyond which nothing is moved
 * @param shoreOffsetKm shore distances are compared as ln(km + this)
 * @param shoreLn difference in that beyond which nothing is moved
 */
record CorrectionReach(
    double localShare,
    double localKm,
    double regionalKm,
    double heightM,
    double shoreOffsetKm,
    double shoreLn) {

  double closeness(CorrectionSpot a, CorrectionSpot b) {
    double km = a.chordKm(b);
    if (km >= regionalKm) {
      return 0;
    }
    double height = (a.elevationM() - b.elevationM()) / heightM;
    double shore =
        Math.log((a.seaDistanceKm() + shoreOffsetKm) / (b.seaDistanceKm() + shoreOffsetKm))
            / shoreLn;
    double aside = height * height + shore * shore;
    return localShare * compact(km / localKm, aside)
        + (1 - localShare) * compact(km / regionalKm, aside);
  }

  private static double compact(double along, double asideSquared) {
    double h = Math.sqrt(along * along + asideSquared);
    double left = Math.max(0, 1 - h);
    return left * left * left * left * left * (5 * h + 1);
  }
}
