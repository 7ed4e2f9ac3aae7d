package saltspoke.faces.web;

import java.util.Arrays;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import saltspoke.atlas.AtlasLayer;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.Metal;
import saltspoke.atmosphere.MetalCorrosivity;
import saltspoke.faces.picture.LayerStyle;
import saltspoke.faces.picture.LayerStyles;
import saltspoke.values.Refusal;

/** What the map can show: each layer is a number of the air at a place, and how it is drawn. */
enum MapLayer {
  CLASS_CARBON_STEEL(Metal.CARBON_STEEL),
  CLASS_ZINC(Metal.ZINC),
  CLASS_COPPER(Metal.COPPER),
  CLASS_ALUMINIUM(Metal.ALUMINIUM),
  WET_HOURS(AtlasLayer.WET_HOURS, air -> air.annual().wetHours()),
  CHLORIDE(AtlasLayer.CHLORIDE, air -> air.chlorideDepositionMgPerM2Day().median()),
  NEAR_FREEZING_DAYS(AtlasLayer.NEAR_FREEZING_DAYS, air -> air.annual().nearFreezingDays());

  private final Optional<Metal> metal;
  private final LayerStyle style;
  private final ToDoubleFunction<AirClimate> value;

  MapLayer(Metal metal) {
    this.metal = Optional.of(metal);
    this.style = LayerStyles.classesOfLoss(metal);
    this.value = air -> corrosivity(air, metal).firstYearLossUm().median();
  }

  MapLayer(AtlasLayer layer, ToDoubleFunction<AirClimate> value) {
    this.metal = Optional.empty();
    this.style = LayerStyles.of(layer);
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
