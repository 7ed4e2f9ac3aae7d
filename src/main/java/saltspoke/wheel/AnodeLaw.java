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

  AnodeLaw(Kinetics kinetics, Film film) {
    double warm = Kinetics.temperatureFactor(film.temperatureC());
    passive = warm * kinetics.passiveUAPerCm2();
    pitPerVolt = LN10 / kinetics.pitSlopeV();
    pitScale =
        warm
            * Kinetics.PIT_CRITERION_UA_PER_CM2
            * Math.exp(-kinetics.pitV(film.chlorideMolPerKg()) * pitPerVolt);
    activePerVolt = kinetics.active().perVolt();
    activeScale = warm * kinetics.active().at(0);
    oxygenPerVolt = kinetics.oxygen().perVolt();
    oxygenScale = Kinetics.oxygenFactor(film) * kinetics.oxygen().at(0);
    perOxygenLimit = 1 / ThinFilm.oxygenLimitUAPerCm2(film);
    hydrogenPerVolt = kinetics.hydrogen().perVolt();
    hydrogenScale = warm * kinetics.hydrogen().at(0);
  }

  @Override
  public void at(double potentialV, double[] out) {
    double pit = pitScale * Math.exp(pitPerVolt * potentialV);
    double active = activeScale * Math.exp(activePerVolt * potentialV);
    double free = oxygenScale * Math.exp(oxygenPerVolt * potentialV);
    double supplied = 1 / (1 + free * perOxygenLimit);
    double hydrogen = hydrogenScale * Math.exp(hydrogenPerVolt * potentialV);
    out[0] = passive + pit + active - free * supplied - hydrogen;
    out[1] =
        pitPerVolt * pit
            + activePerVolt * active
            - oxygenPerVolt * free * supplied * supplied
            - hydrogenPerVolt * hydrogen;
  }

  /** Its own cathodic reactions at a potential, µA/cm². */
  double cathodicUAPerCm2(double potentialV) {
    double free = oxygenScale * Math.exp(oxygenPerVolt * potentialV);
    return free / (1 + free * perOxygenLimit)
        + hydrogenScale * Math.exp(hydrogenPerVolt * potentialV);
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
