package saltspoke.wheel.damage;

import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Storage;

/** Share of the outdoor loss of an open surface that reaches the outside of a wheel. */
public final class Shelter {
  private static final double HOURS_PER_WEEK = 168;

  private Shelter() {}

  /**
   * Shares while it stands: heated room 1/100 of outdoors (copper, nickel: Rice 1980); shed, one to
   * two categories below outdoors (ISO 12944-2 calls it C2), 1/8 ASSUMPTION; under a roof outdoors
   * 0.6 ASSUMPTION: salt stays, rain does not; open 1. Spread in {@link Assumption#SHELTER}.
   */
  static double standing(Storage storage) {
    return switch (storage) {
      case HEATED_ROOM -> 0.01;
      case UNHEATED_SHED -> 0.125;
      case COVERED_OUTDOORS -> 0.6;
      case OPEN -> 1;
    };
  }

  /** Standing and riding together, weighed by time; 0..1. */
  public static double share(RidingProfile profile) {
    double riding = profile.months().size() / 12.0 * profile.hoursPerWeek() / HOURS_PER_WEEK;
    return riding + (1 - riding) * standing(profile.storage());
  }
}
