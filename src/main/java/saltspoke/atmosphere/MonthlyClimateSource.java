package saltspoke.atmosphere;

import saltspoke.places.Place;

/** Where the monthly temperature, humidity, wetness, rain and wind of a place come from. */
@FunctionalInterface
public interface MonthlyClimateSource {
  ClimateYear at(Place place);
}
