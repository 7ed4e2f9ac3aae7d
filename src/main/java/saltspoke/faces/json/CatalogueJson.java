package saltspoke.faces.json;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.function.Function;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Pairing;
import saltspoke.wheel.Profiles;

/** The JSON form of the catalogue of parts and of the ready profiles. */
public final class CatalogueJson {
  private CatalogueJson() {}

  /** All parts and all valid pairings. */
  public static ObjectNode of(Catalogue catalogue) {
    ObjectNode node = Json.object();
    node.set("rims", parts(catalogue.rims(), rim -> rim.id()));
    node.set("nipples", parts(catalogue.nipples(), nipple -> nipple.id()));
    node.set("interfaces", parts(catalogue.interfaces(), between -> between.id()));
    node.set("spokes", parts(catalogue.spokes(), spoke -> spoke.id()));
    ArrayNode pairings = node.putArray("pairings");
    for (Pairing pairing : catalogue.pairings()) {
      ObjectNode entry = pairings.addObject();
      entry.put("rim", pairing.rim());
      entry.put("nipple", pairing.nipple());
      entry.put("interface", pairing.between());
      entry.put("spoke", pairing.spoke());
    }
    return node;
  }

  /** All ready profiles. */
  public static ObjectNode of(Profiles profiles) {
    ObjectNode node = Json.object();
    ArrayNode list = node.putArray("profiles");
    profiles.all().forEach(profile -> list.add(ProfileJson.of(profile)));
    return node;
  }

  private static <T> ArrayNode parts(List<T> parts, Function<T, String> idOf) {
    ArrayNode list = Json.array();
    parts.forEach(part -> list.addObject().put("id", idOf.apply(part)));
    return list;
  }
}
