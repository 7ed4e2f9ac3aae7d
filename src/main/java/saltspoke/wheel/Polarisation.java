package saltspoke.wheel;

/** A current density, µA/cm², as a function of potential, with its derivative. */
interface Polarisation {
  /**
   * @param potentialV potential of the metal against the film beside it
   * @param out receives the current density, µA/cm², and its derivative, µA/(cm² V)
   */
  void at(double potentialV, double[] out);
}
