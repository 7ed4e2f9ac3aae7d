package saltspoke.faces.cli;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.function.DoubleBinaryOperator;
import javax.imageio.ImageIO;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import saltspoke.atlas.ClimateComparison;
import saltspoke.atlas.Comparison;
import saltspoke.atlas.SiteComparison;
import saltspoke.atlas.SiteDepartures;
import saltspoke.atlas.WetnessComparison;
import saltspoke.atmosphere.AirModel;
import saltspoke.atmosphere.LeaveOneOut;
import saltspoke.atmosphere.MonthlyClimate;
import saltspoke.faces.json.ComparisonJson;
import saltspoke.faces.json.Json;
import saltspoke.fields.DataSet;
import saltspoke.places.PlaceDirectory;
import saltspoke.values.Refusal;

/** {@code compare}: judges the program's estimates by a file of measurements. */
@Command(
    name = "compare",
    description = {
      "Judge the program's estimates by a file of measurements.",
      "Files are CSV in UTF-8 with one header row; rows that do not read are listed and left out.",
      ""
    },
    footer = {
      "",
      "Examples:",
      "  saltspoke compare climate stations.csv",
      "  saltspoke compare wetness hourly.csv --json",
      "  saltspoke compare chloride sites.csv --picture chloride.png",
      "  saltspoke compare climate stations.csv --write-corrections local.csv",
      "  saltspoke air --place Valparaiso --corrections local.csv"
    })
final class CompareCommand implements Runnable {
  @Spec private CommandSpec spec;

  @Option(
      names = {"-h", "--help"},
      usageHelp = true,
      description = "Show this help.")
  private boolean help;

  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }

  /** What every comparison takes. */
  static final class Request {
    @Mixin private CommonOptions common;

    @Parameters(paramLabel = "FILE", description = "CSV file of measurements.")
    private Path file;

    @Option(
        names = "--worst",
        paramLabel = "N",
        description = "List the N stations farthest off, 0..1000 (5).")
    private int worst = 5;

    @Option(
        names = "--picture",
        paramLabel = "FILE.png",
        description = "Draw estimates over measurements.")
    private Path picture;
  }

  /** Reads an opened file of measurements. */
  private interface Reading<T> {
    T of(InputStream in, String fileName);
  }

  @Command(
      name = "climate",
      description = {
        "Monthly climate at stations. Columns:",
        "  latitude_deg, longitude_deg, elevation_m, temperature_c_01 … _12,",
        "  relative_humidity_pct_01 … _12",
        "and if there: station, diurnal_range_c_…, precipitation_mm_…, wind_speed_m_s_…,",
        "  frost_days_…",
        "Bias of humidity is given by continent too: coarse boxes, Europe and Asia meet at 60° E."
      })
  int climate(@Mixin Request request, @Mixin CorrectionsWriting writing) {
    World world = World.open(request.common.data);
    return answer(
        request,
        new ClimateComparison(world.climate(), world.seaDistanceKm())::run,
        writing,
        (in, name) -> SiteDepartures.climate(world.climate(), world.seaDistanceKm(), in, name));
  }

  @Command(
      name = "wetness",
      description = {
        "Wet hours of hourly records, from their own monthly means and from the shipped fields.",
        "Columns:",
        "  station, latitude_deg, longitude_deg, elevation_m, month, hour, temperature_c,",
        "  relative_humidity_pct",
        "A station's rows of one month stand in order of time; all twelve months are needed."
      })
  int wetness(@Mixin Request request, @Mixin CorrectionsWriting writing) {
    World world = World.open(request.common.data);
    return answer(
        request,
        new WetnessComparison(world.climate(), world.seaDistanceKm())::run,
        writing,
        (in, name) -> SiteDepartures.wetness(world.climate(), world.seaDistanceKm(), in, name));
  }

  @Command(
      name = "chloride",
      description = {
        "Sea-salt deposition at sites, from what the file says of them. Columns:",
        "  programme, station_id, distance_to_coast_km, elevation_m, wind_speed_m_s,",
        "  saline_wind_fraction (0..1), roughness (0..1), chloride_mg_m2_day",
        "and, to write corrections: latitude_deg, longitude_deg. A correction is the measurement",
        "over what the command air answers there."
      })
  int chloride(@Mixin Request request, @Mixin CorrectionsWriting writing) {
    return answer(
        request,
        SiteComparison::chloride,
        writing,
        (in, name) -> {
          World world = World.open(request.common.data);
          return SiteDepartures.chloride(AirModel.from(world.data()), world.places(), in, name);
        });
  }

  @Command(
      name = "corrosion",
      description = {
        "First-year losses by ISO 9223 from measured inputs. Columns:",
        "  site, temperature_c, relative_humidity_pct, so2_mg_m2_day, chloride_mg_m2_day",
        "and of carbon_steel_um, zinc_um, copper_um, aluminium_um those that were measured."
      })
  int corrosion(@Mixin Request request) {
    return answer(request, SiteComparison::corrosion, new CorrectionsWriting(), null);
  }

  /** The shipped or named data, with what a comparison asks of it. */
  private record World(
      DataSet data,
      PlaceDirectory places,
      MonthlyClimate climate,
      DoubleBinaryOperator seaDistanceKm) {
    static World open(Path directory) {
      DataSet data = Opening.dataSet(directory);
      PlaceDirectory places = PlaceDirectory.open(data);
      return new World(
          data,
          places,
          MonthlyClimate.from(data),
          (lat, lon) -> places.seaView(lat, lon).distanceKm());
    }
  }

  private int answer(
      Request request,
      Reading<Comparison> judge,
      CorrectionsWriting writing,
      Reading<SiteDepartures> correct) {
    if (request.worst < 0 || request.worst > 1000) {
      throw Refusal.outOfRange("worst", request.worst, "0..1000");
    }
    Comparison comparison = read(request.file, judge);
    if (request.picture != null) {
      draw(comparison, request.picture);
    }
    ObjectNode json = ComparisonJson.of(comparison, request.worst);
    StringBuilder text = new StringBuilder(ComparisonText.of(comparison, request.worst));
    if (writing.target != null) {
      SiteDepartures departures = read(request.file, correct);
      LeaveOneOut.Drafted drafted = writing.write(departures, request.file);
      json.set("corrections", CorrectionsWriting.json(writing.target, drafted, departures));
      text.append('\n').append(CorrectionsWriting.text(writing.target, drafted, departures));
    }
    spec.commandLine().getOut().println(request.common.json ? Json.pretty(json) : text);
    return ExitCode.DONE;
  }

  private static <T> T read(Path file, Reading<T> reading) {
    if (!Files.isRegularFile(file)) {
      throw Refusal.notFound("unreadable-file", "FILE", file, "a CSV file that can be read");
    }
    try (InputStream in = Files.newInputStream(file)) {
      return reading.of(in, file.getFileName().toString());
    } catch (IOException e) {
      throw Refusal.notFound("unreadable-file", "FILE", file, "a CSV file that can be read");
    }
  }

  private static void draw(Comparison comparison, Path picture) {
    try {
      if (!ImageIO.write(ScatterPicture.of(comparison.series()), "png", picture.toFile())) {
        throw new IOException("no PNG writer");
      }
    } catch (IOException e) {
      throw Refusal.wrongUse(
          "unwritable-file", "picture", picture, "a file name in a folder that can be written");
    }
  }
}
