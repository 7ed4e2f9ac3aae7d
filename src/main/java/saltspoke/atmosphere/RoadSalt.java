package saltspoke.atmosphere;

import java.util.List;
import saltspoke.values.Quantiles;

/**
 * De-icing salt on the roads of a place: outside the standard's classification and kept apart from
 * it.
 *
 * @param practice {@code none}, {@code rare}, {@code usual} or {@code heavy}: what the country does
 * @param practiceConfidence {@code low}, {@code medium} or {@code high}
 * @param treatmentsPerWinter spreadings in a winter
 * @param magnesiumShare share of treatments with magnesium or calcium chloride brine, 0..1
 * @param months the twelve months
 */
public record RoadSalt(
    String practice,
    String practiceConfidence,
    Quantiles treatmentsPerWinter,
    double magnesiumShare,
    List<Month> months) {
  public RoadSalt {
    months = List.copyOf(months);
  }

  /**
   * @param month 1..12
   * @param treatments spreadings in the month
   * @param saltOnRoadGPerM2 mean salt lying on a salted road, g NaCl-equivalent per m²
   */
  public record Month(int month, double treatments, double saltOnRoadGPerM2) {}
}
