package saltspoke.faces.export;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import saltspoke.atlas.AtlasFrame;
import saltspoke.atlas.TileStore;
import saltspoke.faces.picture.LayerStyle;

/** Draws an atlas with its title and legend, as a PNG for a meeting or a report. */
public final class AtlasPicture {
  /** Widest and highest map, pixels; a larger atlas is thinned. */
  private static final int MOST_PX = 2400;

  /** Narrowest map, pixels; the cells of a smaller atlas become squares. */
  private static final int LEAST_PX = 900;

  private static final int MARGIN = 24;
  private static final int TITLE = 44;
  private static final int LEGEND = 96;
  private static final int BOX = 22;
  private static final Color PAPER = Color.WHITE;
  private static final Color SEA = new Color(0xB4C1C8);
  private static final Color INK = new Color(0x15252A);

  private final AtlasFrame frame;
  private final LayerStyle style;
  private final int thin;
  private final int widen;
  private final int width;
  private final int height;

  private AtlasPicture(AtlasFrame frame, LayerStyle style) {
    this.frame = frame;
    this.style = style;
    int longest = Math.max(frame.columns(), frame.rows());
    thin = (longest + MOST_PX - 1) / MOST_PX;
    widen = Math.max(1, (LEAST_PX + frame.columns() - 1) / frame.columns());
    width = Math.max(1, frame.columns() / thin) * widen;
    height = Math.max(1, frame.rows() / thin) * widen;
  }

  /**
   * What is written around the map.
   *
   * @param title above it
   * @param subtitle below the title, may be empty
   * @param unit behind the legend
   * @param source below the legend
   */
  public record Words(String title, String subtitle, String unit, String source) {}

  public static void write(
      Path target, AtlasFrame frame, LayerStyle style, TileStore tiles, Words words)
      throws IOException {
    BufferedImage image = new AtlasPicture(frame, style).draw(tiles, words);
    Path aside = WholeFile.aside(target);
    ImageIO.setUseCache(false);
    if (!ImageIO.write(image, "png", aside.toFile())) {
      throw new IOException("no PNG writer");
    }
    WholeFile.moveInto(aside, target);
  }

  private BufferedImage draw(TileStore tiles, Words words) throws IOException {
    BufferedImage image =
        new BufferedImage(
            Math.max(width, LEAST_PX) + 2 * MARGIN,
            height + TITLE + LEGEND + 2 * MARGIN,
            BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g.setColor(PAPER);
    g.fillRect(0, 0, image.getWidth(), image.getHeight());
    g.setColor(SEA);
    g.fillRect(MARGIN, MARGIN + TITLE, width, height);
    for (int tile = 0; tile < frame.tiles(); tile++) {
      paint(image, tile, tiles.get(tile));
    }
    g.setColor(INK);
    g.setFont(new Font(Font.SANS_SERIF, Font.BOLD, 22));
    g.drawString(words.title, MARGIN, MARGIN + 14);
    g.setFont(new Font(Font.SANS_SERIF, Font.PLAIN, 13));
    g.drawString(words.subtitle, MARGIN, MARGIN + 34);
    legend(g, MARGIN + TITLE + height + 16, words);
    g.dispose();
    return image;
  }

  private void paint(BufferedImage image, int tile, float[] values) {
    int row0 = tile / frame.tilesAcross() * AtlasFrame.TILE;
    int column0 = tile % frame.tilesAcross() * AtlasFrame.TILE;
    for (int i = 0; i < values.length; i++) {
      int row = row0 + i / AtlasFrame.TILE;
      int column = column0 + i % AtlasFrame.TILE;
      int step = style.step(values[i]);
      int x0 = column / thin * widen;
      int y0 = row / thin * widen;
      boolean chosen = row % thin == thin / 2 && column % thin == thin / 2;
      if (step < 0 || !chosen || x0 >= width || y0 >= height) {
        continue;
      }
      int colour = style.colours().get(step);
      for (int y = 0; y < widen; y++) {
        for (int x = 0; x < widen; x++) {
          image.setRGB(MARGIN + x0 + x, MARGIN + TITLE + y0 + y, colour);
        }
      }
    }
  }

  private void legend(Graphics2D g, int top, Words words) {
    g.setFont(new Font(Font.SANS_SERIF, Font.PLAIN, 15));
    int x = MARGIN;
    for (int i = 0; i < style.labels().size(); i++) {
      g.setColor(new Color(style.colours().get(i)));
      g.fillRect(x, top, BOX, BOX);
      g.setColor(INK);
      g.drawRect(x, top, BOX, BOX);
      g.drawString(style.labels().get(i), x + BOX + 6, top + 17);
      x += BOX + 24 + g.getFontMetrics().stringWidth(style.labels().get(i));
    }
    g.drawString(words.unit, x, top + 17);
    g.setFont(new Font(Font.SANS_SERIF, Font.PLAIN, 12));
    g.drawString(words.source, MARGIN, top + BOX + 28);
  }
}
