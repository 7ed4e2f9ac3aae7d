package saltspoke.wheel.damage;

import saltspoke.values.Quantiles;
import saltspoke.wheel.CellSpec;
import saltspoke.wheel.Coating;
import saltspoke.wheel.Material;

/**
 * One place at a spoke hole where one part is eaten, with or without another driving it.
 *
 * @param part what is eaten: {@code nipple}, {@code rim}, {@code interface} or {@code spoke}
 * @param where the seat ring or the thread
 * @param spec the cell as built, over the ring that is bare then
 * @param wholeRing the cell once the coating is gone
 * @param bareShare share of the ring's length that is bare as built
 * @param activeShare of the cathode's surface, for its spread only
 * @param edgeShare bare share of the cut hole wall, for its spread only
 * @param shield coating of the other part that is eaten first, so that this couple starts only once
 *     it is gone; {@code null} for none
 */
public record Couple(
    String part,
    Where where,
    CellSpec spec,
    CellSpec wholeRing,
    Quantiles bareShare,
    Quantiles activeShare,
    Quantiles edgeShare,
    Coating shield) {

  /** Places at a spoke hole. */
  public enum Where {
    SEAT,
    THREAD
  }

  /** Months until the shield is gone, 0 without one. */
  double delayMonths(double wetShare) {
    return shield == null ? 0 : CoatingLife.months(shield, wetShare);
  }

  /** The metal that is eaten. */
  public Material metal() {
    return spec.anode();
  }
}
