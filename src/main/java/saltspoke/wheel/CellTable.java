package saltspoke.wheel;

/**
 * One galvanic cell ready to be asked for many films, ring widths and strengths of the cathode.
 *
 * <p>Only the strip of film over the cathode is interpolated ({@link StripTable}); the anode's
 * kinetics, the ring and the metallic contact are solved at each question, by a safeguarded Newton
 * iteration for one potential. So ring width, chloride and temperature carry no interpolation
 * error. Against {@link GalvanicCell#solve} penetration differs by under 4 %, 95 times of 100 by
 * under 1 % (tested over random films and cells).
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

  /**
   * Dissolution and demand agree within this before the last step; its error falls as the square,
   * to about 1e-6.
   */
  private static final double LAST_LN_RATIO = 1e-3;

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
    if (!(film.thicknessUm() > 0) || spec.anode() == Material.POLYMER) {
      return GalvanicCell.NOTHING;
    }
    return new Question(film, ringWidthMm, cathodeScale).answer();
  }

  /** One film, width and strength. */
  private final class Question {
    private final Film film;
    private final double ringCm2;
    private final double ohm = 1e-6 * spec.contactResistanceOhm();
    private final AnodeLaw anode;
    private final CathodeLaw cathode;
    private final double cathodeFactor;
    private final StripTable.Place place;
    private final double[] anodeOut = new double[2];
    private final double[] cathodeOut = new double[2];
    private final double[] areaOut = new double[2];

    private Question(Film film, double ringWidthMm, double cathodeScale) {
      this.film = film;
      ringCm2 = spec.ringCircumferenceMm() * ringWidthMm / 100;
      FilmFactors factors = FilmFactors.of(film);
      anode = new AnodeLaw(anodeKinetics, factors);
      cathodeFactor = factors.oxygen() * skirtFactor * cathodeScale;
      double limit = factors.scaledLimitUAPerCm2();
      cathode = strip == null ? null : new CathodeLaw(cathodeKinetics, limit);
      place =
          strip == null ? null : StripTable.Place.of(limit, factors.sheetMicroS() / cathodeFactor);
    }

    private CellCurrents answer() {
      double cathodeV = solve();
      double currentUA = cathodeCurrent(cathodeV);
      double reachMm = strip == null ? 0 : strip.reachMm(place, cathodeV);
      return GalvanicCell.currents(
          anodeKinetics, anode, film, cathodeV - currentUA * ohm, currentUA, ringCm2, reachMm);
    }

    /**
     * The cathode's potential at the anode's end of the film: where dissolution meets the demand
     * for it. Both are near exponential in potential, so Newton's method is applied to the
     * difference of their logarithms, within a bracket.
     */
    private double solve() {
      double low = LOWEST_V;
      double high = HIGHEST_V;
      double v = anodeKinetics.startV(film.chlorideMolPerKg());
      for (int i = 0; i < MOST_STEPS; i++) {
        double current = cathodeCurrent(v);
        double slope = strip == null ? 0 : current * (areaOut[1] + cathodeOut[1] / cathodeOut[0]);
        double rise = 1 - slope * ohm;
        anode.cathodic(v - current * ohm, anodeOut);
        double demand = current / ringCm2 + anodeOut[0];
        double demandSlope = slope / ringCm2 + anodeOut[1] * rise;
        anode.dissolution(v - current * ohm, anodeOut);
        double lnSlope = anodeOut[1] * rise / anodeOut[0] - demandSlope / demand;
        double lnRatio = demand > 0 ? Math.log(anodeOut[0] / demand) : Double.POSITIVE_INFINITY;
        if (Math.abs(lnRatio) < LAST_LN_RATIO) {
          return v - lnRatio / lnSlope;
        }
        if (lnRatio < 0) {
          low = v;
        } else {
          high = v;
        }
        double next = v - lnRatio / lnSlope;
        v = next > low && next < high ? next : 0.5 * (low + high);
      }
      return v;
    }

    private double cathodeCurrent(double v) {
      if (strip == null) {
        return 0;
      }
      cathode.at(v, cathodeOut);
      strip.lnArea(place, v, areaOut);
      return cathodeFactor * Math.exp(areaOut[0]) * cathodeOut[0];
    }
  }
}
