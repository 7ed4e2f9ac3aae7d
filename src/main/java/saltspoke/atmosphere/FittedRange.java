package saltspoke.atmosphere;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import saltspoke.values.Note;

/**
 * The range of data behind ISO 9223:2012's functions, as published with it. Deposition below the
 * floor is raised to the floor; everything else outside is computed as it is. Both are flagged.
 *
 * @param exposure what to compute with
 * @param flags what left the range
 * @param steps how many of the four inputs left the range other than by a raised floor
 */
public record FittedRange(Exposure exposure, List<Note> flags, int steps) {
  /** ISO 9223:2012, annual temperature, °C; published. */
  static final double T_MIN_C = -17.1;

  static final double T_MAX_C = 28.7;

  /** ISO 9223:2012, annual relative humidity, %; published. */
  static final double RH_MIN_PCT = 34;

  static final double RH_MAX_PCT = 93;

  /** ISO 9223:2012, SO2 deposition, mg/(m² d); published. */
  static final double PD_MIN_MG_PER_M2_DAY = 0.7;

  static final double PD_MAX_MG_PER_M2_DAY = 150.4;

  /** ISO 9223:2012, chloride deposition, mg/(m² d); published. */
  static final double SD_MIN_MG_PER_M2_DAY = 0.4;

  static final double SD_MAX_MG_PER_M2_DAY = 760.5;

  /**
   * ASSUMPTION: each input outside the range adds this to the ln spread of the loss (in
   * quadrature); no basis but that the formula is then an extrapolation.
   */
  static final double EXTRAPOLATION_LN_SPREAD = 0.3;

  public FittedRange {
    flags = List.copyOf(flags);
  }

  /** Checks an exposure and raises its floors. */
  public static FittedRange of(Exposure x) {
    List<Note> flags = new ArrayList<>();
    int steps = 0;
    steps += outside(flags, "temperature", x.temperatureC(), T_MIN_C, T_MAX_C);
    steps += outside(flags, "humidity", x.relativeHumidityPct(), RH_MIN_PCT, RH_MAX_PCT);
    steps += outside(flags, "so2", x.so2MgPerM2Day(), 0, PD_MAX_MG_PER_M2_DAY);
    steps += outside(flags, "chloride", x.chlorideMgPerM2Day(), 0, SD_MAX_MG_PER_M2_DAY);
    double pd = raised(flags, "so2", x.so2MgPerM2Day(), PD_MIN_MG_PER_M2_DAY);
    double sd = raised(flags, "chloride", x.chlorideMgPerM2Day(), SD_MIN_MG_PER_M2_DAY);
    return new FittedRange(
        new Exposure(x.temperatureC(), x.relativeHumidityPct(), pd, sd), flags, steps);
  }

  /** Extra ln spread for what lies outside, a standard deviation. */
  public double extraLnSpread() {
    return EXTRAPOLATION_LN_SPREAD * Math.sqrt(steps);
  }

  private static int outside(List<Note> flags, String what, double value, double low, double high) {
    if (value < low) {
      flags.add(Note.of("air-" + what + "-below-range", "value", rounded(value), "limit", low));
      return 1;
    }
    if (value > high) {
      flags.add(Note.of("air-" + what + "-above-range", "value", rounded(value), "limit", high));
      return 1;
    }
    return 0;
  }

  private static double raised(List<Note> flags, String what, double value, double floor) {
    if (value < floor) {
      flags.add(
          Note.of("air-" + what + "-raised-to-floor", "value", rounded(value), "limit", floor));
      return floor;
    }
    return value;
  }

  /** To three significant digits, for people. */
  private static double rounded(double value) {
    return new BigDecimal(value).round(new MathContext(3)).doubleValue();
  }
}
