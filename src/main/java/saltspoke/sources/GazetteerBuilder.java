package saltspoke.sources;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

/** Builds the table of towns, by 10° tiles, with the names of their regions. */
public final class GazetteerBuilder implements LayerBuilder {
  private static final int LEAST_POPULATION = 1000;

  /** Towns at least this large carry their other names in Latin letters. */
  private static final int ALTERNATES_FROM_POPULATION = 150_000;

  private static final int MOST_ALTERNATES = 25;

  @Override
  public String id() {
    return "places";
  }

  @Override
  public List<String> needs() {
    return List.of("cities-500", "cities-json");
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    List<GeonamesCities.City> cities =
        GeonamesCities.read(in).stream()
            .filter(c -> c.population() >= LEAST_POPULATION)
            .sorted(
                Comparator.comparingLong(GeonamesCities.City::population)
                    .reversed()
                    .thenComparing(GeonamesCities.City::name)
                    .thenComparingDouble(GeonamesCities.City::latitudeDeg))
            .toList();
    TiledTableWriter table =
        new TiledTableWriter(
            "name,other_names,latitude_deg,longitude_deg,country_code,region_code,elevation_m,"
                + "population");
    for (GeonamesCities.City c : cities) {
      table.row(c.latitudeDeg(), c.longitudeDeg(), row(c));
    }
    String attribution = in.get("cities-500").declared().attribution();
    table.write(
        out,
        new LayerFile(
            "places",
            "places/places.csv.gz",
            "Towns of at least 1000 people",
            "",
            "",
            List.of(),
            "CC-BY-4.0",
            attribution,
            "changed: a selection of rows and columns; parts and quarters of towns left out; rows"
                + " gathered by 10° tiles, the largest first"));
    Map<String, String> regions = new TreeMap<>();
    try (InputStream json = in.open("cities-json", "admin1.json")) {
      JsonRows.forEach(json, row -> regions.put(row.get("code"), row.get("name")));
    }
    StringBuilder text = new StringBuilder("region_code,name\n");
    regions.forEach((code, name) -> text.append(code).append(',').append(cell(name)).append('\n'));
    try (OutputStream stream =
        out.file(
            new LayerFile(
                "region-names",
                "places/region-names.csv.gz",
                "Names of first-level regions by country and region code",
                "",
                "",
                List.of(),
                "CC-BY-4.0",
                attribution,
                ""))) {
      stream.write(text.toString().getBytes(StandardCharsets.UTF_8));
    }
  }

  private static String row(GeonamesCities.City c) {
    return String.join(
        ",",
        cell(c.name()),
        cell(alternates(c)),
        String.format(Locale.ROOT, "%.4f", c.latitudeDeg()),
        String.format(Locale.ROOT, "%.4f", c.longitudeDeg()),
        c.country(),
        c.admin1(),
        c.demM() == -9999 ? "" : String.valueOf(c.demM()),
        String.valueOf(c.population()));
  }

  /** A cell as RFC 4180 wants it. */
  static String cell(String text) {
    return text.indexOf(',') < 0 && text.indexOf('"') < 0
        ? text
        : '"' + text.replace("\"", "\"\"") + '"';
  }

  private static String alternates(GeonamesCities.City c) {
    if (c.population() < ALTERNATES_FROM_POPULATION) {
      return "";
    }
    Set<String> names = new LinkedHashSet<>();
    String own = FoldedName.of(c.name());
    for (String name : c.alternates().split(",")) {
      boolean latin = name.chars().allMatch(ch -> ch < 0x250 || ch == 0x2019);
      boolean code = name.chars().allMatch(ch -> ch < 'a' && ch != ' ');
      String folded = FoldedName.of(name);
      if (latin && !code && folded.length() >= 3 && !folded.startsWith(own)) {
        names.add(folded);
      }
    }
    return String.join("|", names.stream().limit(MOST_ALTERNATES).toList());
  }
}
