package saltspoke.atlas;

import saltspoke.places.Area;

/**
 * A layer over one area, each cell weighted by its size on the ground.
 *
 * @param cells land cells of the atlas whose middle lies inside; 0 for an area too small for any,
 *     whose one value then stands at a point inside
 * @param mean of a quantity; NaN for an area without any value
 * @param least smallest value
 * @param most largest value
 * @param share per class, 0 C1 to 5 CX, its share of the ground; empty for a quantity
 */
public record AreaValue(
    Area area, long cells, double mean, double least, double most, double[] share) {
  /** Class with the largest share, 1 for C1 to 6 for CX; of equals the worse. */
  public int mainClass() {
    int main = 0;
    for (int i = 0; i < share.length; i++) {
      main = share[i] >= share[main] ? i : main;
    }
    return main + 1;
  }
}
