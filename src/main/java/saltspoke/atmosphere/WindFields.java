package saltspoke.atmosphere;

import saltspoke.fields.DataSet;
import saltspoke.fields.FieldStack;
import saltspoke.places.Place;

/**
 * Monthly wind at a place: its speed from the monthly climate, its direction and constancy from the
 * map of mean wind vectors.
 */
final class WindFields {
  /**
   * ASSUMPTION: the vectors of that map are this much too short, since they average over eleven
   * years of two-degree means; spread 1.1–1.6.
   */
  private static final double VECTOR_STRETCH = 1.3;

  private final FieldStack eastward;
  private final FieldStack northward;

  private WindFields(FieldStack eastward, FieldStack northward) {
    this.eastward = eastward;
    this.northward = northward;
  }

  static WindFields from(DataSet data) {
    return new WindFields(
        data.stack("wind-direction-monthly-u"), data.stack("wind-direction-monthly-v"));
  }

  /**
   * @param month 1..12
   * @param windMPerS its mean speed at the place
   */
  WindMonth at(Place place, int month, double windMPerS) {
    double speed = SaltKernel.heldWind(windMPerS);
    int band = month - 1;
    double u = eastward.sample(band, place.latitudeDeg(), place.longitudeDeg());
    double v = northward.sample(band, place.latitudeDeg(), place.longitudeDeg());
    if (Double.isNaN(u) || Double.isNaN(v)) {
      return WindMonth.fromAllSides(speed);
    }
    return new WindMonth(speed, VECTOR_STRETCH * u, VECTOR_STRETCH * v);
  }
}
