package saltspoke.wheel;

import java.util.OptionalDouble;

/**
 * A spoke nipple.
 *
 * @param id catalogue id
 * @param title short human title
 * @param material of the body
 * @param coating what covers it
 * @param headDiameterMm head
 * @param headWallMm metal between the seat and the thread's bore that must go for the head to part
 * @param bodyDiameterMm body in the spoke hole
 * @param threadDiameterMm outer diameter of the spoke thread inside
 * @param threadPitchMm pitch
 * @param threadWallMm metal left around the thread
 * @param ringCircumferenceMm length of the ring on which it seats
 * @param ringWidthMm width of that ring
 * @param massG mass of one
 * @param stressCorrosionMpa tensile stress above which it may crack in salt, empty where none is
 *     known
 * @param whitePowder whether its corrosion shows as white powder
 * @param gallsOnSpoke whether the thread tends to gall on a bare metal spoke
 * @param cracksInAmmonia whether it cracks under ammoniated sealant
 * @param source where the numbers come from
 */
public record Nipple(
    String id,
    String title,
    Material material,
    Coating coating,
    double headDiameterMm,
    double headWallMm,
    double bodyDiameterMm,
    double threadDiameterMm,
    double threadPitchMm,
    double threadWallMm,
    double ringCircumferenceMm,
    double ringWidthMm,
    double massG,
    OptionalDouble stressCorrosionMpa,
    boolean whitePowder,
    boolean gallsOnSpoke,
    boolean cracksInAmmonia,
    String source) {

  /** Section of the body around the spoke thread, mm². */
  public double coreMm2() {
    return Math.PI / 4 * (bodyDiameterMm * bodyDiameterMm - threadDiameterMm * threadDiameterMm);
  }

  /** Mean tensile stress in that section, MPa, at a spoke tension in N. */
  public double coreStressMpa(double tensionN) {
    return tensionN / coreMm2();
  }
}
