package saltspoke.atmosphere;

import saltspoke.values.Refusal;

/**
 * Upper limits of the corrosivity categories of ISO 9223:2012 for the first-year loss of one metal;
 * a category holds lower &lt; r ≤ upper.
 *
 * <p>Steel and its CX: published. Zinc C1–C5: published in the tables of ISO 12944-2, its CX from
 * memory. Copper and aluminium from memory. Aluminium's limits are g/(m² a); C1 is "negligible"
 * there.
 */
public final class CategoryLimits {
  /** Turns µm of aluminium into g/m²: density 2.70 g/cm³. */
  public static final double ALUMINIUM_G_PER_M2_PER_UM = 2.70;

  /** ASSUMPTION: "negligible" means less than this, a tenth of C2's limit, g/(m² a). */
  private static final double ALUMINIUM_C1_G_PER_M2 = 0.06;

  private static final double[] STEEL_UM = {1.3, 25, 50, 80, 200, 700};
  private static final double[] ZINC_UM = {0.1, 0.7, 2.1, 4.2, 8.4, 25};
  private static final double[] COPPER_UM = {0.1, 0.6, 1.3, 2.8, 5.6, 10};
  private static final double[] ALUMINIUM_G_PER_M2 = {
    ALUMINIUM_C1_G_PER_M2, 0.6, 2, 5, 10, Double.POSITIVE_INFINITY
  };

  private CategoryLimits() {}

  /** Upper limit in the unit of the metal's table (µm; aluminium g/m²); may be +∞. */
  public static double upperInTableUnit(Metal metal, Category category) {
    return table(metal)[category.ordinal()];
  }

  /** Upper limit as a thickness, µm; may be +∞. */
  public static double upperUm(Metal metal, Category category) {
    return upperInTableUnit(metal, category) / tableUnitsPerUm(metal);
  }

  /** The category of a first-year loss; CX also above its upper limit, see {@link #aboveCx}. */
  public static Category categoryOf(Metal metal, FirstYearLoss loss) {
    return categoryOfTableValue(metal, loss.um() * tableUnitsPerUm(metal));
  }

  /** The category of a loss in the unit of the metal's table (µm; aluminium g/m²). */
  public static Category categoryOfTableValue(Metal metal, double loss) {
    if (!(loss >= 0)) {
      throw Refusal.outOfRange("firstYearLoss", loss, "a number of at least 0");
    }
    double[] upper = table(metal);
    for (Category category : Category.values()) {
      if (loss <= upper[category.ordinal()]) {
        return category;
      }
    }
    return Category.CX;
  }

  /** Whether a loss exceeds even CX, so that the standard has no name for it. */
  public static boolean aboveCx(Metal metal, FirstYearLoss loss) {
    return loss.um() > upperUm(metal, Category.CX);
  }

  private static double tableUnitsPerUm(Metal metal) {
    return metal == Metal.ALUMINIUM ? ALUMINIUM_G_PER_M2_PER_UM : 1;
  }

  private static double[] table(Metal metal) {
    return switch (metal) {
      case CARBON_STEEL -> STEEL_UM;
      case ZINC -> ZINC_UM;
      case COPPER -> COPPER_UM;
      case ALUMINIUM -> ALUMINIUM_G_PER_M2;
    };
  }
}
