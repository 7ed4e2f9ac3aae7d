package saltspoke.sources;

import java.io.Closeable;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;

/** Writes tables that {@link CsvTable} reads: RFC 4180, but lines end in a line feed alone. */
public final class CsvWriter {
  private static final CSVFormat FORMAT =
      CSVFormat.RFC4180.builder().setRecordSeparator('\n').get();

  private CsvWriter() {}

  /** A table that is written row by row. */
  public static final class Rows implements Closeable {
    private final CSVPrinter printer;

    private Rows(CSVPrinter printer) {
      this.printer = printer;
    }

    public void add(List<String> cells) throws IOException {
      printer.printRecord(cells);
    }

    @Override
    public void close() throws IOException {
      printer.close();
    }
  }

  /** Begins a table in UTF-8 of any length; whoever closes it closes the stream. */
  public static Rows rows(OutputStream out, List<String> header) throws IOException {
    CSVPrinter printer =
        new CSVPrinter(new OutputStreamWriter(out, StandardCharsets.UTF_8), FORMAT);
    printer.printRecord(header);
    return new Rows(printer);
  }

  /**
   * @param comments lines for the top, without their {@code #}
   * @param header column names
   * @param rows cells, as many as there are columns
   */
  public static String write(
      List<String> comments, List<String> header, List<? extends List<String>> rows) {
    StringBuilder out = new StringBuilder();
    comments.forEach(line -> out.append("# ").append(line).append('\n'));
    try (CSVPrinter printer = new CSVPrinter(out, FORMAT)) {
      printer.printRecord(header);
      for (List<String> row : rows) {
        if (row.size() != header.size()) {
          throw new IllegalArgumentException(row + " does not fit " + header);
        }
        printer.printRecord(row);
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return out.toString();
  }
}
