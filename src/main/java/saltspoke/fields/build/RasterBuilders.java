package saltspoke.fields.build;

import java.util.List;
import saltspoke.sources.LayerBuilder;

/** The builders of all raster layers of the default world. */
public final class RasterBuilders {
  private RasterBuilders() {}

  public static List<LayerBuilder> all() {
    return List.of(
        new ItuMaps(),
        new VapourPressureHarmonic(),
        new MarineClimate(),
        new WindDirection(),
        new Elevation(),
        new NightLights());
  }
}
