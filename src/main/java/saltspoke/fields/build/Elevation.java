package saltspoke.fields.build;

import java.io.IOException;
import java.util.List;
import saltspoke.fields.Grid;
import saltspoke.sources.LayerBuilder;
import saltspoke.sources.LayerFile;
import saltspoke.sources.LayerSink;
import saltspoke.sources.SourcePackages;

/**
 * Height of the land from ETOPO5: at 10′ for places, and as means over the cells of the temperature
 * maps, which carry no height field of their own.
 */
final class Elevation implements LayerBuilder {
  @Override
  public String id() {
    return "elevation";
  }

  @Override
  public List<String> needs() {
    return List.of(NetcdfSheets.PACKAGE);
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    Sheet relief = NetcdfSheets.read(NetcdfSheets.open(in, "etopo5.cdf"), "ROSE").get(0);
    Sheet land = relief.map(v -> v < 0 ? 0 : v);
    RasterLayer.write(
        out,
        file(
            "elevation",
            "Height of the land, 10′",
            "Mean of the 5′ heights within 5′ around each point, weighted 1-2-1 each way; the sea"
                + " counts as 0, so does land below sea level."),
        List.of(pointMean(land, 2, 1).roundTo(1)));
    RasterLayer.write(
        out,
        file(
            "temperature-height",
            "Height of the ground that goes with the temperature maps, 0.75°",
            "Mean of the 5′ heights over each cell of the layer temperature-monthly, the sea as 0:"
                + " the maps come without the height field of their model."),
        List.of(pointMean(land, 9, 8).roundTo(1)));
  }

  /**
   * Means around every {@code stride}-th point with weights that fall off linearly to nothing one
   * step beyond {@code reach} points.
   */
  private static Sheet pointMean(Sheet fine, int stride, int reach) {
    Grid from = fine.grid();
    int rows = (from.rows() - 1) / stride + 1;
    int columns = from.columns() / stride;
    double[] means = new double[rows * columns];
    for (int row = 0; row < rows; row++) {
      for (int column = 0; column < columns; column++) {
        double sum = 0;
        double weights = 0;
        for (int dy = -reach; dy <= reach; dy++) {
          int y = row * stride + dy;
          if (y < 0 || y >= from.rows()) {
            continue;
          }
          for (int dx = -reach; dx <= reach; dx++) {
            double weight = (reach + 1 - Math.abs(dy)) * (double) (reach + 1 - Math.abs(dx));
            sum += weight * fine.at(y, column * stride + dx);
            weights += weight;
          }
        }
        means[row * columns + column] = sum / weights;
      }
    }
    return new Sheet(
        Grid.of(
            from.northDeg(),
            from.westDeg(),
            from.stepLatDeg() * stride,
            from.stepLonDeg() * stride,
            rows,
            columns),
        means);
  }

  private static LayerFile file(String layer, String title, String remark) {
    return new LayerFile(
        layer,
        "elevation/" + layer + ".tif",
        title,
        "m",
        "",
        List.of("height"),
        NetcdfSheets.LICENCE,
        "NOAA ETOPO5, as distributed with Ferret (NOAA/PMEL/TMAP)",
        remark);
  }
}
