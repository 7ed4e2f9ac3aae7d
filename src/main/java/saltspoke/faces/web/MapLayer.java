package saltspoke.faces.web;

import java.util.Arrays;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.Category;
import saltspoke.atmosphere.CategoryLimits;
import saltspoke.atmosphere.Metal;
import saltspoke.atmosphere.MetalCorrosivity;
import saltspoke.values.Refusal;

/** What the map can show: each layer is a number of the air at a place, and how it is drawn. */
enum MapLayer {
  CLASS_CARBON_STEEL(Metal.CARBON_STEEL),
  CLASS_ZINC(Metal.ZINC),
  CLASS_COPPER(Metal.COPPER),
  CLASS_ALUMINIUM(Metal.ALUMINIUM),
  /** Steps on the bounds of the wetness classes τ2 to τ5 of ISO 9223, and between. */
  WET_HOURS(
      LayerStyle.steps("wet-hours", "h/a", ColourRamp.WATER, 250, 1000, 2500, 3500, 4500, 5500),
      air -> air.annual().wetHours()),
  /** Steps on the bounds of the salinity classes S0 to S3 of ISO 9223, and between. */
  CHLORIDE(
      LayerStyle.steps("chloride", "mg/(m² d)", ColourRamp.OXIDE, 3, 10, 30, 60, 150, 300),
      air -> air.chlorideDepositionMgPerM2Day().median()),
  NEAR_FREEZING_DAYS(
      LayerStyle.steps("near-freezing-days", "d/a", ColourRamp.WATER, 5, 20, 40, 70, 100, 140),
      air -> air.annual().nearFreezingDays());

  private final Optional<Metal> metal;
  private final LayerStyle style;
  private final ToDoubleFunction<AirClimate> value;

  MapLayer(Metal metal) {
    this.metal = Optional.of(metal);
    double[] limitsUm =
        Arrays.stream(Category.values())
            .filter(category -> category != Category.CX)
            .mapToDouble(category -> CategoryLimits.upperUm(metal, category))
            .toArray();
    this.style = LayerStyle.classes("class-" + metal.id(), limitsUm);
    this.value = air -> corrosivity(air, metal).firstYearLossUm().median();
  }

  MapLayer(LayerStyle style, ToDoubleFunction<AirClimate> value) {
    this.metal = Optional.empty();
    this.style = style;
    this.value = value;
  }

  /** The layer with this id; refused with the list of ids otherwise. */
  static MapLayer of(String id) {
    return Arrays.stream(values())
        .filter(layer -> layer.style.layer().equals(id))
        .findFirst()
        .orElseThrow(
            () ->
                Refusal.notFound(
                    "no-such-layer",
                    "layer",
                    "",
                    String.join(
                        ", ", Arrays.stream(values()).map(layer -> layer.style.layer()).toList())));
  }

  LayerStyle style() {
    return style;
  }

  /** The number that the layer shows, in the unit of its style's bounds. */
  double value(AirClimate air) {
    return value.applyAsDouble(air);
  }

  /** Probability of the likeliest class, 0..1; 1 for a layer that is not one of classes. */
  double sureness(AirClimate air) {
    return metal
        .map(
            which ->
                corrosivity(air, which).categoryProbability().values().stream()
                    .mapToDouble(Double::doubleValue)
                    .max()
                    .orElse(1))
        .orElse(1.0);
  }

  private static MetalCorrosivity corrosivity(AirClimate air, Metal metal) {
    return air.corrosivity().get(metal.ordinal());
  }
}
