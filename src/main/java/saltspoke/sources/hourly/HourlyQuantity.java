package saltspoke.sources.hourly;

/**
 * What a station measures, with the limits outside which a value is no weather. Temperature and dew
 * point: extremes of the WMO Archive of Weather and Climate Extremes (−89.2 °C Vostok 1983, 56.7 °C
 * Furnace Creek 1913; dew point 35 °C Dhahran 2003), dew points a little lower than air can be
 * cold. Wind: ASSUMPTION, no mean over ten minutes above 75 m/s (spread 60–90).
 */
public enum HourlyQuantity {
  TEMPERATURE("temperature", "c", -89.2, 56.7),
  DEW_POINT("dew_point", "c", -95, 35),
  RELATIVE_HUMIDITY("relative_humidity", "pct", 0, 105),
  WIND_DIRECTION("wind_direction", "deg", 0, 360),
  WIND_SPEED("wind_speed", "m_s", 0, 75),
  DAY_MINIMUM("day_minimum", "c", -89.2, 56.7),
  DAY_MAXIMUM("day_maximum", "c", -89.2, 56.7);

  private final String id;
  private final String unit;
  private final double low;
  private final double high;

  HourlyQuantity(String id, String unit, double low, double high) {
    this.id = id;
    this.unit = unit;
    this.low = low;
    this.high = high;
  }

  /** Name in mapping files and messages. */
  public String id() {
    return id;
  }

  /** Unit that rows are given in. */
  public String unit() {
    return unit;
  }

  /** Whether a value in the row's unit can be weather. */
  public boolean possible(double value) {
    return value >= low && value <= high;
  }

  /** The possible values, for messages. */
  public String range() {
    return low + ".." + high + " " + unit;
  }
}
