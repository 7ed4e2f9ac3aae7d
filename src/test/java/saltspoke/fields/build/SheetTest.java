package saltspoke.fields.build;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.fields.Grid;

@Tag("law")
class SheetTest {
  private static final int ROWS = 5;

  private static double value(double latitudeDeg, double longitudeDeg) {
    return latitudeDeg * 1000 + Math.floorMod(Math.round(longitudeDeg), 360);
  }

  private static Sheet world(boolean northFirst, double westDeg, double stepDeg, int columns) {
    double[] values = new double[ROWS * columns];
    for (int row = 0; row < ROWS; row++) {
      for (int column = 0; column < columns; column++) {
        double latitudeDeg = northFirst ? 80 - row * 40 : -80 + row * 40;
        values[row * columns + column] = value(latitudeDeg, westDeg + column * stepDeg);
      }
    }
    return Sheet.world(
        northFirst ? 80 : -80, northFirst ? -40 : 40, westDeg, stepDeg, ROWS, columns, values);
  }

  @Test
  void bringsEveryOrientationIntoOne() {
    for (boolean northFirst : new boolean[] {true, false}) {
      for (double westDeg : new double[] {-180, 0, 20}) {
        for (int columns : new int[] {18, 19}) {
          Sheet sheet = world(northFirst, westDeg, 20, columns);
          Grid grid = sheet.grid();
          assertEquals(Grid.of(80, -180, 40, 20, ROWS, 18), grid);
          for (int row = 0; row < ROWS; row++) {
            for (int column = 0; column < 18; column++) {
              assertEquals(
                  value(grid.latitudeDeg(row), grid.longitudeDeg(column)), sheet.at(row, column));
            }
          }
        }
      }
    }
  }

  @Test
  void keepsColumnsThatStandBetweenWholeSteps() {
    assertEquals(-179, world(true, 21, 2, 180).grid().westDeg(), 1e-9);
    assertThrows(IllegalArgumentException.class, () -> world(true, 0, 20, 17));
  }

  private static Sheet of(double... values) {
    return new Sheet(Grid.of(40, -180, 20, 60, values.length / 6, 6), values);
  }

  @Test
  void medianRemovesASpikeAndLeavesGaps() {
    double nan = Double.NaN;
    Sheet sheet = of(1, 1, 1, 1, 1, 1, 1, 1, 99, 1, 1, 1, 1, 1, 1, 1, 1, nan).median3();
    for (int column = 0; column < 5; column++) {
      assertEquals(1, sheet.at(1, column));
    }
    assertTrue(Double.isNaN(sheet.at(2, 5)));
  }

  @Test
  void fillKeepsWhatIsThereAndStaysWithinIt() {
    double nan = Double.NaN;
    Sheet filled =
        of(nan, nan, nan, nan, nan, nan, nan, 2, nan, nan, 8, nan, nan, nan, nan, nan, nan, nan)
            .fill();
    assertEquals(2, filled.at(1, 1));
    assertEquals(8, filled.at(1, 4));
    for (int row = 0; row < 3; row++) {
      for (int column = 0; column < 6; column++) {
        double v = filled.at(row, column);
        assertTrue(v >= 2 && v <= 8, "row " + row + " column " + column + ": " + v);
      }
    }
    double[] nothing = new double[12];
    Arrays.fill(nothing, nan);
    assertThrows(IllegalStateException.class, () -> of(nothing).fill());
  }

  @Test
  void blockMeansStandInTheMiddleAndKeepConstants() {
    double[] fives = new double[24];
    Arrays.fill(fives, 5);
    Sheet sheet = of(fives).blockMean(2);
    assertEquals(Grid.of(30, -150, 40, 120, 2, 3), sheet.grid());
    assertEquals(5, sheet.at(1, 2), 1e-12);
  }

  @Test
  void roundsToBinaryStepsAndDigits() {
    assertEquals(0.375, of(0.4, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0).roundTo(0.125).at(0, 0));
    Sheet digits = of(1000.3, 0.3, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0).roundToBits(8, 0.25);
    assertEquals(1000, digits.at(0, 0));
    assertEquals(0.25, digits.at(0, 1));
  }
}
