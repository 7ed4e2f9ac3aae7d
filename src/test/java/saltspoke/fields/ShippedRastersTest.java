package saltspoke.fields;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.Raster;
import java.io.IOException;
import java.util.List;
import org.geotools.api.geometry.Bounds;
import org.geotools.coverage.grid.GridCoverage2D;
import org.geotools.gce.geotiff.GeoTiffReader;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** The shipped rasters: read alike by two readers, the right way up, and physically ordered. */
@Tag("law")
class ShippedRastersTest {
  private static DataSet data;

  @BeforeAll
  static void open() {
    data = DataSet.shipped();
  }

  private static List<Manifest.Entry> rasters() {
    return data.manifest().files().stream().filter(f -> f.path().endsWith(".tif")).toList();
  }

  @Test
  void geotoolsReadsTheSame() throws IOException {
    assertTrue(rasters().size() >= 17);
    for (Manifest.Entry entry : rasters()) {
      FieldStack stack = data.stack(entry.layer());
      Grid grid = stack.band(0).grid();
      GeoTiffReader reader = new GeoTiffReader(data.open(entry.layer()));
      GridCoverage2D coverage = reader.read(null);
      Bounds bounds = coverage.getEnvelope();
      // EPSG:4326 as GeoTools reads it from a GeoTIFF: longitude first.
      assertEquals(grid.westDeg() - grid.stepLonDeg() / 2, bounds.getMinimum(0), 1e-6);
      assertEquals(grid.northDeg() + grid.stepLatDeg() / 2, bounds.getMaximum(1), 1e-6);
      assertEquals(grid.columns() * grid.stepLonDeg(), bounds.getSpan(0), 1e-6);
      assertEquals(grid.rows() * grid.stepLatDeg(), bounds.getSpan(1), 1e-6);
      Raster raster = coverage.getRenderedImage().getData();
      assertEquals(stack.size(), raster.getNumBands(), entry.layer());
      for (int band = 0; band < stack.size(); band++) {
        for (int row = 0; row < grid.rows(); row += 7) {
          for (int column = row % 5; column < grid.columns(); column += 5) {
            assertEquals(
                raster.getSampleDouble(column, row, band),
                stack.band(band).at(row, column),
                entry.layer());
          }
        }
      }
      coverage.dispose(true);
      reader.dispose();
    }
  }

  @Test
  void everyPointHasAValueAndEveryWorldWraps() {
    for (Manifest.Entry entry : rasters()) {
      FieldStack stack = data.stack(entry.layer());
      Grid grid = stack.band(0).grid();
      assertTrue(grid.wrapsLongitude(), entry.layer());
      for (int band = 0; band < stack.size(); band++) {
        for (int row = 0; row < grid.rows(); row++) {
          for (int column = 0; column < grid.columns(); column++) {
            assertTrue(Double.isFinite(stack.band(band).at(row, column)), entry.layer());
          }
        }
      }
    }
  }

  @Test
  void mapsStandTheRightWayUp() {
    FieldStack temperature = data.stack("temperature-monthly");
    int january = 0;
    int july = 6;
    assertTrue(temperature.sample(january, 62, 130) < -25, "Yakutia in January");
    assertTrue(temperature.sample(july, 62, 130) > 10, "Yakutia in July");
    assertTrue(temperature.sample(july, -75, 100) < -45, "Antarctica in July");
    assertTrue(temperature.sample(july, 27, 2) > 30, "Sahara in July");
    FieldStack height = data.stack("elevation");
    assertTrue(height.sample(0, 33, 88) > 4300, "Tibet");
    assertTrue(height.sample(0, -18, -68) > 3500, "Altiplano");
    assertTrue(height.sample(0, 31.25, 35.42) < -200, "Dead Sea");
    assertEquals(0, height.sample(0, 0, -140), "Pacific");
    FieldStack rain = data.stack("rain-monthly");
    assertTrue(rain.sample(july, 15.5, 74) > 400, "Western Ghats in July");
    assertTrue(rain.sample(january, 15.5, 74) < 20, "Western Ghats in January");
    FieldStack light = data.stack("night-lights");
    assertTrue(light.sample(0, 51.5, -0.1) > 150, "London");
    assertTrue(light.sample(0, -23, 133) < 60, "central Australia");
    for (String wind : List.of("marine-wind-u", "wind-direction-monthly-u")) {
      // Means over a belt: single cells of the southern ocean rest on a few ship reports.
      assertTrue(
          beltMean(wind, july, -50, -40) > beltMean(wind, july, 40, 50) + 1,
          "winter westerlies are the stronger ones");
      assertTrue(data.stack(wind).sample(july, 14, -45) < -4, "trade winds");
    }
    assertTrue(data.stack("sea-surface-temperature").sample(january, 0, 150) > 28, "warm pool");
    assertTrue(data.stack("marine-pressure").sample(july, 38, -150) > 1020, "Pacific high");
  }

  private static double beltMean(String layer, int band, int southDeg, int northDeg) {
    double sum = 0;
    int points = 0;
    for (int latitudeDeg = southDeg; latitudeDeg <= northDeg; latitudeDeg++) {
      for (int longitudeDeg = -180; longitudeDeg < 180; longitudeDeg++) {
        sum += data.stack(layer).sample(band, latitudeDeg, longitudeDeg);
        points++;
      }
    }
    return sum / points;
  }

  /** The published maps themselves break the order at 38 points; no other break may appear. */
  @Test
  void vapourDensityFallsWithTheShareOfTheYear() {
    FieldStack vapour = data.stack("vapour-density-exceedance");
    assertEquals(data.stack("vapour-scale-height").labels(), vapour.labels());
    Grid grid = vapour.band(0).grid();
    int breaks = 0;
    for (int band = 1; band < vapour.size(); band++) {
      assertTrue(
          Double.parseDouble(vapour.labels().get(band - 1))
              < Double.parseDouble(vapour.labels().get(band)));
      for (int row = 0; row < grid.rows(); row++) {
        for (int column = 0; column < grid.columns(); column++) {
          breaks +=
              vapour.band(band - 1).at(row, column) < vapour.band(band).at(row, column) ? 1 : 0;
        }
      }
    }
    assertEquals(38, breaks);
  }

  @Test
  void harmonicPartsAgreeWithAmplitudeAndDay() {
    FieldStack harmonic = data.stack("vapour-pressure-harmonic");
    Grid grid = harmonic.band(0).grid();
    for (int row = 0; row < grid.rows(); row += 3) {
      for (int column = 0; column < grid.columns(); column += 3) {
        double phase = 2 * Math.PI * harmonic.band(2).at(row, column) / 365.25;
        double amplitude = harmonic.band(1).at(row, column);
        // Rounded to 1/128 hPa each, the day to 1/4.
        double tolerance = 0.02 + 0.005 * amplitude;
        assertEquals(-amplitude * Math.cos(phase), harmonic.band(3).at(row, column), tolerance);
        assertEquals(-amplitude * Math.sin(phase), harmonic.band(4).at(row, column), tolerance);
      }
    }
  }

  @Test
  void everyFileHasItsTerms() {
    for (Manifest.Entry entry : data.manifest().files()) {
      assertFalse(entry.licence().isBlank() || entry.attribution().isBlank(), entry.path());
      if (entry.licence().startsWith("maps © ITU")) {
        assertTrue(entry.path().startsWith("itu/"), entry.path());
      }
    }
  }
}
