package saltspoke.faces.cli;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Locale;
import picocli.CommandLine.Option;
import saltspoke.atlas.SiteDepartures;
import saltspoke.atmosphere.CorrectionFile;
import saltspoke.atmosphere.LeaveOneOut;
import saltspoke.faces.json.Json;
import saltspoke.values.Refusal;

/** The option to write a correction file beside a comparison, and what is said of it. */
final class CorrectionsWriting {
  @Option(
      names = "--write-corrections",
      paramLabel = "OUT.csv",
      description = "Write site corrections that --corrections of other commands takes.")
  Path target;

  /** Writes the file beside its place and then moves it there in one step. */
  LeaveOneOut.Drafted write(SiteDepartures departures, Path measurements) {
    LeaveOneOut.Drafted drafted = LeaveOneOut.draft(departures.rows());
    Path place = target.toAbsolutePath();
    Path aside =
        place.resolveSibling(place.getFileName() + "." + ProcessHandle.current().pid() + ".part");
    try {
      if (Files.exists(place) && Files.isSameFile(place, measurements)) {
        throw Refusal.wrongUse(
            "same-file", "write-corrections", target, "another file than the measurements");
      }
      Files.write(aside, CorrectionFile.write(drafted).getBytes(StandardCharsets.UTF_8));
      Files.move(aside, place, StandardCopyOption.ATOMIC_MOVE);
    } catch (IOException e) {
      throw Refusal.wrongUse(
          "unwritable-file",
          "write-corrections",
          target,
          "a file name in a folder that can be written");
    }
    return drafted;
  }

  static ObjectNode json(Path target, LeaveOneOut.Drafted drafted, SiteDepartures departures) {
    ObjectNode node = Json.object();
    node.put("file", target.toString());
    node.put("rows", drafted.rows().size());
    ArrayNode errors = node.putArray("leaveOneOut");
    for (LeaveOneOut error : drafted.errors()) {
      ObjectNode entry = errors.addObject();
      entry.put("quantity", error.quantity().id());
      entry.put("kind", error.quantity().kind());
      entry.put("sites", error.sites());
      entry.put("withNeighbours", error.withNeighbours());
      boolean judged = error.withNeighbours() > 0;
      Json.numberOrNull(entry, "rmseBefore", judged ? error.rmseBefore() : null);
      Json.numberOrNull(entry, "rmseAfter", judged ? error.rmseAfter() : null);
      Json.numberOrNull(entry, "bandCoveragePct", judged ? error.bandCoveragePct() : null);
      Json.number(entry, "spread", error.spread());
    }
    ArrayNode refused = node.putArray("refused");
    departures.refused().forEach(refusal -> refused.add(Json.error(refusal)));
    return node;
  }

  static String text(Path target, LeaveOneOut.Drafted drafted, SiteDepartures departures) {
    StringBuilder out = new StringBuilder();
    out.append(
        String.format(
            Locale.ROOT, "Corrections: %d rows written to %s%n", drafted.rows().size(), target));
    drafted.errors().forEach(e -> out.append("  ").append(e.sentence()).append('\n'));
    ComparisonText.refused(out, "Without a correction", departures.refused());
    return out.toString();
  }
}
