package saltspoke.places;

import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import saltspoke.fields.DataSet;
import saltspoke.sources.FoldedName;
import saltspoke.sources.GeoJsonFeatures;
import saltspoke.values.Refusal;

/**
 * First-level regions of the world, as Natural Earth draws them, and the larger units and countries
 * that they make up. Read as a whole when made; immutable.
 */
public final class Regions {
  private static final String LAYER = "regions";
  private static final int MOST_LISTED = 12;

  private record Region(Area area, List<String> names, List<String> larger) {}

  private final List<Region> regions;
  private final NameTables countries;
  private AreaIndex index;

  private Regions(List<Region> regions, NameTables countries) {
    this.regions = List.copyOf(regions);
    this.countries = countries;
  }

  /** The regions of a data set. */
  public static Regions from(DataSet data) {
    List<Region> regions = new ArrayList<>();
    try (InputStream in = data.open(LAYER)) {
      GeoJsonFeatures.forEach(
          in,
          (about, polygons) -> {
            if (!polygons.isEmpty()) {
              String name = about.get("name");
              List<String> names = folded(about.getOrDefault("names", ""));
              names.add(FoldedName.of(name));
              regions.add(
                  new Region(
                      new Area(name, about.get("country"), about.get("code"), polygons),
                      names,
                      folded(about.getOrDefault("larger", ""))));
            }
          });
    } catch (IOException e) {
      throw Refusal.dataDamaged("unreadable-geojson", LAYER, e.getMessage(), "GeoJSON");
    }
    return new Regions(regions, new NameTables(data));
  }

  /** Every region, in the order of the layer. */
  public List<Area> all() {
    return regions.stream().map(Region::area).toList();
  }

  /** Whether a point belongs to an area that {@link #find} gave: inside, or beside it. */
  public PointTest belongingTo(Area area) {
    Set<List<double[]>> parts = Collections.newSetFromMap(new IdentityHashMap<>());
    parts.addAll(area.polygons());
    AreaIndex all = index();
    return (lat, lon) -> {
      int region = all.at(lat, lon);
      return region >= 0 && parts.contains(regions.get(region).area.polygons().get(0));
    };
  }

  private synchronized AreaIndex index() {
    if (index == null) {
      index = new AreaIndex(all());
    }
    return index;
  }

  /** Whether a point belongs to something. */
  @FunctionalInterface
  public interface PointTest {
    boolean test(double latitudeDeg, double longitudeDeg);
  }

  /**
   * The area of a name: a region called exactly so in any of its languages; else a larger unit made
   * of several regions; else a country, by name or code. A comma adds the country: {@code nord,
   * fr}.
   *
   * @throws Refusal when there is none, or several in different countries, with their names
   */
  public Area find(String query) {
    String[] parts = query.split(",", 2);
    String name = FoldedName.of(parts[0]);
    String country = parts.length > 1 ? FoldedName.of(parts[1]) : "";
    if (name.isEmpty()) {
      throw Refusal.wrongUse("empty-name", "region", "", "the name of a region or country");
    }
    List<Predicate<Region>> ways =
        List.of(
            r -> r.names.contains(name),
            r -> r.larger.contains(name),
            r -> countries.isCountry(r.area.countryCode(), name));
    for (Predicate<Region> way : ways) {
      List<Region> found =
          regions.stream()
              .filter(way)
              .filter(r -> country.isEmpty() || countries.isCountry(r.area.countryCode(), country))
              .toList();
      if (!found.isEmpty()) {
        return joined(parts[0].strip(), found, way == ways.get(0));
      }
    }
    throw Refusal.notFound("unknown-region", "region", query, nearNames(name));
  }

  private Area joined(String asked, List<Region> found, boolean byOwnName) {
    Map<String, List<Region>> byCountry =
        found.stream()
            .collect(
                Collectors.groupingBy(
                    r -> r.area.countryCode(), LinkedHashMap::new, Collectors.toList()));
    if (byCountry.size() > 1) {
      throw Refusal.wrongUse(
          "ambiguous-region",
          "region",
          asked,
          byCountry.keySet().stream()
              .limit(MOST_LISTED)
              .map(code -> asked + ", " + code)
              .collect(Collectors.joining("; ")));
    }
    Area first = found.get(0).area;
    if (found.size() == 1) {
      return first;
    }
    List<List<double[]>> polygons = new ArrayList<>();
    found.forEach(r -> polygons.addAll(r.area.polygons()));
    return new Area(byOwnName ? first.name() : asked, first.countryCode(), "", polygons);
  }

  private String nearNames(String name) {
    String start = name.substring(0, Math.min(3, name.length()));
    String near =
        regions.stream()
            .filter(r -> r.names.stream().anyMatch(n -> n.startsWith(start)))
            .limit(MOST_LISTED)
            .map(r -> r.area.name() + ", " + r.area.countryCode())
            .collect(Collectors.joining("; "));
    return near.isEmpty() ? "the name of a region or country" : "such as " + near;
  }

  private static List<String> folded(String names) {
    return Arrays.stream(names.split("\\|"))
        .filter(n -> !n.isBlank())
        .map(FoldedName::of)
        .collect(Collectors.toCollection(ArrayList::new));
  }
}
