package saltspoke.faces;

import java.util.Optional;
import java.util.OptionalDouble;
import saltspoke.atmosphere.Setting;
import saltspoke.values.Refusal;

/**
 * Where the question is about: exactly one of a name, a postcode with its country, or coordinates,
 * and what the user knows better than the map.
 *
 * @param name town, perhaps with a country after a comma
 * @param postcode postcode, with {@code country}
 * @param country ISO 3166-1 alpha-2, with {@code postcode}
 * @param latitudeDeg −90..90, with {@code longitudeDeg}
 * @param longitudeDeg −180..180
 * @param elevationM metres, −450..6000, in place of the map's
 * @param seaDistanceKm 0..3000 km, in place of the map's
 * @param setting in place of the guessed one
 */
public record PlaceQuestion(
    Optional<String> name,
    Optional<String> postcode,
    Optional<String> country,
    OptionalDouble latitudeDeg,
    OptionalDouble longitudeDeg,
    OptionalDouble elevationM,
    OptionalDouble seaDistanceKm,
    Optional<Setting> setting) {

  /** Reads the place part of a question. */
  public static PlaceQuestion from(Parameters parameters) {
    Optional<String> at = parameters.text("at");
    Optional<String> name = parameters.text("place");
    Optional<String> postcode = parameters.text("postcode");
    Optional<String> country = parameters.text("country");
    int ways =
        (at.isPresent() ? 1 : 0) + (name.isPresent() ? 1 : 0) + (postcode.isPresent() ? 1 : 0);
    if (ways != 1) {
      throw Refusal.wrongUse(
          ways == 0 ? "no-place" : "several-places",
          "place",
          ways == 0 ? "" : ways + " ways at once",
          "one of: place, postcode with country, or at (LAT,LON)");
    }
    if (postcode.isPresent() && country.isEmpty()) {
      throw Refusal.wrongUse(
          "no-country", "country", "", "the two-letter country of the postcode, such as US or DE");
    }
    if (country.isPresent() && postcode.isEmpty()) {
      throw Refusal.wrongUse(
          "country-without-postcode",
          "country",
          Parameters.shortened(country.get()),
          "a postcode with it; a town's country goes behind a comma in place");
    }
    double[] point = at.map(text -> Parameters.latitudeLongitude("at", text)).orElse(null);
    return new PlaceQuestion(
        name,
        postcode,
        country,
        point == null ? OptionalDouble.empty() : OptionalDouble.of(point[0]),
        point == null ? OptionalDouble.empty() : OptionalDouble.of(point[1]),
        parameters.number("elevation", -450, 6000, "m"),
        parameters.number("sea-distance", 0, 3000, "km"),
        parameters.choice("setting", Setting.values(), Setting::id));
  }
}
