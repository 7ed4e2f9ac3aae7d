package saltspoke.places;

import java.util.OptionalDouble;

/**
 * A town found by a search.
 *
 * @param name its name in the gazetteer
 * @param regionName first-level region, empty when unknown
 * @param countryCode ISO 3166-1 alpha-2
 * @param countryName English name, the code when unknown
 * @param lat latitude, degrees
 * @param lon longitude, degrees
 * @param elevationM ground by GeoNames' elevation model, empty when missing
 * @param population people, 0 when unknown
 */
public record PlaceHit(
    String name,
    String regionName,
    String countryCode,
    String countryName,
    double lat,
    double lon,
    OptionalDouble elevationM,
    long population) {}
