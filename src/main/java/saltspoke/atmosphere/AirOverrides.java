package saltspoke.atmosphere;

import java.util.Optional;
import java.util.OptionalDouble;
import saltspoke.values.Refusal;

/**
 * What the person asking knows better than the maps. Measured means carry no spread of their own.
 *
 * @param setting surroundings as far as SO2 goes
 * @param chlorideMgPerM2Day measured annual deposition, wet candle, 0..10000
 * @param so2MgPerM2Day measured annual deposition, 0..2000
 * @param temperatureC measured annual mean, −60..45
 * @param relativeHumidityPct measured annual mean, 0..100
 */
public record AirOverrides(
    Optional<Setting> setting,
    OptionalDouble chlorideMgPerM2Day,
    OptionalDouble so2MgPerM2Day,
    OptionalDouble temperatureC,
    OptionalDouble relativeHumidityPct) {
  /** Nothing known better. */
  public static final AirOverrides NONE = of(null);

  public AirOverrides {
    check("chlorideMgPerM2Day", chlorideMgPerM2Day, 0, 10_000);
    check("so2MgPerM2Day", so2MgPerM2Day, 0, 2_000);
    check("temperatureC", temperatureC, -60, 45);
    check("relativeHumidityPct", relativeHumidityPct, 0, 100);
  }

  /** Only the setting, or nothing when it is null. */
  public static AirOverrides of(Setting setting) {
    OptionalDouble none = OptionalDouble.empty();
    return new AirOverrides(Optional.ofNullable(setting), none, none, none, none);
  }

  private static void check(String field, OptionalDouble value, double low, double high) {
    if (value.isPresent() && !(value.getAsDouble() >= low && value.getAsDouble() <= high)) {
      throw Refusal.outOfRange(field, value.getAsDouble(), low + ".." + high);
    }
  }
}
