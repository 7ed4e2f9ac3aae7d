package saltspoke.faces.web;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.InputStream;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import saltspoke.atmosphere.AirClimate;
import saltspoke.faces.Answers;
import saltspoke.faces.Parameters;
import saltspoke.faces.PlaceQuestion;
import saltspoke.faces.json.Json;
import saltspoke.fields.DataSet;
import saltspoke.values.Kept;
import saltspoke.values.Refusal;

/** What the page's map asks for: tiles, legend, value under the pointer, land or sea, names. */
final class MapResources {
  private static final Pattern TILE =
      Pattern.compile("/api/tiles/([a-z-]+)/(\\d{1,2})/(\\d{1,5})/(\\d{1,5})\\.png");
  private static final String LEGEND = "/api/legend/";
  private static final int TILE_AGE_SECONDS = 86_400;
  private static final long MOST_TILE_BYTES = 16L << 20;
  private static final Set<String> POINT = Set.of("at", "layer");

  private final Answers answers;
  private final AirNodes nodes;
  private final Kept<String, byte[]> tiles = new Kept<>(MOST_TILE_BYTES, png -> png.length);
  private TileRenderer renderer;
  private byte[] names;

  MapResources(Answers answers) {
    this.answers = answers;
    this.nodes =
        new AirNodes(
            new AirNodes.World() {
              @Override
              public Optional<AirClimate> air(double latitudeDeg, double longitudeDeg) {
                return airOnLand(latitudeDeg, longitudeDeg);
              }

              @Override
              public Optional<double[]> landBeside(
                  double latitudeDeg, double longitudeDeg, double reachKm, double inlandKm) {
                return answers.landBeside(latitudeDeg, longitudeDeg, reachKm, inlandKm);
              }
            });
  }

  /** A tile: {@code /api/tiles/LAYER/Z/X/Y.png}. */
  Reply tile(Ask ask) {
    Matcher path = TILE.matcher(ask.path());
    if (!path.matches()) {
      throw Refusal.notFound("no-such-resource", "path", "", "/api/tiles/LAYER/Z/X/Y.png");
    }
    MapLayer layer = MapLayer.of(path.group(1));
    TileFrame frame =
        new TileFrame(
            Integer.parseInt(path.group(2)),
            Integer.parseInt(path.group(3)),
            Integer.parseInt(path.group(4)));
    byte[] png =
        tiles.get(
            ask.path(), key -> renderer().render(layer.style(), nodes.of(frame, layer), frame));
    return Reply.kept("image/png", png, TILE_AGE_SECONDS);
  }

  /** Steps and colours of a layer. */
  Reply legend(Ask ask) {
    return Reply.json(MapLayer.of(ask.path().substring(LEGEND.length())).style().legend());
  }

  /** The value of a layer at a point; null at sea, which is no error for a pointer that passes. */
  Reply value(Ask ask) {
    Parameters parameters = new Parameters(ask.query(), POINT);
    MapLayer layer =
        MapLayer.of(
            parameters
                .text("layer")
                .orElseThrow(() -> Refusal.wrongUse("empty", "layer", "", "a layer's id")));
    double[] point = point(parameters);
    ObjectNode node = Json.object();
    node.put("layer", layer.style().layer());
    Optional<AirClimate> air = airOnLand(point[0], point[1]);
    if (air.isEmpty()) {
      node.putNull("value");
      return Reply.json(node);
    }
    double value = layer.value(air.get());
    Json.number(node, "value", value);
    node.put("unit", layer.style().unit());
    if (layer.style().ofClasses()) {
      node.put("category", layer.style().labels().get(layer.style().step(value)));
      Json.number(node, "probability", layer.sureness(air.get()));
      node.put("coinToss", layer.sureness(air.get()) < TileRenderer.COIN_TOSS_BELOW);
    }
    return Reply.json(node);
  }

  /**
   * Whether a point can be asked about, which it can up to 2 km off the shore. "No" is an answer
   * here and no error, so that a click at sea is nothing a browser would complain about.
   */
  Reply spot(Ask ask) {
    double[] point = point(new Parameters(ask.query(), Set.of("at")));
    ObjectNode node = Json.object();
    boolean land = true;
    try {
      answers.air(question(point[0], point[1]));
    } catch (Refusal refusal) {
      land = false;
      node.put("error", refusal.error());
      node.put("allowed", refusal.allowed());
    }
    node.put("land", land);
    return Reply.json(node);
  }

  /** Names of countries with where to write them and from which zoom. */
  synchronized Reply names(Ask ask) {
    if (names == null) {
      ObjectNode node = Json.object();
      ArrayNode list = node.putArray("names");
      try (InputStream in = countries(answers.dataSet())) {
        CountryNames.read(in).forEach(name -> list.add(name.json()));
      } catch (java.io.IOException e) {
        throw Refusal.dataDamaged("unreadable-geojson", "countries", "", "ingest the data anew");
      }
      names = Reply.json(node).body();
    }
    return Reply.kept(Reply.JSON, names, TILE_AGE_SECONDS);
  }

  private synchronized TileRenderer renderer() {
    if (renderer == null) {
      renderer =
          new TileRenderer(WorldShapes.ofCountries(countries(answers.dataSet())), answers::isLand);
    }
    return renderer;
  }

  private static InputStream countries(DataSet data) {
    return data.open("countries");
  }

  private Optional<AirClimate> airOnLand(double latitudeDeg, double longitudeDeg) {
    if (!answers.isLand(latitudeDeg, longitudeDeg)) {
      return Optional.empty();
    }
    try {
      return Optional.of(answers.air(question(latitudeDeg, longitudeDeg)));
    } catch (Refusal refusal) {
      return Optional.empty();
    }
  }

  private static double[] point(Parameters parameters) {
    return Parameters.latitudeLongitude(
        "at",
        parameters
            .text("at")
            .orElseThrow(() -> Refusal.wrongUse("empty", "at", "", "LAT,LON in degrees")));
  }

  private static PlaceQuestion question(double latitudeDeg, double longitudeDeg) {
    return new PlaceQuestion(
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        OptionalDouble.of(latitudeDeg),
        OptionalDouble.of(longitudeDeg),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        Optional.empty());
  }
}
