package saltspoke.faces.picture;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import saltspoke.atlas.AtlasLayer;
import saltspoke.atmosphere.Category;
import saltspoke.atmosphere.CategoryLimits;
import saltspoke.atmosphere.Metal;

/** How each layer is drawn, on the page's map and in an atlas alike. */
public final class LayerStyles {
  private LayerStyles() {}

  /** Classes over the median first-year loss of a metal, µm. */
  public static LayerStyle classesOfLoss(Metal metal) {
    double[] limitsUm =
        Arrays.stream(Category.values())
            .filter(category -> category != Category.CX)
            .mapToDouble(category -> CategoryLimits.upperUm(metal, category))
            .toArray();
    return LayerStyle.classes("class-" + metal.id(), limitsUm);
  }

  /** The style of a layer over its values. */
  public static LayerStyle of(AtlasLayer layer) {
    String id = layer.id();
    return switch (layer) {
      case CLASS_CARBON_STEEL, CLASS_ZINC, CLASS_COPPER, CLASS_ALUMINIUM ->
          LayerStyle.classes(id, new double[] {1, 2, 3, 4, 5});
      case LOSS_CARBON_STEEL, LOSS_ZINC, LOSS_COPPER, LOSS_ALUMINIUM -> losses(layer);
      case TEMPERATURE ->
          LayerStyle.steps(id, "°C", ColourRamp.OXIDE, -20, -10, 0, 5, 10, 15, 20, 25);
      case HUMIDITY -> LayerStyle.steps(id, "%", ColourRamp.WATER, 30, 40, 50, 60, 70, 75, 80, 85);
      // Steps on the bounds of the salinity classes S0 to S3 of ISO 9223, and between.
      case CHLORIDE -> LayerStyle.steps(id, "mg/(m² d)", ColourRamp.OXIDE, 3, 10, 30, 60, 150, 300);
      // Steps on the bounds of the classes P0 to P3 of ISO 9223, and between.
      case SO2 -> LayerStyle.steps(id, "mg/(m² d)", ColourRamp.OXIDE, 1, 2, 4, 8, 16, 24, 80);
      // Steps on the bounds of the wetness classes τ2 to τ5 of ISO 9223, and between.
      case WET_HOURS ->
          LayerStyle.steps(id, "h/a", ColourRamp.WATER, 250, 1000, 2500, 3500, 4500, 5500);
      case NEAR_FREEZING_DAYS ->
          LayerStyle.steps(id, "d/a", ColourRamp.WATER, 5, 20, 40, 70, 100, 140);
      case FIRST_LOOK -> firstLook(id);
    };
  }

  /** Losses step where the classes of their metal do. */
  private static LayerStyle losses(AtlasLayer layer) {
    LayerStyle classes = classesOfLoss(layer.metal().orElseThrow());
    double[] bounds = classes.upTo().stream().mapToDouble(LayerStyles::threeDigits).toArray();
    return LayerStyle.steps(layer.id(), "µm", ColourRamp.OXIDE, bounds);
  }

  /** Short intervals are the dark ones. */
  private static LayerStyle firstLook(String id) {
    LayerStyle rising = LayerStyle.steps(id, "months", ColourRamp.OXIDE, 1, 2, 3, 6, 9, 12, 18, 24);
    List<Integer> colours = new ArrayList<>(rising.colours());
    Collections.reverse(colours);
    return new LayerStyle(id, rising.unit(), rising.upTo(), rising.labels(), colours);
  }

  private static double threeDigits(double value) {
    return new BigDecimal(value).round(new MathContext(3)).doubleValue();
  }
}
