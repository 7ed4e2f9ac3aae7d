package saltspoke.wheel.damage;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import saltspoke.values.Quantiles;
import saltspoke.wheel.CellSpec;
import saltspoke.wheel.Coating;
import saltspoke.wheel.Material;
import saltspoke.wheel.Nipple;
import saltspoke.wheel.Rim;
import saltspoke.wheel.SeatInterface;
import saltspoke.wheel.Spoke;

/**
 * Which couples meet at a spoke hole. At the seat the nipple meets the interface's metal, if there
 * is one, and the rim beyond it; the interface meets the rim; in the thread the nipple meets the
 * spoke. Of each two the less noble is eaten; between equals each is eaten by itself.
 */
public final class SpokeHole {
  /** Length of thread at its mouth that the film wets, mm. ASSUMPTION: about two pitches. */
  static final double THREAD_MOUTH_MM = 1.0;

  /**
   * Metallic path nipple–seat–rim, Ω. ASSUMPTION: pressed seat; far below the film's resistance.
   */
  static final double SEAT_OHM = 10;

  private static final Quantiles WHOLE = new Quantiles(1, 1, 1);

  private SpokeHole() {}

  /** All couples of a pairing, the seat's first. */
  public static List<Couple> couples(Parts parts) {
    List<Couple> found = new ArrayList<>();
    Optional<Material> washer =
        parts.between().insulating() ? Optional.empty() : parts.between().material();
    nippleAtSeat(parts, washer).ifPresent(found::add);
    rimAtSeat(parts, washer).ifPresent(found::add);
    washer.flatMap(metal -> washerAtSeat(parts, metal)).ifPresent(found::add);
    thread(parts, found);
    return found;
  }

  private static Optional<Couple> nippleAtSeat(Parts parts, Optional<Material> washer) {
    Nipple nipple = parts.nipple();
    Rim rim = parts.rim();
    if (!Nobility.corrodes(nipple.material())) {
      return Optional.empty();
    }
    boolean toWasher = washer.isPresent() && Nobility.nobler(washer.get(), nipple.material());
    boolean toRim = Nobility.nobler(rim.material(), nipple.material());
    double radiusMm = rim.holeDiameterMm() / 2;
    Quantiles active = rim.coating().defectShare();
    Quantiles edge = rim.edgeBareShare();
    CellSpec whole;
    if (toWasher) {
      // The washer stands between and takes the whole drive: nearest, bare, all of it active.
      whole =
          new CellSpec(
              nipple.material(),
              washer.get(),
              radiusMm,
              nipple.ringCircumferenceMm(),
              nipple.ringWidthMm(),
              0,
              1,
              Math.max(parts.between().outerDiameterMm() / 2, radiusMm + 0.5),
              SEAT_OHM,
              0);
      active = WHOLE;
      edge = WHOLE;
    } else if (toRim) {
      whole = againstRim(parts, washer);
    } else {
      whole =
          alone(nipple.material(), radiusMm, nipple.ringCircumferenceMm(), nipple.ringWidthMm());
      active = WHOLE;
      edge = WHOLE;
    }
    Quantiles bare = nipple.coating().seatBareShare();
    return Optional.of(
        new Couple(
            "nipple",
            Couple.Where.SEAT,
            bareOf(whole, bare.median()),
            whole,
            bare,
            active,
            edge,
            null));
  }

  private static CellSpec againstRim(Parts parts, Optional<Material> washer) {
    Rim rim = parts.rim();
    Nipple nipple = parts.nipple();
    SeatInterface between = parts.between();
    double radiusMm = rim.holeDiameterMm() / 2;
    double skirtMm =
        washer.isPresent()
            ? Math.max(0, between.outerDiameterMm() / 2 - radiusMm)
            : between.skirtMm();
    double seatOhm =
        between.insulating() ? between.leakageResistanceOhm() : SEAT_OHM / contactShare(rim);
    return new CellSpec(
        nipple.material(),
        rim.material(),
        radiusMm,
        nipple.ringCircumferenceMm(),
        nipple.ringWidthMm(),
        rim.holeWallCm2() * rim.edgeBareShare().median() * (1 - between.holeWallCovered()),
        rim.coating().defectShare().median(),
        Math.max(rim.bedWidthMm() / 2, radiusMm + 1),
        seatOhm,
        skirtMm);
  }

  /** Share of the seat where nipple and carbon touch: all of a bare bed, what is worn of a ply. */
  private static double contactShare(Rim rim) {
    return rim.coating().kind() == Coating.Kind.PLY
        ? Math.max(rim.coating().seatBareShare().median(), 1e-3)
        : 1;
  }

  private static Optional<Couple> rimAtSeat(Parts parts, Optional<Material> washer) {
    Rim rim = parts.rim();
    SeatInterface between = parts.between();
    if (rim.carbon()) {
      return Optional.empty();
    }
    Material driver = washer.orElse(surface(parts.nipple()));
    double radiusMm = rim.holeDiameterMm() / 2;
    double driverMm =
        washer.isPresent()
            ? Math.max(between.outerDiameterMm() / 2, radiusMm + 0.5)
            : equivalentRadiusMm(parts.nipple(), radiusMm);
    double lengthMm = Math.PI * rim.holeDiameterMm();
    CellSpec whole =
        Nobility.nobler(driver, rim.material()) && driver != Material.POLYMER
            ? new CellSpec(
                rim.material(),
                driver,
                radiusMm,
                lengthMm,
                rim.ringWidthMm(),
                0,
                1,
                driverMm,
                between.insulating() ? between.leakageResistanceOhm() : SEAT_OHM,
                between.insulating() ? between.skirtMm() : 0)
            : alone(rim.material(), radiusMm, lengthMm, rim.ringWidthMm());
    Quantiles bare = rim.coating().seatBareShare();
    return Optional.of(
        new Couple(
            "rim",
            Couple.Where.SEAT,
            bareOf(whole, bare.median()),
            whole,
            bare,
            WHOLE,
            WHOLE,
            null));
  }

  private static Optional<Couple> washerAtSeat(Parts parts, Material washer) {
    Rim rim = parts.rim();
    if (!Nobility.corrodes(washer)) {
      return Optional.empty();
    }
    double radiusMm = parts.between().outerDiameterMm() / 2;
    boolean toRim = Nobility.nobler(rim.material(), washer);
    Material nipple = surface(parts.nipple());
    double lengthMm = 2 * Math.PI * radiusMm;
    // The rim-side edge of the washer is the ring: as wide as the washer is thick.
    double widthMm = Math.max(parts.between().thicknessMm(), 0.2);
    CellSpec whole;
    if (toRim) {
      whole =
          new CellSpec(
              washer,
              rim.material(),
              radiusMm,
              lengthMm,
              widthMm,
              rim.holeWallCm2() * rim.edgeBareShare().median(),
              rim.coating().defectShare().median(),
              Math.max(rim.bedWidthMm() / 2, radiusMm + 1),
              SEAT_OHM,
              0);
    } else if (nipple != Material.POLYMER && Nobility.nobler(nipple, washer)) {
      whole =
          new CellSpec(
              washer,
              nipple,
              radiusMm,
              lengthMm,
              widthMm,
              0,
              1,
              equivalentRadiusMm(parts.nipple(), radiusMm),
              SEAT_OHM,
              0);
    } else {
      whole = alone(washer, radiusMm, lengthMm, widthMm);
    }
    Quantiles active = toRim ? rim.coating().defectShare() : WHOLE;
    Quantiles edge = toRim ? rim.edgeBareShare() : WHOLE;
    return Optional.of(
        new Couple("interface", Couple.Where.SEAT, whole, whole, WHOLE, active, edge, null));
  }

  private static void thread(Parts parts, List<Couple> found) {
    Spoke spoke = parts.spoke();
    if (spoke.coating().kind() == Coating.Kind.ZINC) {
      thread(parts, Material.ZINC, null).ifPresent(found::add);
      thread(parts, spoke.material(), spoke.coating()).ifPresent(found::add);
    } else {
      thread(parts, spoke.material(), null).ifPresent(found::add);
    }
  }

  private static Optional<Couple> thread(Parts parts, Material wire, Coating shield) {
    Nipple nipple = parts.nipple();
    boolean nippleEaten = !Nobility.nobler(nipple.material(), wire);
    Material anode = nippleEaten ? nipple.material() : wire;
    Material other = nippleEaten ? wire : nipple.material();
    if (nipple.material() == Material.POLYMER || !Nobility.corrodes(anode)) {
      return Optional.empty();
    }
    double radiusMm = nipple.threadDiameterMm() / 2;
    double lengthMm = Math.PI * nipple.threadDiameterMm();
    // Area of the wire near the nipple, written as a disc around the thread.
    double outerMm = Math.sqrt(radiusMm * radiusMm + parts.spoke().wettedAreaCm2() * 100 / Math.PI);
    CellSpec whole =
        Nobility.nobler(other, anode)
            ? new CellSpec(
                anode,
                other,
                radiusMm,
                lengthMm,
                THREAD_MOUTH_MM,
                0,
                1,
                outerMm,
                parts.spoke().threadResistanceOhm(),
                0)
            : alone(anode, radiusMm, lengthMm, THREAD_MOUTH_MM);
    Quantiles bare =
        nippleEaten && nipple.coating().kind() == Coating.Kind.ANODIC
            ? nipple.coating().seatBareShare()
            : WHOLE;
    return Optional.of(
        new Couple(
            nippleEaten ? "nipple" : "spoke",
            Couple.Where.THREAD,
            bareOf(whole, bare.median()),
            whole,
            bare,
            WHOLE,
            WHOLE,
            shield));
  }

  private static CellSpec bareOf(CellSpec ring, double share) {
    return new CellSpec(
        ring.anode(),
        ring.cathode(),
        ring.holeRadiusMm(),
        ring.ringCircumferenceMm() * share,
        ring.ringWidthMm(),
        ring.edgeAreaCm2(),
        ring.activeShare(),
        ring.outerRadiusMm(),
        ring.contactResistanceOhm(),
        ring.skirtMm());
  }

  /** A ring that nothing drives: it is eaten by itself. */
  private static CellSpec alone(Material metal, double radiusMm, double lengthMm, double widthMm) {
    return new CellSpec(metal, null, radiusMm, lengthMm, widthMm, 0, 0, radiusMm, SEAT_OHM, 0);
  }

  /** Radius of the disc around the hole that has the wet area of the nipple's head. */
  private static double equivalentRadiusMm(Nipple nipple, double holeRadiusMm) {
    double headMm = nipple.headDiameterMm();
    double areaMm2 = Math.PI * headMm * headMm / 4 + Math.PI * headMm * nipple.headWallMm();
    return Math.sqrt(holeRadiusMm * holeRadiusMm + areaMm2 / Math.PI);
  }

  static Material surface(Nipple nipple) {
    return nipple.coating().kind() == Coating.Kind.NICKEL ? Material.NICKEL : nipple.material();
  }

  static Material surface(Spoke spoke) {
    return spoke.coating().kind() == Coating.Kind.ZINC ? Material.ZINC : spoke.material();
  }
}
