package saltspoke.bench;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import saltspoke.atmosphere.AirClimate;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;
import saltspoke.wheel.rim.InventedClimates;
import saltspoke.wheel.rim.WheelWeather;

/** One settled year of a salted commuter's wheel. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class WheelYearBenchmark {
  private final AirClimate air = InventedClimates.all().get("maritime-winter");
  private final RidingProfile profile = Profiles.shipped().get("all-winter-commuter");

  @Benchmark
  public WheelYear year() {
    return WheelWeather.over(air, profile, WheelBuild.USUAL);
  }
}
