package saltspoke.fields.build;

import java.io.IOException;
import java.util.List;
import saltspoke.fields.Grid;
import saltspoke.sources.LayerBuilder;
import saltspoke.sources.LayerFile;
import saltspoke.sources.LayerSink;
import saltspoke.sources.NumpyArray;
import saltspoke.sources.SourcePackages;

/**
 * Height of the land from the 5′ topography of Recommendation ITU-R P.1511-2: at 10′ for places,
 * and as means around the points of the temperature maps, which carry no height field of their own.
 */
final class Elevation implements LayerBuilder {
  private static final String PACKAGE = "itur";

  /** Points of margin around the world in the file. */
  private static final int MARGIN = 2;

  @Override
  public String id() {
    return "elevation";
  }

  @Override
  public List<String> needs() {
    return List.of(PACKAGE);
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    NumpyArray metres = NumpyArray.fromNpz(in.bytes(PACKAGE, "1511/v2_topo.npz"), "v2_topo.npz");
    int columns = metres.shape()[1] - 2 * MARGIN;
    double stepDeg = 360.0 / columns;
    Sheet land =
        Sheet.world(
            90 - stepDeg / 2,
            -stepDeg,
            -180 + stepDeg / 2,
            stepDeg,
            metres.shape()[0] - 2 * MARGIN,
            columns,
            metres.inner(MARGIN));
    RasterLayer.write(
        out,
        file("elevation", "Height of the land, 10′", "Means of 2 × 2 cells of 5′; the sea is 0."),
        List.of(land.blockMean(2).roundTo(1)));
    RasterLayer.write(
        out,
        file(
            "temperature-height",
            "Height of the ground that goes with the temperature maps, 0.75°",
            "Mean of the 5′ heights around each point of the layer temperature-monthly, with weights"
                + " that fall to nothing one step of 0.75° away; the sea is 0. The maps come without"
                + " the height field of their own model."),
        List.of(around(land, Grid.of(90, -180, 0.75, 0.75, 241, 480)).roundTo(1)));
  }

  /** Means around the points of another grid, weights falling linearly to nothing one step away. */
  private static Sheet around(Sheet fine, Grid target) {
    Grid from = fine.grid();
    double[] means = new double[target.rows() * target.columns()];
    int reach = (int) Math.ceil(target.stepLatDeg() / from.stepLatDeg());
    for (int i = 0; i < means.length; i++) {
      double latitudeDeg = target.latitudeDeg(i / target.columns());
      double longitudeDeg = target.longitudeDeg(i % target.columns());
      int middleRow = (int) Math.round((from.northDeg() - latitudeDeg) / from.stepLatDeg());
      int middleColumn = (int) Math.round((longitudeDeg - from.westDeg()) / from.stepLonDeg());
      double sum = 0;
      double weights = 0;
      for (int row = Math.max(0, middleRow - reach);
          row <= Math.min(from.rows() - 1, middleRow + reach);
          row++) {
        double north = Math.abs(from.latitudeDeg(row) - latitudeDeg) / target.stepLatDeg();
        for (int column = middleColumn - reach; column <= middleColumn + reach; column++) {
          double east = Math.abs(from.longitudeDeg(column) - longitudeDeg) / target.stepLonDeg();
          double weight = Math.max(0, 1 - north) * Math.max(0, 1 - east);
          sum += weight * fine.at(row, column);
          weights += weight;
        }
      }
      means[i] = sum / weights;
    }
    return new Sheet(target, means);
  }

  private static LayerFile file(String layer, String title, String remark) {
    return new LayerFile(
        layer,
        "itu/" + layer + ".tif",
        title,
        "m",
        "",
        List.of("height"),
        ItuMaps.LICENCE,
        "© International Telecommunication Union, Recommendation ITU-R P.1511-2, by way of the"
            + " Python package itur",
        remark);
  }
}
