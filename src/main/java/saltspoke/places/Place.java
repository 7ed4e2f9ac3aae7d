package saltspoke.places;

import java.util.List;
import saltspoke.values.Note;

/**
 * A place on land, with all that the air over it is computed from.
 *
 * @param name town or postcode as found, empty when the place was given by coordinates only
 * @param regionName first-level region, empty when unknown
 * @param countryCode ISO 3166-1 alpha-2 in capitals, empty when unknown
 * @param latitudeDeg −90..90
 * @param longitudeDeg −180..180
 * @param elevationM metres above sea level
 * @param sea the sea as seen from here; its distance may have been overridden by the user
 * @param surroundings neighbours and lights
 * @param flags what the person asking should know about how the place was found
 */
public record Place(
    String name,
    String regionName,
    String countryCode,
    double latitudeDeg,
    double longitudeDeg,
    double elevationM,
    SeaView sea,
    Surroundings surroundings,
    List<Note> flags) {
  public Place {
    flags = List.copyOf(flags);
  }
}
