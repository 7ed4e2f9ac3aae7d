package saltspoke.wheel.damage;

import saltspoke.wheel.Material;

/** Who is eaten where two materials meet under one film. */
final class Nobility {
  private Nobility() {}

  /**
   * Nobility in sea water, V(SCE), middle of the ranges of LaQue's series (ASTM G82); it decides
   * only who is eaten, never how fast.
   */
  static double volts(Material material) {
    return switch (material) {
      case ZINC -> -1.00;
      case ALUMINIUM_HIGH_STRENGTH, ALUMINIUM_WROUGHT -> -0.88;
      case CARBON_STEEL -> -0.66;
      case BRASS -> -0.36;
      case NICKEL_ALUMINIUM_BRONZE -> -0.2;
      case NICKEL -> -0.15;
      case STAINLESS, STAINLESS_PH -> -0.05;
      case TITANIUM -> 0.01;
      case PLATINUM -> 0.2;
      case CARBON_FIBRE -> 0.25;
      case POLYMER -> 1;
    };
  }

  /** Whether a metal dissolves at all in salt water at its own potential or a nobler one. */
  static boolean corrodes(Material material) {
    return switch (material) {
      case ZINC,
          ALUMINIUM_HIGH_STRENGTH,
          ALUMINIUM_WROUGHT,
          CARBON_STEEL,
          BRASS,
          NICKEL,
          NICKEL_ALUMINIUM_BRONZE ->
          true;
      case STAINLESS, STAINLESS_PH, TITANIUM, PLATINUM, CARBON_FIBRE, POLYMER -> false;
    };
  }

  /** Whether {@code other} drives {@code metal}, rather than being driven or equal. */
  static boolean nobler(Material other, Material metal) {
    return volts(other) > volts(metal) + 0.02;
  }
}
