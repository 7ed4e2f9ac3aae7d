package saltspoke.wheel;

import java.util.List;
import saltspoke.sources.CsvTable;

/** Printed values for tests, from {@code src/test/resources/reference}. */
final class Reference {
  private Reference() {}

  static List<CsvTable.Row> rows(String path) {
    return CsvTable.read(Reference.class.getResourceAsStream("/reference/" + path), path);
  }
}
