package saltspoke.atmosphere;

import java.util.List;
import saltspoke.sources.CsvTable;

/** Rows of the reference files beside the tests. */
final class Reference {
  private Reference() {}

  static List<CsvTable.Row> rows(String path) {
    return CsvTable.read(Reference.class.getResourceAsStream("/reference/" + path), path);
  }

  static Metal metal(String id) {
    for (Metal metal : Metal.values()) {
      if (metal.id().equals(id)) {
        return metal;
      }
    }
    throw new IllegalArgumentException(id);
  }
}
