package saltspoke.wheel;

import java.util.ArrayList;
import java.util.List;
import saltspoke.values.Note;

/**
 * The galvanic cell at one spoke hole, in one film: potentials solved along the film, then currents
 * and penetration of the bare ring.
 *
 * <p>Kinetics: {@link Kinetics}; film: {@link ThinFilm}; numbers: {@link FilmStrip}. The ohmic loss
 * within the bare ring itself is neglected (below 40 mV for a ring of 0.3 mm even in rain).
 */
public final class GalvanicCell {
  /**
   * A hydrophobic insulating skirt cuts the current about 3 decades, 6 at 6.4 mm (published:
   * Srinivasan and Hihara 2016).
   */
  static final double SKIRT_DECADES = 3;

  static final double WIDE_SKIRT_MM = 6.4;

  /** ASSUMPTION: the first three decades need this much of a skirt, mm; spread 0.3..2. */
  static final double NARROW_SKIRT_MM = 1;

  /** Cells on each part of the film; halving them moves the current by under 0.2 %. */
  static final int CELLS = 40;

  static final CellCurrents NOTHING = new CellCurrents(0, 0, 0, 0, 0, 0, 0);

  private GalvanicCell() {}

  /**
   * Solves the cell. A dry film gives zeros. A cathode of null or polymer, or one without area,
   * leaves self-corrosion. When the other metal is the less noble one, the current and its density
   * come out negative: the anode of the question is then protected.
   */
  public static CellCurrents solve(CellSpec spec, Film film) {
    return solve(spec, film, 1);
  }

  /**
   * The same with the cathode's current density (kinetics, edge and share alike) multiplied.
   *
   * @param cathodeScale factor on the cathode, &gt; 0
   */
  public static CellCurrents solve(CellSpec spec, Film film, double cathodeScale) {
    return solve(spec, film, cathodeScale, CELLS);
  }

  static CellCurrents solve(CellSpec spec, Film film, double cathodeScale, int cells) {
    if (!(film.thicknessUm() > 0) || spec.anode() == Material.POLYMER) {
      return NOTHING;
    }
    Kinetics kinetics = Kinetics.of(spec.anode());
    FilmFactors factors = FilmFactors.of(film);
    AnodeLaw anode = new AnodeLaw(kinetics, factors);
    double restV = anode.restV();
    if (hasNoCathode(spec)) {
      return currents(kinetics, anode, film, restV, 0, spec.ringAreaCm2(), 0);
    }
    double factor = cathodeScale * skirtFactor(spec.skirtMm()) * factors.oxygen();
    CathodeLaw law = new CathodeLaw(Kinetics.of(spec.cathode()), factors.scaledLimitUAPerCm2());
    FilmStrip strip =
        FilmStrip.joined(
            StripGrid.of(spec, cells),
            factors.sheetMicroS() / factor,
            law,
            anode,
            spec.ringAreaCm2() / factor,
            spec.contactResistanceOhm() * factor,
            restV);
    return currents(
        kinetics,
        anode,
        film,
        strip.anodeV(),
        factor * strip.currentUA(),
        spec.ringAreaCm2(),
        strip.reachMm());
  }

  static boolean hasNoCathode(CellSpec spec) {
    return spec.cathode() == null
        || spec.cathode() == Material.POLYMER
        || spec.edgeAreaCm2() == 0
            && (spec.activeShare() == 0 || spec.outerRadiusMm() == spec.holeRadiusMm());
  }

  /** Share of the cathode's current that an insulating skirt lets through. */
  static double skirtFactor(double skirtMm) {
    double decades =
        SKIRT_DECADES * Math.min(1, skirtMm / NARROW_SKIRT_MM)
            + SKIRT_DECADES * Math.min(1, skirtMm / WIDE_SKIRT_MM);
    return Math.pow(10, -decades);
  }

  static CellCurrents currents(
      Kinetics kinetics,
      AnodeLaw anode,
      Film film,
      double anodeV,
      double currentUA,
      double ringAreaCm2,
      double reachMm) {
    double galvanic = currentUA / ringAreaCm2;
    double[] cathodic = new double[2];
    anode.cathodic(anodeV, cathodic);
    double self = cathodic[0];
    double local = localUAPerCm2(kinetics, film, galvanic);
    double total = galvanic + self + local;
    if (galvanic < 0) {
      anode.dissolution(anodeV, cathodic);
      total = cathodic[0];
    }
    return new CellCurrents(
        currentUA, galvanic, self, local, anodeV, reachMm, total * kinetics.umPerYearPerUAPerCm2());
  }

  /**
   * Local attack beyond the galvanic current, µA/cm²: goes with it at first, ends at what the
   * cathode's alkali can dissolve, and fades in films thick enough to dilute the alkali.
   */
  static double localUAPerCm2(Kinetics kinetics, Film film, double galvanicUAPerCm2) {
    if (galvanicUAPerCm2 <= 0 || kinetics.localPerGalvanic() == 0) {
      return 0;
    }
    double confined = Math.min(1, Kinetics.LOCAL_CONFINED_UM / film.thicknessUm());
    double free = confined * kinetics.localPerGalvanic() * galvanicUAPerCm2;
    return free / (1 + free / Kinetics.LOCAL_LIMIT_UA_PER_CM2);
  }

  /** What was assumed or left its range in this cell and film. */
  public static List<Note> flags(CellSpec spec, Film film) {
    List<Note> notes = new ArrayList<>(ThinFilm.flags(film));
    boolean coupled = film.thicknessUm() > 0 && !hasNoCathode(spec);
    if (coupled && Kinetics.of(spec.anode()).localPerGalvanic() > 0) {
      notes.add(Note.of("cell-local-attack-assumed"));
    }
    if (coupled && spec.skirtMm() > 0) {
      notes.add(Note.of("cell-skirt-sound", "mm", spec.skirtMm()));
    }
    if (spec.anode() == Material.STAINLESS || spec.anode() == Material.STAINLESS_PH) {
      notes.add(Note.of("cell-stainless-crevice-not-modelled"));
    }
    return notes;
  }
}
