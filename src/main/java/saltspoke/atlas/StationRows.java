package saltspoke.atlas;

import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import saltspoke.sources.CsvTable;
import saltspoke.values.Refusal;

/**
 * Rows of a station file: those that read, and the refusals of those that do not.
 *
 * @param <T> one of the records of {@link saltspoke.sources.StationFiles}
 */
record StationRows<T>(List<T> rows, List<Refusal> refused) {
  /**
   * Reads a file; closes the stream.
   *
   * @throws Refusal when not a single row can be read: the first row's
   */
  static <T> StationRows<T> read(
      InputStream in, String fileName, Function<CsvTable.Row, T> reader) {
    List<T> rows = new ArrayList<>();
    List<Refusal> refused = new ArrayList<>();
    CsvTable.forEach(
        in,
        fileName,
        row -> {
          try {
            rows.add(reader.apply(row));
          } catch (Refusal refusal) {
            refused.add(refusal);
          }
        });
    if (rows.isEmpty()) {
      throw refused.isEmpty()
          ? Refusal.dataDamaged("no-rows", fileName, "", "a header and at least one row")
          : refused.get(0);
    }
    return new StationRows<>(rows, refused);
  }
}
