package saltspoke.atmosphere;

/**
 * A month's wind at 10 m.
 *
 * @param meanSpeedMPerS mean of the hourly speeds, m/s, &gt; 0
 * @param eastwardMPerS mean vector, component towards the east, m/s
 * @param northwardMPerS mean vector, component towards the north, m/s
 */
public record WindMonth(double meanSpeedMPerS, double eastwardMPerS, double northwardMPerS) {
  public WindMonth {
    if (!(meanSpeedMPerS > 0 && meanSpeedMPerS < 60)) {
      throw new IllegalArgumentException("mean wind speed is between 0 and 60 m/s");
    }
    if (!(Double.isFinite(eastwardMPerS) && Double.isFinite(northwardMPerS))) {
      throw new IllegalArgumentException("a mean wind vector is finite");
    }
  }

  /** Wind of that mean speed from all directions alike. */
  public static WindMonth fromAllSides(double meanSpeedMPerS) {
    return new WindMonth(meanSpeedMPerS, 0, 0);
  }
}
