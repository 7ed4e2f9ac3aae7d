package saltspoke.bench;

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
import saltspoke.atmosphere.MonthClimate;
import saltspoke.atmosphere.MonthlyClimate;
import saltspoke.fields.DataSet;

/** Twelve months of climate at one place, warmed, without finding the place and its coast. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class MonthlyClimateBenchmark {
  private MonthlyClimate climate;
  private double longitudeDeg;

  @Setup
  public void open() {
    climate = MonthlyClimate.from(DataSet.shipped());
  }

  @Benchmark
  public List<MonthClimate> place() {
    longitudeDeg = longitudeDeg > 170 ? -170 : longitudeDeg + 7.3;
    return climate.at(47, longitudeDeg, 300, 40);
  }
}
