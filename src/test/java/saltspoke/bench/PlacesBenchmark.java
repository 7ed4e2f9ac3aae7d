package saltspoke.bench;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import saltspoke.fields.DataSet;
import saltspoke.places.Place;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceHit;
import saltspoke.places.PlaceOverrides;
import saltspoke.places.SeaView;

/** How long a warmed directory takes for the sea, a place and a name. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class PlacesBenchmark {
  @Param({"47.37,8.54", "60.39,5.32", "43.80,87.60"})
  public String point;

  private PlaceDirectory places;
  private double latitudeDeg;
  private double longitudeDeg;

  @Setup
  public void open() {
    places = PlaceDirectory.open(DataSet.shipped());
    latitudeDeg = Double.parseDouble(point.substring(0, point.indexOf(',')));
    longitudeDeg = Double.parseDouble(point.substring(point.indexOf(',') + 1));
  }

  @Benchmark
  public SeaView seaView() {
    return places.seaView(latitudeDeg, longitudeDeg);
  }

  @Benchmark
  public Place place() {
    return places.at(latitudeDeg, longitudeDeg, PlaceOverrides.NONE);
  }

  @Benchmark
  public java.util.List<PlaceHit> search() {
    return places.search("springf", 10);
  }
}
