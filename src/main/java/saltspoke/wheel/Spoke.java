package saltspoke.wheel;

/**
 * A spoke, as far as its end in the nipple goes.
 *
 * @param id catalogue id
 * @param title short human title
 * @param material of the wire
 * @param coating what covers it
 * @param diameterMm wire
 * @param threadDiameterMm thread
 * @param wettedAreaCm2 surface near the nipple that a film in the seat can reach
 * @param threadResistanceOhm metallic resistance from nipple to spoke through the thread
 * @param source where the numbers come from
 */
public record Spoke(
    String id,
    String title,
    Material material,
    Coating coating,
    double diameterMm,
    double threadDiameterMm,
    double wettedAreaCm2,
    double threadResistanceOhm,
    String source) {}
