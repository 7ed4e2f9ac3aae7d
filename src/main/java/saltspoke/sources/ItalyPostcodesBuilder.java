package saltspoke.sources;

import java.io.IOException;
import java.io.InputStream;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * Postcodes of Italy, joined to towns by name within the province; of several municipalities with
 * one code the largest counts. An adapted database under the ODbL, in a folder of its own. (The
 * other list at hand states that no licence applies to its postcodes, so it is not used.)
 */
public final class ItalyPostcodesBuilder implements LayerBuilder {
  private static final String PACKAGE = "countrystatecity-postal-codes";

  @Override
  public String id() {
    return "postcodes-it";
  }

  @Override
  public List<String> needs() {
    return List.of(PACKAGE, "cities-500", "cities-json");
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    TownIndex towns = new TownIndex(GeonamesCities.read(in), "IT");
    Map<String, String> regions = PostcodeTable.regionNames(in);
    Map<String, GeonamesCities.City> best = new TreeMap<>();
    Map<String, Integer> municipalities = new HashMap<>();
    try (InputStream json = in.open(PACKAGE, "data/by-country/IT/postcodes.json")) {
      JsonRows.forEach(
          json,
          row -> {
            String code = row.get("code");
            municipalities.merge(code, 1, Integer::sum);
            town(towns, row)
                .ifPresent(
                    city ->
                        best.merge(code, city, (a, b) -> a.population() >= b.population() ? a : b));
          });
    }
    PostcodeTable table = new PostcodeTable();
    Map<String, Integer> codesOfTown = new HashMap<>();
    best.values().forEach(c -> codesOfTown.merge(c.name() + c.admin2(), 1, Integer::sum));
    best.forEach(
        (code, city) ->
            table.put(
                code,
                city.name(),
                regions.getOrDefault("IT." + city.admin1(), ""),
                city.latitudeDeg(),
                city.longitudeDeg(),
                municipalities.get(code) > 1 || codesOfTown.get(city.name() + city.admin2()) > 1));
    out.note(
        "Italy: " + table.size() + " of " + municipalities.size() + " postcodes have a point.");
    table.write(
        out,
        PostcodeTable.about(
            "IT",
            "postcodes-odbl",
            "ODbL-1.0",
            in.get(PACKAGE).declared().attribution()
                + "; points © GeoNames (geonames.org), CC BY 4.0",
            "changed: joined to towns by name and province; a city's codes share one point"));
  }

  private static Optional<GeonamesCities.City> town(TownIndex towns, Map<String, String> row) {
    String name = row.getOrDefault("localityName", "");
    Optional<GeonamesCities.City> inProvince =
        towns.called(name, row.getOrDefault("stateCode", ""));
    if (inProvince.isPresent()) {
      return inProvince;
    }
    List<GeonamesCities.City> anywhere = towns.called(name);
    return anywhere.size() == 1 ? Optional.of(anywhere.get(0)) : Optional.empty();
  }
}
