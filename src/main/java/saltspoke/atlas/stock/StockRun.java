package saltspoke.atlas.stock;

import java.util.ArrayList;
import java.util.List;
import java.util.function.LongConsumer;
import java.util.stream.IntStream;
import saltspoke.sources.LooseTable;
import saltspoke.values.Refusal;
import saltspoke.values.Stopped;

/**
 * Goes through a customer list: rows are answered some at a time on all cores and handed on in the
 * order of the file, so that the outcome does not hang on the number of cores and memory does not
 * grow with the list. Every row is handed on once, answered or refused.
 */
public final class StockRun {
  /** Rows answered together. */
  private static final int TOGETHER = 512;

  /** Where the rows go, in the order of the file. */
  public interface Outcome {
    void answered(CustomerAnswer answer);

    void refused(RefusedRow row);
  }

  private record Answered(CustomerAnswer answer, RefusedRow refused) {}

  private StockRun() {}

  /**
   * @param progress called with the number of rows done now and then
   */
  public static void over(
      LooseTable table,
      CustomerReader reader,
      CustomerDesk desk,
      Outcome outcome,
      LongConsumer progress) {
    long done = 0;
    List<LooseTable.Row> rows = new ArrayList<>(TOGETHER);
    while (table.hasNext()) {
      Stopped.check();
      rows.add(table.next());
      if (rows.size() == TOGETHER || !table.hasNext()) {
        Answered[] answered = new Answered[rows.size()];
        List<LooseTable.Row> batch = rows;
        IntStream.range(0, answered.length)
            .parallel()
            .forEach(i -> answered[i] = answer(batch.get(i), reader, desk));
        for (Answered each : answered) {
          if (each.answer() != null) {
            outcome.answered(each.answer());
          } else {
            outcome.refused(each.refused());
          }
        }
        done += answered.length;
        progress.accept(done);
        rows = new ArrayList<>(TOGETHER);
      }
    }
  }

  private static Answered answer(LooseTable.Row row, CustomerReader reader, CustomerDesk desk) {
    try {
      return new Answered(desk.answer(reader.read(row)), null);
    } catch (Refusal refusal) {
      if (refusal.kind() == Refusal.Kind.DATA_DAMAGED) {
        throw refusal;
      }
      return new Answered(null, new RefusedRow(row, refusal));
    }
  }
}
