package saltspoke.faces.picture;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import saltspoke.atmosphere.Category;
import saltspoke.faces.json.Json;

/**
 * How the values of a map layer become colours: in steps, so that a value can be read off the
 * legend.
 *
 * @param layer id of the layer, such as {@code class-zinc}
 * @param unit unit of the values for people, empty for classes
 * @param upTo upper bound of every step but the last, ascending; a value equal to it belongs below
 * @param labels one per step
 * @param colours one per step, 0xFFRRGGBB
 */
public record LayerStyle(
    String layer, String unit, List<Double> upTo, List<String> labels, List<Integer> colours) {
  public LayerStyle {
    upTo = List.copyOf(upTo);
    labels = List.copyOf(labels);
    colours = List.copyOf(colours);
    if (labels.size() != upTo.size() + 1 || colours.size() != labels.size()) {
      throw new IllegalArgumentException("layer " + layer + " has steps without label or colour");
    }
    for (int i = 1; i < upTo.size(); i++) {
      if (!(upTo.get(i) > upTo.get(i - 1))) {
        throw new IllegalArgumentException("the bounds of layer " + layer + " do not ascend");
      }
    }
  }

  /**
   * Corrosivity classes over first-year losses.
   *
   * @param upperLimitsUm upper limits of C1 to C5, µm in the first year
   */
  public static LayerStyle classes(String layer, double[] upperLimitsUm) {
    Category[] categories = Category.values();
    List<String> labels = new ArrayList<>();
    for (Category category : categories) {
      labels.add(category.name());
    }
    return new LayerStyle(
        layer, "", list(upperLimitsUm), labels, list(ColourRamp.OXIDE.steps(categories.length)));
  }

  /** Steps of a quantity; the last is open. */
  public static LayerStyle steps(String layer, String unit, ColourRamp ramp, double... bounds) {
    List<String> labels = new ArrayList<>();
    labels.add("≤ " + plain(bounds[0]));
    for (int i = 1; i < bounds.length; i++) {
      labels.add(plain(bounds[i - 1]) + "–" + plain(bounds[i]));
    }
    labels.add("> " + plain(bounds[bounds.length - 1]));
    return new LayerStyle(layer, unit, list(bounds), labels, list(ramp.steps(bounds.length + 1)));
  }

  /** Whether the steps are classes, which may be a coin toss. */
  public boolean ofClasses() {
    return unit.isEmpty();
  }

  /** The step of a value, from 0; −1 for a missing one. */
  public int step(double value) {
    if (Double.isNaN(value)) {
      return -1;
    }
    int step = 0;
    while (step < upTo.size() && value > upTo.get(step)) {
      step++;
    }
    return step;
  }

  /** The legend as the page reads it. */
  public ObjectNode legend() {
    ObjectNode node = Json.object();
    node.put("layer", layer);
    node.put("unit", unit);
    node.put("hatched", ofClasses());
    ArrayNode steps = node.putArray("steps");
    for (int i = 0; i < labels.size(); i++) {
      ObjectNode step = steps.addObject();
      step.put("label", labels.get(i));
      step.put("colour", ColourRamp.css(colours.get(i)));
    }
    return node;
  }

  private static String plain(double bound) {
    return bound == Math.rint(bound) ? Long.toString((long) bound) : Double.toString(bound);
  }

  private static List<Double> list(double[] values) {
    List<Double> list = new ArrayList<>();
    for (double value : values) {
      list.add(value);
    }
    return list;
  }

  private static List<Integer> list(int[] values) {
    List<Integer> list = new ArrayList<>();
    for (int value : values) {
      list.add(value);
    }
    return list;
  }
}
