package saltspoke.faces.web;

import java.util.Map;
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
import saltspoke.faces.Answers;
import saltspoke.fields.DataSet;

/** A tile of the map that nobody has asked for before, over central Europe. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
public class TileBench {
  private static final int ZOOM = 10;
  private static final int WEST = 520;
  private static final int NORTH = 330;
  private static final int ACROSS = 60;

  private final MapResources map = new MapResources(new Answers(DataSet.shipped()));
  private int next;

  @Benchmark
  public byte[] newTile() {
    int column = WEST + next % ACROSS;
    int row = NORTH + next / ACROSS % ACROSS;
    next++;
    String path = "/api/tiles/chloride/" + ZOOM + "/" + column + "/" + row + ".png";
    return map.tile(new Ask("GET", path, Map.of(), "")).body();
  }
}
