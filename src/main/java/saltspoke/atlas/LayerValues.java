package saltspoke.atlas;

import java.util.function.ToDoubleFunction;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.AirGlance;
import saltspoke.atmosphere.AirModel;
import saltspoke.atmosphere.AirOverrides;
import saltspoke.atmosphere.Metal;
import saltspoke.atmosphere.MonthClimate;
import saltspoke.places.Place;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceOverrides;

/**
 * The values of an atlas layer: at every point the answer that the same point gets when asked
 * alone, without interpolation. What a layer does not need is left out of the work.
 */
public final class LayerValues implements PointValues {
  private final PlaceDirectory places;
  private final ToDoubleFunction<Place> value;

  private LayerValues(PlaceDirectory places, ToDoubleFunction<Place> value) {
    this.places = places;
    this.value = value;
  }

  /** A layer that needs the air's annual means or its monthly climate. */
  public static LayerValues of(AtlasLayer layer, PlaceDirectory places, AirModel air) {
    return new LayerValues(places, value(layer, air));
  }

  /**
   * The months to the first look at a wheel.
   *
   * @param firstLookMonths of a pairing and profile in an air
   */
  public static LayerValues firstLook(
      PlaceDirectory places, AirModel air, ToDoubleFunction<AirClimate> firstLookMonths) {
    return new LayerValues(
        places, place -> firstLookMonths.applyAsDouble(air.at(place, AirOverrides.NONE)));
  }

  @Override
  public boolean isLand(double latitudeDeg, double longitudeDeg) {
    return places.isLand(latitudeDeg, longitudeDeg);
  }

  @Override
  public float at(double latitudeDeg, double longitudeDeg) {
    return isLand(latitudeDeg, longitudeDeg)
        ? (float) value.applyAsDouble(places.at(latitudeDeg, longitudeDeg, PlaceOverrides.NONE))
        : Float.NaN;
  }

  private static ToDoubleFunction<Place> value(AtlasLayer layer, AirModel air) {
    return switch (layer) {
      case CLASS_CARBON_STEEL, CLASS_ZINC, CLASS_COPPER, CLASS_ALUMINIUM -> {
        Metal metal = layer.metal().orElseThrow();
        yield place -> air.glance(place).category(metal).ordinal() + 1;
      }
      case LOSS_CARBON_STEEL, LOSS_ZINC, LOSS_COPPER, LOSS_ALUMINIUM -> {
        Metal metal = layer.metal().orElseThrow();
        yield place -> air.glance(place).loss(metal).um();
      }
      case TEMPERATURE -> annual(air, glance -> glance.exposure().temperatureC());
      case HUMIDITY -> annual(air, glance -> glance.exposure().relativeHumidityPct());
      case CHLORIDE -> annual(air, glance -> glance.exposure().chlorideMgPerM2Day());
      case SO2 -> annual(air, glance -> glance.exposure().so2MgPerM2Day());
      case WET_HOURS -> yearly(air, MonthClimate::wetHours);
      case NEAR_FREEZING_DAYS -> yearly(air, MonthClimate::nearFreezingDays);
      case FIRST_LOOK ->
          throw new IllegalArgumentException("the first look needs a pairing and a profile");
    };
  }

  private static ToDoubleFunction<Place> annual(AirModel air, ToDoubleFunction<AirGlance> value) {
    return place -> value.applyAsDouble(air.glance(place));
  }

  private static ToDoubleFunction<Place> yearly(
      AirModel air, ToDoubleFunction<MonthClimate> value) {
    return place -> air.months(place).stream().mapToDouble(value).sum();
  }
}
