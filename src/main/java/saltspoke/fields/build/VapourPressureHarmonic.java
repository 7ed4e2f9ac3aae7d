package saltspoke.fields.build;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import saltspoke.sources.LayerBuilder;
import saltspoke.sources.LayerFile;
import saltspoke.sources.LayerSink;
import saltspoke.sources.NumberGrid;
import saltspoke.sources.SourcePackages;

/**
 * Seasonal water-vapour pressure of Recommendation ITU-R P.834 from the text files in Orekit: X(d)
 * = a1 − a2·cos(2π(d − a3)/365.25), d the day of the year.
 */
final class VapourPressureHarmonic implements LayerBuilder {
  private static final String PACKAGE = "orekit";
  private static final double DAYS_PER_YEAR = 365.25;
  private static final int ROWS = 121;
  private static final int COLUMNS = 241;
  private static final double STEP_DEG = 1.5;

  @Override
  public String id() {
    return "vapour pressure harmonic";
  }

  @Override
  public List<String> needs() {
    return List.of(PACKAGE);
  }

  @Override
  public Optional<String> fallBack() {
    return Optional.of("there is no second opinion on humidity then");
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    Sheet mean = sheet(in, "vapr_gd_a1.dat");
    Sheet amplitude = sheet(in, "vapr_gd_a2.dat");
    Sheet day = sheet(in, "vapr_gd_a3.dat");
    List<Sheet> bands = new ArrayList<>();
    bands.add(mean.roundTo(1 / 128.0));
    bands.add(amplitude.roundTo(1 / 128.0));
    bands.add(day.roundTo(1 / 4.0));
    bands.add(part(amplitude, day, true));
    bands.add(part(amplitude, day, false));
    RasterLayer.write(
        out,
        new LayerFile(
            "vapour-pressure-harmonic",
            "itu/vapour-pressure-harmonic.tif",
            "Mean water-vapour pressure at the ground and its course over the year, 1.5°",
            "hPa",
            "long-term mean",
            List.of("mean", "amplitude", "day-of-minimum", "cosine", "sine"),
            ItuMaps.LICENCE,
            "© International Telecommunication Union, Recommendation ITU-R P.834, by way of Orekit",
            "X(d) = mean - amplitude cos(2 pi (d - day)/365.25). The day (unit d) must not be"
                + " interpolated, it jumps at new year: between points use X(d) = mean + cosine"
                + " cos(2 pi d/365.25) + sine sin(2 pi d/365.25)."),
        bands);
  }

  private static Sheet part(Sheet amplitude, Sheet day, boolean cosine) {
    double[] values = new double[amplitude.grid().rows() * amplitude.grid().columns()];
    for (int i = 0; i < values.length; i++) {
      int row = i / amplitude.grid().columns();
      int column = i % amplitude.grid().columns();
      double phase = 2 * Math.PI * day.at(row, column) / DAYS_PER_YEAR;
      values[i] = -amplitude.at(row, column) * (cosine ? Math.cos(phase) : Math.sin(phase));
    }
    return new Sheet(amplitude.grid(), values).roundTo(1 / 128.0);
  }

  private static Sheet sheet(SourcePackages in, String name) throws IOException {
    double[] values = NumberGrid.read(in.open(PACKAGE, "ITU-R-P.834/" + name), name, ROWS, COLUMNS);
    return Sheet.world(90, -STEP_DEG, 0, STEP_DEG, ROWS, COLUMNS, values);
  }
}
