package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.faces.picture.ColourRamp;
import saltspoke.faces.picture.LayerStyle;
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
  private static final LayerStyle STYLE =
      LayerStyle.classes("class-zinc", new double[] {0.1, 0.7, 2.1, 4.2, 8.4});

  /** One country across longitude 180°, 170 E to 160 W, and one round the south pole. */
  private static final String ACROSS =
      """
      {"type":"FeatureCollection","features":[
      {"type":"Feature","properties":{},"geometry":{"type":"Polygon","coordinates":
      [[[170,10],[-160,10],[-160,40],[170,40],[170,10]]]}},
      {"type":"Feature","properties":{},"geometry":{"type":"Polygon","coordinates":
      [[[-180,-60],[-60,-65],[60,-60],[180,-60],[-180,-60]]]}}]}
      """;

  private static BufferedImage tile(double value, double sureness, int z, int x, int y)
      throws Exception {
    return tile(COUNTRIES, value, sureness, z, x, y);
  }

  private static BufferedImage tile(
      String countries, double value, double sureness, int z, int x, int y) throws Exception {
    InputStream stream = new ByteArrayInputStream(countries.getBytes(StandardCharsets.UTF_8));
    double[] values = {value, value, value, value};
    double[] sure = {sureness, sureness, sureness, sureness};
    byte[] png =
        new TileRenderer(WorldShapes.ofCountries(stream), TileRendererTest::isLand)
            .render(STYLE, new TileValues(2, values, sure), new TileFrame(z, x, y));
    return ImageIO.read(new ByteArrayInputStream(png));
  }

  private static boolean isLand(double latitudeDeg, double longitudeDeg) {
    return latitudeDeg > 0 && latitudeDeg < 60 && longitudeDeg > 0 && longitudeDeg < 80;
  }

  @Test
  void landCarriesTheColourOfItsStepAndTheSeaNone() throws Exception {
    BufferedImage world = tile(3, 1, 0, 0, 0);
    int atTwentyEastThirtyNorth = world.getRGB(142, 105);
    assertEquals(STYLE.colours().get(3), atTwentyEastThirtyNorth);
    assertEquals(0, world.getRGB(20, 105) >>> 24, "the sea is transparent");
  }

  @Test
  void landAcrossTheDateLineLiesAtBothEdgesAndLandRoundAPoleBelow() throws Exception {
    BufferedImage world = tile(ACROSS, 3, 1, 0, 0, 0);
    int fill = STYLE.colours().get(3);
    int twentyFiveNorth = 109;
    assertEquals(fill, world.getRGB(252, twentyFiveNorth), "174 E");
    assertEquals(fill, world.getRGB(7, twentyFiveNorth), "170 W");
    assertEquals(0, world.getRGB(128, twentyFiveNorth) >>> 24, "the sea at Greenwich");
    assertEquals(0, world.getRGB(128, 180) >>> 24, "60° S less a little");
    for (int x : new int[] {1, 60, 128, 200, 254}) {
      assertEquals(fill, world.getRGB(x, 230), "round the pole, column " + x);
    }
  }

  @Test
  void aBorderIsDrawnWhereTwoCountriesMeetAndNowhereElse() throws Exception {
    BufferedImage tile = tile(3, 1, 2, 2, 1);
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
    BufferedImage sure = tile(3, 0.9, 2, 2, 1);
    BufferedImage toss = tile(3, 0.5, 2, 2, 1);
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
  void fromTownZoomTheShoreIsThatOfTheAnswers() throws Exception {
    // Column 256 of zoom 9 starts at 0° E and row 255 ends at the equator: both shores of the land.
    BufferedImage inside = tile(3, 1, 9, 256, 255);
    assertEquals(STYLE.colours().get(3), inside.getRGB(128, 128));
    BufferedImage outside = tile(3, 1, 9, 255, 255);
    assertEquals(0, outside.getRGB(128, 128) >>> 24);
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
    Refusal refusal = assertThrows(Refusal.class, () -> tile(3, 1, 2, 4, 0));
    assertEquals("x", refusal.field());
    assertEquals("0..3", refusal.allowed());
    assertThrows(Refusal.class, () -> tile(3, 1, 12, 0, 0));
    assertThrows(Refusal.class, () -> tile(3, 1, -1, 0, 0));
  }

  @Test
  void theLegendNamesEveryStepWithItsColour() {
    LayerStyle wet = LayerStyle.steps("wet-hours", "h", ColourRamp.WATER, 250, 2500, 5500);
    assertEquals(4, wet.legend().get("steps").size());
    assertEquals("250–2500", wet.legend().get("steps").get(1).get("label").asText());
    assertTrue(wet.legend().get("steps").get(0).get("colour").asText().matches("#[0-9a-f]{6}"));
  }
}
