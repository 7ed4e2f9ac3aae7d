package saltspoke.wheel;

/**
 * The four parts that meet at a spoke hole, by catalogue id.
 *
 * @param rim such as {@code carbon-bare}
 * @param nipple such as {@code brass-nickel}
 * @param between interface between nipple and rim, such as {@code none} or {@code
 *     washer-insulating}
 * @param spoke such as {@code stainless}
 */
public record Pairing(String rim, String nipple, String between, String spoke) {}
