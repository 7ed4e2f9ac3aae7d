package saltspoke.wheel.damage;

import saltspoke.wheel.Material;
import saltspoke.wheel.RidingProfile;

/**
 * Wear of a tensioned thread that works a little at every turn of the wheel, wet or dry. It is what
 * is left where nothing corrodes, and what makes titanium and stainless nipples gall.
 *
 * <p>Archard's law: depth an hour = k·p·s. k = 5e-14 m²/N for fretting of aluminium on steel (from
 * memory, reported 1e-14 to 1e-13); p = 85 MPa, 1100 N over eight engaged flanks (computed); s =
 * 11,900 turns an hour at 25 km/h × a stroke of 0.34 µm (ASSUMPTION, elastic working of the first
 * flanks). Together 17 nm an hour, spread in {@link Assumption#FRETTING}. It was set knowing the
 * dry trade case, which is so no test of it.
 */
final class Fretting {
  /** Wear of an aluminium thread, µm per hour of riding. */
  static final double ALUMINIUM_UM_PER_HOUR = 5e-14 * 85e6 * 11_900 * 0.34e-6 * 1e6;

  private static final double WEEKS_PER_MONTH = 365.25 / 12 / 7;

  private Fretting() {}

  /**
   * Wear over that of aluminium. ASSUMPTION: titanium and stainless gall as readily, steel half,
   * brass, a bearing metal, a fifth; polymer does not.
   */
  static double relative(Material metal) {
    return switch (metal) {
      case ALUMINIUM_WROUGHT, ALUMINIUM_HIGH_STRENGTH, TITANIUM, STAINLESS, STAINLESS_PH -> 1;
      case CARBON_STEEL, NICKEL, PLATINUM -> 0.5;
      case BRASS, NICKEL_ALUMINIUM_BRONZE, ZINC -> 0.2;
      case POLYMER, CARBON_FIBRE -> 0;
    };
  }

  /** Metal whose debris fills the thread, µm; oxide of titanium 1.8, of stainless 2.1 times. */
  static double toFillUm(Material metal) {
    return switch (metal) {
      case TITANIUM -> Products.THREAD_GAP_UM / 0.8;
      case STAINLESS, STAINLESS_PH -> Products.THREAD_GAP_UM / 1.1;
      default -> Products.metalToFillUm(metal, Products.THREAD_GAP_UM);
    };
  }

  /** Wear in each calendar month, µm; the trainer counts like the road. */
  static double[] monthlyUm(Material metal, RidingProfile profile) {
    double[] monthly = new double[12];
    for (int m = 0; m < 12; m++) {
      double weekly =
          profile.months().contains(m + 1) ? profile.hoursPerWeek() : profile.trainerHoursPerWeek();
      monthly[m] = weekly * WEEKS_PER_MONTH * ALUMINIUM_UM_PER_HOUR * relative(metal);
    }
    return monthly;
  }
}
