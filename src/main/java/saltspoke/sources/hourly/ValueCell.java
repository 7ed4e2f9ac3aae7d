package saltspoke.sources.hourly;

import java.nio.charset.StandardCharsets;

/** One measured value of a row: its cell, unit, missing codes and quality code. */
final class ValueCell {
  /**
   * Quality codes under which a value is not used: 2, 3, 6, 7 are suspect and erroneous in the ISD
   * and in the sources that GHCN hourly took over from it (Federal Climate Complex Data
   * Documentation for ISD, 2018). Letters are tests that a value of GHCN hourly failed. ASSUMPTION:
   * any letter; the list of letters is from memory.
   */
  private static final String BAD_QUALITY = "2367";

  private final HourlyQuantity quantity;
  private final ColumnMap.Unit unit;
  private final byte[][] missingTexts;
  private final double[] missingNumbers;
  private final Cells cells;
  private final int cell;
  private final int qualityCell;
  private final LineReader lines;

  ValueCell(
      HourlyQuantity quantity,
      ColumnMap.Column column,
      Cells cells,
      int cell,
      int qualityCell,
      LineReader lines) {
    this.quantity = quantity;
    this.unit = column.unit();
    this.missingTexts = column.missingTexts();
    this.missingNumbers = column.missingNumbers();
    this.cells = cells;
    this.cell = cell;
    this.qualityCell = qualityCell;
    this.lines = lines;
  }

  HourlyQuantity quantity() {
    return quantity;
  }

  void read(HourlyRow row, Plausibility plausible) {
    if (cells.isEmpty(cell) || (qualityCell != Columns.ABSENT && isBad())) {
      return;
    }
    double value = Decimal.parse(lines.bytes(), cells.from(cell), cells.to(cell));
    if (Double.isNaN(value)) {
      for (byte[] missing : missingTexts) {
        if (cells.equal(cell, missing)) {
          return;
        }
      }
      throw lines.refuse(
          "not-a-number",
          quantity.id() + " (cell " + (cell + 1) + ")",
          new String(cells.copy(cell), StandardCharsets.UTF_8),
          "a number or an empty cell");
    }
    for (double missing : missingNumbers) {
      if (value == missing) {
        return;
      }
    }
    plausible.take(row, quantity, unit.inRowUnit(value));
  }

  private boolean isBad() {
    if (cells.isEmpty(qualityCell)) {
      return false;
    }
    char code = (char) lines.bytes()[cells.from(qualityCell)];
    return BAD_QUALITY.indexOf(code) >= 0 || Character.isLetter(code);
  }
}
