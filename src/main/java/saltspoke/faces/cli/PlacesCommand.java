package saltspoke.faces.cli;

import java.io.PrintWriter;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import saltspoke.faces.json.Json;
import saltspoke.faces.json.PlacesJson;
import saltspoke.places.PlaceHit;
import saltspoke.values.Refusal;

/** {@code places}: towns whose name begins as asked, most populous first. */
@Command(
    name = "places",
    description = "Find towns by the beginning of their name, most populous first.",
    footer = {"", "Example:", "  saltspoke places \"San Sebastian, ES\""})
final class PlacesCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;
  @Mixin private CommonOptions common;

  @Parameters(
      paramLabel = "NAME",
      description = "Beginning of a name; a country may follow a comma.")
  private String query;

  @Option(names = "--limit", paramLabel = "N", description = "At most this many, 1..50 (10).")
  private int limit = 10;

  @Override
  public Integer call() {
    if (limit < 1 || limit > 50) {
      throw Refusal.outOfRange("limit", limit, "1..50");
    }
    List<PlaceHit> hits = Opening.answers(common.data).search(query, limit);
    PrintWriter out = spec.commandLine().getOut();
    if (common.json) {
      out.println(Json.pretty(PlacesJson.of(hits)));
      return ExitCode.DONE;
    }
    if (hits.isEmpty()) {
      throw Refusal.notFound(
          "no-such-place",
          "place",
          query,
          "another spelling, a larger town near by, or --at LAT,LON");
    }
    for (PlaceHit hit : hits) {
      out.println(
          String.format(
              Locale.ROOT,
              "%s, %s, %s   %.4f,%.4f   %s   population %,d",
              hit.name(),
              hit.regionName(),
              hit.countryName(),
              hit.lat(),
              hit.lon(),
              hit.elevationM().isPresent()
                  ? Math.round(hit.elevationM().getAsDouble()) + " m"
                  : "height unknown",
              hit.population()));
    }
    return ExitCode.DONE;
  }
}
