package saltspoke.sources;

import java.util.List;

/** The builders of the shipped vector layers and tables, in the order in which they are built. */
public final class PlaceBuilders {
  private PlaceBuilders() {}

  public static List<LayerBuilder> all() {
    return List.of(
        new CoastBuilder(),
        new CountriesBuilder(),
        new GazetteerBuilder(),
        new UsPostcodesBuilder(),
        new IndiaPostcodesBuilder(),
        new FrancePostcodesBuilder(),
        new ItalyPostcodesBuilder(),
        new GermanyPostcodesBuilder());
  }
}
