package saltspoke.atlas.stock;

import java.io.InputStream;
import java.util.List;
import saltspoke.sources.CsvTable;
import saltspoke.sources.ShippedTable;
import saltspoke.values.Refusal;
import saltspoke.wheel.Catalogue;

/**
 * One step in the order in which pairings are tried for a customer.
 *
 * @param nipple catalogue id
 * @param between interface, catalogue id
 * @param reason why it stands where it does
 */
public record Preference(String nipple, String between, String reason) {

  /** The shipped order, common practice. */
  public static List<Preference> shipped(Catalogue catalogue) {
    return from(ShippedTable.rows("stock/preference.csv"), catalogue);
  }

  /**
   * An order of one's own: columns nipple, interface, reason.
   *
   * @throws Refusal with file and row for an id that is not in the catalogue
   */
  public static List<Preference> read(InputStream in, String fileName, Catalogue catalogue) {
    return from(CsvTable.read(in, fileName), catalogue);
  }

  private static List<Preference> from(List<CsvTable.Row> rows, Catalogue catalogue) {
    if (rows.isEmpty()) {
      throw Refusal.wrongUse("empty-table", "preference", "", "at least one nipple and interface");
    }
    return rows.stream()
        .map(
            row ->
                new Preference(
                    catalogue.nipple(row.text("nipple")).id(),
                    catalogue.between(row.text("interface")).id(),
                    row.text("reason")))
        .toList();
  }
}
