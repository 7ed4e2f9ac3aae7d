package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.List;
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
   * January to December.
   *
   * @param windMPerS mean speed of each month at the place
   */
  List<WindMonth> year(Place place, double[] windMPerS) {
    double[] u = eastward.sampleAll(place.latitudeDeg(), place.longitudeDeg());
    double[] v = northward.sampleAll(place.latitudeDeg(), place.longitudeDeg());
    List<WindMonth> year = new ArrayList<>(windMPerS.length);
    for (int m = 0; m < windMPerS.length; m++) {
      double speed = SaltKernel.heldWind(windMPerS[m]);
      year.add(
          Double.isNaN(u[m]) || Double.isNaN(v[m])
              ? WindMonth.fromAllSides(speed)
              : new WindMonth(speed, VECTOR_STRETCH * u[m], VECTOR_STRETCH * v[m]));
    }
    return year;
  }
}
