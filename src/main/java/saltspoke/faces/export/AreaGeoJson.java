package saltspoke.faces.export;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import saltspoke.atlas.AreaValue;
import saltspoke.atlas.AtlasLayer;
import saltspoke.atmosphere.Category;
import saltspoke.places.Area;
import saltspoke.sources.GeoJsonText;

/** Writes a layer by area as GeoJSON (RFC 7946): WGS 84, longitude first, right-hand rule. */
public final class AreaGeoJson {
  private static final int DECIMALS = 3;
  private static final MathContext FOUR_DIGITS = new MathContext(4);

  private AreaGeoJson() {}

  /**
   * @param about what the numbers are and where they come from, as members of the collection
   */
  public static void write(
      Path target, AtlasLayer layer, List<AreaValue> values, Map<String, String> about)
      throws IOException {
    List<GeoJsonText.Feature> features = new ArrayList<>();
    for (AreaValue value : values) {
      features.add(new GeoJsonText.Feature(properties(layer, value), value.area().polygons()));
    }
    Path aside = WholeFile.aside(target);
    try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(aside))) {
      GeoJsonText.write(out, about, features, DECIMALS);
    }
    WholeFile.moveInto(aside, target);
  }

  private static Map<String, Object> properties(AtlasLayer layer, AreaValue value) {
    Area area = value.area();
    Map<String, Object> properties = new LinkedHashMap<>();
    properties.put("name", area.name());
    properties.put("country", area.countryCode());
    properties.put("code", area.code());
    properties.put("layer", layer.id());
    properties.put("unit", layer.unit());
    properties.put("cells", value.cells());
    if (layer.ofClasses()) {
      Category[] categories = Category.values();
      properties.put("class", categories[value.mainClass() - 1].name());
      for (int i = 0; i < categories.length; i++) {
        properties.put("share_" + categories[i].name(), number(value.share()[i]));
      }
    } else {
      properties.put("mean", number(value.mean()));
      properties.put("least", number(value.least()));
      properties.put("most", number(value.most()));
    }
    return properties;
  }

  private static double number(double value) {
    return new BigDecimal(value).round(FOUR_DIGITS).doubleValue();
  }
}
