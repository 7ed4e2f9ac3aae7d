package saltspoke.faces.export;

import java.io.BufferedWriter;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.List;
import org.apache.commons.csv.CSVPrinter;
import saltspoke.atlas.stock.CustomerAnswer;
import saltspoke.atlas.stock.Pieces;
import saltspoke.atlas.stock.RefusedRow;
import saltspoke.atlas.stock.Splits;
import saltspoke.atlas.stock.StockRun;

/**
 * Writes what comes of a customer list into a folder. Rows go to files with the ending {@code
 * .part} as they come; only {@link #finish} gives all files their names.
 */
public final class StockFolder implements StockRun.Outcome, AutoCloseable {
  private static final List<String> FILES =
      List.of("rows.csv", "refused.csv", "split.csv", "states.csv", "demand.csv", "orders.csv");

  private final Path folder;
  private final StockTables tables;
  private final CSVPrinter rows;
  private final CSVPrinter refused;
  private boolean open = true;

  /**
   * @param header columns of the list, for the file of refused rows
   */
  public StockFolder(Path folder, StockTables tables, List<String> header) throws IOException {
    this.folder = Files.createDirectories(folder);
    this.tables = tables;
    this.rows = StockTables.printer(writer("rows.csv"));
    this.refused = StockTables.printer(writer("refused.csv"));
    StockTables.answeredHeader(rows);
    StockTables.refusedHeader(refused, header);
  }

  private BufferedWriter writer(String file) throws IOException {
    return Files.newBufferedWriter(part(file), StandardCharsets.UTF_8);
  }

  private Path part(String file) {
    return folder.resolve(file + ".part");
  }

  @Override
  public void answered(CustomerAnswer answer) {
    try {
      tables.answered(rows, answer);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  @Override
  public void refused(RefusedRow row) {
    try {
      StockTables.refused(refused, row);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Writes the sums and gives every file its name. */
  public void finish(Splits splits, List<Pieces.Line> orders) throws IOException {
    close();
    try (BufferedWriter out = writer("split.csv")) {
      StockTables.split(out, splits);
    }
    try (BufferedWriter out = writer("states.csv")) {
      StockTables.states(out, splits);
    }
    try (BufferedWriter out = writer("demand.csv")) {
      StockTables.demand(out, splits);
    }
    try (BufferedWriter out = writer("orders.csv")) {
      StockTables.orders(out, orders);
    }
    for (String file : FILES) {
      Files.move(part(file), folder.resolve(file), StandardCopyOption.REPLACE_EXISTING);
    }
  }

  @Override
  public void close() throws IOException {
    if (open) {
      open = false;
      rows.close(true);
      refused.close(true);
    }
  }
}
