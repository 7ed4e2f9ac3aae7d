package saltspoke.faces.cli;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import saltspoke.atlas.AreaTally;
import saltspoke.atlas.AreaValue;
import saltspoke.atlas.AtlasFrame;
import saltspoke.atlas.AtlasLayer;
import saltspoke.atlas.AtlasRun;
import saltspoke.atlas.PlaneToEarth;
import saltspoke.atlas.PointValues;
import saltspoke.faces.About;
import saltspoke.faces.Answers;
import saltspoke.faces.Parameters;
import saltspoke.faces.Questions;
import saltspoke.faces.Texts;
import saltspoke.faces.export.AreaGeoJson;
import saltspoke.faces.export.AtlasPicture;
import saltspoke.faces.export.AtlasWorkFile;
import saltspoke.faces.export.CloudGeoTiff;
import saltspoke.faces.export.CoordinateSystem;
import saltspoke.faces.json.Json;
import saltspoke.faces.picture.LayerStyle;
import saltspoke.faces.picture.LayerStyles;
import saltspoke.values.Note;
import saltspoke.values.Refusal;

/** {@code atlas}: rasters, pictures and regions of any layer, for a box or the world. */
@Command(
    name = "atlas",
    description = {
      "Rasters of any layer for a box or the world.",
      "Every cell holds the answer of the point in its middle. The name of --out says the form: .tif (cloud-optimised GeoTIFF), .png (picture",
      "with legend), .geojson (by region); give --out more than once for several. A run that was",
      "killed goes on where it stopped when the same command is given again.",
      ""
    },
    footer = {
      "",
      "Layers:",
      "  class-METAL, loss-METAL (carbon-steel, zinc, copper, aluminium), temperature, humidity,",
      "  chloride, so2, wet-hours, near-freezing-days; first-look with the options of a wheel",
      "",
      "Examples:",
      "  saltspoke atlas --layer class-carbon-steel --out world.tif --out world.png",
      "  saltspoke atlas --layer chloride --box -11,49,2,61 --step 0.05 --out isles.geojson",
      "  saltspoke atlas --layer wet-hours --box 0,42,20,56 --crs EPSG:3035 --step 10000 \\",
      "      --out europe.tif",
      "  saltspoke atlas --layer first-look --profile all-winter-commuter --rim carbon-bare \\",
      "      --nipple brass-nickel --interface none --spoke stainless --box 5,45,16,56 \\",
      "      --out germany.png"
    })
final class AtlasCommand implements Callable<Integer> {
  private static final double[] WORLD = {-180, -90, 180, 90};

  @Spec private CommandSpec spec;
  @Mixin private WheelOptions wheel;
  @Mixin private CommonOptions common;
  @Mixin private CorrectionsOption corrections;

  @Option(names = "--layer", paramLabel = "LAYER", required = true, description = "What to show.")
  private String layer;

  @Option(
      names = "--out",
      paramLabel = "FILE",
      required = true,
      description = "File to write: .tif, .png or .geojson.")
  private List<Path> out;

  @Option(
      names = "--box",
      paramLabel = "W,S,E,N",
      description = "Edges in degrees; west may exceed east across 180° (the world).")
  private String box;

  @Option(
      names = "--step",
      paramLabel = "STEP",
      description = "Size of a cell: degrees (0.25), or metres where the system has them (25000).")
  private Double step;

  @Option(
      names = "--crs",
      paramLabel = "EPSG:n",
      description = "Coordinate system of the cells (EPSG:4326, degrees).")
  private String crs = "EPSG:4326";

  @Option(names = "--threads", paramLabel = "N", description = "Threads, 1..64 (all cores).")
  private int threads = Runtime.getRuntime().availableProcessors();

  @Override
  public Integer call() throws IOException, InterruptedException {
    AtlasLayer which = Parameters.choose("layer", layer, AtlasLayer.values(), AtlasLayer::id);
    out.forEach(AtlasCommand::form);
    if (threads < 1 || threads > 64) {
      throw Refusal.outOfRange("threads", threads, "1..64");
    }
    Map<String, String> values = wheel.values();
    PlaceOptions.put(values, "lang", common.language);
    Parameters parameters = new Parameters(values, Questions.ATLAS);
    Texts texts = Answers.textsFor(parameters);
    double[] edges = box == null ? WORLD : edges(box);
    CoordinateSystem system = CoordinateSystem.of(crs);
    AtlasFrame frame = system.frame(edges, step(system));
    PlaneToEarth earth = system.toEarth(edges);
    Answers answers = Opening.answers(common.data, corrections).prepare();
    PointValues points = points(answers, which, parameters);

    Path workFile = out.get(0).resolveSibling(out.get(0).getFileName() + ".part");
    String request =
        String.join(
            "\n",
            About.version(),
            which.id(),
            frame.toString(),
            Arrays.toString(edges),
            values.toString(),
            content(wheel.profileFile),
            content(corrections.file),
            answers.dataSet().manifest().files().toString());
    PrintWriter err = spec.commandLine().getErr();
    try (AtlasWorkFile tiles = AtlasWorkFile.open(workFile, request, frame.tiles())) {
      if (tiles.count() > 0) {
        err.printf("going on: %d of %d tiles are there%n", tiles.count(), frame.tiles());
      }
      ProgressLine progress = new ProgressLine(err, "land cells");
      new AtlasRun(frame, earth, points, threads).into(tiles, progress::report);
      for (Path file : out) {
        write(file, which, frame, earth, tiles, edges, points, answers, texts);
      }
      tell(which, frame);
    }
    Files.delete(workFile);
    return ExitCode.DONE;
  }

  private static String content(Path file) throws IOException {
    return file == null ? "" : Files.readString(file);
  }

  private PointValues points(Answers answers, AtlasLayer which, Parameters parameters) {
    if (which != AtlasLayer.FIRST_LOOK) {
      return answers.values(which);
    }
    return wheel.profileFile == null
        ? answers.firstLook(parameters)
        : answers.firstLook(parameters, wheel.ownProfile(parameters));
  }

  private void write(
      Path file,
      AtlasLayer which,
      AtlasFrame frame,
      PlaneToEarth earth,
      AtlasWorkFile tiles,
      double[] edges,
      PointValues points,
      Answers answers,
      Texts texts)
      throws IOException {
    String title = texts.say("page-layer-" + which.id());
    String source = texts.say(Note.of("atlas-source", "version", About.version()));
    switch (form(file)) {
      case "png" -> {
        LayerStyle style = LayerStyles.of(which);
        String unit = which == AtlasLayer.FIRST_LOOK ? texts.say("atlas-months") : style.unit();
        AtlasPicture.write(
            file,
            frame,
            style,
            tiles,
            new AtlasPicture.Words(title, wheel.title(texts), unit, source));
      }
      case "geojson" -> {
        List<AreaValue> areas =
            AreaTally.of(
                answers.regions().all(), frame, earth, tiles, which.ofClasses(), edges, points);
        Map<String, String> about = new LinkedHashMap<>();
        about.put("title", title);
        about.put("source", source);
        AreaGeoJson.write(file, which, areas, about);
      }
      default -> CloudGeoTiff.write(file, frame, which, tiles, description(which));
    }
  }

  private void tell(AtlasLayer which, AtlasFrame frame) throws IOException {
    ObjectNode answer = Json.object();
    answer.put("layer", which.id());
    answer.put("unit", which.unit());
    answer.put("crs", "EPSG:" + frame.epsg());
    answer.put("columns", frame.columns());
    answer.put("rows", frame.rows());
    ArrayNode files = answer.putArray("files");
    StringBuilder lines = new StringBuilder();
    for (Path file : out) {
      files.addObject().put("file", file.toString()).put("bytes", Files.size(file));
      AirText.line(
          lines,
          "%s: %d × %d cells, %,d bytes",
          file,
          frame.columns(),
          frame.rows(),
          Files.size(file));
    }
    spec.commandLine()
        .getOut()
        .print(common.json ? Json.pretty(answer) + System.lineSeparator() : lines);
  }

  private static String description(AtlasLayer which) {
    return String.format(
        "Saltspoke %s, %s, %s, value of the middle of each cell; missing at sea. Made from maps of"
            + " ITU-R, NOAA and US Navy climatologies, GSHHG (LGPL-3), GeoNames (CC BY 4.0), Natural"
            + " Earth; see saltspoke about --licences",
        About.version(), which.id(), which.unit());
  }

  private double step(CoordinateSystem system) {
    double size = step == null ? (system.inDegrees() ? 0.25 : 25_000) : step;
    double least = system.inDegrees() ? 0.001 : 100;
    double most = system.inDegrees() ? 30 : 3_000_000;
    if (!(size >= least && size <= most)) {
      throw Refusal.outOfRange(
          "step", size, least + ".." + most + (system.inDegrees() ? " degrees" : " metres"));
    }
    return size;
  }

  private static double[] edges(String text) {
    String allowed = "W,S,E,N in degrees, such as -11,49,2,61";
    String[] parts = text.split(",", -1);
    if (parts.length != 4) {
      throw Refusal.wrongUse("not-a-box", "box", Parameters.shortened(text), allowed);
    }
    double[] southWest = Parameters.latitudeLongitude("box", parts[1] + "," + parts[0]);
    double[] northEast = Parameters.latitudeLongitude("box", parts[3] + "," + parts[2]);
    double east = northEast[1] <= southWest[1] ? northEast[1] + 360 : northEast[1];
    if (!(northEast[0] > southWest[0])) {
      throw Refusal.outOfRange("box", Parameters.shortened(text), allowed + ", north above south");
    }
    return new double[] {southWest[1], southWest[0], east, northEast[0]};
  }

  private static String form(Path file) {
    String name = file.getFileName().toString().toLowerCase(Locale.ROOT);
    String end = name.substring(name.lastIndexOf('.') + 1);
    return switch (end) {
      case "tif", "tiff" -> "tif";
      case "png" -> "png";
      case "geojson", "json" -> "geojson";
      default ->
          throw Refusal.wrongUse("unknown-form", "out", file, "a name in .tif, .png or .geojson");
    };
  }
}
