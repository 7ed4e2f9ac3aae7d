package saltspoke.faces.cli;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import saltspoke.atlas.stock.CustomerAnswer;
import saltspoke.atlas.stock.CustomerDesk;
import saltspoke.atlas.stock.CustomerReader;
import saltspoke.atlas.stock.Pieces;
import saltspoke.atlas.stock.Preference;
import saltspoke.atlas.stock.RefusedRow;
import saltspoke.atlas.stock.Splits;
import saltspoke.atlas.stock.StockQuestion;
import saltspoke.atlas.stock.StockRun;
import saltspoke.faces.Answers;
import saltspoke.faces.Parameters;
import saltspoke.faces.StockQuestions;
import saltspoke.faces.Texts;
import saltspoke.faces.export.StockFolder;
import saltspoke.faces.export.StockTables;
import saltspoke.faces.json.Json;
import saltspoke.faces.json.StockJson;
import saltspoke.faces.picture.SplitPicture;
import saltspoke.sources.CsvTable;
import saltspoke.sources.LooseTable;
import saltspoke.values.Refusal;
import saltspoke.wheel.RidingProfile;

/** {@code stock}: a list of customers in, the split and what to order out. */
@Command(
    name = "stock",
    description = {
      "What to hold in stock for a list of customers: classes, pairings, demand, orders.",
      "CUSTOMERS is a CSV as offices export it (any usual encoding and separator) with a header",
      "row: postcode and country, or place; and, where known, wheels (how many the row stands",
      "for, 1), profile, rim, nipple, interface, spoke (of today's wheels). What is sure is",
      "mended, what is not comes back in refused.csv with the reason.",
      ""
    },
    footer = {
      "",
      "A customer gets the first pairing of the order of preference whose first look, by the",
      "accepted risk alone, lies at least --wanted-months away; else the one that lasts longest.",
      "Orders cover the wheels of today's pairing that are expected to seize within a year.",
      "",
      "Examples:",
      "  saltspoke stock customers.csv --into out",
      "  saltspoke stock customers.csv --risk cautious --pack 72 --lead-weeks 8 --stock have.csv",
      "  saltspoke stock customers.csv --json --picture split.svg"
    })
final class StockCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;
  @Mixin private WheelOptions wheel;
  @Mixin private CommonOptions common;
  @Mixin private CorrectionsOption corrections;

  @picocli.CommandLine.Parameters(paramLabel = "CUSTOMERS", description = "CSV file of customers.")
  private Path customers;

  @Option(
      names = "--into",
      paramLabel = "FOLDER",
      description = "Write rows, refused, split, states, demand and orders there as CSV.")
  private Path into;

  @Option(
      names = "--wanted-months",
      paramLabel = "N",
      description = "First look that is wanted, 1..24 months (12).")
  private String wantedMonths;

  @Option(names = "--pack", paramLabel = "N", description = "Pieces in a pack (100).")
  private String pack;

  @Option(
      names = "--lead-weeks",
      paramLabel = "N",
      description = "Weeks from order to delivery, 0..52 (6).")
  private String leadWeeks;

  @Option(
      names = "--stock",
      paramLabel = "FILE",
      description = "CSV of what is in hand: kind (nipple or interface), id, pieces.")
  private Path inHand;

  @Option(
      names = "--preference",
      paramLabel = "FILE",
      description = "CSV of your own order of preference: nipple, interface, reason.")
  private Path preference;

  @Option(
      names = "--picture",
      paramLabel = "FILE.svg",
      description = "Draw the split by region as bars.")
  private Path picture;

  @Override
  public Integer call() throws IOException {
    Map<String, String> values = wheel.values();
    PlaceOptions.put(values, "lang", common.language);
    PlaceOptions.put(values, "wanted-months", wantedMonths);
    PlaceOptions.put(values, "pack", pack);
    PlaceOptions.put(values, "lead-weeks", leadWeeks);
    Parameters parameters = new Parameters(values, StockQuestions.NAMES);
    Texts texts = Answers.textsFor(parameters);
    Answers answers = Opening.answers(common.data, corrections).prepare();
    StockQuestion question = question(answers, parameters);
    Pieces.Buying buying =
        StockQuestions.buying(
            parameters,
            inHand == null
                ? Map.of()
                : StockQuestions.inHand(
                    CsvTable.read(open(inHand, "stock"), inHand.getFileName().toString()),
                    answers.catalogue()));
    Splits splits = new Splits(question);
    long refused = run(answers, question, splits, texts, buying);
    List<Pieces.Line> orders = Pieces.order(splits, buying, question.buildMonth());
    if (picture != null) {
      Files.writeString(
          picture,
          SplitPicture.svg(splits, texts, texts.say("page-stock-split")),
          StandardCharsets.UTF_8);
    }
    spec.commandLine()
        .getOut()
        .println(
            common.json
                ? Json.pretty(StockJson.of(splits, orders, refused))
                : StockText.of(splits, orders, refused, texts));
    return ExitCode.DONE;
  }

  private StockQuestion question(Answers answers, Parameters parameters) throws IOException {
    if (wheel.profileFile == null && preference == null) {
      return answers.stockQuestion(parameters);
    }
    RidingProfile profile =
        wheel.profileFile == null
            ? answers.stockQuestion(parameters).profile()
            : wheel.ownProfile(parameters);
    List<Preference> order =
        preference == null
            ? Preference.shipped(answers.catalogue())
            : Preference.read(
                open(preference, "preference"),
                preference.getFileName().toString(),
                answers.catalogue());
    return answers.stockQuestion(parameters, profile, order);
  }

  private long run(
      Answers answers, StockQuestion question, Splits splits, Texts texts, Pieces.Buying buying)
      throws IOException {
    CountingInput in = new CountingInput(open(customers, "CUSTOMERS"));
    long size = Math.max(1, Files.size(customers));
    ProgressLine progress = new ProgressLine(spec.commandLine().getErr(), "rows");
    try (LooseTable table = LooseTable.open(in, customers.getFileName().toString())) {
      CustomerReader reader =
          new CustomerReader(table, answers.catalogue(), answers.profiles(), question);
      CustomerDesk desk = answers.desk(question);
      Sums sums = new Sums(splits);
      if (into == null) {
        StockRun.over(
            table, reader, desk, sums, rows -> progress.report(rows, in.share(size, table)));
      } else {
        try (StockFolder folder = new StockFolder(into, new StockTables(texts), table.header())) {
          StockRun.over(
              table,
              reader,
              desk,
              sums.and(folder),
              rows -> progress.report(rows, in.share(size, table)));
          folder.finish(splits, Pieces.order(splits, buying, question.buildMonth()));
        }
      }
      List<String> ignored = reader.ignored(table.header());
      if (!ignored.isEmpty()) {
        spec.commandLine()
            .getErr()
            .println("columns without a known meaning: " + String.join(", ", ignored));
      }
      return sums.refused;
    }
  }

  private static InputStream open(Path file, String field) {
    try {
      return Files.newInputStream(file);
    } catch (IOException e) {
      throw Refusal.notFound("unreadable-file", field, file, "a file that can be read");
    }
  }

  /** Adds up what comes, and hands it on if there is somebody to hand it to. */
  private static final class Sums implements StockRun.Outcome {
    private final Splits splits;
    private StockRun.Outcome next;
    private long refused;

    Sums(Splits splits) {
      this.splits = splits;
    }

    Sums and(StockRun.Outcome other) {
      next = other;
      return this;
    }

    @Override
    public void answered(CustomerAnswer answer) {
      splits.add(answer);
      if (next != null) {
        next.answered(answer);
      }
    }

    @Override
    public void refused(RefusedRow row) {
      refused++;
      if (next != null) {
        next.refused(row);
      }
    }
  }

  /** Counts the bytes read, for the share that is done. */
  private static final class CountingInput extends FilterInputStream {
    private long count;

    CountingInput(InputStream in) {
      super(in);
    }

    /** The file is read ahead of the rows, so the end is only where no row is left. */
    double share(long size, LooseTable table) {
      return table.hasNext() ? Math.min(0.999, count / (double) size) : 1;
    }

    @Override
    public int read() throws IOException {
      int b = super.read();
      count += b >= 0 ? 1 : 0;
      return b;
    }

    @Override
    public int read(byte[] buffer, int offset, int length) throws IOException {
      int n = super.read(buffer, offset, length);
      count += Math.max(0, n);
      return n;
    }
  }
}
