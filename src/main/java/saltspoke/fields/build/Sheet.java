package saltspoke.fields.build;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.IntStream;
import saltspoke.fields.Field;
import saltspoke.fields.Grid;

/**
 * Working copy of one quantity on a grid while a layer is being made. Operations return new sheets.
 * North first, west first from −180°; missing values are NaN.
 */
final class Sheet {
  /**
   * Common practice: enough to blend rings of a few cells, few enough to keep distant values apart.
   */
  private static final int RELAXATIONS = 30;

  private final Grid grid;
  private final double[] values;

  Sheet(Grid grid, double[] values) {
    this.grid = grid;
    this.values = values;
  }

  /**
   * Brings a world map of any orientation into north-first rows and columns from −180°. Columns
   * beyond one turn, which repeat the first ones, are dropped.
   *
   * @param firstLatDeg latitude of the first row
   * @param stepLatDeg signed step between rows, negative when the north comes first
   * @param firstLonDeg longitude of the first column
   * @param stepLonDeg step between columns, positive
   */
  static Sheet world(
      double firstLatDeg,
      double stepLatDeg,
      double firstLonDeg,
      double stepLonDeg,
      int rows,
      int columns,
      double[] values) {
    if (values.length != rows * columns) {
      throw new IllegalArgumentException(values.length + " values for " + rows + " × " + columns);
    }
    int around = (int) Math.round(360 / stepLonDeg);
    if (columns < around || Math.abs(around * stepLonDeg - 360) > 1e-6) {
      throw new IllegalArgumentException("columns do not go round the world");
    }
    // The first column that stands at −180° or just east of it, seen modulo 360°.
    int shift = (int) Math.ceil((-180 - firstLonDeg) / stepLonDeg - 1e-6);
    double westDeg = firstLonDeg + shift * stepLonDeg;
    boolean northFirst = stepLatDeg < 0;
    double[] turned = new double[rows * around];
    for (int row = 0; row < rows; row++) {
      int from = northFirst ? row : rows - 1 - row;
      for (int column = 0; column < around; column++) {
        turned[row * around + column] =
            values[from * columns + Math.floorMod(column + shift, around)];
      }
    }
    double north = northFirst ? firstLatDeg : firstLatDeg + (rows - 1) * stepLatDeg;
    return new Sheet(
        Grid.of(north, westDeg, Math.abs(stepLatDeg), stepLonDeg, rows, around), turned);
  }

  Grid grid() {
    return grid;
  }

  double at(int row, int column) {
    return values[row * grid.columns() + Math.floorMod(column, grid.columns())];
  }

  /** What {@code f} makes of every value. */
  Sheet map(DoubleUnaryOperator f) {
    return new Sheet(grid, Arrays.stream(values).map(f).toArray());
  }

  /** Rounded to whole multiples of a power of two, which packs well and is exact in binary. */
  Sheet roundTo(double step) {
    return map(v -> Math.rint(v / step) * step);
  }

  /** Rounded to a number of significant binary digits, but not finer than a step. */
  Sheet roundToBits(int bits, double finestStep) {
    return map(
        v -> {
          double step = Math.max(finestStep, Math.scalb(1.0, Math.getExponent(v) + 1 - bits));
          return Math.rint(v / step) * step;
        });
  }

  /**
   * Means over blocks of cells, weighted by the cosine of latitude; missing cells are left out.
   * Points of the result stand in the middle of their blocks.
   */
  Sheet blockMean(int factor) {
    int rows = grid.rows() / factor;
    int columns = grid.columns() / factor;
    double[] means = new double[rows * columns];
    for (int row = 0; row < rows; row++) {
      for (int column = 0; column < columns; column++) {
        double sum = 0;
        double weight = 0;
        for (int y = row * factor; y < (row + 1) * factor; y++) {
          double share = Math.max(0, Math.cos(Math.toRadians(grid.latitudeDeg(y))));
          for (int x = column * factor; x < (column + 1) * factor; x++) {
            double value = at(y, x);
            if (!Double.isNaN(value)) {
              sum += share * value;
              weight += share;
            }
          }
        }
        means[row * columns + column] = weight > 0 ? sum / weight : Double.NaN;
      }
    }
    double offset = (factor - 1) / 2.0;
    return new Sheet(
        Grid.of(
            grid.northDeg() - offset * grid.stepLatDeg(),
            grid.westDeg() + offset * grid.stepLonDeg(),
            grid.stepLatDeg() * factor,
            grid.stepLonDeg() * factor,
            rows,
            columns),
        means);
  }

  /** Each value becomes the median of the 3 × 3 values around it; missing ones stay missing. */
  Sheet median3() {
    double[] filtered = new double[values.length];
    double[] near = new double[9];
    for (int row = 0; row < grid.rows(); row++) {
      for (int column = 0; column < grid.columns(); column++) {
        double value = at(row, column);
        if (!Double.isNaN(value)) {
          int n = gather(row, column, near);
          Arrays.sort(near, 0, n);
          value = n % 2 == 1 ? near[n / 2] : (near[n / 2 - 1] + near[n / 2]) / 2;
        }
        filtered[row * grid.columns() + column] = value;
      }
    }
    return new Sheet(grid, filtered);
  }

  /** Present values among the 3 × 3 around a cell; rows beyond the edge are left out. */
  private int gather(int row, int column, double[] near) {
    int n = 0;
    for (int y = Math.max(0, row - 1); y <= Math.min(grid.rows() - 1, row + 1); y++) {
      for (int x = column - 1; x <= column + 1; x++) {
        double value = at(y, x);
        if (!Double.isNaN(value)) {
          near[n++] = value;
        }
      }
    }
    return n;
  }

  /**
   * Fills every missing cell ring by ring with the mean of its present neighbours, then relaxes the
   * filled cells alone towards the mean of their neighbours, so that no ring pattern remains.
   */
  Sheet fill() {
    int[] gaps = IntStream.range(0, values.length).filter(i -> Double.isNaN(values[i])).toArray();
    double[] filled = values.clone();
    double[] near = new double[9];
    Sheet work = new Sheet(grid, filled);
    int open = gaps.length;
    while (open > 0) {
      double[] ring = neighbourMeans(work, gaps, near);
      int before = open;
      open = 0;
      for (int k = 0; k < gaps.length; k++) {
        if (Double.isNaN(filled[gaps[k]])) {
          filled[gaps[k]] = ring[k];
          open += Double.isNaN(ring[k]) ? 1 : 0;
        }
      }
      if (open == before) {
        throw new IllegalStateException("nothing to fill from");
      }
    }
    for (int round = 0; round < RELAXATIONS; round++) {
      double[] smooth = neighbourMeans(work, gaps, near);
      for (int k = 0; k < gaps.length; k++) {
        filled[gaps[k]] = smooth[k];
      }
    }
    return work;
  }

  private static double[] neighbourMeans(Sheet sheet, int[] cells, double[] near) {
    double[] means = new double[cells.length];
    for (int k = 0; k < cells.length; k++) {
      int columns = sheet.grid.columns();
      int n = sheet.gather(cells[k] / columns, cells[k] % columns, near);
      double sum = 0;
      for (int i = 0; i < n; i++) {
        sum += near[i];
      }
      means[k] = sum / n;
    }
    return means;
  }

  Field toField(String unit) {
    float[] narrow = new float[values.length];
    for (int i = 0; i < values.length; i++) {
      narrow[i] = (float) values[i];
    }
    return new Field(grid, unit, narrow);
  }
}
