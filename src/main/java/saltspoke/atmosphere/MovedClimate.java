package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The climate at a spot as local measurements move it: first the means of temperature and humidity,
 * then the wet hours that follow from them.
 *
 * @param months January to December
 * @param moves how far each quantity was moved
 */
public record MovedClimate(List<MonthClimate> months, Map<CorrectedQuantity, SiteMove> moves) {
  private static final int HOURS_OF_A_DAY = 24;

  /** Whether any measurement was near enough. */
  public boolean isMoved() {
    return moves.values().stream().anyMatch(move -> !move.isNone());
  }

  /**
   * Moves modelled means.
   *
   * @param corrections measurements; those too far away move nothing
   */
  public static MovedClimate of(
      MonthMeans means, SiteCorrections corrections, CorrectionSpot spot) {
    Map<CorrectedQuantity, SiteMove> moves = new LinkedHashMap<>();
    for (CorrectedQuantity quantity :
        List.of(
            CorrectedQuantity.TEMPERATURE,
            CorrectedQuantity.RELATIVE_HUMIDITY,
            CorrectedQuantity.WET_HOURS)) {
      moves.put(quantity, corrections.at(quantity, spot));
    }
    SiteMove warmer = moves.get(CorrectedQuantity.TEMPERATURE);
    SiteMove moister = moves.get(CorrectedQuantity.RELATIVE_HUMIDITY);
    SiteMove wetter = moves.get(CorrectedQuantity.WET_HOURS);
    MonthMeans moved =
        warmer.isNone() && moister.isNone()
            ? means
            : means.moved(warmer.departure(), moister.departure());
    List<MonthClimate> months = moved.climate(spot.latitudeDeg());
    return new MovedClimate(wetter.isNone() ? months : wetter(months, wetter), moves);
  }

  private static List<MonthClimate> wetter(List<MonthClimate> months, SiteMove move) {
    List<MonthClimate> wetter = new ArrayList<>(months.size());
    for (MonthClimate month : months) {
      double factor = Math.exp(move.departure()[month.month() - 1]);
      double most = HOURS_OF_A_DAY * MonthMeans.daysIn(month.month());
      wetter.add(month.withWetHours(WetHours.times(factor, month.wetHours(), most)));
    }
    return wetter;
  }
}
