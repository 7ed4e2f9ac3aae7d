package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Optional;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.fields.Field;
import saltspoke.fields.Grid;
import saltspoke.values.Refusal;

/** Two square made-up countries side by side: 0..40 E and 40..80 E, 0..60 N. */
@Tag("law")
class TileRendererTest {
  private static final String COUNTRIES =
      """
      {"type":"FeatureCollection","features":[
      {"type":"Feature","properties":{},"geometry":{"type":"Polygon","coordinates":
      [[[0,0],[40,0],[40,60],[0,60],[0,0]]]}},
      {"type":"Feature","properties":{},"geometry":{"type":"MultiPolygon","coordinates":
      [[[[40,60],[40,0],[80,0],[80,60],[40,60]]]]}}]}
      """;
  private static final Grid WORLD = new Grid(90, -180, 10, 10, 19, 36, true);
  private static final LayerStyle STYLE =
      LayerStyle.classes("class-zinc", new double[] {0.1, 0.7, 2.1, 4.2, 8.4});

  private final TileRenderer renderer = new TileRenderer(WorldShapes.ofCountries(stream()));

  private static InputStream stream() {
    return new ByteArrayInputStream(COUNTRIES.getBytes(StandardCharsets.UTF_8));
  }

  private static Field everywhere(double value) {
    float[] values = new float[WORLD.rows() * WORLD.columns()];
    Arrays.fill(values, (float) value);
    return new Field(WORLD, "um", values);
  }

  private BufferedImage tile(double value, Optional<Field> sureness, int z, int x, int y)
      throws Exception {
    byte[] png = renderer.render(STYLE, everywhere(value), sureness, z, x, y);
    return ImageIO.read(new ByteArrayInputStream(png));
  }

  @Test
  void landCarriesTheColourOfItsStepAndTheSeaNone() throws Exception {
    BufferedImage world = tile(3, Optional.empty(), 0, 0, 0);
    int atTwentyEastThirtyNorth = world.getRGB(142, 105);
    assertEquals(STYLE.colours().get(3), atTwentyEastThirtyNorth);
    assertEquals(0, world.getRGB(20, 105) >>> 24, "the sea is transparent");
  }

  @Test
  void aBorderIsDrawnWhereTwoCountriesMeetAndNowhereElse() throws Exception {
    BufferedImage tile = tile(3, Optional.empty(), 2, 2, 1);
    int fill = STYLE.colours().get(3);
    int borderColumn = (int) Math.round((220 / 360.0 * 4 - 2) * 256);
    boolean drawn =
        tile.getRGB(borderColumn, 128) != fill || tile.getRGB(borderColumn - 1, 128) != fill;
    assertTrue(drawn, "a line between the two");
    assertEquals(fill, tile.getRGB(borderColumn - 20, 128));
    assertEquals(fill, tile.getRGB(borderColumn + 20, 128));
  }

  @Test
  void aCoinTossIsHatched() throws Exception {
    BufferedImage sure = tile(3, Optional.of(everywhere(0.9)), 2, 2, 1);
    BufferedImage toss = tile(3, Optional.of(everywhere(0.5)), 2, 2, 1);
    assertEquals(1, colours(sure, 64).size());
    assertEquals(2, colours(toss, 64).size());
  }

  private static java.util.Set<Integer> colours(BufferedImage tile, int from) {
    java.util.Set<Integer> colours = new java.util.HashSet<>();
    for (int x = from; x < from + 32; x++) {
      for (int y = 100; y < 132; y++) {
        colours.add(tile.getRGB(x, y));
      }
    }
    return colours;
  }

  @Test
  void valuesOnABoundBelongToTheMilderClass() {
    assertEquals(0, STYLE.step(0.1));
    assertEquals(1, STYLE.step(Math.nextUp(0.1)));
    assertEquals(5, STYLE.step(1000));
    assertEquals(-1, STYLE.step(Double.NaN));
  }

  @Test
  void aTileOutsideThePyramidIsRefusedWithItsRange() {
    Refusal refusal = assertThrows(Refusal.class, () -> tile(3, Optional.empty(), 2, 4, 0));
    assertEquals("x", refusal.field());
    assertEquals("0..3", refusal.allowed());
    assertThrows(Refusal.class, () -> tile(3, Optional.empty(), 12, 0, 0));
    assertThrows(Refusal.class, () -> tile(3, Optional.empty(), -1, 0, 0));
  }

  @Test
  void theLegendNamesEveryStepWithItsColour() {
    LayerStyle wet = LayerStyle.steps("wet-hours", "h", ColourRamp.WATER, 250, 2500, 5500);
    assertEquals(4, wet.legend().get("steps").size());
    assertEquals("250–2500", wet.legend().get("steps").get(1).get("label").asText());
    assertTrue(wet.legend().get("steps").get(0).get("colour").asText().matches("#[0-9a-f]{6}"));
  }
}
