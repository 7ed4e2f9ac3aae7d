package saltspoke.atlas.stations;

import java.util.function.DoubleBinaryOperator;
import saltspoke.atmosphere.MonthlyClimate;

/**
 * The shipped world that stations are compared with.
 *
 * @param seaDistanceKm distance to the sea, km, from latitude and longitude in degrees
 */
public record StationWorld(MonthlyClimate climate, DoubleBinaryOperator seaDistanceKm) {}
