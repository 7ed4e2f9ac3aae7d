package saltspoke.wheel;

/**
 * A metal in the part of the anode, in one film: net current = dissolution − its own cathodic
 * reactions. Rises with potential.
 */
final class AnodeLaw implements Polarisation {
  private static final double LN10 = Math.log(10);

  private final double passive;
  private final double pitScale;
  private final double pitPerVolt;
  private final double activeScale;
  private final double activePerVolt;
  private final double oxygenScale;
  private final double oxygenPerVolt;
  private final double perOxygenLimit;
  private final double hydrogenScale;
  private final double hydrogenPerVolt;

  AnodeLaw(Kinetics kinetics, FilmFactors film) {
    double warm = film.warmth();
    passive = warm * kinetics.passiveUAPerCm2();
    pitPerVolt = LN10 / kinetics.pitSlopeV();
    pitScale =
        warm
            * Kinetics.PIT_CRITERION_UA_PER_CM2
            * Math.exp(-kinetics.pitV(film.chlorideMolPerKg()) * pitPerVolt);
    activePerVolt = kinetics.active().perVolt();
    activeScale = warm * kinetics.active().at(0);
    oxygenPerVolt = kinetics.oxygen().perVolt();
    oxygenScale = film.oxygen() * kinetics.oxygen().at(0);
    perOxygenLimit = 1 / film.oxygenLimitUAPerCm2();
    hydrogenPerVolt = kinetics.hydrogen().perVolt();
    hydrogenScale = warm * kinetics.hydrogen().at(0);
  }

  @Override
  public void at(double potentialV, double[] out) {
    dissolution(potentialV, out);
    double anodic = out[0];
    double anodicSlope = out[1];
    cathodic(potentialV, out);
    out[0] = anodic - out[0];
    out[1] = anodicSlope - out[1];
  }

  /** Its dissolution, µA/cm², and the derivative per V. */
  void dissolution(double potentialV, double[] out) {
    double pit = pitScale > 0 ? pitScale * Math.exp(pitPerVolt * potentialV) : 0;
    double active = activeScale > 0 ? activeScale * Math.exp(activePerVolt * potentialV) : 0;
    out[0] = passive + pit + active;
    out[1] = pitPerVolt * pit + activePerVolt * active;
  }

  /** Its own cathodic reactions, µA/cm², and the derivative per V. */
  void cathodic(double potentialV, double[] out) {
    double free = oxygenScale * Math.exp(oxygenPerVolt * potentialV);
    double supplied = 1 / (1 + free * perOxygenLimit);
    double hydrogen = hydrogenScale * Math.exp(hydrogenPerVolt * potentialV);
    out[0] = free * supplied + hydrogen;
    out[1] = oxygenPerVolt * free * supplied * supplied + hydrogenPerVolt * hydrogen;
  }

  /** Potential at which the metal rests alone, V(SCE). */
  double restV() {
    double[] out = new double[2];
    return MixedPotential.solve(
        e -> {
          at(e, out);
          return out[0];
        },
        -1.6,
        1.0);
  }
}
