package saltspoke.fields;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Laws of sampling, above all at the date line and the poles. */
@Tag("law")
class FieldTest {
  private static final Grid WORLD = Grid.of(90, -180, 30, 30, 7, 12);
  private static final Grid PATCH = Grid.of(50, 5, 0.5, 0.25, 5, 9);

  private static Field numbered(Grid grid) {
    float[] values = new float[grid.rows() * grid.columns()];
    for (int i = 0; i < values.length; i++) {
      values[i] = (i * 37) % 101;
    }
    return new Field(grid, "1", values);
  }

  @Test
  void knowsWhetherItGoesRoundTheWorld() {
    assertTrue(WORLD.wrapsLongitude());
    assertTrue(!PATCH.wrapsLongitude());
  }

  @Test
  void givesTheValueItselfAtEveryPoint() {
    for (Grid grid : List.of(WORLD, PATCH)) {
      Field field = numbered(grid);
      for (int row = 0; row < grid.rows(); row++) {
        for (int column = 0; column < grid.columns(); column++) {
          assertEquals(
              field.at(row, column),
              field.sample(grid.latitudeDeg(row), grid.longitudeDeg(column)),
              1e-9);
        }
      }
    }
  }

  @Property
  void isExactForPlanes(
      @ForAll @DoubleRange(min = 48, max = 50) double latitudeDeg,
      @ForAll @DoubleRange(min = 5, max = 7) double longitudeDeg) {
    float[] values = new float[PATCH.rows() * PATCH.columns()];
    for (int i = 0; i < values.length; i++) {
      values[i] =
          (float)
              (3 * PATCH.latitudeDeg(i / PATCH.columns())
                  - 2 * PATCH.longitudeDeg(i % PATCH.columns()));
    }
    assertEquals(
        3 * latitudeDeg - 2 * longitudeDeg,
        new Field(PATCH, "1", values).sample(latitudeDeg, longitudeDeg),
        1e-4);
  }

  @Property
  void staysWithinItsValuesAndRepeatsEveryTurn(
      @ForAll @DoubleRange(min = -90, max = 90) double latitudeDeg,
      @ForAll @DoubleRange(min = -180, max = 180) double longitudeDeg) {
    Field field = numbered(WORLD);
    double value = field.sample(latitudeDeg, longitudeDeg);
    assertTrue(value >= 0 && value <= 100);
    assertEquals(value, field.sample(latitudeDeg, longitudeDeg + 360), 1e-6);
    assertEquals(value, field.sample(latitudeDeg, longitudeDeg - 360), 1e-6);
  }

  @Test
  void joinsTheLastColumnToTheFirst() {
    Field field = numbered(WORLD);
    assertEquals(
        (field.at(3, 11) + field.at(3, 0)) / 2, field.sample(WORLD.latitudeDeg(3), 165), 1e-9);
    assertEquals(field.sample(10, 180), field.sample(10, -180), 1e-9);
    assertEquals(field.sample(10, 180), field.sample(10, 180 - 1e-9), 1e-6);
  }

  @Test
  void holdsTheEdgeBeyondTheOutermostRowsAndColumns() {
    Field field = numbered(PATCH);
    assertEquals(field.sample(50, 6), field.sample(80, 6), 1e-9);
    assertEquals(field.sample(48, 6), field.sample(-80, 6), 1e-9);
    assertEquals(field.sample(49, 5), field.sample(49, -100), 1e-9);
    Field world = numbered(WORLD);
    assertEquals(world.at(0, 6), world.sample(90, 0), 1e-9);
    assertEquals(world.at(6, 6), world.sample(-90, 0), 1e-9);
  }

  @Test
  void leavesMissingCornersOut() {
    float nan = Float.NaN;
    Grid grid = Grid.of(1, 0, 1, 1, 2, 2);
    assertEquals(4, new Field(grid, "1", new float[] {nan, 4, nan, 4}).sample(0.5, 0.25), 1e-9);
    assertEquals(
        Double.NaN, new Field(grid, "1", new float[] {nan, nan, nan, nan}).sample(0.5, 0.5));
    assertEquals(Double.NaN, new Field(grid, "1", new float[] {nan, 4, 5, 6}).sample(1, 0));
  }

  @Test
  void refusesShapesThatDoNotFit() {
    assertThrows(IllegalArgumentException.class, () -> new Field(PATCH, "1", new float[3]));
    assertThrows(IllegalArgumentException.class, () -> Grid.of(0, 0, 1, 1, 1, 5));
    assertThrows(
        IllegalArgumentException.class,
        () -> new FieldStack("x", List.of(numbered(PATCH), numbered(WORLD))));
    assertThrows(
        IllegalArgumentException.class,
        () -> new FieldStack("x", List.of("a", "b"), List.of(numbered(PATCH))));
  }
}
