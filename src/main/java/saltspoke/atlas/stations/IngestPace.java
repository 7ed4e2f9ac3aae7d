package saltspoke.atlas.stations;

import java.util.Locale;
import saltspoke.fields.Progress;
import saltspoke.sources.hourly.ArchiveFiles;

/** Tells the person who waits how fast it goes and how long it will take, once a second at most. */
final class IngestPace {
  private static final double NANOS = 1e9;

  private final Progress progress;
  private final int files;
  private final long bytes;
  private final long start = System.nanoTime();
  private int filesDone;
  private long bytesDone;
  private long rows;
  private double toldS;

  /**
   * @param files in all
   * @param filesDone of them done by a run before
   * @param bytes of the files that are left
   */
  IngestPace(Progress progress, int files, int filesDone, long bytes) {
    this.progress = progress;
    this.files = files;
    this.filesDone = filesDone;
    this.bytes = bytes;
    if (filesDone > 0) {
      progress.report(filesDone, files, "done by the run before; going on");
    }
  }

  synchronized void done(ArchiveFiles.Item item, FileOutcome outcome) {
    filesDone++;
    bytesDone += item.bytes();
    rows += outcome.rows();
    outcome
        .refusal()
        .ifPresent(
            refusal ->
                progress.report(
                    filesDone,
                    files,
                    "set aside " + refusal.field() + ": " + refusal.error().replace('-', ' ')));
    double spentS = (System.nanoTime() - start) / NANOS;
    if (spentS - toldS >= 1 || filesDone == files) {
      toldS = spentS;
      double leftS = bytesDone == 0 ? 0 : spentS * (bytes - bytesDone) / bytesDone;
      progress.report(
          filesDone,
          files,
          String.format(
              Locale.ROOT,
              "%,d rows, %,.0f a second, about %s left",
              rows,
              rows / spentS,
              time(leftS)));
    }
  }

  private static String time(double seconds) {
    return seconds < 90
        ? Math.round(seconds) + " s"
        : seconds < 5400 ? Math.round(seconds / 60) + " min" : Math.round(seconds / 3600) + " h";
  }
}
