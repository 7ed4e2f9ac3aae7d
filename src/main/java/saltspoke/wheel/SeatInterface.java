package saltspoke.wheel;

import java.util.Optional;

/**
 * What lies between nipple and rim.
 *
 * @param id catalogue id
 * @param title short human title
 * @param material of a metal piece or of a polymer one; empty for none
 * @param insulating whether it parts nipple and rim electrically
 * @param thicknessMm thickness under the nipple, 0 for none
 * @param outerDiameterMm outer diameter, 0 for none
 * @param skirtMm width of insulation between the nipple's ring and the rim, along the film
 * @param holeWallCovered share of the hole's wall that it covers, 0..1
 * @param leakageResistanceOhm resistance of its body between nipple and rim: 0 for a metal piece
 * @param aluminiumRimOnly whether it can be fitted in aluminium rims only
 * @param carbonRimOnly whether it can be fitted in carbon rims only
 * @param source where the numbers come from
 */
public record SeatInterface(
    String id,
    String title,
    Optional<Material> material,
    boolean insulating,
    double thicknessMm,
    double outerDiameterMm,
    double skirtMm,
    double holeWallCovered,
    double leakageResistanceOhm,
    boolean aluminiumRimOnly,
    boolean carbonRimOnly,
    String source) {}
