package saltspoke.atmosphere;

/** What a site correction can move. */
public enum CorrectedQuantity {
  /**
   * Monthly mean temperature, K added. The reach was chosen by leaving stations out in one half of
   * 1500 climate stations; a wider one (1500 km) served them slightly better, but their errors
   * agree by only a third at 150 km.
   */
  TEMPERATURE(
      "temperature", "add", 0.95, 0.3, 5, -40, 40, new CorrectionReach(0.2, 30, 800, 4000, 10, 5)),

  /**
   * Monthly mean relative humidity, points added. Chosen likewise; the humidity maps err over whole
   * regions, so that neighbours 300 km apart agree by more than half.
   */
  RELATIVE_HUMIDITY(
      "relative-humidity",
      "add",
      5.6,
      2,
      30,
      -100,
      100,
      new CorrectionReach(0.2, 30, 1500, 4000, 10, 5)),

  /**
   * Sea-salt chloride, factor. ASSUMPTION: half of the error is the site's own (shelter, surf) and
   * shared within 10 km only, half is the coast's (winds, waves) and fades over 150 km; no file of
   * sites with coordinates was at hand to choose by. Spread of the reaches: a factor 2.
   */
  CHLORIDE(
      "chloride",
      "multiply",
      SeaSalt.LN_SPREAD,
      0.3,
      3,
      1e-4,
      1e4,
      new CorrectionReach(0.5, 10, 150, 1500, 0.1, 5)),

  /**
   * Wet hours a month, factor on what follows from the month's own temperature and humidity. Half
   * of the model's error with exact means is taken as the month's, so its spread is larger than
   * that of a year ({@link ClimateSpread#WET_HOURS_LN}). ASSUMPTION: reaches as humidity, whose
   * days the factor describes; spread a factor 2.
   */
  WET_HOURS(
      "wet-hours",
      "multiply",
      0.18,
      0.06,
      2,
      1e-3,
      1e3,
      new CorrectionReach(0.2, 30, 1500, 4000, 10, 5));

  private static final String FACTOR = "multiply";

  private final String id;
  private final String kind;
  private final double priorSpread;
  private final double usualSpread;
  private final double largestSpread;
  private final double least;
  private final double most;
  private final CorrectionReach reach;

  CorrectedQuantity(
      String id,
      String kind,
      double priorSpread,
      double usualSpread,
      double largestSpread,
      double least,
      double most,
      CorrectionReach reach) {
    this.id = id;
    this.kind = kind;
    this.priorSpread = priorSpread;
    this.usualSpread = usualSpread;
    this.largestSpread = largestSpread;
    this.least = least;
    this.most = most;
    this.reach = reach;
  }

  /** Name in a correction file. */
  public String id() {
    return id;
  }

  /** {@code add} or {@code multiply}. */
  public String kind() {
    return kind;
  }

  /** Whether amounts multiply. */
  boolean isFactor() {
    return kind.equals(FACTOR);
  }

  /** Spread of the uncorrected model, one standard deviation; of the logarithm for a factor. */
  double priorSpread() {
    return priorSpread;
  }

  /**
   * ASSUMPTION: spread of a measurement that says nothing of it (instrument, short record): 0.3 K,
   * 2 points, 0.3 of ln chloride, 0.06 of ln wet hours; a factor 2 either way.
   */
  public double usualSpread() {
    return usualSpread;
  }

  double largestSpread() {
    return largestSpread;
  }

  double least() {
    return least;
  }

  double most() {
    return most;
  }

  CorrectionReach reach() {
    return reach;
  }

  /** The departure that sites are blended by: the amount, or its logarithm for a factor. */
  double departure(double amount) {
    return isFactor() ? Math.log(amount) : amount;
  }

  /** The amount that takes an estimate to a measurement. */
  public double amount(double measured, double estimated) {
    return isFactor() ? measured / estimated : measured - estimated;
  }
}
