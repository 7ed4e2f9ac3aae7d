package saltspoke.sources;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * Postcodes of Germany, joined to towns by name. Of towns with one name the one nearest to the
 * other codes with the same first two digits counts. All codes of a city share its point. An
 * adapted database under the ODbL, in a folder of its own.
 */
public final class GermanyPostcodesBuilder implements LayerBuilder {
  @Override
  public String id() {
    return "postcodes-de";
  }

  @Override
  public List<String> needs() {
    return List.of("postleitzahlen", "cities-500", "cities-json");
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    TownIndex towns = new TownIndex(GeonamesCities.read(in), "DE");
    Map<String, String> regions = PostcodeTable.regionNames(in);
    Map<String, List<String>> codes;
    try (InputStream json = in.open("postleitzahlen", "data/plz.full.json")) {
      codes = new TreeMap<>(JsonRows.lists(json));
    }
    Map<String, double[]> middle = middles(codes, towns);
    Map<String, Integer> codesOfTown = new HashMap<>();
    Map<String, GeonamesCities.City> chosen = new TreeMap<>();
    codes.forEach(
        (code, names) ->
            names.stream()
                .flatMap(name -> candidates(towns, name).stream())
                .min(nearest(middle.get(code.substring(0, 2))))
                .ifPresent(
                    city -> {
                      chosen.put(code, city);
                      codesOfTown.merge(key(city), 1, Integer::sum);
                    }));
    PostcodeTable table = new PostcodeTable();
    chosen.forEach(
        (code, city) ->
            table.put(
                code,
                city.name(),
                regions.getOrDefault("DE." + city.admin1(), ""),
                city.latitudeDeg(),
                city.longitudeDeg(),
                codesOfTown.get(key(city)) > 1 || codes.get(code).size() > 1));
    out.note("Germany: " + table.size() + " of " + codes.size() + " postcodes have a point.");
    String attribution =
        in.get("postleitzahlen").declared().attribution()
            + "; points © GeoNames (geonames.org), CC BY 4.0";
    notice(out, attribution);
    table.write(
        out,
        PostcodeTable.about(
            "DE",
            "postcodes-odbl",
            "ODbL-1.0",
            attribution,
            "changed: joined to towns by name; a city's codes share one point"));
  }

  /** ODbL 1.0, section 4.2: a copy of the licence or its address goes with the database. */
  private static void notice(LayerSink out, String attribution) throws IOException {
    LayerFile file =
        new LayerFile(
            "postcodes-odbl-notice",
            "postcodes-odbl/notice.txt",
            "Terms of the tables in this folder",
            "",
            "",
            List.of(),
            "ODbL-1.0",
            attribution,
            "");
    try (OutputStream stream = out.file(file)) {
      stream.write(
          ("The tables in this folder are adapted databases, made available under the Open"
                  + " Database License 1.0:\nhttps://opendatacommons.org/licenses/odbl/1-0/\n"
                  + "Share them, or databases made from them, under the same licence and with the"
                  + " attribution that the manifest gives.\n")
              .getBytes(StandardCharsets.UTF_8));
    }
  }

  private static String key(GeonamesCities.City city) {
    return city.name() + city.latitudeDeg();
  }

  private static List<GeonamesCities.City> candidates(TownIndex towns, String name) {
    List<GeonamesCities.City> exact = towns.called(name);
    return exact.isEmpty() ? towns.called(name.replaceFirst("[ (,/].*$", "")) : exact;
  }

  /** Middle of the towns with but one candidate, by the first two digits. */
  private static Map<String, double[]> middles(Map<String, List<String>> codes, TownIndex towns) {
    Map<String, List<GeonamesCities.City>> sure = new TreeMap<>();
    codes.forEach(
        (code, names) -> {
          if (names.size() == 1 && towns.called(names.get(0)).size() == 1) {
            sure.computeIfAbsent(code.substring(0, 2), k -> new ArrayList<>())
                .add(towns.called(names.get(0)).get(0));
          }
        });
    Map<String, double[]> middle = new HashMap<>();
    sure.forEach(
        (prefix, list) ->
            middle.put(
                prefix,
                new double[] {
                  PostcodeTable.median(list.stream().map(c -> c.latitudeDeg()).toList()),
                  PostcodeTable.median(list.stream().map(c -> c.longitudeDeg()).toList())
                }));
    return middle;
  }

  private static Comparator<GeonamesCities.City> nearest(double[] middle) {
    return Comparator.comparingDouble(
        c ->
            middle == null
                ? -c.population()
                : Math.hypot(
                    c.latitudeDeg() - middle[0],
                    // 0.63 is the cosine of Germany's middle latitude, 51°
                    0.63 * (c.longitudeDeg() - middle[1])));
  }
}
