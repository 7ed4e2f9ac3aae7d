package saltspoke.atmosphere;

import java.util.List;
import saltspoke.values.Note;

/**
 * Twelve months of outside air before the salt is known.
 *
 * @param months January to December; their chloride deposition is not read
 * @param temperatureSpreadK one standard deviation of the annual mean temperature, K
 * @param relativeHumiditySpreadPct one standard deviation of the annual mean humidity, points
 * @param flags what was assumed or left its range
 */
public record ClimateYear(
    List<MonthAir> months,
    double temperatureSpreadK,
    double relativeHumiditySpreadPct,
    List<Note> flags) {
  public ClimateYear {
    if (months.size() != 12) {
      throw new IllegalArgumentException("a year has twelve months");
    }
    months = List.copyOf(months);
    flags = List.copyOf(flags);
  }
}
