package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import saltspoke.fields.DataSet;
import saltspoke.fields.FieldStack;
import saltspoke.places.Place;
import saltspoke.values.Note;

/**
 * The monthly climate of any place on land, from the shipped fields. Immutable; safe for use by
 * many threads.
 */
public final class MonthlyClimate {
  private final PlaceFields fields;

  private MonthlyClimate(PlaceFields fields) {
    this.fields = fields;
  }

  public static MonthlyClimate from(DataSet data) {
    return of(data::stack);
  }

  /** From any source of layers by id. */
  static MonthlyClimate of(Function<String, FieldStack> layers) {
    return new MonthlyClimate(new PlaceFields(layers));
  }

  /**
   * January to December at a point.
   *
   * @param elevationM metres above sea level
   * @param seaDistanceKm at least 0
   */
  public List<MonthClimate> at(
      double latitudeDeg, double longitudeDeg, double elevationM, double seaDistanceKm) {
    return means(latitudeDeg, longitudeDeg, elevationM, seaDistanceKm).climate(latitudeDeg);
  }

  /** The modelled monthly means at a place, without what follows from them. */
  public MonthMeans means(Place place) {
    return means(
        place.latitudeDeg(), place.longitudeDeg(), place.elevationM(), place.sea().distanceKm());
  }

  /** The modelled monthly means alone. */
  public MonthMeans means(
      double latitudeDeg, double longitudeDeg, double elevationM, double seaDistanceKm) {
    PlaceFields.At at = fields.at(latitudeDeg, longitudeDeg);
    Site site = Site.of(latitudeDeg, longitudeDeg, elevationM, seaDistanceKm, at);
    double[] temperatureC = TemperatureModel.monthlyC(site, at);
    double[] humidityPct = HumidityModel.monthlyPct(site, at, temperatureC);
    YearShape year = YearShape.of(temperatureC, at.rainMm());
    double[] rangeC = DiurnalRangeModel.monthlyC(site, at, year, humidityPct);
    double[] windMPerS = LandWindModel.monthlyMPerS(site, at, year, rangeC);
    return new MonthMeans(temperatureC, humidityPct, rangeC, at.rainMm(), windMPerS);
  }

  /** What a person should know about the climate of a place beside its numbers. */
  public List<Note> notes(Place place) {
    PlaceFields.At at = fields.at(place.latitudeDeg(), place.longitudeDeg());
    Site site =
        Site.of(
            place.latitudeDeg(),
            place.longitudeDeg(),
            place.elevationM(),
            place.sea().distanceKm(),
            at);
    List<Note> notes = new ArrayList<>();
    if (site.outsideFittedHeights()) {
      notes.add(
          Note.of("air-climate-height-outside-fit", "elevationM", Math.round(place.elevationM())));
    }
    if (HumidityModel.australia(place.latitudeDeg(), place.longitudeDeg()) > 0.5) {
      notes.add(Note.of("air-climate-australia-humidity"));
    }
    return notes;
  }
}
