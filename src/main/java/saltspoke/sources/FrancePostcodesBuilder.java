package saltspoke.sources;

import java.io.IOException;
import java.io.InputStream;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Postcodes of France: INSEE's codes of municipalities lead to GeoNames' points; of several
 * municipalities with one postcode the largest counts.
 */
public final class FrancePostcodesBuilder implements LayerBuilder {
  @Override
  public String id() {
    return "postcodes-fr";
  }

  @Override
  public List<String> needs() {
    return List.of("codes-postaux", "cities-500", "cities-json");
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    Map<String, GeonamesCities.City> byInsee = new HashMap<>();
    for (GeonamesCities.City city : GeonamesCities.read(in)) {
      if (city.country().equals("FR") && !city.admin4().isEmpty()) {
        byInsee.merge(city.admin4(), city, (a, b) -> a.population() >= b.population() ? a : b);
      }
    }
    Map<String, String> regions = PostcodeTable.regionNames(in);
    Map<String, GeonamesCities.City> best = new HashMap<>();
    Map<String, Integer> municipalities = new HashMap<>();
    try (InputStream json = in.open("codes-postaux", "codes-postaux.json")) {
      JsonRows.forEach(
          json,
          row -> {
            String code = row.get("codePostal");
            boolean district = !wholeCity(row.get("codeCommune")).equals(row.get("codeCommune"));
            municipalities.merge(code, district ? 2 : 1, Integer::sum);
            GeonamesCities.City city = byInsee.get(wholeCity(row.get("codeCommune")));
            if (city != null) {
              best.merge(code, city, (a, b) -> a.population() >= b.population() ? a : b);
            }
          });
    }
    PostcodeTable table = new PostcodeTable();
    best.forEach(
        (code, city) ->
            table.put(
                code,
                city.name(),
                regions.getOrDefault("FR." + city.admin1(), ""),
                city.latitudeDeg(),
                city.longitudeDeg(),
                municipalities.get(code) > 1));
    out.note(
        "France: " + table.size() + " of " + municipalities.size() + " postcodes have a point.");
    table.write(
        out,
        PostcodeTable.about(
            "FR",
            "postcodes",
            "codes: open licence of the French state; points CC-BY-4.0 (GeoNames)",
            in.get("codes-postaux").declared().attribution()
                + "; © GeoNames (geonames.org), CC BY 4.0",
            "changed: joined by INSEE code; districts of Paris, Lyon and Marseille share the city's"
                + " point"));
  }

  /** INSEE code of the city for a district of Paris, Lyon or Marseille (INSEE). */
  private static String wholeCity(String insee) {
    if (insee.startsWith("751")) {
      return "75056";
    }
    if (insee.startsWith("6938")) {
      return "69123";
    }
    return insee.startsWith("132") ? "13055" : insee;
  }
}
