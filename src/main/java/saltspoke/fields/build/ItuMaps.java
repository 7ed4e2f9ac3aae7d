package saltspoke.fields.build;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.UnaryOperator;
import saltspoke.sources.LayerBuilder;
import saltspoke.sources.LayerFile;
import saltspoke.sources.LayerSink;
import saltspoke.sources.NumpyArray;
import saltspoke.sources.SourcePackages;
import saltspoke.values.Refusal;

/**
 * Digital maps of Recommendations ITU-R P.1510-1 (monthly temperature), P.836-6 (water-vapour
 * density and its scale height) and P.837-7 (monthly rain), from the NumPy files of the Python
 * package itur.
 */
final class ItuMaps implements LayerBuilder {
  static final String LICENCE = "maps © ITU, published free of charge, no open licence stated";
  private static final String PACKAGE = "itur";
  private static final String DATA = "itur/data/";

  /** Kelvin at 0 °C (SI Brochure, 9th edition, 2.3.1). */
  private static final double ZERO_CELSIUS_K = 273.15;

  /** Exceedance levels of P.836-6, % of an average year, as band label → part of the file name. */
  private static final List<String> LEVELS =
      List.of(
          "0.1", "0.2", "0.3", "0.5", "1", "2", "3", "5", "10", "20", "30", "50", "60", "70", "80",
          "90", "95", "99");

  @Override
  public String id() {
    return "ITU-R climate maps";
  }

  @Override
  public List<String> needs() {
    return List.of(PACKAGE);
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    Map<String, NumpyArray> arrays = read(in);
    temperature(arrays, out);
    vapour(arrays, out);
    topography(arrays, out);
    rain(arrays, out);
    notice(out);
  }

  private static Map<String, NumpyArray> read(SourcePackages in) throws IOException {
    Map<String, NumpyArray> arrays = new HashMap<>();
    in.each(
        PACKAGE,
        path ->
            path.matches(
                ".*/data/(1510/v1_(lat|lon|t_month\\d\\d)"
                    + "|836/v6_(lat|lon|topo\\w*|rho_\\d+|vsch_\\d+)"
                    + "|837/v7_(lat_mt|lon_mt|mt_month\\d\\d))\\.npz"),
        (path, content) ->
            arrays.put(
                path.substring(path.indexOf(DATA) + DATA.length()),
                NumpyArray.fromNpz(content.readAllBytes(), path)));
    return arrays;
  }

  private static void temperature(Map<String, NumpyArray> arrays, LayerSink out)
      throws IOException {
    List<Sheet> months = new ArrayList<>();
    for (int month = 1; month <= 12; month++) {
      String name = String.format(Locale.ROOT, "1510/v1_t_month%02d.npz", month);
      Sheet kelvin = sheet(arrays, "1510/v1_lat.npz", "1510/v1_lon.npz", name);
      months.add(kelvin.map(k -> k - ZERO_CELSIUS_K).roundTo(1 / 16.0));
    }
    RasterLayer.write(
        out,
        file(
            "temperature-monthly",
            "Monthly mean air temperature 2 m above the ground, 0.75°",
            "degC",
            "1979–2014",
            RasterLayer.MONTHS,
            "P.1510-1",
            "At the height of the reanalysis model's own ground; go to a site's height with the"
                + " layer temperature-height. Rounded to 1/16 K."),
        months);
  }

  private static void vapour(Map<String, NumpyArray> arrays, LayerSink out) throws IOException {
    Map<String, UnaryOperator<Sheet>> rounding =
        Map.of("rho", s -> s.roundToBits(8, 1 / 256.0), "vsch", s -> s.roundToBits(7, 1 / 128.0));
    Map<String, List<Sheet>> bands = new HashMap<>();
    for (String level : LEVELS) {
      String part = level.replace(".", "");
      // 0.1 to 0.5 % are written 01 to 05 in the file names.
      for (String quantity : rounding.keySet()) {
        Sheet raw =
            sheet(
                arrays,
                "836/v6_lat.npz",
                "836/v6_lon.npz",
                "836/v6_" + quantity + "_" + part + ".npz");
        bands
            .computeIfAbsent(quantity, k -> new ArrayList<>())
            .add(rounding.get(quantity).apply(raw.fill()));
      }
    }
    RasterLayer.write(
        out,
        file(
            "vapour-density-exceedance",
            "Surface water-vapour density exceeded in a share of an average year, 1.125°",
            "g/m3",
            "long-term mean",
            LEVELS,
            "P.836-6",
            "Bands: % of the year. At the height of the layer vapour-topography; density falls off"
                + " with exp(-height difference/scale height). 287 missing points next to the north"
                + " pole filled from their neighbours. Rounded to 8 binary digits."),
        bands.get("rho"));
    RasterLayer.write(
        out,
        file(
            "vapour-scale-height",
            "Scale height of water vapour at the same shares of an average year, 1.125°",
            "km",
            "long-term mean",
            LEVELS,
            "P.836-6",
            "Bands: % of the year. Missing points filled likewise. Rounded to 7 binary digits."),
        bands.get("vsch"));
  }

  private static void topography(Map<String, NumpyArray> arrays, LayerSink out) throws IOException {
    NumpyArray lat = array(arrays, "836/v6_topolat.npz");
    NumpyArray lon = array(arrays, "836/v6_topolon.npz");
    NumpyArray km = array(arrays, "836/v6_topo_0dot5.npz");
    // The map carries a margin of one point around the world; the margin is left out.
    int rows = km.shape()[0] - 2;
    int columns = km.shape()[1] - 2;
    Sheet metres =
        Sheet.world(
                lat.values()[km.shape()[1]],
                lat.values()[km.shape()[1]] - lat.values()[0],
                lon.values()[1],
                lon.values()[1] - lon.values()[0],
                rows,
                columns,
                km.inner(1))
            .map(v -> Math.rint(v * 1000));
    RasterLayer.write(
        out,
        file(
            "vapour-topography",
            "Height of the ground that the water-vapour maps stand on, 0.5°",
            "m",
            "",
            List.of("height"),
            "P.836-6",
            "The topography that P.836-6 itself interpolates with (ITU-R P.1511)."),
        List.of(metres));
  }

  private static void rain(Map<String, NumpyArray> arrays, LayerSink out) throws IOException {
    NumpyArray lat = array(arrays, "837/v7_lat_mt.npz");
    NumpyArray lon = array(arrays, "837/v7_lon_mt.npz");
    List<Sheet> months = new ArrayList<>();
    for (int month = 1; month <= 12; month++) {
      NumpyArray mm = array(arrays, String.format(Locale.ROOT, "837/v7_mt_month%02d.npz", month));
      // Here too the margin of one cell around the world is left out.
      Sheet quarter =
          Sheet.world(
              lat.values()[mm.shape()[1]],
              lat.values()[mm.shape()[1]] - lat.values()[0],
              lon.values()[1],
              lon.values()[1] - lon.values()[0],
              mm.shape()[0] - 2,
              mm.shape()[1] - 2,
              mm.inner(1));
      months.add(quarter.blockMean(2).roundToBits(5, 0.5));
    }
    RasterLayer.write(
        out,
        file(
            "rain-monthly",
            "Mean monthly total of rain, 0.5°",
            "mm",
            "long-term mean",
            RasterLayer.MONTHS,
            "P.837-7",
            "Area means of 2 × 2 cells of 0.25°. Rounded to 5 binary digits, not finer than"
                + " 0.5 mm."),
        months);
  }

  private static void notice(LayerSink out) throws IOException {
    LayerFile file =
        new LayerFile(
            "itu-notice",
            "itu/notice.txt",
            "Terms of the maps in this folder",
            "",
            "",
            List.of(),
            LICENCE,
            "© International Telecommunication Union",
            "");
    try (OutputStream text = out.file(file)) {
      text.write(
          """
          The maps in this folder are made from the digital maps that go with Recommendations of the
          International Telecommunication Union, Radiocommunication Sector: P.834 (vapour pressure),
          P.836-6 (water-vapour density), P.837-7 (rain), P.1510-1 (temperature) and P.1511-2 (height).
          © International Telecommunication Union.

          The ITU publishes these maps free of charge together with the Recommendations. Others pass
          them on: the Python package itur (MIT) and the Java library Orekit (Apache-2.0), from which
          they were taken here. The ITU itself states no open licence for them.

          They are therefore kept apart from the other data, in this folder, and the whole climate
          layer can be replaced by one ingest of data under an open licence, such as CRU CL 2.0,
          WorldClim or ERA5.

          Changed: converted to GeoTIFF, turned to north first and -180 to 180 degrees, rounded, rain
          averaged to 0.5 degrees, missing points next to the north pole filled.
          """
              .getBytes(StandardCharsets.UTF_8));
    }
  }

  private static Sheet sheet(
      Map<String, NumpyArray> arrays, String latName, String lonName, String name) {
    NumpyArray lat = array(arrays, latName);
    NumpyArray lon = array(arrays, lonName);
    NumpyArray map = array(arrays, name);
    int columns = map.shape()[1];
    return Sheet.world(
        lat.values()[0],
        lat.values()[columns] - lat.values()[0],
        lon.values()[0],
        lon.values()[1] - lon.values()[0],
        map.shape()[0],
        columns,
        map.values());
  }

  private static NumpyArray array(Map<String, NumpyArray> arrays, String name) {
    NumpyArray array = arrays.get(name);
    if (array == null) {
      throw Refusal.dataDamaged(
          "missing-entry", PACKAGE + " " + name, "", "itur 0.4.0, which holds this file");
    }
    return array;
  }

  private static LayerFile file(
      String layer,
      String title,
      String unit,
      String period,
      List<String> bands,
      String recommendation,
      String remark) {
    return new LayerFile(
        layer,
        "itu/" + layer + ".tif",
        title,
        unit,
        period,
        bands,
        LICENCE,
        "© International Telecommunication Union, Recommendation ITU-R "
            + recommendation
            + ", by way of the Python package itur",
        remark);
  }
}
