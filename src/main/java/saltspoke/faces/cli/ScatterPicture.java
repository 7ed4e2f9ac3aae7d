package saltspoke.faces.cli;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.image.BufferedImage;
import java.util.List;
import java.util.Locale;
import saltspoke.atlas.Comparison;
import saltspoke.atlas.Pair;

/**
 * Estimates over measurements, one square panel per quantity, with the line of equality; on a ratio
 * scale also the lines of a factor 2, and logarithmic axes where the range asks for it.
 */
final class ScatterPicture {
  private static final int PANEL = 420;
  private static final int MARGIN = 60;
  private static final int COLUMNS = 3;
  private static final double LOG_FROM_RATIO = 30;
  private static final Color INK = new Color(0x222222);
  private static final Color POINT = new Color(0x33, 0x66, 0x88, 0x70);
  private static final Color GUIDE = new Color(0xB0, 0x50, 0x20);

  private ScatterPicture() {}

  static BufferedImage of(List<Comparison.Series> series) {
    int columns = Math.min(COLUMNS, series.size());
    int rows = (series.size() + columns - 1) / columns;
    BufferedImage image =
        new BufferedImage(columns * PANEL, rows * PANEL, BufferedImage.TYPE_INT_RGB);
    Graphics2D g = image.createGraphics();
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setColor(Color.WHITE);
    g.fillRect(0, 0, image.getWidth(), image.getHeight());
    for (int i = 0; i < series.size(); i++) {
      Graphics2D panel =
          (Graphics2D) g.create(i % columns * PANEL, i / columns * PANEL, PANEL, PANEL);
      new Panel(series.get(i)).draw(panel);
      panel.dispose();
    }
    g.dispose();
    return image;
  }

  private static final class Panel {
    private final Comparison.Series series;
    private final boolean log;
    private final double low;
    private final double high;

    Panel(Comparison.Series series) {
      this.series = series;
      double least = Double.POSITIVE_INFINITY;
      double most = Double.NEGATIVE_INFINITY;
      double leastAbove0 = Double.POSITIVE_INFINITY;
      for (Pair pair : series.pairs()) {
        for (double value : new double[] {pair.measured(), pair.estimated()}) {
          least = Math.min(least, value);
          most = Math.max(most, value);
          leastAbove0 = value > 0 ? Math.min(leastAbove0, value) : leastAbove0;
        }
      }
      log = series.ratioScale() && least > 0 && most > LOG_FROM_RATIO * leastAbove0;
      double pad = most > least ? 0.04 * (most - least) : 1;
      low = log ? leastAbove0 / 1.3 : least - pad;
      high = log ? most * 1.3 : most + pad;
    }

    void draw(Graphics2D g) {
      g.setFont(new Font(Font.SANS_SERIF, Font.PLAIN, 12));
      g.setColor(INK);
      g.drawString(series.quantity(), MARGIN, 22);
      g.drawRect(MARGIN, MARGIN / 2, side(), side());
      ticks(g);
      g.setColor(GUIDE);
      g.setStroke(new BasicStroke(1.2f));
      line(g, 1);
      if (series.ratioScale() && low >= 0) {
        g.setStroke(
            new BasicStroke(
                0.8f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER, 1, new float[] {4, 4}, 0));
        line(g, 2);
        line(g, 0.5);
      }
      g.setColor(POINT);
      for (Pair pair : series.pairs()) {
        g.fill(new Ellipse2D.Double(x(pair.measured()) - 2.5, y(pair.estimated()) - 2.5, 5, 5));
      }
      g.setColor(INK);
      g.drawString("measured →   estimated ↑", MARGIN, PANEL - 8);
    }

    private void ticks(Graphics2D g) {
      int count = 4;
      for (int i = 0; i <= count; i++) {
        double share = (double) i / count;
        double value =
            log
                ? Math.exp(Math.log(low) + share * Math.log(high / low))
                : low + share * (high - low);
        String text = String.format(Locale.ROOT, high - low < 20 && !log ? "%.1f" : "%.0f", value);
        g.drawString(text, (int) x(value) - 12, MARGIN / 2 + side() + 16);
        g.drawString(text, 8, (int) y(value) + 4);
        g.draw(new Line2D.Double(MARGIN - 4, y(value), MARGIN, y(value)));
        double bottom = MARGIN / 2.0 + side();
        g.draw(new Line2D.Double(x(value), bottom, x(value), bottom + 4));
      }
    }

    private void line(Graphics2D g, double factor) {
      java.awt.Shape before = g.getClip();
      g.clipRect(MARGIN, MARGIN / 2, side(), side());
      g.draw(new Line2D.Double(x(low), y(low * factor), x(high), y(high * factor)));
      g.setClip(before);
    }

    private int side() {
      return PANEL - MARGIN - MARGIN / 2 - 20;
    }

    private double share(double value) {
      return log
          ? Math.log(Math.max(value, 1e-300) / low) / Math.log(high / low)
          : (value - low) / (high - low);
    }

    private double x(double value) {
      return MARGIN + share(value) * side();
    }

    private double y(double value) {
      return MARGIN / 2.0 + (1 - share(value)) * side();
    }
  }
}
