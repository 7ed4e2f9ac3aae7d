package saltspoke.atmosphere;

import saltspoke.values.Refusal;

/**
 * The four annual means that ISO 9223 computes corrosion from.
 *
 * @param temperatureC annual mean, °C, −90..60
 * @param relativeHumidityPct annual mean, %, 0..100
 * @param so2MgPerM2Day SO2 deposition Pd, mg/(m² d), ≥ 0
 * @param chlorideMgPerM2Day chloride deposition Sd on the wet candle, mg/(m² d), ≥ 0
 */
public record Exposure(
    double temperatureC,
    double relativeHumidityPct,
    double so2MgPerM2Day,
    double chlorideMgPerM2Day) {
  public Exposure {
    within("temperatureC", temperatureC, -90, 60);
    within("relativeHumidityPct", relativeHumidityPct, 0, 100);
    within("so2MgPerM2Day", so2MgPerM2Day, 0, 1e5);
    within("chlorideMgPerM2Day", chlorideMgPerM2Day, 0, 1e5);
  }

  private static void within(String field, double value, double low, double high) {
    if (!(value >= low && value <= high)) {
      throw Refusal.outOfRange(field, value, low + ".." + high);
    }
  }
}
