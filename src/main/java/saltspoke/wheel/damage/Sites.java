package saltspoke.wheel.damage;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.Metal;
import saltspoke.atmosphere.MetalCorrosivity;
import saltspoke.values.Quantiles;
import saltspoke.wheel.CellSpec;
import saltspoke.wheel.Coating;
import saltspoke.wheel.Material;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.Spoke;
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
   * How the galvanic current answers to the cathode's active share: part of it comes from the cut
   * hole wall, part from a ring whose reach shrinks as its activity grows (current ~ square root
   * where ohmic loss limits). ASSUMPTION 0.7 between 0.5 and 1.
   */
  private static final double ACTIVE_ELASTICITY = 0.7;

  /** How the current answers to the length of bare ring: the cathode limits it, so little. */
  private static final double RING_ELASTICITY = 0.3;

  /** Loss of the rim bed over its thickness at which it cracks at the hole. ASSUMPTION. */
  private static final double BED_SHARE = 0.5;

  /** Tensile strength of spoke wire, MPa, common practice. */
  private static final double WIRE_MPA = 1000;

  private final AirClimate air;
  private final RidingProfile profile;
  private final WheelBuild build;
  private final int buildMonth;
  private final CellRates rates;
  private final Map<WheelYear, Map<CellSpec, FilmLoss>> losses = new HashMap<>();

  public Sites(
      AirClimate air, RidingProfile profile, WheelBuild build, int buildMonth, CellRates rates) {
    this.air = air;
    this.profile = profile;
    this.build = build;
    this.buildMonth = buildMonth;
    this.rates = rates;
  }

  /** All sites of a pairing. */
  public List<Site> of(Parts parts, WheelYear year) {
    List<Site> sites = new ArrayList<>();
    double wetShare =
        year.months().stream().mapToDouble(WheelYear.Month::wetHours).sum()
            / FilmLoss.HOURS_PER_YEAR;
    for (Couple couple : SpokeHole.couples(parts)) {
      add(sites, parts, couple, year, wetShare);
    }
    openAir(parts).ifPresent(sites::add);
    return sites;
  }

  private void add(
      List<Site> sites, Parts parts, Couple couple, WheelYear year, double wetShare) {
    boolean thread = couple.where() == Couple.Where.THREAD;
    double factor = Calibration.RATE * (thread ? access(profile.threadCompound()) : 1);
    FilmLoss bare = loss(year, couple.spec());
    double share = couple.bareShare().median();
    DoseCurve dose = new SeasonalDose(bare.scaled(factor * share), buildMonth);
    Coating coating = coatingOf(parts, couple);
    double through = CoatingLife.months(coating, wetShare);
    if (share < 1 && Double.isFinite(through)) {
      FilmLoss whole = loss(year, couple.wholeRing());
      double[] more = whole.scaled(factor);
      double[] less = bare.scaled(factor * share);
      for (int i = 0; i < 12; i++) {
        more[i] = Math.max(0, more[i] - less[i]);
      }
      dose = dose.plus(new SeasonalDose(more, buildMonth).after(through));
    }
    double delay = couple.delayMonths(wetShare);
    DoseCurve unshielded = dose;
    dose = dose.after(delay);
    double[] ln = shifts(couple, bare, thread);
    set(ln, Assumption.COATING_LIFE, coatingShift(dose, unshielded, through, delay));
    sites.add(
        new Site(
            couple.part(),
            thread ? "thread" : "seat",
            couple.metal(),
            dose,
            bare.scaled(factor * share),
            thread ? Double.POSITIVE_INFINITY : Products.visibleAtSeatUm(couple.metal()),
            seized(couple),
            lost(parts, couple),
            ln));
  }

  /**
   * Change of ln dose after five years when coatings last a spread longer; 0 for parts without one,
   * and never more than a factor e.
   */
  private static double coatingShift(
      DoseCurve dose, DoseCurve unshielded, double throughMonths, double delayMonths) {
    double stretch = Math.exp(Assumption.COATING_LIFE.lnSpread());
    double months = 60;
    if (delayMonths > 0) {
      double longer = unshielded.after(delayMonths * stretch).um(months);
      double um = dose.um(months);
      return um > 0 && longer > 0 ? Math.max(-1, Math.log(longer / um)) : um > 0 ? -1 : 0;
    }
    if (!(throughMonths < months)) {
      return 0;
    }
    // The same coating read at an earlier age: what a longer life does to the dose.
    double um = dose.um(months);
    double longer = dose.um(months / stretch) * stretch;
    return um > 0 && longer > 0 ? Math.max(-1, Math.min(0, Math.log(longer / um))) : 0;
  }

  private FilmLoss loss(WheelYear year, CellSpec spec) {
    return losses
        .computeIfAbsent(year, y -> new HashMap<>())
        .computeIfAbsent(spec, s -> FilmLoss.over(year, s, rates));
  }

  /**
   * Share of the seat's attack that reaches the thread. ASSUMPTION: bare metal threads leave two
   * fifths of the mouth open to the film, oil washes out, grease keeps most of it out, a paste with
   * metal or ceramic filler nearly all; spread in {@link Assumption#THREAD_ACCESS}.
   */
  static double access(ThreadCompound compound) {
    return switch (compound) {
      case NONE -> 0.4;
      case OIL -> 0.3;
      case GREASE -> 0.15;
      case ANTI_SEIZE -> 0.1;
    };
  }

  private static Coating coatingOf(Parts parts, Couple couple) {
    return switch (couple.part()) {
      case "nipple" -> parts.nipple().coating();
      case "rim" -> parts.rim().coating();
      case "spoke" -> parts.spoke().coating();
      default -> new Coating(
          Coating.Kind.NONE, 0, couple.bareShare(), couple.bareShare());
    };
  }

  private static double seized(Couple couple) {
    if (couple.where() == Couple.Where.THREAD) {
      return couple.metal() == Material.ZINC
          ? Double.POSITIVE_INFINITY
          : Products.metalToFillUm(couple.metal(), Products.THREAD_GAP_UM);
    }
    return Products.metalToFillUm(couple.metal(), Products.SEAT_GAP_UM);
  }

  private double lost(Parts parts, Couple couple) {
    double widthUm = couple.spec().ringWidthMm() * 1000;
    boolean seat = couple.where() == Couple.Where.SEAT;
    if (couple.part().equals("nipple") && seat) {
      double depthMm =
          HeadSection.criticalDepthMm(
              parts.nipple().threadDiameterMm() / 2,
              parts.nipple().headWallMm(),
              build.tensionN(),
              HeadSection.strengthMpa(couple.metal()));
      return GrooveGrowth.doseUm(depthMm * 1000, widthUm);
    }
    if (couple.part().equals("rim")) {
      return GrooveGrowth.doseUm(parts.rim().bedThicknessMm() * BED_SHARE * 1000, widthUm);
    }
    if (couple.part().equals("spoke") && couple.metal() == Material.CARBON_STEEL) {
      Spoke spoke = parts.spoke();
      double depthMm =
          HeadSection.criticalDepthMm(0, spoke.diameterMm() / 2, build.tensionN(), WIRE_MPA);
      return GrooveGrowth.doseUm(depthMm * 1000, widthUm);
    }
    return Double.POSITIVE_INFINITY;
  }

  private static double[] shifts(Couple couple, FilmLoss loss, boolean thread) {
    double[] ln = new double[Assumption.values().length];
    double driven = loss.galvanicShare() + loss.localShare();
    double self = 1 - driven;
    set(ln, Assumption.ACTIVE_SHARE, driven * ACTIVE_ELASTICITY * lnSpread(couple.activeShare()));
    set(
        ln,
        Assumption.SEAT_BARE,
        (self + driven * RING_ELASTICITY) * lnSpread(couple.bareShare()));
    set(ln, Assumption.CATHODE_SPEED, driven * Assumption.CATHODE_SPEED.lnSpread());
    set(ln, Assumption.LOCAL_ATTACK, loss.localShare() * Assumption.LOCAL_ATTACK.lnSpread());
    set(ln, Assumption.WET_HOURS, Assumption.WET_HOURS.lnSpread());
    set(
        ln,
        Assumption.SALT_STORE,
        Assumption.SALT_ELASTICITY * Assumption.SALT_STORE.lnSpread());
    set(ln, Assumption.THREAD_ACCESS, thread ? Assumption.THREAD_ACCESS.lnSpread() : 0);
    set(ln, Assumption.CALIBRATION, Assumption.CALIBRATION.lnSpread());
    return ln;
  }

  private static void set(double[] ln, Assumption assumption, double shift) {
    ln[assumption.ordinal()] = shift;
  }

  private static double lnSpread(Quantiles share) {
    return share.p10() > 0 ? Math.log(share.p90() / share.p10()) / (2 * Z90) : 0;
  }

  private Optional<Site> openAir(Parts parts) {
    Material metal = SpokeHole.surface(parts.nipple());
    Optional<Metal> standard = standard(metal);
    double visible = Products.visibleInOpenUm(metal);
    if (build.hiddenNipples() || standard.isEmpty()) {
      return Optional.empty();
    }
    MetalCorrosivity loss =
        air.corrosivity().stream()
            .filter(entry -> entry.metal() == standard.get())
            .findFirst()
            .orElseThrow();
    if (parts.nipple().coating().kind() == Coating.Kind.ANODIC) {
      return Optional.empty();
    }
    PowerLawDose dose = PowerLawDose.of(loss, Shelter.share(profile));
    double[] monthly = new double[12];
    Arrays.fill(monthly, dose.firstYearUm() / 12);
    double[] ln = new double[Assumption.values().length];
    set(ln, Assumption.AIR_LOSS, lnSpread(loss.firstYearLossUm()));
    set(ln, Assumption.SHELTER, Assumption.SHELTER.lnSpread());
    return Optional.of(
        new Site(
            "nipple",
            "open-air",
            metal,
            dose,
            monthly,
            visible,
            Double.POSITIVE_INFINITY,
            Double.POSITIVE_INFINITY,
            ln));
  }

  private static Optional<Metal> standard(Material material) {
    return switch (material) {
      case ALUMINIUM_WROUGHT, ALUMINIUM_HIGH_STRENGTH -> Optional.of(Metal.ALUMINIUM);
      case BRASS -> Optional.of(Metal.COPPER);
      case CARBON_STEEL -> Optional.of(Metal.CARBON_STEEL);
      case ZINC -> Optional.of(Metal.ZINC);
      default -> Optional.empty();
    };
  }
}
