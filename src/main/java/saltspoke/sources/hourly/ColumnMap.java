package saltspoke.sources.hourly;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;

/**
 * What the columns of a separated file mean.
 *
 * @param separator between cells; a blank stands for any run of blanks
 * @param dataAfter beginning of the line after which the header, or with numbered columns the rows,
 *     begin; empty when the first line is the header
 * @param kind what a row stands for
 * @param utc whether times are UTC; else local standard time
 * @param hoursEnding whether hours go 1..24 and name the end of the hour
 * @param columns by quantity ({@link HourlyQuantity#id}) or part ({@code station, name,
 *     latitude_deg, longitude_deg, elevation_m, time, year, month, day, hour, minute})
 */
record ColumnMap(
    char separator,
    String dataAfter,
    HourlyStation.Kind kind,
    boolean utc,
    boolean hoursEnding,
    Map<String, Column> columns) {
  /**
   * @param names header names, any of which may stand in the file; {@code #3} is the third cell of
   *     a line; a text after {@code =} stands for every row; {@code @file} is the file's name up to
   *     its first dot
   * @param unit of the file, see {@link Unit}
   * @param missing codes that stand for no value, beside the empty cell
   * @param quality header name of the cell that holds a quality code, empty when there is none
   */
  record Column(List<String> names, Unit unit, List<String> missing, String quality) {
    boolean isNumbered() {
      return names.get(0).startsWith("#");
    }

    boolean isConstant() {
      return names.get(0).startsWith("=");
    }

    boolean isFileName() {
      return names.get(0).equals("@file");
    }

    /** The text that stands for every row. */
    String constant() {
      return names.get(0).substring(1);
    }

    byte[][] missingTexts() {
      return missing.stream()
          .map(text -> text.getBytes(StandardCharsets.UTF_8))
          .toArray(byte[][]::new);
    }

    double[] missingNumbers() {
      return missing.stream()
          .map(text -> text.getBytes(StandardCharsets.UTF_8))
          .mapToDouble(bytes -> Decimal.parse(bytes, 0, bytes.length))
          .filter(Double::isFinite)
          .toArray();
    }
  }

  /** Units of outside files; a value times the factor plus the shift is in the row's unit. */
  enum Unit {
    C(1, 0),
    TENTH_C(0.1, 0),
    F(5 / 9.0, -32 * 5 / 9.0),
    K(1, -273.15),
    PCT(1, 0),
    FRACTION(100, 0),
    DEG(1, 0),
    M_S(1, 0),
    TENTH_M_S(0.1, 0),
    KM_H(1 / 3.6, 0),
    /** International nautical mile of 1852 m an hour. */
    KNOTS(1852 / 3600.0, 0),
    /** International mile of 1609.344 m an hour. */
    MPH(1609.344 / 3600, 0),
    NONE(1, 0);

    private final double factor;
    private final double shift;

    Unit(double factor, double shift) {
      this.factor = factor;
      this.shift = shift;
    }

    double inRowUnit(double value) {
      return value * factor + shift;
    }

    static List<String> names() {
      return java.util.Arrays.stream(values()).map(u -> u.name().toLowerCase(Locale.ROOT)).toList();
    }

    static java.util.Optional<Unit> find(String name) {
      return java.util.Arrays.stream(values())
          .filter(u -> u.name().toLowerCase(Locale.ROOT).equals(name))
          .findFirst();
    }
  }

  /** A constant number of the map, such as a latitude. */
  OptionalDouble constantNumber(String part) {
    Column column = columns.get(part);
    if (column == null || !column.isConstant()) {
      return OptionalDouble.empty();
    }
    byte[] text = column.constant().getBytes(StandardCharsets.UTF_8);
    double value = Decimal.parse(text, 0, text.length);
    return Double.isNaN(value) ? OptionalDouble.empty() : OptionalDouble.of(value);
  }
}
