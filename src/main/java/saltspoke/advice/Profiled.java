package saltspoke.advice;

import java.util.Set;
import java.util.TreeSet;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Rinsing;
import saltspoke.wheel.SaltedRoads;
import saltspoke.wheel.Sealant;
import saltspoke.wheel.Storage;
import saltspoke.wheel.ThreadCompound;

/** A riding profile with one thing changed. */
final class Profiled {
  private static final Set<Integer> WINTER_NORTH = Set.of(11, 12, 1, 2, 3);
  private static final Set<Integer> WINTER_SOUTH = Set.of(5, 6, 7, 8, 9);

  private Profiled() {}

  static RidingProfile storage(RidingProfile p, Storage storage) {
    return copy(
        p,
        p.months(),
        p.wetRideShare(),
        p.saltedRoads(),
        p.seaRideShare(),
        storage,
        p.rinsing(),
        p.driedAfterWet(),
        p.drainHoles(),
        p.threadCompound(),
        p.sealant());
  }

  static RidingProfile rinsing(RidingProfile p, Rinsing rinsing) {
    return copy(
        p,
        p.months(),
        p.wetRideShare(),
        p.saltedRoads(),
        p.seaRideShare(),
        p.storage(),
        rinsing,
        p.driedAfterWet(),
        p.drainHoles(),
        p.threadCompound(),
        p.sealant());
  }

  static RidingProfile dried(RidingProfile p, boolean dried) {
    return copy(
        p,
        p.months(),
        p.wetRideShare(),
        p.saltedRoads(),
        p.seaRideShare(),
        p.storage(),
        p.rinsing(),
        dried,
        p.drainHoles(),
        p.threadCompound(),
        p.sealant());
  }

  static RidingProfile drained(RidingProfile p, boolean holes) {
    return copy(
        p,
        p.months(),
        p.wetRideShare(),
        p.saltedRoads(),
        p.seaRideShare(),
        p.storage(),
        p.rinsing(),
        p.driedAfterWet(),
        holes,
        p.threadCompound(),
        p.sealant());
  }

  static RidingProfile compound(RidingProfile p, ThreadCompound compound) {
    return copy(
        p,
        p.months(),
        p.wetRideShare(),
        p.saltedRoads(),
        p.seaRideShare(),
        p.storage(),
        p.rinsing(),
        p.driedAfterWet(),
        p.drainHoles(),
        compound,
        p.sealant());
  }

  static RidingProfile sealant(RidingProfile p, Sealant sealant) {
    return copy(
        p,
        p.months(),
        p.wetRideShare(),
        p.saltedRoads(),
        p.seaRideShare(),
        p.storage(),
        p.rinsing(),
        p.driedAfterWet(),
        p.drainHoles(),
        p.threadCompound(),
        sealant);
  }

  static RidingProfile roads(RidingProfile p, SaltedRoads roads) {
    return copy(
        p,
        p.months(),
        p.wetRideShare(),
        roads,
        p.seaRideShare(),
        p.storage(),
        p.rinsing(),
        p.driedAfterWet(),
        p.drainHoles(),
        p.threadCompound(),
        p.sealant());
  }

  static RidingProfile awayFromSea(RidingProfile p) {
    return copy(
        p,
        p.months(),
        p.wetRideShare(),
        p.saltedRoads(),
        0,
        p.storage(),
        p.rinsing(),
        p.driedAfterWet(),
        p.drainHoles(),
        p.threadCompound(),
        p.sealant());
  }

  static RidingProfile neverWet(RidingProfile p) {
    return copy(
        p,
        p.months(),
        0,
        p.saltedRoads(),
        p.seaRideShare(),
        p.storage(),
        p.rinsing(),
        p.driedAfterWet(),
        p.drainHoles(),
        p.threadCompound(),
        p.sealant());
  }

  /** Not ridden outdoors from November to March, or May to September south of the equator. */
  static RidingProfile noWinter(RidingProfile p, boolean south) {
    TreeSet<Integer> months = new TreeSet<>(p.months());
    months.removeAll(south ? WINTER_SOUTH : WINTER_NORTH);
    return copy(
        p,
        months,
        p.wetRideShare(),
        p.saltedRoads(),
        p.seaRideShare(),
        p.storage(),
        p.rinsing(),
        p.driedAfterWet(),
        p.drainHoles(),
        p.threadCompound(),
        p.sealant());
  }

  private static RidingProfile copy(
      RidingProfile p,
      java.util.SortedSet<Integer> months,
      double wetRideShare,
      SaltedRoads saltedRoads,
      double seaRideShare,
      Storage storage,
      Rinsing rinsing,
      boolean dried,
      boolean drainHoles,
      ThreadCompound compound,
      Sealant sealant) {
    return new RidingProfile(
        p.name(),
        p.title(),
        months,
        p.hoursPerWeek(),
        wetRideShare,
        saltedRoads,
        seaRideShare,
        p.trainerHoursPerWeek(),
        storage,
        rinsing,
        dried,
        drainHoles,
        compound,
        sealant);
  }
}
