package saltspoke.fields.build;

import java.io.IOException;
import java.util.List;
import saltspoke.sources.LayerBuilder;
import saltspoke.sources.LayerFile;
import saltspoke.sources.LayerSink;
import saltspoke.sources.NetcdfClassic;
import saltspoke.sources.SourcePackages;

/**
 * Monthly marine climate of COADS, 2°, from ship reports. The reports are uneven: single cells are
 * tamed by a 3 × 3 median, empty ones filled from around, over land too, so that a coastal place
 * reads the sea next to it.
 */
final class MarineClimate implements LayerBuilder {
  private record Quantity(String variable, String layer, String title, String unit) {}

  private static final List<Quantity> QUANTITIES =
      List.of(
          new Quantity("WSPD", "marine-wind-speed", "Monthly mean wind speed over the sea", "m/s"),
          new Quantity("UWND", "marine-wind-u", "Monthly mean eastward wind over the sea", "m/s"),
          new Quantity("VWND", "marine-wind-v", "Monthly mean northward wind over the sea", "m/s"),
          new Quantity(
              "AIRT",
              "marine-air-temperature",
              "Monthly mean air temperature over the sea",
              "degC"),
          new Quantity(
              "SPEH",
              "marine-specific-humidity",
              "Monthly mean specific humidity over the sea",
              "g/kg"),
          new Quantity(
              "SST", "sea-surface-temperature", "Monthly mean sea surface temperature", "degC"),
          new Quantity("SLP", "marine-pressure", "Monthly mean pressure at sea level", "hPa"));

  @Override
  public String id() {
    return "marine climate";
  }

  @Override
  public List<String> needs() {
    return List.of(NetcdfSheets.PACKAGE);
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    NetcdfClassic file = NetcdfSheets.open(in, "coads_climatology.cdf");
    for (Quantity quantity : QUANTITIES) {
      double step = quantity.unit().equals("hPa") ? 1 / 8.0 : 1 / 32.0;
      List<Sheet> months =
          NetcdfSheets.read(file, quantity.variable()).stream()
              .map(sheet -> sheet.median3().fill().roundTo(step))
              .toList();
      RasterLayer.write(
          out,
          new LayerFile(
              quantity.layer(),
              "marine/" + quantity.layer() + ".tif",
              quantity.title() + ", 2°",
              quantity.unit(),
              "1946–1989",
              RasterLayer.MONTHS,
              NetcdfSheets.LICENCE,
              "NOAA COADS climatology, as distributed with Ferret (NOAA/PMEL/TMAP)",
              "Median of 3 × 3 cells; empty cells, land among them, filled ring by ring with the"
                  + " mean of their neighbours and smoothed. A value on land is that of the nearest"
                  + " seas and says nothing about the land."),
          months);
    }
  }
}
