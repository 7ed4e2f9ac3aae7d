package saltspoke.atlas;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.places.Area;
import saltspoke.values.Refusal;

@Tag("law")
class AtlasRunTest {
  /** Land where latitude + longitude is above 0; the value tells the place. */
  static final class Slope implements PointValues {
    final AtomicInteger asked = new AtomicInteger();

    @Override
    public boolean isLand(double latitudeDeg, double longitudeDeg) {
      return latitudeDeg + longitudeDeg > 0;
    }

    @Override
    public float at(double latitudeDeg, double longitudeDeg) {
      asked.incrementAndGet();
      return isLand(latitudeDeg, longitudeDeg)
          ? (float) (1000 * latitudeDeg + longitudeDeg)
          : Float.NaN;
    }
  }

  /** Keeps tiles in memory and breaks after so many. */
  static final class Memory implements TileStore {
    final Map<Integer, float[]> tiles = new HashMap<>();
    int breakAfter = Integer.MAX_VALUE;

    @Override
    public boolean has(int tile) {
      return tiles.containsKey(tile);
    }

    @Override
    public void put(int tile, float[] values) throws IOException {
      if (tiles.size() >= breakAfter) {
        throw new IOException("pulled the plug");
      }
      tiles.put(tile, values);
    }

    @Override
    public float[] get(int tile) {
      return tiles.get(tile);
    }
  }

  private static final AtlasFrame FRAME =
      AtlasFrame.over(new double[] {-30, -20, 33.3, 21}, 0.1, 4326, true);

  @Test
  void everyCellHoldsTheValueOfItsMiddle() throws Exception {
    Memory store = new Memory();
    new AtlasRun(FRAME, PlaneToEarth::degrees, new Slope(), 2).into(store, (cells, share) -> {});
    assertEquals(FRAME.tiles(), store.tiles.size());
    for (int tile = 0; tile < FRAME.tiles(); tile++) {
      float[] values = store.get(tile);
      for (int i = 0; i < values.length; i += 97) {
        int column = tile % FRAME.tilesAcross() * AtlasFrame.TILE + i % AtlasFrame.TILE;
        int row = tile / FRAME.tilesAcross() * AtlasFrame.TILE + i / AtlasFrame.TILE;
        boolean inside = column < FRAME.columns() && row < FRAME.rows();
        double lat = 21 - 0.1 * (row + 0.5);
        double lon = -30 + 0.1 * (column + 0.5);
        if (inside && Math.abs(lat + lon) > 1e-9) {
          assertEquals(new Slope().at(lat, lon), values[i], 1e-2f);
        } else if (!inside) {
          assertTrue(Float.isNaN(values[i]));
        }
      }
    }
  }

  @Test
  void aBrokenRunGoesOnWhereItStoppedAndEndsTheSame() throws Exception {
    Memory whole = new Memory();
    Slope once = new Slope();
    new AtlasRun(FRAME, PlaneToEarth::degrees, once, 2).into(whole, (cells, share) -> {});

    Memory broken = new Memory();
    broken.breakAfter = 2;
    Slope twice = new Slope();
    AtlasRun run = new AtlasRun(FRAME, PlaneToEarth::degrees, twice, 2);
    assertThrows(IOException.class, () -> run.into(broken, (cells, share) -> {}));
    int before = twice.asked.get();
    broken.breakAfter = Integer.MAX_VALUE;
    run.into(broken, (cells, share) -> {});
    for (int tile = 0; tile < FRAME.tiles(); tile++) {
      assertArrayEquals(whole.get(tile), broken.get(tile));
    }
    int again = twice.asked.get() - before;
    assertTrue(again <= once.asked.get() - 2 * 256 * 100, again + " of " + once.asked.get());
  }

  @Test
  void progressEndsAtOneAndNeverLeavesItsRange() throws Exception {
    double[] last = {0};
    new AtlasRun(FRAME, PlaneToEarth::degrees, new Slope(), 2)
        .into(
            new Memory(),
            (cells, share) -> {
              assertTrue(share >= 0 && share <= 1, "share " + share);
              last[0] = share;
            });
    assertEquals(1, last[0]);
  }

  @Test
  void degreesGoRoundTheWorldAndStopAtThePoles() {
    assertArrayEquals(new double[] {-170, 10}, PlaneToEarth.degrees(190, 10));
    assertNull(PlaneToEarth.degrees(0, 91));
  }

  @Test
  void aFrameOfTooManyCellsIsRefused() {
    assertThrows(
        Refusal.class, () -> AtlasFrame.over(new double[] {-180, -90, 180, 90}, 0.001, 4326, true));
  }

  /** Two squares of ten degrees and one smaller than a cell, hand-made. */
  @Test
  void areasAreSummedByTheGround() throws Exception {
    List<Area> areas =
        List.of(square("east", 10, 0, 10), square("south", 20, -15, 10), square("dot", 5, 5, 0.04));
    Memory store = new Memory();
    Slope slope = new Slope();
    AtlasFrame frame = AtlasFrame.over(new double[] {-30, -20, 40, 20}, 0.5, 4326, true);
    new AtlasRun(frame, PlaneToEarth::degrees, slope, 2).into(store, (cells, share) -> {});
    List<AreaValue> sums =
        AreaTally.of(
            areas,
            frame,
            PlaneToEarth::degrees,
            store,
            false,
            new double[] {-30, -20, 40, 20},
            slope);
    assertEquals(3, sums.size());
    assertEquals(400, sums.get(0).cells());
    double weights = 0;
    double sum = 0;
    for (double lat = 0.25; lat < 10; lat += 0.5) {
      for (double lon = 10.25; lon < 20; lon += 0.5) {
        weights += Math.cos(Math.toRadians(lat));
        sum += Math.cos(Math.toRadians(lat)) * (1000 * lat + lon);
      }
    }
    assertEquals(sum / weights, sums.get(0).mean(), 0.01);
    assertEquals(0, sums.get(2).cells());
    assertEquals(1000 * 5.02 + 5.02, sums.get(2).mean(), 0.2);
  }

  private static Area square(String name, double west, double south, double size) {
    double east = west + size;
    double north = south + size;
    double[] ring = {west, south, east, south, east, north, west, north, west, south};
    return new Area(name, "", "", List.of(List.of(ring)));
  }
}
