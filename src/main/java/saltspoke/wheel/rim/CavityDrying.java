package saltspoke.wheel.rim;

import java.util.List;
import saltspoke.atmosphere.SaturationPressure;
import saltspoke.wheel.WheelBuild;

/**
 * How fast a rim's cavity loses vapour: diffusion through the gaps round the nipples, the valve
 * hole and drain holes, D·A/L·Δρ.
 */
public final class CavityDrying {
  /**
   * Diffusivity of water vapour in air, m²/s, taken constant: from memory 2.19e-5 at 0 °C rising by
   * 0.7 % per kelvin, so this is the value near 3 °C. The rise is small beside the spread of the
   * open gaps, and the four drying figures that the tests hold were computed with a constant too.
   */
  public static final double VAPOUR_DIFFUSIVITY_M2_PER_S = 2.23e-5;

  /** Open area round one nipple, m², and its length, m: hole 4.5 mm, as computed for the check. */
  public static final double GAP_M2 = 3.3e-6;

  public static final double GAP_LENGTH_M = 2e-3;

  /** Gap round a 6 mm valve in a 6.5 mm hole, 2 mm long: common practice. */
  private static final double VALVE_GAP_M2 = Math.PI / 4 * (6.5e-3 * 6.5e-3 - 6e-3 * 6e-3);

  /** Two drain holes of 2.5 mm through a 2 mm wall: common practice. */
  private static final int DRAIN_HOLES = 2;

  private static final double DRAIN_DIAMETER_M = 2.5e-3;
  private static final double DRAIN_LENGTH_M = 2e-3;

  private CavityDrying() {}

  /** Conductance, m³/s, of so many gaps open by so much, without valve and drain. */
  public static double gapsM3PerS(int gaps, double openShare) {
    return VAPOUR_DIFFUSIVITY_M2_PER_S * gaps * openShare * GAP_M2 / GAP_LENGTH_M;
  }

  /** Conductance of a whole rim, m³/s. The valve hole is as open as the gaps. */
  public static double rimM3PerS(WheelBuild build, boolean drainHoles, RimAssumptions assumptions) {
    double open = assumptions.get(RimAssumption.OPEN_GAP_SHARE);
    double valve = VAPOUR_DIFFUSIVITY_M2_PER_S * open * VALVE_GAP_M2 / GAP_LENGTH_M;
    // An orifice is longer for diffusion than its wall by π/4 of its diameter (two open ends).
    double drain =
        drainHoles
            ? VAPOUR_DIFFUSIVITY_M2_PER_S
                * DRAIN_HOLES
                * (Math.PI / 4 * DRAIN_DIAMETER_M * DRAIN_DIAMETER_M)
                / (DRAIN_LENGTH_M + Math.PI / 4 * DRAIN_DIAMETER_M)
            : 0;
    return gapsM3PerS(build.spokeCount(), open) + valve + drain;
  }

  /** Water lost from a cavity that holds water or ice, g a day. */
  public static double gPerDay(double conductanceM3PerS, double temperatureC, double outsideHpa) {
    double inside =
        temperatureC < 0
            ? SaturationPressure.overIceHpa(temperatureC)
            : SaturationPressure.overWaterHpa(temperatureC);
    double deficit = Vapour.densityGPerM3(Math.max(0, inside - outsideHpa), temperatureC);
    return conductanceM3PerS * deficit * 86400;
  }

  /** Mean of that over the states of the place where the wheel is kept. */
  public static double meanGPerDay(double conductanceM3PerS, List<KeptAir> states) {
    double sum = 0;
    for (KeptAir s : states) {
      sum += s.share() * gPerDay(conductanceM3PerS, s.temperatureC(), s.vapourPressureHpa());
    }
    return sum;
  }
}
