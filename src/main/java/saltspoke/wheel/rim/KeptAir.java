package saltspoke.wheel.rim;

/**
 * The air at the wheel in one slot of one kind of day.
 *
 * @param share share of the month's time, 0..1
 * @param day index of the day type
 * @param temperatureC of the air at the wheel, or of the wheel itself where it cools below the air
 * @param vapourPressureHpa vapour pressure there
 * @param relativeHumidityPct over liquid water, 0..100
 */
public record KeptAir(
    double share,
    int day,
    double temperatureC,
    double vapourPressureHpa,
    double relativeHumidityPct) {}
