package saltspoke.advice;

/**
 * What is known of a wheel in service.
 *
 * @param ageMonths time in service, months
 * @param finding of the last look, taken as found now
 * @param chanceToSee chance that a look finds attack that is there, 0..1
 */
record History(double ageMonths, Finding finding, double chanceToSee) {
  /** A wheel that goes into service now. */
  static final History NEW = new History(0, Finding.NOT_LOOKED, 1);

  boolean isNew() {
    return ageMonths <= 0;
  }
}
