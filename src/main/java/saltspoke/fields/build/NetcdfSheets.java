package saltspoke.fields.build;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import saltspoke.sources.NetcdfClassic;
import saltspoke.sources.SourcePackages;

/** Sheets from the netCDF files of the Debian package ferret-datasets. */
final class NetcdfSheets {
  static final String PACKAGE = "ferret-datasets";
  static final String LICENCE = "public domain (United States government)";

  private NetcdfSheets() {}

  static NetcdfClassic open(SourcePackages in, String fileName) throws IOException {
    return new NetcdfClassic(in.bytes(PACKAGE, fileName), fileName);
  }

  /**
   * All time steps of a variable on (time, latitude, longitude), or one of (latitude, longitude).
   */
  static List<Sheet> read(NetcdfClassic file, String variable) {
    List<NetcdfClassic.Dimension> dimensions = file.variable(variable).dimensions();
    int rank = dimensions.size();
    NetcdfClassic.Dimension lat = dimensions.get(rank - 2);
    NetcdfClassic.Dimension lon = dimensions.get(rank - 1);
    double[] latDeg = file.values(lat.name());
    double[] lonDeg = file.values(lon.name());
    double[] values = file.values(variable);
    int size = lat.length() * lon.length();
    List<Sheet> sheets = new ArrayList<>();
    for (int start = 0; start < values.length; start += size) {
      double[] one = new double[size];
      System.arraycopy(values, start, one, 0, size);
      sheets.add(
          Sheet.world(
              latDeg[0], step(latDeg), lonDeg[0], step(lonDeg), lat.length(), lon.length(), one));
    }
    return sheets;
  }

  /**
   * Step of an evenly spaced axis. The files' axes carry rounding noise (0.33333 written seven
   * digits long); the step is taken as the nearest whole fraction of a degree or number of half
   * degrees.
   */
  private static double step(double[] axisDeg) {
    double raw = (axisDeg[axisDeg.length - 1] - axisDeg[0]) / (axisDeg.length - 1);
    return Math.abs(raw) < 0.5
        ? Math.signum(raw) / Math.rint(1 / Math.abs(raw))
        : Math.rint(raw * 2) / 2;
  }
}
