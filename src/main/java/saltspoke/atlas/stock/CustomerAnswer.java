package saltspoke.atlas.stock;

import java.util.List;
import saltspoke.advice.Prospect;
import saltspoke.atmosphere.Category;
import saltspoke.values.Note;
import saltspoke.wheel.Pairing;

/**
 * What a row's customer gets.
 *
 * @param customer the row
 * @param place name as found
 * @param regionName first-level region, empty when unknown
 * @param countryCode ISO 3166-1 alpha-2
 * @param latitudeDeg of the place
 * @param longitudeDeg of the place
 * @param steelCategory class of the outside air for carbon steel
 * @param today pairing of today's wheels
 * @param todayProspect what becomes of them
 * @param taken pairing recommended
 * @param takenProspect what becomes of it
 * @param firstLookMonths first look with the recommended pairing, within the limits of practice
 * @param everyMonths later looks with it
 * @param enough whether the recommended pairing reaches the wanted first look
 * @param notes what was mended in the row or assumed about its place
 */
public record CustomerAnswer(
    Customer customer,
    String place,
    String regionName,
    String countryCode,
    double latitudeDeg,
    double longitudeDeg,
    Category steelCategory,
    Pairing today,
    Prospect todayProspect,
    Pairing taken,
    Prospect takenProspect,
    double firstLookMonths,
    double everyMonths,
    boolean enough,
    List<Note> notes) {
  public CustomerAnswer {
    notes = List.copyOf(notes);
  }
}
