package saltspoke.wheel.rim;

import saltspoke.atmosphere.MonthAir;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Storage;
import saltspoke.wheel.WheelBuild;

/**
 * Free water in one rim, day by day through a settled year: what wet rides, rinses and rain bring,
 * what drains (in proportion to what is there beyond the clinging part), what evaporates (at the
 * month's rate for the place where the wheel is kept, while there is any) and what drying takes.
 * Events are spread evenly over their month; the second of two equal years is kept.
 */
final class WaterStore {
  private static final int STEPS_PER_DAY = 4;
  private static final int SPIN_UP_YEARS = 1;

  /** Per month: mean water, share of time with water, mean while there is some. */
  final double[] meanG = new double[Calendar.MONTHS];

  final double[] wetShare = new double[Calendar.MONTHS];

  /** Per month: share of its dissolved salt that the draining water carries, summed over days. */
  final double[] flushed = new double[Calendar.MONTHS];

  /** Of the settled year, g: in, evaporated, drained, dried away, gain of the store. */
  double inG;

  double evaporatedG;
  double drainedG;
  double driedG;
  double gainG;

  private WaterStore() {}

  /** Water that an event brings, g, apart for rides and rinses. */
  static double perWetHourG(WheelBuild build, RimAssumptions a) {
    return a.get(RimAssumption.INGRESS_G_PER_WET_HOUR)
        + (build.tapeSound() ? 0 : a.get(RimAssumption.TAPE_LEAK_G_PER_WET_HOUR));
  }

  static WaterStore settle(
      MonthAir[] outside,
      RideMonth[] rides,
      double[] evaporationGPerDay,
      RidingProfile profile,
      WheelBuild build,
      RimAssumptions a) {
    WaterStore store = new WaterStore();
    double drainPerDay =
        a.get(
            profile.drainHoles()
                ? RimAssumption.DRAINED_PER_DAY_WITH_HOLES
                : RimAssumption.DRAINED_PER_DAY_WITHOUT_HOLES);
    double drainStep = -Math.expm1(-drainPerDay / STEPS_PER_DAY);
    double clinging = a.get(RimAssumption.CLINGING_G);
    double dried = profile.driedAfterWet() ? a.get(RimAssumption.DRIED_SHARE) : 0;
    double parked =
        profile.storage() == Storage.OPEN
            ? a.get(RimAssumption.INGRESS_G_PER_PARKED_RAIN_HOUR)
                * a.get(RimAssumption.RAIN_HOURS_PER_WET_DAY)
            : 0;
    double perHour = perWetHourG(build, a);
    double perRinse = a.get(RimAssumption.INGRESS_G_PER_RINSE);
    double water = 0;
    for (int year = 0; year <= SPIN_UP_YEARS; year++) {
      boolean kept = year == SPIN_UP_YEARS;
      double start = water;
      for (int m = 0; m < Calendar.MONTHS; m++) {
        int days = Calendar.days(m);
        Events wetRides = new Events(rides[m].wetRides() / days);
        Events rinses = new Events(rides[m].rinses() / days);
        Events rainDays = new Events(Math.min(1, outside[m].wetDays() / days));
        double perRide =
            rides[m].wetRides() > 0 ? perHour * rides[m].wetRideHours() / rides[m].wetRides() : 0;
        double sumG = 0;
        double sumWet = 0;
        double sumFlushed = 0;
        for (int day = 0; day < days; day++) {
          int ridden = wetRides.today();
          int rinsed = rinses.today();
          double in = ridden * perRide + rinsed * perRinse + rainDays.today() * parked;
          double before = water + in;
          double taken = ridden + rinsed > 0 ? dried * before : 0;
          water = before - taken;
          double drainedToday = 0;
          double evaporatedToday = 0;
          for (int step = 0; step < STEPS_PER_DAY; step++) {
            double runs = Math.max(0, water - clinging) * drainStep;
            double left = water - runs;
            double could = evaporationGPerDay[m] / STEPS_PER_DAY;
            double gone = Math.min(left, could);
            double part = left >= could ? 1 : left / could;
            sumWet += part;
            sumG += part * (water + left - gone) / 2;
            water = left - gone;
            drainedToday += runs;
            evaporatedToday += gone;
          }
          sumFlushed += before > 0 ? (drainedToday + taken) / (before + clinging) : 0;
          if (kept) {
            store.inG += in;
            store.driedG += taken;
            store.drainedG += drainedToday;
            store.evaporatedG += evaporatedToday;
          }
        }
        store.meanG[m] = sumG / (days * STEPS_PER_DAY);
        store.wetShare[m] = sumWet / (days * STEPS_PER_DAY);
        store.flushed[m] = sumFlushed;
      }
      store.gainG = water - start;
    }
    return store;
  }

  /** Mean water while there is some, g; 0 when there never is. */
  double meanWhileWetG(int monthIndex) {
    return wetShare[monthIndex] > 0 ? meanG[monthIndex] / wetShare[monthIndex] : 0;
  }

  /** So many events a day, spread evenly, whole ones only. */
  private static final class Events {
    private final double perDay;
    private double due = 0.5;

    private Events(double perDay) {
      this.perDay = perDay;
    }

    private int today() {
      due += perDay;
      int whole = (int) due;
      due -= whole;
      return whole;
    }
  }
}
