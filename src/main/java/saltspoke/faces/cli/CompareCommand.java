package saltspoke.faces.cli;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
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
import saltspoke.atlas.WetnessComparison;
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
      "  saltspoke compare chloride sites.csv --picture chloride.png"
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
  private interface Judge {
    Comparison run(InputStream in, String fileName);
  }

  @Command(
      name = "climate",
      description = {
        "Monthly climate at stations. Columns:",
        "  latitude_deg, longitude_deg, elevation_m, temperature_c_01 … _12,",
        "  relative_humidity_pct_01 … _12",
        "and if there: diurnal_range_c_…, precipitation_mm_…, wind_speed_m_s_…, frost_days_…",
        "Bias of humidity is given by continent too: coarse boxes, Europe and Asia meet at 60° E."
      })
  int climate(@Mixin Request request) {
    DataSet data = Opening.dataSet(request.common.data);
    PlaceDirectory places = PlaceDirectory.open(data);
    return answer(
        request,
        new ClimateComparison(
                MonthlyClimate.from(data), (lat, lon) -> places.seaView(lat, lon).distanceKm())
            ::run);
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
  int wetness(@Mixin Request request) {
    DataSet data = Opening.dataSet(request.common.data);
    PlaceDirectory places = PlaceDirectory.open(data);
    return answer(
        request,
        new WetnessComparison(
                MonthlyClimate.from(data), (lat, lon) -> places.seaView(lat, lon).distanceKm())
            ::run);
  }

  @Command(
      name = "chloride",
      description = {
        "Sea-salt deposition at sites, from what the file says of them. Columns:",
        "  programme, station_id, distance_to_coast_km, elevation_m, wind_speed_m_s,",
        "  saline_wind_fraction (0..1), roughness (0..1), chloride_mg_m2_day"
      })
  int chloride(@Mixin Request request) {
    return answer(request, SiteComparison::chloride);
  }

  @Command(
      name = "corrosion",
      description = {
        "First-year losses by ISO 9223 from measured inputs. Columns:",
        "  site, temperature_c, relative_humidity_pct, so2_mg_m2_day, chloride_mg_m2_day",
        "and of carbon_steel_um, zinc_um, copper_um, aluminium_um those that were measured."
      })
  int corrosion(@Mixin Request request) {
    return answer(request, SiteComparison::corrosion);
  }

  private int answer(Request request, Judge judge) {
    if (request.worst < 0 || request.worst > 1000) {
      throw Refusal.outOfRange("worst", request.worst, "0..1000");
    }
    Comparison comparison = read(request.file, judge);
    if (request.picture != null) {
      draw(comparison, request.picture);
    }
    spec.commandLine()
        .getOut()
        .println(
            request.common.json
                ? Json.pretty(ComparisonJson.of(comparison, request.worst))
                : ComparisonText.of(comparison, request.worst));
    return ExitCode.DONE;
  }

  private static Comparison read(Path file, Judge judge) {
    if (!Files.isRegularFile(file)) {
      throw Refusal.notFound("unreadable-file", "FILE", file, "a CSV file that can be read");
    }
    try (InputStream in = Files.newInputStream(file)) {
      return judge.run(in, file.getFileName().toString());
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
