package saltspoke.atlas;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.EnumMap;
import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.AirModel;
import saltspoke.atmosphere.AirOverrides;
import saltspoke.atmosphere.Metal;
import saltspoke.atmosphere.MetalCorrosivity;
import saltspoke.fields.DataSet;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceOverrides;

/** A map and an answer about one point cannot disagree. */
@Tag("law")
class LayerValuesTest {
  private static final DataSet DATA = DataSet.shipped();
  private static final PlaceDirectory PLACES = PlaceDirectory.open(DATA);
  private static final AirModel AIR = AirModel.from(DATA);

  /** Half the last digit of a 32-bit number, relative. */
  private static final double FLOAT = Math.pow(2, -24);

  @Test
  void everyLayerGivesWhatThePointGetsWhenAskedAlone() {
    Map<AtlasLayer, PointValues> layers = new EnumMap<>(AtlasLayer.class);
    for (AtlasLayer layer : AtlasLayer.values()) {
      if (layer != AtlasLayer.FIRST_LOOK) {
        layers.put(layer, LayerValues.of(layer, PLACES, AIR));
      }
    }
    int land = 0;
    // Steps that share no factor with any grid, so that no sample stands on a grid point.
    for (double lat = -61.3; lat < 80; lat += 8.77) {
      for (double lon = -179.1; lon < 180; lon += 12.31) {
        if (PLACES.isLand(lat, lon)) {
          land++;
          AirClimate answer = AIR.at(PLACES.at(lat, lon, PlaceOverrides.NONE), AirOverrides.NONE);
          for (Map.Entry<AtlasLayer, PointValues> layer : layers.entrySet()) {
            double expected = expected(layer.getKey(), answer);
            assertEquals(
                expected,
                layer.getValue().at(lat, lon),
                FLOAT * Math.abs(expected),
                layer.getKey() + " at " + lat + "," + lon);
          }
        } else {
          assertTrue(Float.isNaN(layers.get(AtlasLayer.TEMPERATURE).at(lat, lon)));
        }
      }
    }
    assertTrue(land > 100, "only " + land + " points on land");
  }

  private static double expected(AtlasLayer layer, AirClimate answer) {
    return switch (layer) {
      case TEMPERATURE -> answer.annual().temperatureC();
      case HUMIDITY -> answer.annual().relativeHumidityPct();
      case CHLORIDE -> answer.chlorideDepositionMgPerM2Day().median();
      case SO2 -> answer.so2DepositionMgPerM2Day().median();
      case WET_HOURS -> answer.annual().wetHours();
      case NEAR_FREEZING_DAYS -> answer.annual().nearFreezingDays();
      default -> {
        Metal metal = layer.metal().orElseThrow();
        MetalCorrosivity found = answer.corrosivity().get(metal.ordinal());
        yield layer.ofClasses() ? found.category().ordinal() + 1 : found.firstYearLossUm().median();
      }
    };
  }
}
