package saltspoke.wheel.rim;

/**
 * Everything about a wheel's own weather that has no published figure. Each constant is an
 * ASSUMPTION with its unit, its median and its 10 % and 90 % quantiles, and says what it rests on.
 * {@link #at} turns a standard normal deviate into a value, so that draws and sensitivities use the
 * same spread.
 */
public enum RimAssumption {
  /** Water that gets into a rim with sound tape while riding in the wet, per wheel. */
  INGRESS_G_PER_WET_HOUR("ingress", "g/h", 0.05, 0.25, 1.0),
  /** The same through tape that leaks, on top. */
  TAPE_LEAK_G_PER_WET_HOUR("tape-leak", "g/h", 0.1, 0.5, 2.0),
  /** Water that one rinse puts into the rim. */
  INGRESS_G_PER_RINSE("rinse-ingress", "g", 0.1, 0.4, 1.5),
  /** Water that an hour of rain puts into the rim of a bicycle left in the open. */
  INGRESS_G_PER_PARKED_RAIN_HOUR("parked-ingress", "g/h", 0.004, 0.02, 0.1),
  /** Share of the gaps round the nipples that is open: a tensioned head seats on its hole. */
  OPEN_GAP_SHARE("open-gap-share", "1", 0.1, 0.3, 0.7),
  /** Free water that drains away a day through drain holes, share of what is there. */
  DRAINED_PER_DAY_WITH_HOLES("drained-with-holes", "1/d", 0.4, 1.5, 5.0),
  /** The same without drain holes, past the nipples. */
  DRAINED_PER_DAY_WITHOUT_HOLES("drained-without-holes", "1/d", 0.005, 0.03, 0.15),
  /** Share of the water in the rim that drying a wheel takes out. */
  DRIED_SHARE("dried-share", "1", 0.1, 0.35, 0.7),
  /** Free water that clings to the bed and neither drains nor pools. */
  CLINGING_G("clinging-water", "g", 0.1, 0.3, 0.8),
  /**
   * Film that free water makes in the cavity at least: less water wets fewer seats, not all of them
   * thinner.
   */
  PATCH_FILM_UM("patch-film", "um", 10, 20, 50),
  /** Wetted surface of the cavity over which water and salt spread: bed 1.9 m × 20 mm and walls. */
  WETTED_BED_M2("wetted-bed", "m2", 0.03, 0.05, 0.09),
  /** Salt that stays behind when the water it is dissolved in drains away. */
  SALT_RETENTION("salt-retention", "1", 0.2, 0.5, 0.8),
  /**
   * Share of the water in an open seat's crevice, and of what is dissolved in it, that an hour of
   * riding in the wet exchanges for the road's water, fresh or salted.
   */
  WASHED_PER_RAIN_HOUR("rain-wash", "1/h", 0.006, 0.02, 0.06),
  /** An hour of rain on a parked bicycle over an hour of riding in the wet, in that exchange. */
  PARKED_WASH_RATIO("parked-wash", "1", 0.1, 0.3, 0.7),
  /** Salt that one rinse takes from a seat, share of what is there. */
  WASHED_PER_RINSE("rinse-wash", "1", 0.05, 0.15, 0.4),
  /** Share of that washing which reaches a seat hidden inside the rim. */
  HIDDEN_WASH_SHARE("hidden-wash-share", "1", 0.1, 0.3, 0.6),
  /** Salt lost with dust, brushing and rebuilding, share a year. */
  SALT_SHED_PER_YEAR("salt-shed", "1/a", 0.2, 0.5, 1.5),
  /** Share of the salt falling from the air on a wet candle that a seat catches and keeps. */
  SEA_CAPTURE_SHARE("sea-capture", "1", 0.01, 0.04, 0.15),
  /** That share for a hidden seat over that for an open one. */
  HIDDEN_CAPTURE_RATIO("hidden-capture", "1", 0.1, 0.3, 0.7),
  /** Salt deposition under a roof open at the sides, over the open. */
  COVERED_DEPOSITION("covered-deposition", "1", 0.3, 0.6, 0.9),
  /** Salt deposition in an unheated shed, over the open. */
  SHED_DEPOSITION("shed-deposition", "1", 0.02, 0.08, 0.25),
  /** Salt deposition in a heated room, over the open. */
  ROOM_DEPOSITION("room-deposition", "1", 0.005, 0.02, 0.06),
  /** Chloride deposition within sight of the sea, where rides by the sea go, at least. */
  SEA_FRONT_MG_PER_M2_DAY("sea-front-deposition", "mg/(m2 d)", 50, 150, 500),
  /** Deposition on a moving wheel over that on a standing one, about the ratio of air speeds. */
  MOVING_FACTOR("moving-factor", "1", 1.5, 3, 6),
  /** Water on a wet road, as depth: it dilutes the road's salt. */
  ROAD_WATER_MM("road-water", "mm", 0.15, 0.4, 1.0),
  /**
   * Days for which the salt of one treatment lies: 73 % is gone after 25 h in traffic (TRL PPR392),
   * 2–3 g/m² may stay two weeks without rain (published).
   */
  SALT_LIES_DAYS("salt-lies", "d", 1.5, 3, 7),
  /** Chloride that an hour of hard indoor riding drips on a seat. */
  SWEAT_MG_PER_M2_HOUR("sweat", "mg/(m2 h)", 0.5, 2, 8),
  /** Share of indoor riding in which a seat open to the outside is wet with sweat. */
  SWEAT_WET_SHARE("sweat-wet", "1", 0.05, 0.15, 0.4),
  /**
   * Thinnest brine that counts as a film: less salt lies as separate droplets that carry no current
   * from nipple to rim.
   */
  CONTINUOUS_FILM_UM("continuous-film", "um", 0.3, 1, 2.5),
  /** Length of a ride. */
  RIDE_HOURS("ride-length", "h", 0.5, 1, 2.5),
  /** Share of riding hours in the wet on a day with at least 1 mm of rain. */
  WET_SHARE_OF_RAIN_DAY("wet-share-rain-day", "1", 0.25, 0.45, 0.7),
  /** Share of riding hours on wet roads on a day near freezing, without rain. */
  WET_SHARE_OF_FREEZING_DAY("wet-share-freezing-day", "1", 0.1, 0.3, 0.6),
  /** Hours of rain on a day with at least 1 mm. */
  RAIN_HOURS_PER_WET_DAY("rain-hours", "h", 3, 6, 10),
  /** Temperature of a heated room, in the heating season. */
  ROOM_C("room-temperature", "degC", 18, 20, 22),
  /** Time constant of a shed's air against the air outside. */
  SHED_LAG_HOURS("shed-lag", "h", 3, 8, 20),
  /** Share of a shed's daily swing of humidity that wood, cloth and dust take up. */
  SHED_BUFFERING("shed-buffering", "1", 0.2, 0.45, 0.7),
  /** How far a thing under the open sky cools below the air, as share of the day's range. */
  SKY_COOLING_SHARE("sky-cooling", "1", 0.08, 0.18, 0.3),
  /** How directly a seat open to the outside follows the humidity there, not the cavity's. */
  OPEN_SEAT_SHARE("open-seat", "1", 0.2, 0.5, 0.8),
  /** Water held in the crevice of an open seat after rain, as film. */
  CREVICE_FILM_UM("crevice-film", "um", 50, 100, 250),
  /** Drying of that crevice over drying of an open film. */
  CREVICE_DRYING("crevice-drying", "1", 0.1, 0.3, 0.7);

  /** Standard normal deviate of the 90 % quantile (computed). */
  private static final double Z90 = 1.2815515655446004;

  private final String id;
  private final String unit;
  private final double p10;
  private final double median;
  private final double p90;

  RimAssumption(String id, String unit, double p10, double median, double p90) {
    this.id = id;
    this.unit = unit;
    this.p10 = p10;
    this.median = median;
    this.p90 = p90;
  }

  /** Name used in tables and options. */
  public String id() {
    return id;
  }

  public String unit() {
    return unit;
  }

  public double p10() {
    return p10;
  }

  public double median() {
    return median;
  }

  public double p90() {
    return p90;
  }

  /**
   * The value at a standard normal deviate: log-normal on either side of the median, logit-normal
   * for shares between 0 and 1, so that p10, median and p90 come out and no share leaves 0..1.
   */
  public double at(double z) {
    boolean share = unit.equals("1") && p90 < 1;
    double centre = stretch(median, share);
    double edge = stretch(z > 0 ? p90 : p10, share);
    double y = centre + Math.abs(z) / Z90 * (edge - centre);
    return share ? 1 / (1 + Math.exp(-y)) : Math.exp(y);
  }

  private static double stretch(double value, boolean share) {
    return share ? Math.log(value / (1 - value)) : Math.log(value);
  }
}
