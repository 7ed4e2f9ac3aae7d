package saltspoke.wheel.rim;

import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.MonthAir;
import saltspoke.atmosphere.RoadSalt;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Rinsing;
import saltspoke.wheel.SaltedRoads;

/**
 * What is done with a bicycle in one month.
 *
 * @param rideHours outdoor riding
 * @param wetRideHours of which in rain or on wet roads
 * @param wetRides rides in the wet
 * @param rinses rinses
 * @param trainerHours indoor riding
 * @param saltedShare share of the wet riding on roads on which salt lies, 0..1
 * @param brinePct mass % of salt, as sodium chloride, in the water on those roads
 * @param magnesiumShare share of that chloride that came as magnesium or calcium chloride, 0..1
 */
record RideMonth(
    double rideHours,
    double wetRideHours,
    double wetRides,
    double rinses,
    double trainerHours,
    double saltedShare,
    double brinePct,
    double magnesiumShare) {

  /**
   * Salt on a salted road when the rider says "yes" where the climate says no, g/m². Common
   * practice: a treatment is 8–20 g/m², of which a quarter is left after a day (TRL PPR392).
   */
  private static final double SALT_ON_ROAD_IF_TOLD_G_PER_M2 = 3;

  /** Treatments per near-freezing day in that case. ASSUMPTION, spread 0.3–1. */
  private static final double TREATMENTS_PER_FREEZING_DAY_IF_TOLD = 0.6;

  /** Strongest brine that stays on a road, mass %: saturated sodium chloride, from memory. */
  private static final double SATURATED_PCT = 26;

  static RideMonth of(
      AirClimate air, int monthIndex, RidingProfile profile, RimAssumptions assumptions) {
    int month = monthIndex + 1;
    double weeks = Calendar.days(monthIndex) / 7.0;
    boolean ridden = profile.months().contains(month) && profile.hoursPerWeek() > 0;
    double rideHours = ridden ? profile.hoursPerWeek() * weeks : 0;
    MonthAir outside = air.months().get(monthIndex);
    double wetHours = rideHours * wetShare(outside, profile, assumptions);
    double wetRides =
        wetHours / Math.min(assumptions.get(RimAssumption.RIDE_HOURS), Math.max(1e-9, rideHours));
    double rinses = ridden ? rinses(profile.rinsing(), weeks, wetRides) : 0;
    RoadSalt.Month road = road(air, monthIndex, profile.saltedRoads(), assumptions);
    double saltedShare =
        road.saltOnRoadGPerM2() > 0 ? saltedShare(road.treatments(), monthIndex, assumptions) : 0;
    // The month's mean lies on the salted days only.
    double onRoad = saltedShare > 0 ? road.saltOnRoadGPerM2() / saltedShare : 0;
    double waterG = 1000 * assumptions.get(RimAssumption.ROAD_WATER_MM);
    double brinePct = Math.min(SATURATED_PCT, 100 * onRoad / (onRoad + waterG));
    return new RideMonth(
        rideHours,
        wetHours,
        wetRides,
        rinses,
        profile.months().contains(month) ? 0 : profile.trainerHoursPerWeek() * weeks,
        saltedShare,
        brinePct,
        air.roadSalt().magnesiumShare());
  }

  /**
   * Share of riding in the wet: as given, else wet days × their wet share plus the remaining
   * near-freezing days × theirs.
   */
  static double wetShare(MonthAir outside, RidingProfile profile, RimAssumptions assumptions) {
    if (profile.wetRideShare() >= 0) {
      return profile.wetRideShare();
    }
    double days = Calendar.days(outside.month() - 1);
    double wet = Math.min(1, outside.wetDays() / days);
    double freezing = Math.min(1, outside.nearFreezingDays() / days) * (1 - wet);
    return wet * assumptions.get(RimAssumption.WET_SHARE_OF_RAIN_DAY)
        + freezing * assumptions.get(RimAssumption.WET_SHARE_OF_FREEZING_DAY);
  }

  private static double rinses(Rinsing rinsing, double weeks, double wetRides) {
    return switch (rinsing) {
      case NEVER -> 0;
      case MONTHLY -> 1;
      case WEEKLY -> weeks;
      case AFTER_WET_RIDES -> wetRides;
    };
  }

  private static RoadSalt.Month road(
      AirClimate air, int monthIndex, SaltedRoads salted, RimAssumptions assumptions) {
    RoadSalt.Month byClimate = air.roadSalt().months().get(monthIndex);
    return switch (salted) {
      case NO -> new RoadSalt.Month(monthIndex + 1, 0, 0);
      case BY_CLIMATE -> byClimate;
      case YES -> {
        double treatments =
            Math.max(
                byClimate.treatments(),
                TREATMENTS_PER_FREEZING_DAY_IF_TOLD
                    * air.months().get(monthIndex).nearFreezingDays());
        double share = saltedShare(treatments, monthIndex, assumptions);
        yield new RoadSalt.Month(
            monthIndex + 1,
            treatments,
            Math.max(byClimate.saltOnRoadGPerM2(), share * SALT_ON_ROAD_IF_TOLD_G_PER_M2));
      }
    };
  }

  /**
   * Share of the days on which salt lies, when each treatment lies so long and they fall at random.
   */
  private static double saltedShare(double treatments, int monthIndex, RimAssumptions a) {
    return -Math.expm1(
        -treatments * a.get(RimAssumption.SALT_LIES_DAYS) / Calendar.days(monthIndex));
  }
}
