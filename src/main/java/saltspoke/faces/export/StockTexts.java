package saltspoke.faces.export;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.csv.CSVPrinter;
import saltspoke.atlas.stock.CustomerAnswer;
import saltspoke.atlas.stock.Pieces;
import saltspoke.atlas.stock.RefusedRow;
import saltspoke.atlas.stock.Splits;
import saltspoke.atlas.stock.StockRun;

/** The tables of a short customer list as texts in memory. */
public final class StockTexts implements StockRun.Outcome {
  private final StockTables tables;
  private final StringBuilder answered = new StringBuilder();
  private final StringBuilder refused = new StringBuilder();
  private final CSVPrinter answeredOut;
  private final CSVPrinter refusedOut;

  /**
   * @param header columns of the list, for the table of refused rows
   */
  public StockTexts(StockTables tables, List<String> header) throws IOException {
    this.tables = tables;
    answeredOut = StockTables.printer(answered);
    refusedOut = StockTables.printer(refused);
    StockTables.answeredHeader(answeredOut);
    StockTables.refusedHeader(refusedOut, header);
  }

  @Override
  public void answered(CustomerAnswer answer) {
    try {
      tables.answered(answeredOut, answer);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  @Override
  public void refused(RefusedRow row) {
    try {
      StockTables.refused(refusedOut, row);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** All tables by name; those of shares only when somebody was answered. */
  public Map<String, String> all(Splits splits, List<Pieces.Line> orders) throws IOException {
    Map<String, String> all = new LinkedHashMap<>();
    all.put("rows", answered.toString());
    all.put("refused", refused.toString());
    if (splits.all().customers() > 0) {
      all.put("split", text(out -> StockTables.split(out, splits)));
      all.put("states", text(out -> StockTables.states(out, splits)));
      all.put("demand", text(out -> StockTables.demand(out, splits)));
      all.put("orders", text(out -> StockTables.orders(out, orders)));
    }
    return all;
  }

  private interface Writing {
    void to(StringBuilder out) throws IOException;
  }

  private static String text(Writing writing) throws IOException {
    StringBuilder out = new StringBuilder();
    writing.to(out);
    return out.toString();
  }
}
