package saltspoke.sources;

import java.io.InputStream;
import java.util.List;
import saltspoke.values.Refusal;

/** Small tables that travel inside the jar, under {@code /saltspoke/}. */
public final class ShippedTable {
  private ShippedTable() {}

  /**
   * All rows of a shipped table.
   *
   * @param path path below {@code /saltspoke/}, such as {@code wheel/rims.csv}
   * @throws Refusal of kind DATA_DAMAGED when the program was built or copied without it
   */
  public static List<CsvTable.Row> rows(String path) {
    InputStream in = ShippedTable.class.getResourceAsStream("/saltspoke/" + path);
    if (in == null) {
      throw Refusal.dataDamaged(
          "missing-file", path, "", "the table inside the program's jar; fetch the jar again");
    }
    return CsvTable.read(in, path);
  }
}
