package saltspoke.places;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import saltspoke.fields.DataSet;
import saltspoke.values.Note;
import saltspoke.values.Refusal;

/**
 * Finds places by name, postcode or coordinates, with all that the air over them is computed from.
 * Everything is read at first use, so that a question by coordinates never loads the names of the
 * world. Safe for use by many threads.
 */
public final class PlaceDirectory {
  /** A point at sea within this distance of land is moved to the shore, km. */
  static final double SHORE_REACH_KM = 2;

  /** Longest query that is looked at, characters: longer than any name in the gazetteer. */
  private static final int LONGEST_QUERY = 200;

  private final Gazetteer gazetteer;
  private final PostcodeBook postcodes;
  private final Coast coast;
  private final PlaceAssembly assembly;

  private PlaceDirectory(DataSet data) {
    NameTables names = new NameTables(data);
    this.gazetteer = new Gazetteer(data, names);
    this.postcodes = new PostcodeBook(data);
    this.coast = new Coast(data);
    this.assembly = new PlaceAssembly(data, gazetteer, coast);
  }

  /** A directory over a data set's layers. */
  public static PlaceDirectory open(DataSet data) {
    return new PlaceDirectory(data);
  }

  /**
   * Towns whose name starts with the query, accents and case ignored, the most populous first. A
   * comma adds a country or region: {@code springfield, illinois}, {@code york, gb}. Names called
   * exactly so are never crowded out by the limit.
   *
   * @param limit 1..1000
   * @return an empty list when there is none
   */
  public List<PlaceHit> search(String query, int limit) {
    if (limit < 1 || limit > 1000) {
      throw Refusal.outOfRange("limit", limit, "1..1000");
    }
    return gazetteer.search(checked(query, "q"), limit).stream().map(gazetteer::hit).toList();
  }

  /** The place that a name most likely means: called exactly so, else starting so; the largest. */
  public Place byName(String query, PlaceOverrides overrides) {
    String name = checked(query, "place");
    Optional<Gazetteer.Town> found = gazetteer.best(name);
    if (found.isEmpty()) {
      throw Refusal.notFound(
          "unknown-place",
          "place",
          name,
          "the start of a town's name, with \", country\" or \", region\" to narrow it; else"
              + " coordinates");
    }
    PlaceHit hit = gazetteer.hit(found.get());
    List<Note> flags = new ArrayList<>();
    namesakes(name, hit).ifPresent(flags::add);
    return assembly.named(
        hit.name(),
        hit.regionName(),
        hit.countryCode(),
        hit.lat(),
        hit.lon(),
        hit.elevationM(),
        overrides,
        flags);
  }

  /** Towns whose centre passes a test, in the order of the gazetteer. */
  public List<PlaceHit> within(Regions.PointTest test) {
    return gazetteer.within(test).stream().map(gazetteer::hit).toList();
  }

  /** The place of a town that a search found. */
  public Place of(PlaceHit hit) {
    return assembly.named(
        hit.name(),
        hit.regionName(),
        hit.countryCode(),
        hit.lat(),
        hit.lon(),
        hit.elevationM(),
        PlaceOverrides.NONE,
        new ArrayList<>());
  }

  /** The place of a postcode. Leading zeros that a spreadsheet ate are put back, with a flag. */
  public Place byPostcode(String code, String countryCode, PlaceOverrides overrides) {
    PostcodeBook.Found found = postcodes.find(code, countryCode);
    List<Note> flags = new ArrayList<>();
    if (found.zerosAdded()) {
      flags.add(Note.of("place-postcode-zeros-added", "postcode", found.code()));
    }
    if (found.point().approximate()) {
      flags.add(Note.of("place-postcode-approximate", "postcode", found.code()));
    }
    PostalPoint point = found.point();
    return assembly.named(
        (found.code() + " " + point.name()).strip(),
        point.regionName(),
        found.countryCode(),
        point.latitudeDeg(),
        point.longitudeDeg(),
        OptionalDouble.empty(),
        overrides,
        flags);
  }

  /**
   * The place at a point.
   *
   * @param latitudeDeg −90..90
   * @param longitudeDeg −180..180
   */
  public Place at(double latitudeDeg, double longitudeDeg, PlaceOverrides overrides) {
    if (!(latitudeDeg >= -90 && latitudeDeg <= 90)) {
      throw Refusal.outOfRange("latitudeDeg", latitudeDeg, "-90..90");
    }
    if (!(longitudeDeg >= -180 && longitudeDeg <= 180)) {
      throw Refusal.outOfRange("longitudeDeg", longitudeDeg, "-180..180");
    }
    return assembly.at(latitudeDeg, longitudeDeg, overrides);
  }

  /** Adds a GeoNames postal-code file to the postcodes; later files go before earlier ones. */
  public void addPostalFile(Path file) {
    postcodes.add(PostalFile.read(file));
  }

  /** Codes of the countries whose postcodes are known. */
  public List<String> postcodeCountries() {
    List<String> codes = new ArrayList<>();
    postcodes.countries().forEach(codes::add);
    return codes;
  }

  /** Whether a point is on land; lakes are land, the Caspian is sea. */
  public boolean isLand(double latitudeDeg, double longitudeDeg) {
    return coast.isLand(latitudeDeg, longitudeDeg);
  }

  /**
   * A point of land for one in the water: from the nearest shore straight on inland, so far as
   * there is land; nothing when no shore lies within reach. For maps, where a node off the shore
   * stands for the land beside it.
   *
   * @param reachKm farthest shore that counts
   * @param inlandKm wanted distance behind the shore
   * @return latitude and longitude, degrees
   */
  public Optional<double[]> landBeside(
      double latitudeDeg, double longitudeDeg, double reachKm, double inlandKm) {
    return assembly.landBeside(latitudeDeg, longitudeDeg, reachKm, inlandKm);
  }

  /** The sea as seen from a point, without looking for names: for maps of many points. */
  public SeaView seaView(double latitudeDeg, double longitudeDeg) {
    return coast.view(latitudeDeg, longitudeDeg);
  }

  private Optional<Note> namesakes(String query, PlaceHit chosen) {
    List<String> others =
        gazetteer.search(query, 10).stream()
            .map(gazetteer::hit)
            .filter(h -> h.name().equalsIgnoreCase(chosen.name()) && h.lat() != chosen.lat())
            .limit(3)
            .map(PlaceDirectory::inFull)
            .toList();
    return others.isEmpty()
        ? Optional.empty()
        : Optional.of(
            Note.of(
                "place-namesakes", "chosen", inFull(chosen), "others", String.join("; ", others)));
  }

  private static String inFull(PlaceHit hit) {
    String region = hit.regionName().isEmpty() ? "" : hit.regionName() + ", ";
    return hit.name() + ", " + region + hit.countryName();
  }

  private static String checked(String query, String field) {
    String text = query == null ? "" : query.strip();
    if (text.isEmpty()) {
      throw Refusal.wrongUse("empty-name", field, "", "the start of a town's name");
    }
    if (text.length() > LONGEST_QUERY) {
      throw Refusal.wrongUse(
          "too-long", field, text.length() + " characters", "at most " + LONGEST_QUERY);
    }
    return text;
  }
}
