package saltspoke.fields.build;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import saltspoke.fields.Grid;
import saltspoke.sources.LayerBuilder;
import saltspoke.sources.LayerFile;
import saltspoke.sources.LayerSink;
import saltspoke.sources.NetcdfClassic;
import saltspoke.sources.SourcePackages;

/**
 * Monthly wind vectors on land and sea, 2.5°, from eleven years of monthly means of the US Navy's
 * Fleet Numerical Oceanography Center. Directions are good, speeds understated, being means of
 * vectors.
 */
final class WindDirection implements LayerBuilder {
  @Override
  public String id() {
    return "wind direction";
  }

  @Override
  public List<String> needs() {
    return List.of(NetcdfSheets.PACKAGE);
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    NetcdfClassic file = NetcdfSheets.open(in, "monthly_navy_winds.cdf");
    List<Sheet> east = NetcdfSheets.read(file, "UWND");
    List<Sheet> north = NetcdfSheets.read(file, "VWND");
    Grid grid = east.get(0).grid();
    int size = grid.rows() * grid.columns();
    List<Sheet> meanEast = new ArrayList<>();
    List<Sheet> meanNorth = new ArrayList<>();
    List<Sheet> steadiness = new ArrayList<>();
    for (int month = 0; month < 12; month++) {
      double[] u = new double[size];
      double[] v = new double[size];
      double[] steady = new double[size];
      for (int i = 0; i < size; i++) {
        int row = i / grid.columns();
        int column = i % grid.columns();
        double length = 0;
        int years = 0;
        for (int step = month; step < east.size(); step += 12) {
          double eastward = east.get(step).at(row, column);
          double northward = north.get(step).at(row, column);
          if (!Double.isNaN(eastward) && !Double.isNaN(northward)) {
            u[i] += eastward;
            v[i] += northward;
            length += Math.hypot(eastward, northward);
            years++;
          }
        }
        steady[i] = length > 0 ? Math.hypot(u[i], v[i]) / length : 0;
        u[i] = years > 0 ? u[i] / years : Double.NaN;
        v[i] = years > 0 ? v[i] / years : Double.NaN;
      }
      meanEast.add(new Sheet(grid, u).roundTo(1 / 32.0));
      meanNorth.add(new Sheet(grid, v).roundTo(1 / 32.0));
      steadiness.add(new Sheet(grid, steady).roundTo(1 / 128.0));
    }
    write(out, "wind-direction-monthly-u", "Monthly mean eastward wind, 2.5°", "m/s", meanEast);
    write(out, "wind-direction-monthly-v", "Monthly mean northward wind, 2.5°", "m/s", meanNorth);
    write(
        out,
        "wind-direction-monthly-steadiness",
        "Steadiness of the monthly wind from year to year, 2.5°",
        "1",
        steadiness);
  }

  private static void write(
      LayerSink out, String layer, String title, String unit, List<Sheet> months)
      throws IOException {
    String remark =
        unit.equals("1")
            ? "Length of the mean vector over the mean length of the eleven monthly vectors: 1 when"
                + " the wind of this month blows alike every year."
            : "Mean of eleven monthly mean vectors: use its direction, the speed is understated."
                + " Years as the file's own time axis has them.";
    RasterLayer.write(
        out,
        new LayerFile(
            layer,
            "wind/" + layer + ".tif",
            title,
            unit,
            "1982–1992",
            IntStream.rangeClosed(1, 12).mapToObj(String::valueOf).toList(),
            NetcdfSheets.LICENCE,
            "US Navy Fleet Numerical Oceanography Center monthly winds, as distributed with Ferret"
                + " (NOAA/PMEL/TMAP)",
            remark),
        months);
  }
}
