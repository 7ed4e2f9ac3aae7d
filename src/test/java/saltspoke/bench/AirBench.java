package saltspoke.bench;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.AirModel;
import saltspoke.atmosphere.AirOverrides;
import saltspoke.atmosphere.CorrectedQuantity;
import saltspoke.atmosphere.CorrectionSpot;
import saltspoke.atmosphere.SiteCorrection;
import saltspoke.atmosphere.SiteCorrections;
import saltspoke.fields.DataSet;
import saltspoke.places.Place;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceOverrides;

/** The air at one place: of a place already found, and with its coast and neighbours. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
public class AirBench {
  private PlaceDirectory places;
  private AirModel model;
  private AirModel corrected;
  private Place hamburg;

  @Setup
  public void open() {
    DataSet data = DataSet.in(Path.of("climate-data"));
    places = PlaceDirectory.open(data);
    model = AirModel.from(data);
    corrected = AirModel.from(data, thousandSites());
    hamburg = places.at(53.55, 9.99, PlaceOverrides.NONE);
  }

  @Benchmark
  public AirClimate air() {
    return model.at(hamburg, AirOverrides.NONE);
  }

  @Benchmark
  public AirClimate placeAndAir() {
    return model.at(places.at(53.55, 9.99, PlaceOverrides.NONE), AirOverrides.NONE);
  }

  /** By a correction file of 1000 sites, 16 and more of them near. */
  @Benchmark
  public AirClimate airWithCorrections() {
    return corrected.at(hamburg, AirOverrides.NONE);
  }

  private static SiteCorrections thousandSites() {
    List<SiteCorrection> rows = new ArrayList<>();
    for (int i = 0; i < 1000; i++) {
      CorrectionSpot spot = new CorrectionSpot(40 + i % 25, i / 25 - 10, 100, 50);
      for (int month = 1; month <= 12; month++) {
        double kelvin = Math.sin(i + 0.3 * month);
        rows.add(
            new SiteCorrection("s" + i, spot, CorrectedQuantity.TEMPERATURE, month, kelvin, 0.3));
      }
    }
    return SiteCorrections.of(rows);
  }
}
