package saltspoke.sources;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Consumer;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import saltspoke.values.Refusal;

/**
 * Reads a comma-separated table in UTF-8 with one header row. Lines that start with {@code #} are
 * comments. A cell that is not what was asked for is refused with file, line, column, the text
 * found and what was expected.
 */
public final class CsvTable {
  private static final CSVFormat FORMAT =
      CSVFormat.RFC4180
          .builder()
          .setHeader()
          .setSkipHeaderRecord(true)
          .setCommentMarker('#')
          .setIgnoreEmptyLines(true)
          .setTrim(true)
          .get();

  private CsvTable() {}

  /** Reads all rows. */
  public static List<Row> read(InputStream in, String fileName) {
    List<Row> rows = new ArrayList<>();
    forEach(in, fileName, rows::add);
    return rows;
  }

  /** Streams the rows in file order; closes the stream. */
  public static void forEach(InputStream in, String fileName, Consumer<Row> action) {
    try (Reader reader = new InputStreamReader(in, StandardCharsets.UTF_8);
        CSVParser parser = open(reader, fileName)) {
      for (CSVRecord csvRecord : parser) {
        action.accept(new Row(fileName, parser.getCurrentLineNumber(), csvRecord));
      }
    } catch (IOException | UncheckedIOException e) {
      throw Refusal.dataDamaged("unreadable-table", fileName, e.getMessage(), "a UTF-8 CSV table");
    }
  }

  private static CSVParser open(Reader reader, String fileName) throws IOException {
    try {
      return CSVParser.parse(reader, FORMAT);
    } catch (IllegalArgumentException e) {
      throw Refusal.dataDamaged(
          "bad-header", fileName, e.getMessage(), "a name for every column, none twice");
    }
  }

  /** One row, with its place in the file for messages. */
  public static final class Row {
    private final String fileName;
    private final long line;
    private final CSVRecord cells;

    private Row(String fileName, long line, CSVRecord cells) {
      this.fileName = fileName;
      this.line = line;
      this.cells = cells;
    }

    /** File and line, as {@code name:12}. */
    public String where() {
      return fileName + ":" + line;
    }

    /** Whether the file has a column of that name. */
    public boolean has(String column) {
      return cells.isMapped(column);
    }

    /** The text of a cell; refused when the column is missing. May be empty. */
    public String text(String column) {
      if (!cells.isMapped(column)) {
        throw Refusal.dataDamaged(
            "missing-column",
            where() + " " + column,
            "",
            "a column of that name; the file has " + cells.getParser().getHeaderNames());
      }
      if (!cells.isSet(column)) {
        throw Refusal.dataDamaged(
            "short-row", where() + " " + column, "", "a cell for every column");
      }
      return cells.get(column);
    }

    /** A finite number; refused when empty or not a number. */
    public double number(String column) {
      return optionalNumber(column)
          .orElseThrow(
              () -> Refusal.dataDamaged("empty-cell", where() + " " + column, "", "a number"));
    }

    /** A number from {@code low} to {@code high}; refused when empty, no number or outside. */
    public double number(String column, double low, double high) {
      double value = number(column);
      if (!(value >= low && value <= high)) {
        throw Refusal.dataDamaged(
            "out-of-range", where() + " " + column, text(column), low + ".." + high);
      }
      return value;
    }

    /** A whole number from {@code low} to {@code high}; refused when it is anything else. */
    public int whole(String column, int low, int high) {
      double value = number(column);
      if (!(value >= low && value <= high && value == Math.rint(value))) {
        throw Refusal.dataDamaged(
            "out-of-range", where() + " " + column, text(column), low + ".." + high + ", whole");
      }
      return (int) value;
    }

    /** A finite number, or nothing when the cell is empty. */
    public OptionalDouble optionalNumber(String column) {
      String text = text(column);
      if (text.isEmpty()) {
        return OptionalDouble.empty();
      }
      try {
        double value = Double.parseDouble(text);
        if (Double.isFinite(value)) {
          return OptionalDouble.of(value);
        }
      } catch (NumberFormatException e) {
        // Falls through to the refusal below, which says where and what.
      }
      throw Refusal.dataDamaged("not-a-number", where() + " " + column, text, "a finite number");
    }
  }
}
