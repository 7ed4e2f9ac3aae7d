package saltspoke.atmosphere;

import java.util.List;
import java.util.Map;
import saltspoke.values.Quantiles;

/**
 * What ISO 9223 and ISO 9224 say of one metal at a place.
 *
 * @param firstYearLossUm first-year loss, µm
 * @param category category of the median
 * @param categoryProbability probability of each category, adding to 1
 * @param longTerm loss after 1, 2, 5, 10, 20 and 50 years
 */
public record MetalCorrosivity(
    Metal metal,
    Quantiles firstYearLossUm,
    Category category,
    Map<Category, Double> categoryProbability,
    List<LongTermLoss> longTerm) {
  public MetalCorrosivity {
    categoryProbability = Map.copyOf(categoryProbability);
    longTerm = List.copyOf(longTerm);
  }
}
