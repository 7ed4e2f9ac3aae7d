package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.sources.CsvTable;
import saltspoke.values.Refusal;

class CategoryLimitsTest {
  @Test
  @Tag("published")
  void everyLimitBelongsToTheLowerCategory() {
    for (CsvTable.Row row : Reference.rows("iso-9223-2012/category-limits.csv")) {
      Metal metal = Reference.metal(row.text("metal"));
      for (Category category : Category.values()) {
        OptionalDouble printed = row.optionalNumber(category.name());
        if (printed.isEmpty()) {
          assertEquals(Double.POSITIVE_INFINITY, CategoryLimits.upperInTableUnit(metal, category));
          continue;
        }
        double limit = printed.getAsDouble();
        assertEquals(category, CategoryLimits.categoryOfTableValue(metal, limit));
        Category next = Category.values()[Math.min(category.ordinal() + 1, 5)];
        assertEquals(next, CategoryLimits.categoryOfTableValue(metal, Math.nextUp(limit)));
      }
    }
  }

  @Test
  @Tag("law")
  void aboveCxStaysCxAndIsKnown() {
    assertEquals(
        Category.CX, CategoryLimits.categoryOf(Metal.CARBON_STEEL, new FirstYearLoss(701)));
    assertTrue(CategoryLimits.aboveCx(Metal.CARBON_STEEL, new FirstYearLoss(701)));
    assertFalse(CategoryLimits.aboveCx(Metal.CARBON_STEEL, new FirstYearLoss(700)));
    assertFalse(CategoryLimits.aboveCx(Metal.ALUMINIUM, new FirstYearLoss(1e6)));
    assertThrows(Refusal.class, () -> CategoryLimits.categoryOfTableValue(Metal.ZINC, Double.NaN));
  }

  @Test
  @Tag("law")
  void aluminiumIsWeighedByItsDensity() {
    assertEquals(Category.C3, CategoryLimits.categoryOf(Metal.ALUMINIUM, new FirstYearLoss(0.74)));
    assertEquals(Category.C4, CategoryLimits.categoryOf(Metal.ALUMINIUM, new FirstYearLoss(0.75)));
  }
}
