package saltspoke.bench;

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
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import saltspoke.wheel.CellCurrents;
import saltspoke.wheel.CellSpec;
import saltspoke.wheel.CellTable;
import saltspoke.wheel.CellTables;
import saltspoke.wheel.Film;
import saltspoke.wheel.GalvanicCell;
import saltspoke.wheel.Material;
import saltspoke.wheel.SaltMix;
import saltspoke.wheel.ThinFilm;

/** The galvanic cell: solved directly, off a warm table, and a cold table over a year of films. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class CellBench {
  private static final int FILMS = 100;

  private final CellSpec spec =
      new CellSpec(
          Material.ALUMINIUM_WROUGHT, Material.CARBON_FIBRE, 2.25, 14, 0.3, 0.35, 0.02, 12, 0, 0);
  private final List<Film> films = new ArrayList<>();
  private final CellTable warm = new CellTables(1).table(spec);
  private int next;

  public CellBench() {
    for (int i = 0; i < FILMS; i++) {
      films.add(ThinFilm.inEquilibrium(new SaltMix(100, 600, 100, 0), 50 + 0.45 * i, 15 - 0.2 * i));
    }
  }

  private Film film() {
    next = (next + 1) % FILMS;
    return films.get(next);
  }

  @Benchmark
  public CellCurrents direct() {
    return GalvanicCell.solve(spec, film());
  }

  @Benchmark
  public double warmTable() {
    return warm.rate(film(), 0.3, 1);
  }

  @Benchmark
  public double coldTableOverHundredFilms() {
    CellTable cold = new CellTables(1).table(spec);
    double sum = 0;
    for (Film film : films) {
      sum += cold.rate(film, 0.3, 1);
    }
    return sum;
  }

  @Benchmark
  public Film equilibriumFilm() {
    return ThinFilm.inEquilibrium(new SaltMix(100, 600, 100, 0), 70 + 0.2 * (next++ % 100), 8);
  }
}
