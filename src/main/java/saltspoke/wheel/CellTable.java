package saltspoke.wheel;

/**
 * One galvanic cell ready to be asked for many films, ring widths and strengths of the cathode.
 *
 * <p>Only the strip of film over the cathode is interpolated ({@link StripTable}); the anode's
 * kinetics, the ring and the metallic contact are solved at each question, by a safeguarded Newton
 * iteration for one potential. So ring width, chloride and temperature carry no interpolation
 * error. Against {@link GalvanicCell#solve} penetration differs by under 2 % (tested over random
 * films and cells).
 *
 * <p>Uncertain inputs enter as dimensionless scales. {@code cathodeScale} multiplies the cathode's
 * current density everywhere; dividing the film's equations by it shows that it acts as a cathode
 * area × scale in a film of conductance / scale, so a draw of kinetics, of cut-edge area and of
 * exposed share may be multiplied into one number: exact for kinetics; for the edge area or the
 * share alone, right to the part of the current that it carries. A draw of conductivity is a {@link
 * Film} with that conductivity. Safe for many threads.
 */
public final class CellTable {
  private static final int MOST_STEPS = 80;

  /** Newton's error falls as the square of its step: after one of 0.2 mV it is below 1 µV. */
  private static final double LAST_STEP_V = 2e-4;

  private static final double LOWEST_V = -1.6;
  private static final double HIGHEST_V = 1.0;

  private final CellSpec spec;
  private final Kinetics anodeKinetics;
  private final Kinetics cathodeKinetics;
  private final double skirtFactor;
  private final StripTable strip;

  /**
   * @param strip the cathode's table, null when the cell has no cathode
   */
  CellTable(CellSpec spec, StripTable strip) {
    this.spec = spec;
    this.strip = strip;
    anodeKinetics = Kinetics.of(spec.anode());
    cathodeKinetics = strip == null ? null : Kinetics.of(spec.cathode());
    skirtFactor = GalvanicCell.skirtFactor(spec.skirtMm());
  }

  public CellSpec spec() {
    return spec;
  }

  /**
   * Penetration of the bare ring, µm per year of wetness.
   *
   * @param ringWidthMm width of the bare ring, &gt; 0
   * @param cathodeScale factor on the cathode's current density, &gt; 0
   */
  public double rate(Film film, double ringWidthMm, double cathodeScale) {
    return currents(film, ringWidthMm, cathodeScale).penetrationUmPerYear();
  }

  /** All currents of the cell, as {@link GalvanicCell#solve} gives them. */
  public CellCurrents currents(Film film, double ringWidthMm, double cathodeScale) {
    return in(film).currents(ringWidthMm, cathodeScale);
  }

  /** The cell in one film, for many widths and strengths. */
  InFilm in(Film film) {
    return new InFilm(film);
  }

  /** Holds what depends on the film alone. Not for more than one thread. */
  final class InFilm {
    private final Film film;
    private final boolean dry;
    private final AnodeLaw anode;
    private final CathodeLaw cathode;
    private final double oxygenFactor;
    private final double limitUAPerCm2;
    private final double sheetMicroS;
    private final double[] anodeOut = new double[2];
    private final double[] cathodeOut = new double[2];
    private final double[] areaOut = new double[2];
    private double startV;
    private double lnLoad;
    private double voltsPerLnLoad;

    private InFilm(Film film) {
      this.film = film;
      dry = !(film.thicknessUm() > 0) || spec.anode() == Material.POLYMER;
      oxygenFactor = Kinetics.oxygenFactor(film);
      limitUAPerCm2 = dry ? 0 : ThinFilm.oxygenLimitUAPerCm2(film) / oxygenFactor;
      sheetMicroS = ThinFilm.sheetMicroS(film) / (oxygenFactor * skirtFactor);
      anode = dry ? null : new AnodeLaw(anodeKinetics, film);
      cathode = dry || strip == null ? null : new CathodeLaw(cathodeKinetics, limitUAPerCm2);
      startV = dry ? 0 : anodeKinetics.startV(film);
    }

    CellCurrents currents(double ringWidthMm, double cathodeScale) {
      double ringCm2 = spec.ringCircumferenceMm() * ringWidthMm / 100;
      if (dry) {
        return GalvanicCell.NOTHING;
      }
      StripTable.Place place =
          strip == null ? null : StripTable.Place.of(limitUAPerCm2, sheetMicroS / cathodeScale);
      double cathodeV = solve(ringCm2, place, cathodeScale);
      double currentUA = place == null ? 0 : cathodeCurrent(place, cathodeScale, cathodeV);
      double anodeV = cathodeV - currentUA * 1e-6 * spec.contactResistanceOhm();
      double reachMm = place == null ? 0 : strip.reachMm(place, cathodeV);
      return GalvanicCell.currents(anodeKinetics, anode, film, anodeV, currentUA, ringCm2, reachMm);
    }

    /**
     * The cathode's potential at the anode's end of the film: where dissolution meets the demand
     * for it. Both are near exponential in potential, so Newton's method is applied to the
     * difference of their logarithms, within a bracket. It starts from the last answer in this
     * film, moved along its tangent to the new load (cathode strength over ring area).
     */
    private double solve(double ringCm2, StripTable.Place place, double cathodeScale) {
      double low = LOWEST_V;
      double high = HIGHEST_V;
      double load = Math.log(cathodeScale / ringCm2);
      double v = startV + voltsPerLnLoad * (load - lnLoad);
      double ohm = 1e-6 * spec.contactResistanceOhm();
      for (int i = 0; i < MOST_STEPS; i++) {
        double current = 0;
        double slope = 0;
        if (place != null) {
          current = cathodeCurrent(place, cathodeScale, v);
          slope = current * (areaOut[1] + cathodeOut[1] / cathodeOut[0]);
        }
        double rise = 1 - slope * ohm;
        anode.cathodic(v - current * ohm, anodeOut);
        double demand = current / ringCm2 + anodeOut[0];
        double demandSlope = slope / ringCm2 + anodeOut[1] * rise;
        anode.dissolution(v - current * ohm, anodeOut);
        double next = Double.NaN;
        double lnSlope = anodeOut[1] * rise / anodeOut[0] - demandSlope / demand;
        if (demand > anodeOut[0]) {
          low = v;
        } else {
          high = v;
        }
        if (demand > 0) {
          next = v - Math.log(anodeOut[0] / demand) / lnSlope;
        }
        if (!(next > low && next < high)) {
          next = 0.5 * (low + high);
        }
        double moved = Math.abs(next - v);
        v = next;
        if (moved < LAST_STEP_V) {
          voltsPerLnLoad = current > 0 ? current / (ringCm2 * demand * lnSlope) : 0;
          break;
        }
      }
      startV = v;
      lnLoad = load;
      return v;
    }

    private double cathodeCurrent(StripTable.Place place, double cathodeScale, double v) {
      cathode.at(v, cathodeOut);
      strip.lnArea(place, v, areaOut);
      return cathodeScale * skirtFactor * oxygenFactor * Math.exp(areaOut[0]) * cathodeOut[0];
    }
  }
}
