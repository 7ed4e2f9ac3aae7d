package saltspoke.faces.web;

import java.awt.AlphaComposite;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Path2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import javax.imageio.ImageIO;
import saltspoke.faces.picture.LayerStyle;

/**
 * Draws map tiles: the steps of a layer on land, a thin line where the step changes, hatching where
 * a class is a coin toss, coast and borders. The sea is left transparent.
 */
final class TileRenderer {
  /**
   * Below this probability of the likeliest class the map hatches. A choice for people, not a
   * published limit: the runner-up is then often nearly as likely.
   */
  static final double COIN_TOSS_BELOW = 0.6;

  private static final int HATCH_STEP_PX = 8;
  private static final int NO_DATA = 0xFFC9CFCE;
  private static final Color COAST = new Color(0x15, 0x25, 0x2A, 150);
  private static final Color BORDER = new Color(0x15, 0x25, 0x2A, 190);
  private static final double CHANGE_SHADE = 0.72;

  /** From this zoom a pixel is finer than the outlines for drawing. */
  private static final int FINE_ZOOM = 7;

  private final WorldShapes shapes;
  private final LandTest isLand;

  /** Whether a point is on land, by the coast that answers use. */
  @FunctionalInterface
  interface LandTest {
    boolean test(double latitudeDeg, double longitudeDeg);
  }

  TileRenderer(WorldShapes shapes, LandTest isLand) {
    this.shapes = shapes;
    this.isLand = isLand;
  }

  /**
   * A tile as PNG.
   *
   * @param style steps and colours
   * @param values the layer's values, in the unit of the style's bounds
   * @param frame which tile
   */
  byte[] render(LayerStyle style, TileValues values, TileFrame frame) {
    BufferedImage image =
        new BufferedImage(TileFrame.SIZE_PX, TileFrame.SIZE_PX, BufferedImage.TYPE_INT_ARGB);
    boolean fine = frame.zoom() >= FINE_ZOOM;
    Path2D land = shapes.land(frame);
    if (fine || land.getCurrentPoint() != null) {
      paintValues(image, style, values);
      Graphics2D graphics = image.createGraphics();
      graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
      if (fine) {
        keepLand(image, frame);
      } else {
        keepOnly(graphics, land);
        graphics.setStroke(new BasicStroke(0.8f));
        graphics.setColor(COAST);
        graphics.draw(land);
      }
      graphics.setStroke(new BasicStroke(frame.zoom() < 4 ? 0.7f : 1.1f));
      graphics.setColor(BORDER);
      graphics.draw(shapes.borders(frame));
      graphics.dispose();
    }
    return png(image);
  }

  private static void paintValues(BufferedImage image, LayerStyle style, TileValues values) {
    int size = TileFrame.SIZE_PX;
    int[] above = new int[size + 1];
    int[] steps = new int[size + 1];
    for (int y = -1; y < size; y++) {
      for (int x = -1; x < size; x++) {
        int step = style.step(values.value(x, y));
        steps[x + 1] = step;
        if (x < 0 || y < 0) {
          continue;
        }
        int colour = step < 0 ? NO_DATA : style.colours().get(step);
        boolean edge = step != steps[x] || step != above[x + 1];
        if (edge) {
          colour = shade(colour, CHANGE_SHADE);
        } else if (step >= 0
            && (x + y) % HATCH_STEP_PX == 0
            && values.sureness(x, y) < COIN_TOSS_BELOW) {
          colour = isDark(colour) ? shade(colour, 1.9) : shade(colour, 0.6);
        }
        image.setRGB(x, y, colour);
      }
      int[] swap = above;
      above = steps;
      steps = swap;
    }
  }

  /** Erases the sea pixel by pixel, by the same coast that answers use, and draws its shore. */
  private void keepLand(BufferedImage image, TileFrame frame) {
    int size = TileFrame.SIZE_PX;
    boolean[] above = new boolean[size + 1];
    boolean[] row = new boolean[size + 1];
    for (int y = -1; y < size; y++) {
      for (int x = -1; x < size; x++) {
        boolean land = isLand.test(frame.latitudeDeg(y), frame.longitudeDeg(x));
        row[x + 1] = land;
        if (x < 0 || y < 0) {
          continue;
        }
        if (land != row[x] || land != above[x + 1]) {
          image.setRGB(x, y, COAST.getRGB());
        } else if (!land) {
          image.setRGB(x, y, 0);
        }
      }
      boolean[] swap = above;
      above = row;
      row = swap;
    }
  }

  /** Erases what lies off the shape, softly at its edge. */
  private static void keepOnly(Graphics2D graphics, Path2D land) {
    BufferedImage mask =
        new BufferedImage(TileFrame.SIZE_PX, TileFrame.SIZE_PX, BufferedImage.TYPE_INT_ARGB);
    Graphics2D ink = mask.createGraphics();
    ink.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    ink.setColor(Color.BLACK);
    ink.fill(land);
    ink.dispose();
    graphics.setComposite(AlphaComposite.DstIn);
    graphics.drawImage(mask, 0, 0, null);
    graphics.setComposite(AlphaComposite.SrcOver);
  }

  private static boolean isDark(int argb) {
    return ((argb >> 16 & 0xFF) * 3 + (argb >> 8 & 0xFF) * 6 + (argb & 0xFF)) / 10 < 110;
  }

  private static int shade(int argb, double factor) {
    int shaded = 0xFF;
    for (int shift = 16; shift >= 0; shift -= 8) {
      int channel = argb >> shift & 0xFF;
      shaded = shaded << 8 | (int) Math.min(255, Math.round(channel * factor));
    }
    return shaded;
  }

  private static byte[] png(BufferedImage image) {
    ByteArrayOutputStream out = new ByteArrayOutputStream(16 * 1024);
    try {
      ImageIO.setUseCache(false);
      ImageIO.write(image, "png", out);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return out.toByteArray();
  }
}
