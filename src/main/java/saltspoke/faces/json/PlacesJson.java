package saltspoke.faces.json;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import saltspoke.places.PlaceHit;

/** The JSON form of a search for places. */
public final class PlacesJson {
  private PlacesJson() {}

  public static ObjectNode of(List<PlaceHit> hits) {
    ObjectNode node = Json.object();
    ArrayNode list = node.putArray("places");
    for (PlaceHit hit : hits) {
      ObjectNode entry = list.addObject();
      entry.put("name", hit.name());
      entry.put("regionName", hit.regionName());
      entry.put("countryCode", hit.countryCode());
      entry.put("countryName", hit.countryName());
      Json.number(entry, "latitudeDeg", hit.lat());
      Json.number(entry, "longitudeDeg", hit.lon());
      Json.numberOrNull(
          entry,
          "elevationM",
          hit.elevationM().isPresent() ? hit.elevationM().getAsDouble() : null);
      Json.number(entry, "population", hit.population());
    }
    return node;
  }
}
