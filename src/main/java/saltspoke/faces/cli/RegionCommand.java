package saltspoke.faces.cli;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import saltspoke.atlas.RegionOutlook;
import saltspoke.faces.Answers;
import saltspoke.faces.Parameters;
import saltspoke.faces.Questions;
import saltspoke.faces.Texts;
import saltspoke.faces.json.Json;
import saltspoke.faces.json.RegionJson;
import saltspoke.places.Area;
import saltspoke.sources.DrawnPolygons;
import saltspoke.values.Refusal;
import saltspoke.wheel.RidingProfile;

/** {@code region}: classes and pairings for the people of a region. */
@Command(
    name = "region",
    description = {
      "Classes and, with a profile, pairings for the people of a region.",
      "Shares of its towns by population. A region is a state, province or department by any of its",
      "names, a larger unit, or a country; or a polygon of your own.",
      ""
    },
    footer = {
      "",
      "Examples:",
      "  saltspoke region Bretagne",
      "  saltspoke region \"Nord, FR\" --profile all-winter-commuter --rim carbon-bare",
      "  saltspoke region --polygon sales-area.geojson --json"
    })
final class RegionCommand implements Callable<Integer> {
  @Spec private CommandSpec spec;
  @Mixin private WheelOptions wheel;
  @Mixin private CommonOptions common;
  @Mixin private CorrectionsOption corrections;

  @picocli.CommandLine.Parameters(
      paramLabel = "NAME",
      arity = "0..1",
      description = "Name of a region, in any of five languages; \", COUNTRY\" narrows it.")
  private String name;

  @Option(
      names = "--polygon",
      paramLabel = "FILE.geojson",
      description = "Polygon or MultiPolygon in place of a name (RFC 7946).")
  private Path polygon;

  @Option(
      names = "--sample",
      paramLabel = "N",
      description = "Towns at which wheels are worked out, 4..400 (32).")
  private String sample;

  @Override
  public Integer call() throws IOException {
    Map<String, String> values = wheel.values();
    PlaceOptions.put(values, "region", name);
    PlaceOptions.put(values, "sample", sample);
    PlaceOptions.put(values, "lang", common.language);
    Parameters parameters = new Parameters(values, Questions.REGION);
    Texts texts = Answers.textsFor(parameters);
    Answers answers = Opening.answers(common.data, corrections).prepare();
    Area area = area(answers, parameters);
    Optional<RidingProfile> profile =
        wheel.profileFile == null
            ? answers.namedProfile(parameters)
            : Optional.of(wheel.ownProfile(parameters));
    RegionOutlook outlook =
        answers.outlook(
            area,
            polygon == null ? answers.regions().belongingTo(area) : area::contains,
            parameters,
            profile);
    spec.commandLine()
        .getOut()
        .println(
            common.json
                ? Json.pretty(RegionJson.of(outlook, texts))
                : RegionText.of(outlook, texts));
    return ExitCode.DONE;
  }

  private Area area(Answers answers, Parameters parameters) throws IOException {
    Optional<String> region = parameters.text("region");
    if (region.isPresent() == (polygon != null)) {
      throw Refusal.wrongUse(
          "name-or-polygon", "region", region.orElse(""), "a region's name, or --polygon FILE");
    }
    if (region.isPresent()) {
      return answers.regions().find(region.get());
    }
    if (!Files.isReadable(polygon)) {
      throw Refusal.notFound("unreadable-file", "polygon", polygon, "a file that can be read");
    }
    String file = polygon.getFileName().toString();
    try (InputStream in = Files.newInputStream(polygon)) {
      return new Area(file, "", "", DrawnPolygons.read(in, file));
    }
  }
}
