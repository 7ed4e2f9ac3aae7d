package saltspoke.atlas;

import java.io.IOException;
import java.util.Arrays;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ForkJoinPool;
import java.util.concurrent.atomic.LongAdder;
import java.util.stream.IntStream;

/**
 * Works out an atlas tile by tile, the rows of a tile on all threads at once: memory holds one tile
 * whatever the size of the atlas, and threads stay on one stretch of coast.
 */
public final class AtlasRun {
  /** Every so many cells each way one is looked at to guess how much land a tile holds. */
  private static final int SURVEY_STEP = 16;

  private final AtlasFrame frame;
  private final PlaneToEarth earth;
  private final PointValues values;
  private final int threads;

  /** Told after every row; rows come from several threads. */
  @FunctionalInterface
  public interface Progress {
    /**
     * @param landCells cells worked out in this run
     * @param share of the whole work that is done, 0..1, guessed from a survey of the land
     */
    void report(long landCells, double share);
  }

  public AtlasRun(AtlasFrame frame, PlaneToEarth earth, PointValues values, int threads) {
    this.frame = frame;
    this.earth = earth;
    this.values = values;
    this.threads = threads;
  }

  /** Works out every tile that the store lacks. */
  public void into(TileStore store, Progress progress) throws IOException, InterruptedException {
    ForkJoinPool pool = new ForkJoinPool(threads);
    try {
      double[] land = onAll(pool, this::survey);
      double all = Arrays.stream(land).sum();
      double before = 0;
      LongAdder cells = new LongAdder();
      for (int tile = 0; tile < land.length; tile++) {
        if (!store.has(tile)) {
          store.put(tile, tile(pool, tile, land[tile] / all, before / all, cells, progress));
        }
        before += land[tile];
      }
      progress.report(cells.sum(), 1);
    } finally {
      pool.shutdownNow();
    }
  }

  private float[] tile(
      ForkJoinPool pool, int tile, double share, double before, LongAdder cells, Progress progress)
      throws InterruptedException {
    float[] out = new float[AtlasFrame.TILE * AtlasFrame.TILE];
    Arrays.fill(out, Float.NaN);
    int row0 = tile / frame.tilesAcross() * AtlasFrame.TILE;
    int column0 = tile % frame.tilesAcross() * AtlasFrame.TILE;
    int rows = Math.min(AtlasFrame.TILE, frame.rows() - row0);
    int columns = Math.min(AtlasFrame.TILE, frame.columns() - column0);
    LongAdder rowsDone = new LongAdder();
    onAll(
        pool,
        () -> {
          IntStream.range(0, rows)
              .parallel()
              .forEach(
                  r -> {
                    double y = frame.y(row0 + r);
                    for (int c = 0; c < columns; c++) {
                      double[] at = earth.lonLat(frame.x(column0 + c), y);
                      if (at != null) {
                        float value = values.at(at[1], at[0]);
                        out[r * AtlasFrame.TILE + c] = value;
                        if (!Float.isNaN(value)) {
                          cells.increment();
                        }
                      }
                    }
                    rowsDone.increment();
                    progress.report(cells.sum(), before + share * rowsDone.sum() / rows);
                  });
          return null;
        });
    return out;
  }

  /** Share of land cells in every tile, and a little for the tile itself. */
  private double[] survey() {
    double[] land = new double[frame.tiles()];
    IntStream.range(0, land.length)
        .parallel()
        .forEach(
            tile -> {
              int row0 = tile / frame.tilesAcross() * AtlasFrame.TILE;
              int column0 = tile % frame.tilesAcross() * AtlasFrame.TILE;
              land[tile] = 1;
              for (int r = SURVEY_STEP / 2; r < AtlasFrame.TILE; r += SURVEY_STEP) {
                for (int c = SURVEY_STEP / 2; c < AtlasFrame.TILE; c += SURVEY_STEP) {
                  boolean inside = row0 + r < frame.rows() && column0 + c < frame.columns();
                  double[] at =
                      inside ? earth.lonLat(frame.x(column0 + c), frame.y(row0 + r)) : null;
                  if (at != null && values.isLand(at[1], at[0])) {
                    land[tile] += SURVEY_STEP * SURVEY_STEP;
                  }
                }
              }
            });
    return land;
  }

  private static <T> T onAll(ForkJoinPool pool, Callable<T> work) throws InterruptedException {
    try {
      return pool.submit(work).get();
    } catch (ExecutionException e) {
      if (e.getCause() instanceof RuntimeException fault) {
        throw fault;
      }
      throw new IllegalStateException(e.getCause());
    }
  }
}
