package saltspoke.wheel;

/**
 * What the kinetics take from a wet film, worked out once.
 *
 * @param warmth Arrhenius factor of all charge transfer against 25 °C
 * @param oxygen factor of oxygen's kinetics: warmth, and oxygen salted out
 * @param oxygenLimitUAPerCm2 most that oxygen's supply allows
 * @param sheetMicroS conductance of a square of film
 * @param chlorideMolPerKg chloride molality
 */
record FilmFactors(
    double warmth,
    double oxygen,
    double oxygenLimitUAPerCm2,
    double sheetMicroS,
    double chlorideMolPerKg) {
  static FilmFactors of(Film film) {
    double warmth = Kinetics.temperatureFactor(film.temperatureC());
    double salted = film.oxygenUmolPerL() / Oxygen.freshUmolPerL(film.temperatureC());
    return new FilmFactors(
        warmth,
        warmth * Math.pow(salted, Kinetics.SALTING_ORDER),
        ThinFilm.oxygenLimitUAPerCm2(film),
        ThinFilm.sheetMicroS(film),
        film.chlorideMolPerKg());
  }

  /** Oxygen limit over the kinetic factor: all that a {@link CathodeLaw} takes from the film. */
  double scaledLimitUAPerCm2() {
    return oxygenLimitUAPerCm2 / oxygen;
  }
}
