package saltspoke.wheel;

/**
 * A material in the part of the cathode: net cathodic current per unit of its kinetic factor. Falls
 * with potential and passes through 0 where the material rests.
 *
 * <p>All of it, its own anodic branch included, is divided by the factor of oxygen's kinetics in
 * the film ({@link FilmFactors#oxygen}); what is left depends on the film only through the oxygen
 * limit over that factor. So one table serves every film ({@link StripTable}). The pitting
 * potential of the cathode is that at 1 mol/kg: a cathode is far below it.
 */
final class CathodeLaw implements Polarisation {
  /** Branches below e^−30 of their reference are left out: 1e-13 µA/cm². */
  private static final double NEGLIGIBLE_LN = -30;

  private final double passive;
  private final double lnPit;
  private final double pitPerVolt;
  private final double lnActive;
  private final double activePerVolt;
  private final double oxygenScale;
  private final double oxygenPerVolt;
  private final double perOxygenLimit;
  private final double hydrogenScale;
  private final double hydrogenPerVolt;

  /**
   * @param limitUAPerCm2 oxygen limit over the kinetic factor, &gt; 0, may be infinite
   */
  CathodeLaw(Kinetics kinetics, double limitUAPerCm2) {
    passive = kinetics.passiveUAPerCm2();
    pitPerVolt = Math.log(10) / kinetics.pitSlopeV();
    lnPit = Math.log(Kinetics.PIT_CRITERION_UA_PER_CM2) - kinetics.pitAtOneMolalV() * pitPerVolt;
    activePerVolt = kinetics.active().perVolt();
    lnActive = Math.log(kinetics.active().at(0));
    oxygenPerVolt = kinetics.oxygen().perVolt();
    oxygenScale = kinetics.oxygen().at(0);
    perOxygenLimit = 1 / limitUAPerCm2;
    hydrogenPerVolt = kinetics.hydrogen().perVolt();
    hydrogenScale = kinetics.hydrogen().at(0);
  }

  @Override
  public void at(double potentialV, double[] out) {
    double pit = branch(lnPit + pitPerVolt * potentialV);
    double active = branch(lnActive + activePerVolt * potentialV);
    double free = oxygenScale * Math.exp(oxygenPerVolt * potentialV);
    double supplied = 1 / (1 + free * perOxygenLimit);
    double hydrogen = hydrogenScale * Math.exp(hydrogenPerVolt * potentialV);
    out[0] = free * supplied + hydrogen - passive - pit - active;
    out[1] =
        oxygenPerVolt * free * supplied * supplied
            + hydrogenPerVolt * hydrogen
            - pitPerVolt * pit
            - activePerVolt * active;
  }

  private static double branch(double ln) {
    return ln > NEGLIGIBLE_LN ? Math.exp(ln) : 0;
  }
}
