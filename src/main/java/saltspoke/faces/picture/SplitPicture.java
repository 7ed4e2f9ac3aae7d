package saltspoke.faces.picture;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import saltspoke.atlas.stock.Split;
import saltspoke.atlas.stock.Splits;
import saltspoke.faces.Texts;

/**
 * The recommended split as bars, one for all customers and one for each of the regions with most
 * wheels, as SVG.
 */
public final class SplitPicture {
  private static final int WIDTH = 960;
  private static final int LABEL = 230;
  private static final int BAR = 24;
  private static final int ROW = 34;
  private static final int TOP = 64;
  private static final int MOST_REGIONS = 24;
  private static final String INK = "#10262b";

  private SplitPicture() {}

  /** The picture as an SVG document. */
  public static String svg(Splits splits, Texts texts, String title) {
    Map<String, String> colours = colours(splits.all().byPairing());
    List<Map.Entry<Splits.RegionKey, Split>> regions = new ArrayList<>();
    splits.byRegion().entrySet().stream()
        .sorted(
            Comparator.comparing(
                (Map.Entry<Splits.RegionKey, Split> e) -> e.getValue().wheels().negate()))
        .limit(MOST_REGIONS)
        .forEach(regions::add);
    int legendTop = TOP + ROW * (regions.size() + 1) + 24;
    int height = legendTop + 24 * colours.size() + 24;
    StringBuilder svg = new StringBuilder();
    svg.append(
        String.format(
            "<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 %d %d\" width=\"%d\""
                + " height=\"%d\" font-family=\"sans-serif\" font-size=\"14\" fill=\"%s\">%n",
            WIDTH, height, WIDTH, height, INK));
    svg.append(
        String.format(
            "<rect width=\"%d\" height=\"%d\" fill=\"#ffffff\"/>%n<text x=\"20\" y=\"34\""
                + " font-size=\"20\" font-weight=\"bold\">%s</text>%n",
            WIDTH, height, escaped(title)));
    bar(svg, TOP, texts.say("page-stock-all"), splits.all(), colours);
    for (int i = 0; i < regions.size(); i++) {
      Splits.RegionKey key = regions.get(i).getKey();
      String name =
          key.regionName().isEmpty()
              ? key.countryCode()
              : key.regionName() + ", " + key.countryCode();
      bar(svg, TOP + ROW * (i + 1), name, regions.get(i).getValue(), colours);
    }
    int y = legendTop;
    for (Map.Entry<String, String> entry : colours.entrySet()) {
      svg.append(
          String.format(
              "<rect x=\"%d\" y=\"%d\" width=\"16\" height=\"16\" fill=\"%s\" stroke=\"%s\"/>"
                  + "<text x=\"%d\" y=\"%d\">%s</text>%n",
              LABEL, y, entry.getValue(), INK, LABEL + 24, y + 13, escaped(entry.getKey())));
      y += 24;
    }
    return svg.append("</svg>\n").toString();
  }

  private static Map<String, String> colours(Map<String, BigDecimal> pairings) {
    int[] steps = ColourRamp.OXIDE.steps(Math.max(2, pairings.size()));
    Map<String, String> colours = new LinkedHashMap<>();
    int i = 0;
    for (String pairing : pairings.keySet()) {
      colours.put(pairing, ColourRamp.css(steps[i++]));
    }
    return colours;
  }

  private static void bar(
      StringBuilder svg, int y, String name, Split split, Map<String, String> colours) {
    svg.append(
        String.format(
            "<text x=\"%d\" y=\"%d\" text-anchor=\"end\">%s</text>%n",
            LABEL - 10, y + 17, escaped(name)));
    double whole = split.wheels().doubleValue();
    double x = LABEL;
    for (Map.Entry<String, BigDecimal> part : split.byPairing().entrySet()) {
      double width = (WIDTH - LABEL - 110) * part.getValue().doubleValue() / whole;
      svg.append(
          String.format(
              Locale.ROOT,
              "<rect x=\"%.1f\" y=\"%d\" width=\"%.1f\" height=\"%d\" fill=\"%s\" stroke=\"%s\""
                  + " stroke-width=\"0.5\"/>%n",
              x,
              y,
              width,
              BAR,
              colours.get(part.getKey()),
              INK));
      x += width;
    }
    svg.append(
        String.format(
            "<text x=\"%d\" y=\"%d\">%s</text>%n",
            WIDTH - 100, y + 17, split.wheels().stripTrailingZeros().toPlainString()));
  }

  private static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
  }
}
