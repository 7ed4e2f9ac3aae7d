package saltspoke.places;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.PriorityQueue;
import java.util.concurrent.ConcurrentHashMap;
import saltspoke.fields.DataSet;
import saltspoke.sources.FoldedName;

/** The towns of the world: by the start of a name, and by what lies near a point. */
final class Gazetteer {
  /**
   * A row of the table.
   *
   * @param names the folded name, then other folded names
   */
  record Town(
      String name,
      String[] names,
      double latitudeDeg,
      double longitudeDeg,
      String countryCode,
      String regionCode,
      OptionalDouble elevationM,
      long population) {

    boolean startsWith(String folded) {
      for (String n : names) {
        if (n.startsWith(folded)) {
          return true;
        }
      }
      return false;
    }

    boolean isCalled(String folded) {
      for (String n : names) {
        if (n.equals(folded)) {
          return true;
        }
      }
      return false;
    }
  }

  private static final Comparator<Town> LARGEST_FIRST =
      Comparator.comparingLong(Town::population)
          .reversed()
          .thenComparing(Town::name)
          .thenComparing(Town::countryCode)
          .thenComparingDouble(Town::latitudeDeg);

  private final TiledTable table;
  private final NameTables names;
  private final Map<Integer, List<Town>> tiles = new ConcurrentHashMap<>();
  private volatile List<Town> all;

  Gazetteer(DataSet data, NameTables names) {
    this.table = new TiledTable(data, "places");
    this.names = names;
  }

  /** Towns whose name starts as asked, the largest first; exact names are never crowded out. */
  List<Town> search(String query, int limit) {
    String[] parts = query.split(",");
    String name = parts.length == 0 ? "" : FoldedName.of(parts[0]);
    if (name.isEmpty()) {
      return List.of();
    }
    PriorityQueue<Town> best = new PriorityQueue<>(exactThenLarge(name).reversed());
    for (Town town : all()) {
      if (town.startsWith(name) && isIn(town, parts)) {
        best.add(town);
        if (best.size() > limit) {
          best.poll();
        }
      }
    }
    List<Town> found = new ArrayList<>(best);
    found.sort(LARGEST_FIRST);
    return found;
  }

  /** The one town that a name most likely means: called exactly so before only starting so. */
  Optional<Town> best(String query) {
    String name = FoldedName.of(query.split(",", 2)[0]);
    return search(query, 50).stream().min(exactThenLarge(name));
  }

  private static Comparator<Town> exactThenLarge(String folded) {
    return Comparator.<Town>comparingInt(t -> t.isCalled(folded) ? 0 : 1)
        .thenComparing(LARGEST_FIRST);
  }

  private boolean isIn(Town town, String[] parts) {
    for (int i = 1; i < parts.length; i++) {
      String within = FoldedName.of(parts[i]);
      if (!within.isEmpty() && !names.isWithin(town.countryCode, town.regionCode, within)) {
        return false;
      }
    }
    return true;
  }

  /** Towns within a distance of a point, km along the great circle. */
  List<Town> near(double latitudeDeg, double longitudeDeg, double reachKm) {
    double high = reachKm / 111.0;
    double wide =
        Math.min(
            180, high / Math.max(0.02, Math.cos(Math.toRadians(Math.abs(latitudeDeg) + high))));
    List<Town> near = new ArrayList<>();
    int step = TiledTable.TILE_DEG;
    double south = Math.floor(Math.max(-90, latitudeDeg - high) / step) * step;
    double west = Math.floor((longitudeDeg - wide) / step) * step;
    for (double lat = south; lat <= Math.min(89.9, latitudeDeg + high); lat += step) {
      for (double lon = west; lon <= longitudeDeg + wide && lon < west + 360; lon += step) {
        for (Town town : tile(TiledTable.tileOf(lat, lon))) {
          if (Math.abs(town.latitudeDeg - latitudeDeg) <= high
              && distanceKm(town, latitudeDeg, longitudeDeg) <= reachKm) {
            near.add(town);
          }
        }
      }
    }
    return near;
  }

  List<Town> within(Regions.PointTest test) {
    return all().parallelStream()
        .filter(town -> test.test(town.latitudeDeg, town.longitudeDeg))
        .toList();
  }

  static double distanceKm(Town town, double latitudeDeg, double longitudeDeg) {
    double phi1 = Math.toRadians(town.latitudeDeg);
    double phi2 = Math.toRadians(latitudeDeg);
    double dLon = Math.toRadians(town.longitudeDeg - longitudeDeg);
    double h =
        Math.pow(Math.sin((phi2 - phi1) / 2), 2)
            + Math.cos(phi1) * Math.cos(phi2) * Math.pow(Math.sin(dLon / 2), 2);
    return 2 * Vantage.MEAN_RADIUS_M / 1000 * Vantage.arcSine(Math.sqrt(h));
  }

  PlaceHit hit(Town town) {
    return new PlaceHit(
        town.name,
        names.region(town.countryCode, town.regionCode),
        town.countryCode,
        names.country(town.countryCode),
        town.latitudeDeg,
        town.longitudeDeg,
        town.elevationM,
        town.population);
  }

  private List<Town> tile(int key) {
    return tiles.computeIfAbsent(
        key,
        k -> {
          List<Town> towns = new ArrayList<>();
          table.tile(k, line -> towns.add(parse(line)));
          return List.copyOf(towns);
        });
  }

  private List<Town> all() {
    if (all == null) {
      synchronized (this) {
        if (all == null) {
          List<Town> towns = new ArrayList<>(120_000);
          table.all(line -> towns.add(parse(line)));
          all = towns;
        }
      }
    }
    return all;
  }

  private static Town parse(String line) {
    CsvLine row = new CsvLine(line);
    String name = row.next();
    String others = row.next();
    double lat = Double.parseDouble(row.next());
    double lon = Double.parseDouble(row.next());
    String country = row.next();
    String region = row.next();
    String elevation = row.next();
    long population = Long.parseLong(row.next());
    String folded = FoldedName.of(name);
    return new Town(
        name,
        others.isEmpty() ? new String[] {folded} : (folded + "|" + others).split("\\|"),
        lat,
        lon,
        country.intern(),
        region,
        elevation.isEmpty()
            ? OptionalDouble.empty()
            : OptionalDouble.of(Double.parseDouble(elevation)),
        population);
  }
}
