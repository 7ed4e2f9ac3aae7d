package saltspoke.wheel;

import java.util.List;
import saltspoke.values.Note;

/**
 * A settled year of weather inside the rim, at the nipple seat: what films lie there for how long.
 *
 * @param months January to December
 * @param flags what was assumed or left its range
 */
public record WheelYear(List<Month> months, List<Note> flags) {
  public WheelYear {
    months = List.copyOf(months);
    flags = List.copyOf(flags);
  }

  /**
   * @param month 1..12
   * @param wetHours hours with a liquid film of any kind
   * @param salt mean salt store
   * @param waterG mean liquid water held in the cavity, g per wheel
   * @param saltedWetRides rides in the month on wet salted roads
   * @param films the films of the month; the hours of all add to {@code wetHours}
   */
  public record Month(
      int month,
      double wetHours,
      SaltMix salt,
      double waterG,
      double saltedWetRides,
      List<FilmHours> films) {
    public Month {
      films = List.copyOf(films);
    }
  }

  /** A film and the hours in the month for which it is there. */
  public record FilmHours(Film film, double hours) {}
}
