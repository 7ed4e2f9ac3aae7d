package saltspoke.places;

import saltspoke.fields.DataSet;

/** The shipped world, opened once for all tests. */
final class World {
  static final DataSet DATA = DataSet.shipped();
  static final PlaceDirectory PLACES = PlaceDirectory.open(DATA);
  static final Coast COAST = new Coast(DATA);

  private World() {}
}
