package saltspoke.wheel.damage;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.MonthAir;
import saltspoke.values.Quantiles;
import saltspoke.wheel.CellSpec;
import saltspoke.wheel.Coating;
import saltspoke.wheel.Material;
import saltspoke.wheel.Nipple;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.ThreadCompound;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;

/**
 * The sites of a pairing under one year of films. Cells that several pairings share are computed
 * once per instance; an instance serves one question and one thread.
 */
public final class Sites {
  /** z-value of the 90 % quantile of the normal law. */
  private static final double Z90 = 1.2815515655446004;

  /**
   * Change of ln current per change of ln active share of the rim's surface: most of the current
   * comes from the cut wall of the hole. Computed with the cell for aluminium on bare carbon in a
   * salted shed: 0.07.
   */
  private static final double ACTIVE_ELASTICITY = 0.07;

  /** The same for the bare share of the hole's cut wall: 0.5. */
  private static final double EDGE_ELASTICITY = 0.5;

  /** The same for the length of the bare ring: 0.2. */
  private static final double RING_ELASTICITY = 0.2;

  /** A coating that outlives this, twice what the advice looks ahead, is taken as lasting. */
  private static final double HORIZON_MONTHS = 480;

  /** Time over which the pace of a coated part is evened out, five years, months. ASSUMPTION. */
  private static final double PACE_MONTHS = 60;

  private static final Maturity SEAT = new Maturity(0);
  private static final Maturity OILED = new Maturity(9);
  private static final Maturity GREASED = new Maturity(24);
  private static final Maturity PASTED = new Maturity(48);

  /** Half-range of monthly temperature from which on a climate has a full winter, K. ASSUMPTION. */
  private static final double WINTER_HALF_RANGE_K = 5;

  private final AirClimate air;
  private final RidingProfile profile;
  private final WheelBuild build;
  private final int buildMonth;
  private final CellRates rates;
  private final double[] winter;
  private final FilmPool films;
  private final double wetShare;
  private final Map<CellSpec, FilmLoss> losses = new HashMap<>();
  private final Map<Object, Site> made = new HashMap<>();

  public Sites(
      AirClimate air,
      RidingProfile profile,
      WheelBuild build,
      int buildMonth,
      WheelYear year,
      CellRates rates) {
    this.air = air;
    this.films = FilmPool.of(year);
    this.wetShare =
        year.months().stream().mapToDouble(WheelYear.Month::wetHours).sum()
            / FilmLoss.HOURS_PER_YEAR;
    this.profile = profile;
    this.build = build;
    this.buildMonth = buildMonth;
    this.rates = rates;
    this.winter = winter(air);
  }

  /** All sites of a pairing. */
  public List<Site> of(Parts parts) {
    List<Site> sites = new ArrayList<>();
    for (Couple couple : SpokeHole.couples(parts)) {
      sites.add(made.computeIfAbsent(key(parts, couple), k -> site(parts, couple)));
    }
    Nipple nipple = parts.nipple();
    if (Fretting.relative(nipple.material()) > 0) {
      sites.add(made.computeIfAbsent(List.of("wear", nipple.id()), k -> wornThread(nipple)));
    }
    if (OpenAir.shows(nipple, build)) {
      sites.add(
          made.computeIfAbsent(
              List.of("open-air", nipple.id()), k -> OpenAir.site(nipple, air, profile)));
    }
    return sites;
  }

  /** Everything that a couple's site depends on besides the question itself. */
  private static Object key(Parts parts, Couple couple) {
    boolean thread = couple.where() == Couple.Where.THREAD;
    return List.of(couple, parts.nipple().id(), thread ? parts.spoke().id() : parts.rim().id());
  }

  private Site site(Parts parts, Couple couple) {
    boolean thread = couple.where() == Couple.Where.THREAD;
    double factor = Calibration.RATE * (thread ? access(profile.threadCompound()) : 1);
    Maturity maturity = thread ? threadMaturity(profile.threadCompound()) : SEAT;
    FilmLoss bare = loss(couple.spec());
    double share = couple.bareShare().median();
    double[] monthly = bare.scaled(factor * share);
    DoseCurve dose = new SeasonalDose(monthly, buildMonth, winter, maturity);
    Coating coating = coatingOf(parts, couple);
    double through = CoatingLife.months(coating, wetShare);
    if (share < 1 && through < HORIZON_MONTHS) {
      FilmLoss whole = loss(couple.wholeRing());
      double[] more = whole.scaled(factor);
      double[] less = bare.scaled(factor * share);
      for (int i = 0; i < 12; i++) {
        more[i] = Math.max(0, more[i] - less[i]);
      }
      dose = dose.plus(new SeasonalDose(more, buildMonth, winter, maturity).after(through));
    }
    double delay = couple.delayMonths(wetShare);
    dose = evenly(dose.after(delay), maturity);
    double[] ln = shifts(couple, bare, thread);
    set(ln, Assumption.COATING_LIFE, coatingShift(through, delay));
    return new Site(
        couple.part(),
        thread ? "thread" : "seat",
        couple.metal(),
        dose,
        monthly,
        thread
            ? SiteLimits.seizedUm(parts, couple) * Products.STIFF_SHARE
            : Products.visibleAtSeatUm(couple.metal()),
        SiteLimits.seizedUm(parts, couple),
        SiteLimits.lostUm(parts, couple, build.tensionN()),
        ln);
  }

  /**
   * The same loss, steady at its mean pace over the first years: a coating that wears through in
   * between is spread over them. A pace of one piece is what keeps a harsher year from lengthening
   * the time between two depths.
   */
  private static DoseCurve evenly(DoseCurve dose, Maturity maturity) {
    double pace = dose.steady().um(PACE_MONTHS) / maturity.settledMonths(PACE_MONTHS);
    return new DoseCurve() {
      @Override
      public double um(double months) {
        return dose.um(months);
      }

      @Override
      public DoseCurve steady() {
        return months -> pace * maturity.settledMonths(months);
      }
    };
  }

  /**
   * A thread wears whether or not it corrodes. The two are kept apart and the faster counts, so
   * that each keeps its own spread; where they are equal that is late by at most a factor 2.
   */
  private Site wornThread(Nipple nipple) {
    Material metal = nipple.material();
    double[] monthly = Fretting.monthlyUm(metal, profile);
    double access = access(profile.threadCompound());
    for (int m = 0; m < monthly.length; m++) {
      monthly[m] *= access;
    }
    double[] ln = new double[Assumption.values().length];
    set(ln, Assumption.FRETTING, Assumption.FRETTING.lnSpread());
    set(ln, Assumption.THREAD_ACCESS, Assumption.THREAD_ACCESS.lnSpread());
    double seized = Fretting.toFillUm(metal);
    return new Site(
        "nipple",
        "wear",
        metal,
        new SeasonalDose(
            monthly, buildMonth, new double[12], threadMaturity(profile.threadCompound())),
        monthly,
        Nobility.corrodes(metal) ? seized * Products.STIFF_SHARE : Double.POSITIVE_INFINITY,
        seized,
        Double.POSITIVE_INFINITY,
        ln);
  }

  /**
   * Change of ln dose when coatings last a spread longer. ASSUMPTION: the dose goes as one over the
   * coating's life where it wears through within the first years; the same for all films, so that
   * more hours in one move no spread.
   */
  private static double coatingShift(double throughMonths, double delayMonths) {
    boolean wears = delayMonths > 0 || throughMonths < PACE_MONTHS;
    return wears ? -Assumption.COATING_LIFE.lnSpread() : 0;
  }

  private FilmLoss loss(CellSpec spec) {
    return losses.computeIfAbsent(spec, s -> FilmLoss.over(films, s, rates));
  }

  /**
   * Share of the film's attack that reaches the thread in the end. ASSUMPTION: all of it on dry or
   * once oiled threads; what is left of grease and of a filled paste keeps two and three fifths
   * out; spread in {@link Assumption#THREAD_ACCESS}.
   */
  private static double access(ThreadCompound compound) {
    return switch (compound) {
      case NONE, OIL -> 1;
      case GREASE -> 0.6;
      case ANTI_SEIZE -> 0.4;
    };
  }

  /** Months in which a compound washes out of the thread. ASSUMPTION, x/÷ 2, same entry. */
  private static Maturity threadMaturity(ThreadCompound compound) {
    return switch (compound) {
      case NONE -> SEAT;
      case OIL -> OILED;
      case GREASE -> GREASED;
      case ANTI_SEIZE -> PASTED;
    };
  }

  /** Weight of winter in each month: 1 in the coldest, 0 in the warmest, less without seasons. */
  private static double[] winter(AirClimate air) {
    double coldest = Double.POSITIVE_INFINITY;
    double warmest = Double.NEGATIVE_INFINITY;
    for (MonthAir month : air.months()) {
      coldest = Math.min(coldest, month.temperatureC());
      warmest = Math.max(warmest, month.temperatureC());
    }
    double range = warmest - coldest;
    double full = Math.min(1, range / (2 * WINTER_HALF_RANGE_K));
    double[] weights = new double[12];
    for (MonthAir month : air.months()) {
      weights[month.month() - 1] = range > 0 ? full * (warmest - month.temperatureC()) / range : 0;
    }
    return weights;
  }

  private static Coating coatingOf(Parts parts, Couple couple) {
    return switch (couple.part()) {
      case "nipple" -> parts.nipple().coating();
      case "rim" -> parts.rim().coating();
      case "spoke" -> parts.spoke().coating();
      default -> new Coating(Coating.Kind.NONE, 0, couple.bareShare(), couple.bareShare());
    };
  }

  private static double[] shifts(Couple couple, FilmLoss loss, boolean thread) {
    double[] ln = new double[Assumption.values().length];
    double driven = loss.galvanicShare() + loss.localShare();
    double self = 1 - driven;
    set(
        ln,
        Assumption.ACTIVE_SHARE,
        driven
            * (ACTIVE_ELASTICITY * lnSpread(couple.activeShare())
                + EDGE_ELASTICITY * lnSpread(couple.edgeShare())));
    set(ln, Assumption.SEAT_BARE, (self + driven * RING_ELASTICITY) * lnSpread(couple.bareShare()));
    set(ln, Assumption.CATHODE_SPEED, driven * Assumption.CATHODE_SPEED.lnSpread());
    set(ln, Assumption.LOCAL_ATTACK, loss.localShare() * Assumption.LOCAL_ATTACK.lnSpread());
    set(ln, Assumption.WET_HOURS, Assumption.WET_HOURS.lnSpread());
    set(ln, Assumption.SALT_STORE, Assumption.SALT_ELASTICITY * Assumption.SALT_STORE.lnSpread());
    set(ln, Assumption.CALIBRATION, Assumption.CALIBRATION.lnSpread());
    set(ln, Assumption.THREAD_ACCESS, thread ? Assumption.THREAD_ACCESS.lnSpread() : 0);
    return ln;
  }

  static void set(double[] ln, Assumption assumption, double shift) {
    ln[assumption.ordinal()] = shift;
  }

  static double lnSpread(Quantiles share) {
    return share.p10() > 0 ? Math.log(share.p90() / share.p10()) / (2 * Z90) : 0;
  }
}
