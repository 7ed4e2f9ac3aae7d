package saltspoke.atlas.stations;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.Stream;
import saltspoke.fields.Progress;
import saltspoke.fields.PublishedFolder;
import saltspoke.sources.hourly.ArchiveFiles;
import saltspoke.sources.hourly.HourlyFormats;
import saltspoke.values.Refusal;

/**
 * Reads archives into a station data set. What is done lies in a journal beside the data set, so
 * that a run that was killed goes on where it stopped; the data set itself changes in one step at
 * the end.
 */
public final class StationIngest {
  private static final int MOST_THREADS = 64;
  private static final int MOST_YEARS = 30;

  /**
   * What to read and where to.
   *
   * @param archives files, folders and zip files
   * @param target folder of the data set
   * @param formats layouts that can be read
   * @param setting what the formats were made from (contents of station list and mapping): a
   *     journal of another setting is not gone on with
   * @param attribution line to show with the data
   * @param leastYears years that a calendar month needs, 1..30
   * @param threads 1..64
   */
  public record Request(
      List<Path> archives,
      Path target,
      HourlyFormats formats,
      String setting,
      String attribution,
      int leastYears,
      int threads) {
    public Request {
      archives = List.copyOf(archives);
      if (leastYears < 1 || leastYears > MOST_YEARS) {
        throw Refusal.outOfRange("least-years", leastYears, "1.." + MOST_YEARS);
      }
      if (threads < 1 || threads > MOST_THREADS) {
        throw Refusal.outOfRange("threads", threads, "1.." + MOST_THREADS);
      }
    }
  }

  /**
   * What came of it.
   *
   * @param files files read, those set aside included
   * @param resumed of them done by a run before
   * @param rows rows read
   * @param setAside reasons of the files set aside, at most the first hundred
   */
  public record Result(
      int files,
      int resumed,
      long rows,
      int stationYears,
      int stations,
      int used,
      int setAsideCount,
      List<Refusal> setAside,
      List<StationJudgement> judgements) {}

  private final Request request;
  private final Progress progress;
  private final Path work;

  public StationIngest(Request request, Progress progress) {
    this.request = request;
    this.progress = progress;
    Path place = request.target().toAbsolutePath().normalize();
    this.work = place.resolveSibling(place.getFileName() + ".work");
  }

  /**
   * Runs it.
   *
   * @throws Refusal when nothing could be read, when another ingest into the folder runs, or when
   *     the folder holds something else
   */
  public Result run(StationWorld world) throws IOException {
    Map<String, ArchiveFiles.Item> items = keyed(ArchiveFiles.list(request.archives()));
    if (items.isEmpty()) {
      throw Refusal.notFound("no-files", "ARCHIVE", request.archives(), "at least one file");
    }
    PublishedFolder.refuseOther(request.target());
    Result result;
    try (IngestJournal journal = IngestJournal.open(work, request.setting())) {
      int resumed = (int) items.keySet().stream().filter(journal::has).count();
      read(items, journal, resumed);
      Path aside = work.resolve("out");
      deleteTree(aside);
      try {
        result =
            new StationMerge(request, world, journal, List.copyOf(items.keySet()), resumed)
                .publish(aside);
      } catch (Refusal refusal) {
        // Nothing could be read: what is mended should not be held against an old journal.
        deleteTree(work);
        throw refusal;
      }
      // While the lock is still held: whoever gets it next finds no folder and begins anew.
      deleteTree(work);
    }
    return result;
  }

  /** A file by what would change with its content; two alike are told apart by their number. */
  private static Map<String, ArchiveFiles.Item> keyed(List<ArchiveFiles.Item> items) {
    Map<String, ArchiveFiles.Item> keyed = new LinkedHashMap<>();
    Map<String, Integer> alike = new HashMap<>();
    for (ArchiveFiles.Item item : items) {
      String key = item.name() + "|" + item.bytes() + "|" + item.changedMillis();
      int number = alike.merge(key, 1, Integer::sum);
      keyed.put(key + "|" + number, item);
    }
    return keyed;
  }

  private void read(Map<String, ArchiveFiles.Item> items, IngestJournal journal, int resumed)
      throws IOException {
    List<Map.Entry<String, ArchiveFiles.Item>> left =
        items.entrySet().stream().filter(e -> !journal.has(e.getKey())).toList();
    IngestPace pace =
        new IngestPace(
            progress,
            items.size(),
            resumed,
            left.stream().mapToLong(e -> e.getValue().bytes()).sum());
    AtomicInteger next = new AtomicInteger();
    ExecutorService pool = Executors.newFixedThreadPool(request.threads(), StationIngest::daemon);
    try {
      List<Future<?>> workers = new ArrayList<>();
      for (int t = 0; t < request.threads(); t++) {
        workers.add(
            pool.submit(
                () -> {
                  FileReading reading = new FileReading(request.formats());
                  for (int i = next.getAndIncrement();
                      i < left.size();
                      i = next.getAndIncrement()) {
                    ArchiveFiles.Item item = left.get(i).getValue();
                    FileOutcome outcome = reading.read(item.name(), item::open);
                    journal.add(left.get(i).getKey(), outcome);
                    pace.done(item, outcome);
                  }
                  return null;
                }));
      }
      for (Future<?> worker : workers) {
        worker.get();
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IOException("interrupted", e);
    } catch (ExecutionException e) {
      if (e.getCause() instanceof IOException io) {
        throw io;
      }
      throw new IllegalStateException(e.getCause());
    } finally {
      pool.shutdownNow();
    }
  }

  private static Thread daemon(Runnable work) {
    Thread thread = new Thread(work, "ingest");
    thread.setDaemon(true);
    return thread;
  }

  private static void deleteTree(Path folder) throws IOException {
    if (!Files.exists(folder)) {
      return;
    }
    try (Stream<Path> walk = Files.walk(folder)) {
      walk.sorted(Comparator.reverseOrder())
          .forEach(
              path -> {
                try {
                  Files.delete(path);
                } catch (IOException e) {
                  throw new UncheckedIOException(e);
                }
              });
    }
  }
}
