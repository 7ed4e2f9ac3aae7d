package saltspoke.places;

/**
 * Who lives near a place, as a guess at what the air carries.
 *
 * @param populationWithin5Km people in towns of the gazetteer whose centre lies within 5 km
 * @param populationWithin25Km likewise within 25 km
 * @param nightLight brightness of night lights, 0..255
 */
public record Surroundings(
    double populationWithin5Km, double populationWithin25Km, double nightLight) {}
