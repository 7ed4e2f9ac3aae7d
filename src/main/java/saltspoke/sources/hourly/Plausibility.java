package saltspoke.sources.hourly;

import saltspoke.values.Refusal;

/**
 * Tells a damaged or mistaken file from one with a few bad values. When a large share of a column
 * cannot be weather, or the dew point lies above the temperature, columns or units were mixed up,
 * and the file is refused with the first such line.
 */
final class Plausibility {
  /** ASSUMPTION: share of impossible values that no working instrument gives, 0..1 (0.05–0.5). */
  private static final double MOST_IMPOSSIBLE = 0.2;

  /** A dew point above the temperature by more than the rounding of both, K. */
  private static final double DEW_POINT_ABOVE_K = 1.1;

  private static final int DEW_POINT_TEST = HourlyQuantity.values().length;

  private final LineReader lines;
  private final long[] seen = new long[DEW_POINT_TEST + 1];
  private final long[] wrong = new long[DEW_POINT_TEST + 1];
  private final Refusal[] first = new Refusal[DEW_POINT_TEST + 1];

  Plausibility(LineReader lines) {
    this.lines = lines;
  }

  /** Puts a value into a row. */
  void take(HourlyRow row, HourlyQuantity quantity, double value) {
    int q = quantity.ordinal();
    seen[q]++;
    if (!row.set(quantity, value)) {
      wrong[q]++;
      if (first[q] == null) {
        first[q] =
            lines.refuse(
                "impossible-values", quantity.id(), Double.toString(value), quantity.range());
      }
    }
  }

  /** Looks at a row that has all its values. */
  void rowDone(HourlyRow row) {
    double above = row.get(HourlyQuantity.DEW_POINT) - row.get(HourlyQuantity.TEMPERATURE);
    if (!Double.isNaN(above)) {
      seen[DEW_POINT_TEST]++;
      if (above > DEW_POINT_ABOVE_K) {
        wrong[DEW_POINT_TEST]++;
        if (first[DEW_POINT_TEST] == null) {
          first[DEW_POINT_TEST] =
              lines.refuse(
                  "impossible-values",
                  HourlyQuantity.DEW_POINT.id(),
                  Double.toString(row.get(HourlyQuantity.DEW_POINT)),
                  "at most the temperature, " + row.get(HourlyQuantity.TEMPERATURE) + " c");
        }
      }
    }
  }

  /**
   * At the end of the file.
   *
   * @throws Refusal when a column is mostly impossible
   */
  void fileDone() {
    for (int q = 0; q < seen.length; q++) {
      if (wrong[q] > MOST_IMPOSSIBLE * seen[q]) {
        throw first[q];
      }
    }
  }
}
