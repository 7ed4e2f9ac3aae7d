package saltspoke.atmosphere;

/**
 * One row of a correction file: how far a measurement lies from the model at a site.
 *
 * @param site name, shown with the answers that it moves
 * @param month 1..12, or 0 for every month of the year
 * @param amount added (K, points) or multiplied with, as the quantity has it
 * @param spread one standard deviation of the corrected value at the site; of its logarithm for a
 *     factor; 0 for a correction to be met exactly
 */
public record SiteCorrection(
    String site,
    CorrectionSpot spot,
    CorrectedQuantity quantity,
    int month,
    double amount,
    double spread) {
  public SiteCorrection {
    if (month < 0 || month > PlaceFields.MONTHS || !(spread >= 0)) {
      throw new IllegalArgumentException("a month is 0..12, a spread at least 0");
    }
  }

  SiteCorrection withSpread(double other) {
    return new SiteCorrection(site, spot, quantity, month, amount, other);
  }
}
