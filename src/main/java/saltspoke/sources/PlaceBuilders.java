package saltspoke.sources;

import java.util.List;

/** The builders of all shapes and tables of places of the default world. */
public final class PlaceBuilders {
  private PlaceBuilders() {}

  public static List<LayerBuilder> all() {
    return List.of(
        new CoastBuilder(),
        new CountriesBuilder(),
        new RegionsBuilder(),
        new GazetteerBuilder(),
        new UsPostcodesBuilder(),
        new IndiaPostcodesBuilder(),
        new FrancePostcodesBuilder(),
        new ItalyPostcodesBuilder(),
        new GermanyPostcodesBuilder());
  }
}
