package saltspoke.faces.web;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.List;
import java.util.Map;
import saltspoke.atlas.stock.CustomerAnswer;
import saltspoke.atlas.stock.CustomerReader;
import saltspoke.atlas.stock.Pieces;
import saltspoke.atlas.stock.RefusedRow;
import saltspoke.atlas.stock.Splits;
import saltspoke.atlas.stock.StockQuestion;
import saltspoke.atlas.stock.StockRun;
import saltspoke.faces.Answers;
import saltspoke.faces.Parameters;
import saltspoke.faces.StockQuestions;
import saltspoke.faces.Texts;
import saltspoke.faces.export.StockTables;
import saltspoke.faces.export.StockTexts;
import saltspoke.faces.json.Json;
import saltspoke.faces.json.StockJson;
import saltspoke.places.Area;
import saltspoke.places.AreaIndex;
import saltspoke.sources.LooseTable;
import saltspoke.values.Refusal;

/**
 * A customer list by POST: answered in one go and forgotten. The reply carries the tables for
 * download, so that nothing need be kept.
 */
final class StockResource {
  /** Rows of one list; the command line takes any number. */
  static final int MOST_ROWS = 5_000;

  /** Time for one list. */
  static final Duration LONGEST = Duration.ofSeconds(25);

  private final Answers answers;
  private AreaIndex areas;

  StockResource(Answers answers) {
    this.answers = answers;
  }

  Reply list(Ask ask) {
    Parameters parameters = new Parameters(ask.query(), StockQuestions.NAMES);
    Texts texts = Answers.textsFor(parameters);
    StockQuestion question = answers.stockQuestion(parameters);
    Splits splits = new Splits(question);
    byte[] list = ask.body().getBytes(StandardCharsets.UTF_8);
    try (LooseTable table = LooseTable.open(new ByteArrayInputStream(list), "list")) {
      CustomerReader reader =
          new CustomerReader(table, answers.catalogue(), answers.profiles(), question);
      StockTexts files = new StockTexts(new StockTables(texts), table.header());
      Rows rows = new Rows(splits, files);
      StockRun.over(table, reader, answers.desk(question), rows, Rows::counted);
      List<Pieces.Line> orders =
          Pieces.order(splits, StockQuestions.buying(parameters, Map.of()), question.buildMonth());
      ObjectNode node = StockJson.of(splits, orders, rows.refusedRows.size());
      node.set("rows", rows.rows);
      node.set("refusedRows", rows.refusedRows);
      ArrayNode ignored = node.putArray("ignoredColumns");
      reader.ignored(table.header()).forEach(ignored::add);
      outlines(node, splits);
      ObjectNode named = node.putObject("files");
      files.all(splits, orders).forEach(named::put);
      return Reply.json(node);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Outlines of the regions, in the order of the regions; empty where none is known. */
  private void outlines(ObjectNode node, Splits splits) {
    ArrayNode outlines = node.putArray("outlines");
    splits
        .byRegion()
        .values()
        .forEach(
            split -> {
              ArrayNode polygons = outlines.addArray();
              int at = index().at(split.latitudeDeg(), split.longitudeDeg());
              if (at >= 0) {
                outline(answers.regions().all().get(at), polygons);
              }
            });
  }

  private synchronized AreaIndex index() {
    if (areas == null) {
      areas = new AreaIndex(answers.regions().all());
    }
    return areas;
  }

  /** Latitude before longitude, as the map's library takes them, to a hundredth of a degree. */
  private static void outline(Area area, ArrayNode polygons) {
    for (List<double[]> polygon : area.polygons()) {
      ArrayNode ring = polygons.addArray();
      double[] outer = polygon.get(0);
      for (int i = 0; i < outer.length; i += 2) {
        ring.addArray()
            .add(Math.rint(100 * outer[i + 1]) / 100)
            .add(Math.rint(100 * outer[i]) / 100);
      }
    }
  }

  /** Gathers the rows of a list. */
  private static final class Rows implements StockRun.Outcome {
    private final Splits splits;
    private final StockTexts files;
    private final ArrayNode rows = Json.array();
    private final ArrayNode refusedRows = Json.array();

    Rows(Splits splits, StockTexts files) {
      this.splits = splits;
      this.files = files;
    }

    static void counted(long done) {
      if (done > MOST_ROWS) {
        throw Refusal.outOfRange(
            "list",
            "more than " + MOST_ROWS + " rows",
            "at most " + MOST_ROWS + " rows; the stock command takes any number");
      }
    }

    @Override
    public void answered(CustomerAnswer answer) {
      splits.add(answer);
      rows.add(StockJson.row(answer));
      files.answered(answer);
    }

    @Override
    public void refused(RefusedRow row) {
      refusedRows.add(StockJson.refused(row));
      files.refused(row);
    }
  }
}
