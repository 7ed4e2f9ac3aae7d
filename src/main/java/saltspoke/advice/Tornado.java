package saltspoke.advice;

import java.util.List;

/**
 * How far the interval of one pairing moves when each assumption is off by its spread.
 *
 * @param firstLookMonths first look with nothing shifted, limits of practice off
 * @param bars one per assumption, the widest first
 */
public record Tornado(double firstLookMonths, List<Bar> bars) {
  public Tornado {
    bars = List.copyOf(bars);
  }

  /**
   * @param assumption name, such as {@code seizing-gap} or {@code rim-weather-sweat}
   * @param room {@code damage}, {@code rim-weather} or {@code risk}
   * @param spread one standard deviation, in words
   * @param lowMonths first look with the assumption one spread down, months
   * @param highMonths one spread up
   * @param factor the greater of the two moves, as a factor of at least 1
   */
  public record Bar(
      String assumption,
      String room,
      String spread,
      double lowMonths,
      double highMonths,
      double factor) {}
}
