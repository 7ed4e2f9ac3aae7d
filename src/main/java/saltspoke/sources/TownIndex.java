package saltspoke.sources;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The towns of one country by folded name, other names included, the largest first. */
final class TownIndex {
  private final Map<String, List<GeonamesCities.City>> byName = new HashMap<>();

  TownIndex(List<GeonamesCities.City> cities, String country) {
    cities.stream()
        .filter(c -> c.country().equals(country))
        .sorted(Comparator.comparingLong(GeonamesCities.City::population).reversed())
        .forEach(
            c -> {
              add(c.name(), c);
              for (String other : c.alternates().split(",")) {
                add(other, c);
              }
            });
  }

  private void add(String name, GeonamesCities.City city) {
    List<GeonamesCities.City> list =
        byName.computeIfAbsent(FoldedName.of(name), k -> new ArrayList<>());
    if (!list.contains(city)) {
      list.add(city);
    }
  }

  List<GeonamesCities.City> called(String name) {
    return byName.getOrDefault(FoldedName.of(name), List.of());
  }

  /** The largest town of that name in a second-level division. */
  Optional<GeonamesCities.City> called(String name, String admin2) {
    return called(name).stream().filter(c -> c.admin2().equals(admin2)).findFirst();
  }
}
