package saltspoke.wheel.damage;

/**
 * What the damage rests on without a published figure for it, each with its spread. One draw of a
 * wheel's fate shifts all of them at once; the sensitivity table shifts one after the other. Where
 * the spread comes with a part of the catalogue the figure here is null-free fallback 0 and the
 * part's own quantiles are used.
 */
public enum Assumption {
  /** Share of the carbon's (or other cathode's) surface and hole wall that is active. Catalogue. */
  ACTIVE_SHARE("active-share", "x/÷ of the catalogue's 10..90 %", 0),
  /** Length of seat worn bare when the wheel is built. Catalogue. */
  SEAT_BARE("seat-bare", "x/÷ of the catalogue's 10..90 %", 0),
  /**
   * Speed of oxygen reduction on the cathode. Published figures for carbon span 10–40 µA/cm²; what
   * is left after the calibration is the difference between rims and nipples.
   */
  CATHODE_SPEED("cathode-speed", "x/÷ 1.3", Math.log(1.3)),
  /** Attack beyond Faraday's current: galvanic current is under 30 % of the loss outdoors. */
  LOCAL_ATTACK("local-attack", "x/÷ 1.6", Math.log(1.6)),
  /** Hours in which the seat is wet. */
  WET_HOURS("wet-hours", "x/÷ 1.35", Math.log(1.35)),
  /** Salt on the rim bed; works through {@link #SALT_ELASTICITY}. */
  SALT_STORE("salt-store", "x/÷ 2", Math.log(2)),
  /** Share of the film's attack that reaches the thread past compound and fit. */
  THREAD_ACCESS("thread-access", "x/÷ 1.6", Math.log(1.6)),
  /** Wear of a tensioned thread per hour of riding. */
  FRETTING("fretting", "x/÷ 1.7", Math.log(1.7)),
  /** Room that product must fill before a nipple will not turn. */
  SEIZING_GAP("seizing-gap", "x/÷ 1.4", Math.log(1.4)),
  /** Loss at which attack is seen. */
  VISIBLE_DEPTH("visible-depth", "x/÷ 1.5", Math.log(1.5)),
  /** Wall, notch and strength of the head or rim bed together, on the dose to lose it. */
  HEAD_MARGIN("head-margin", "x/÷ 1.5", Math.log(1.5)),
  /** Uniform loss by the air model; its own quantiles are used. */
  AIR_LOSS("air-loss", "the air model's 10..90 %", 0),
  /** Share of the outdoor loss that reaches a wheel where it is kept. */
  SHELTER("shelter", "x/÷ 2", Math.log(2)),
  /** Life of an unscratched coating. */
  COATING_LIFE("coating-life", "x/÷ 1.7", Math.log(1.7)),
  /** The one global calibration constant, {@link Calibration#RATE}. */
  CALIBRATION("calibration", "x/÷ 1.3", Math.log(1.3));

  /**
   * Change of ln rate per change of ln salt at the seat. More salt makes the film thicker and wet
   * for longer, but past a few g/m² it only thickens brine. Computed with the wheel's weather and
   * the cell for aluminium on carbon: 0.35 to 0.4.
   */
  public static final double SALT_ELASTICITY = 0.4;

  private final String id;
  private final String spread;
  private final double lnSpread;

  Assumption(String id, String spread, double lnSpread) {
    this.id = id;
    this.spread = spread;
    this.lnSpread = lnSpread;
  }

  /** Name used in tables. */
  public String id() {
    return id;
  }

  /** Spread (one standard deviation) in words. */
  public String spread() {
    return spread;
  }

  /**
   * One standard deviation of the natural logarithm; 0 where the part or the air brings its own.
   */
  public double lnSpread() {
    return lnSpread;
  }
}
