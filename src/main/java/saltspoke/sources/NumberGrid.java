package saltspoke.sources;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.StringTokenizer;
import saltspoke.values.Refusal;

/**
 * Reads a plain text table of numbers, blanks between them, one grid row per line: the format of
 * the digital maps that go with Recommendation ITU-R P.834 (Annex 1: 121 rows from the north pole
 * to the south pole, 241 columns from 0° to 360° east, in steps of 1.5°).
 */
public final class NumberGrid {
  private NumberGrid() {}

  /**
   * @param fileName for messages
   * @return {@code rows × columns} values, row by row
   * @throws Refusal naming the line when a row is missing, short, or holds something else
   */
  public static double[] read(InputStream in, String fileName, int rows, int columns)
      throws IOException {
    String[] lines = new String(in.readAllBytes(), StandardCharsets.US_ASCII).strip().split("\\R");
    if (lines.length != rows) {
      throw refuse(fileName, lines.length + " lines", rows + " lines");
    }
    double[] values = new double[rows * columns];
    for (int row = 0; row < rows; row++) {
      String where = fileName + ":" + (row + 1);
      StringTokenizer cells = new StringTokenizer(lines[row]);
      if (cells.countTokens() != columns) {
        throw refuse(where, cells.countTokens() + " numbers", columns + " numbers");
      }
      for (int column = 0; column < columns; column++) {
        String text = cells.nextToken();
        try {
          values[row * columns + column] = Double.parseDouble(text);
        } catch (NumberFormatException e) {
          throw refuse(where, text, "a number");
        }
      }
    }
    return values;
  }

  private static Refusal refuse(String where, String was, String expected) {
    return Refusal.dataDamaged("not-a-number-grid", where, was, expected);
  }
}
