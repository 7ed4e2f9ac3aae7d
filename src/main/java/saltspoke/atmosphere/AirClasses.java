package saltspoke.atmosphere;

/**
 * The classes of ISO 9223:2012 for wetness (τ), airborne salinity (S) and sulfur dioxide (P).
 * Limits belong to the lower class. Published, save where said.
 */
public final class AirClasses {
  /** τ1, τ2, τ3 published; τ4 from memory. Hours a year. */
  private static final double[] WETNESS_HOURS = {10, 250, 2500, 5500};

  /** S0, S1, S2, S3. Chloride, mg/(m² d). */
  private static final double[] SALINITY_MG = {3, 60, 300, 1500};

  /** P0, P1, P2, P3. SO2, mg/(m² d). */
  private static final double[] SULFUR_MG = {4, 24, 80, 200};

  private AirClasses() {}

  /** {@code τ1}..{@code τ5} from hours a year with RH &gt; 80 % and T &gt; 0 °C. */
  public static String wetness(double hoursPerYear) {
    return "τ" + (1 + below(WETNESS_HOURS, hoursPerYear));
  }

  /** {@code S0}..{@code S3}; {@code S3+} above 1500 mg/(m² d), which the standard leaves out. */
  public static String salinity(double chlorideMgPerM2Day) {
    return open("S", SALINITY_MG, chlorideMgPerM2Day);
  }

  /** {@code P0}..{@code P3}; {@code P3+} above 200 mg/(m² d), which the standard leaves out. */
  public static String sulfur(double so2MgPerM2Day) {
    return open("P", SULFUR_MG, so2MgPerM2Day);
  }

  private static String open(String letter, double[] upper, double value) {
    int index = below(upper, value);
    return index < upper.length ? letter + index : letter + (upper.length - 1) + "+";
  }

  private static int below(double[] upper, double value) {
    int index = 0;
    while (index < upper.length && value > upper[index]) {
      index++;
    }
    return index;
  }
}
