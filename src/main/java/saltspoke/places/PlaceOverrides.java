package saltspoke.places;

import java.util.Locale;
import java.util.OptionalDouble;
import saltspoke.values.Refusal;

/**
 * What the person asking knows better than the map.
 *
 * @param elevationM −430..8850 m (shore of the Dead Sea to Everest, with room for neither more)
 * @param seaDistanceKm 0..3000 km
 */
public record PlaceOverrides(OptionalDouble elevationM, OptionalDouble seaDistanceKm) {
  public static final PlaceOverrides NONE =
      new PlaceOverrides(OptionalDouble.empty(), OptionalDouble.empty());

  public PlaceOverrides {
    check("elevation", elevationM, -430, 8850);
    check("sea-distance", seaDistanceKm, 0, 3000);
  }

  private static void check(String field, OptionalDouble given, double least, double most) {
    if (given.isPresent() && !(given.getAsDouble() >= least && given.getAsDouble() <= most)) {
      throw Refusal.outOfRange(
          field, given.getAsDouble(), String.format(Locale.ROOT, "%.0f..%.0f", least, most));
    }
  }
}
