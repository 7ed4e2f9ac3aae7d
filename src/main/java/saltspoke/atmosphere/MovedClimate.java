package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.List;
import saltspoke.values.Note;

/**
 * The climate at a spot as local measurements move it: first the means of temperature and humidity,
 * then the wet hours that follow from them.
 */
public final class MovedClimate {
  private static final int HOURS_OF_A_DAY = 24;

  private final MonthMeans means;
  private final SiteMove warmer;
  private final SiteMove moister;
  private final SiteMove wetter;
  private final double latitudeDeg;

  private MovedClimate(
      MonthMeans means, SiteMove warmer, SiteMove moister, SiteMove wetter, double latitudeDeg) {
    this.means = means;
    this.warmer = warmer;
    this.moister = moister;
    this.wetter = wetter;
    this.latitudeDeg = latitudeDeg;
  }

  /**
   * Moves modelled means.
   *
   * @param corrections measurements; those too far away move nothing
   */
  public static MovedClimate of(
      MonthMeans means, SiteCorrections corrections, CorrectionSpot spot) {
    SiteMove warmer = corrections.at(CorrectedQuantity.TEMPERATURE, spot);
    SiteMove moister = corrections.at(CorrectedQuantity.RELATIVE_HUMIDITY, spot);
    return new MovedClimate(
        warmer.isNone() && moister.isNone()
            ? means
            : means.moved(warmer.departure(), moister.departure()),
        warmer,
        moister,
        corrections.at(CorrectedQuantity.WET_HOURS, spot),
        spot.latitudeDeg());
  }

  /** Whether any measurement was near enough. */
  public boolean isMoved() {
    return !(warmer.isNone() && moister.isNone() && wetter.isNone());
  }

  /** Monthly means. */
  MonthMeans means() {
    return means;
  }

  /** Factor on the model's spread of the annual mean temperature, 0..1. */
  double temperatureSpreadFactor() {
    return warmer.spreadFactor();
  }

  /** Factor on the model's spread of the annual mean humidity, 0..1. */
  double humiditySpreadFactor() {
    return moister.spreadFactor();
  }

  /** January to December with the wet hours; worked out at every call. */
  public List<MonthClimate> months() {
    List<MonthClimate> months = means.climate(latitudeDeg);
    if (wetter.isNone()) {
      return months;
    }
    List<MonthClimate> moved = new ArrayList<>(months.size());
    for (MonthClimate month : months) {
      double factor = Math.exp(wetter.departure()[month.month() - 1]);
      double most = HOURS_OF_A_DAY * MonthMeans.daysIn(month.month());
      moved.add(month.withWetHours(WetHours.times(factor, month.wetHours(), most)));
    }
    return moved;
  }

  /** What to tell of the moves, empty when there was none. */
  List<Note> notes() {
    List<Note> notes = new ArrayList<>();
    add(notes, CorrectedQuantity.TEMPERATURE, warmer);
    add(notes, CorrectedQuantity.RELATIVE_HUMIDITY, moister);
    add(notes, CorrectedQuantity.WET_HOURS, wetter);
    return notes;
  }

  private static void add(List<Note> notes, CorrectedQuantity quantity, SiteMove move) {
    if (!move.isNone()) {
      notes.add(move.note(quantity));
    }
  }
}
