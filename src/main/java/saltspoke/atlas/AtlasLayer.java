package saltspoke.atlas;

import java.util.Optional;
import saltspoke.atmosphere.Metal;

/** What an atlas can show: one number per cell. */
public enum AtlasLayer {
  /** Number of the ISO 9223 category of the median loss: 1 for C1 to 6 for CX. */
  CLASS_CARBON_STEEL("class-carbon-steel", "class 1 C1 .. 6 CX", Metal.CARBON_STEEL),
  CLASS_ZINC("class-zinc", "class 1 C1 .. 6 CX", Metal.ZINC),
  CLASS_COPPER("class-copper", "class 1 C1 .. 6 CX", Metal.COPPER),
  CLASS_ALUMINIUM("class-aluminium", "class 1 C1 .. 6 CX", Metal.ALUMINIUM),
  /** Median first-year loss by ISO 9223. */
  LOSS_CARBON_STEEL("loss-carbon-steel", "um", Metal.CARBON_STEEL),
  LOSS_ZINC("loss-zinc", "um", Metal.ZINC),
  LOSS_COPPER("loss-copper", "um", Metal.COPPER),
  LOSS_ALUMINIUM("loss-aluminium", "um", Metal.ALUMINIUM),
  /** Annual means. */
  TEMPERATURE("temperature", "degC", null),
  HUMIDITY("humidity", "%", null),
  CHLORIDE("chloride", "mg/(m2 d)", null),
  SO2("so2", "mg/(m2 d)", null),
  /** Hours a year above 80 % and 0 °C. */
  WET_HOURS("wet-hours", "h/a", null),
  /** Days a year with minimum below 1 °C and maximum above −5 °C. */
  NEAR_FREEZING_DAYS("near-freezing-days", "d/a", null),
  /** Months from now to the first look, for one pairing and profile. */
  FIRST_LOOK("first-look", "months", null);

  private final String id;
  private final String unit;
  private final Metal metal;

  AtlasLayer(String id, String unit, Metal metal) {
    this.id = id;
    this.unit = unit;
    this.metal = metal;
  }

  /** Name used on the command line and in files. */
  public String id() {
    return id;
  }

  /** Unit in ASCII, as it stands in the files' metadata. */
  public String unit() {
    return unit;
  }

  /** The metal that the layer is about, if it is about one. */
  public Optional<Metal> metal() {
    return Optional.ofNullable(metal);
  }

  /** Whether the values are whole numbers of classes, not of a quantity. */
  public boolean ofClasses() {
    return ordinal() <= CLASS_ALUMINIUM.ordinal();
  }
}
