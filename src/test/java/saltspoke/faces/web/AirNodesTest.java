package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.atmosphere.AirClimate;

@Tag("law")
class AirNodesTest {
  private final AtomicInteger asked = new AtomicInteger();
  private final List<Double> reachesKm = new ArrayList<>();
  private final AirNodes nodes =
      new AirNodes(
          new AirNodes.World() {
            @Override
            public Optional<AirClimate> air(double latitudeDeg, double longitudeDeg) {
              asked.incrementAndGet();
              return Optional.empty();
            }

            @Override
            public Optional<double[]> landBeside(
                double latitudeDeg, double longitudeDeg, double reachKm, double inlandKm) {
              reachesKm.add(reachKm);
              assertTrue(inlandKm < reachKm);
              return Optional.empty();
            }
          });

  @Test
  void zoomingInAsksOnlyForNodesThatAreNew() {
    int perEdge = AirNodes.PER_TILE + 1;
    nodes.of(new TileFrame(3, 4, 2), MapLayer.CHLORIDE);
    assertEquals(perEdge * perEdge, asked.get());

    nodes.of(new TileFrame(4, 8, 4), MapLayer.CHLORIDE);
    int shared = (AirNodes.PER_TILE / 2 + 1) * (AirNodes.PER_TILE / 2 + 1);
    assertEquals(2 * perEdge * perEdge - shared, asked.get());
  }

  @Test
  void oneLayerBringsAllTheOthersWithIt() {
    TileFrame frame = new TileFrame(5, 16, 10);
    nodes.of(frame, MapLayer.CHLORIDE);
    int once = asked.get();
    nodes.of(frame, MapLayer.CLASS_ZINC);
    assertEquals(once, asked.get());
  }

  @Test
  void aNodeInTheWaterLooksForLandAgainAtEveryZoomAndHalfAsFar() {
    nodes.of(new TileFrame(3, 4, 2), MapLayer.CHLORIDE);
    double coarseKm = reachesKm.get(0);
    int coarse = reachesKm.size();
    nodes.of(new TileFrame(4, 8, 4), MapLayer.CHLORIDE);
    int perEdge = AirNodes.PER_TILE + 1;
    assertEquals(perEdge * perEdge, reachesKm.size() - coarse);
    assertEquals(coarseKm / 2, reachesKm.get(coarse), 1e-6 * coarseKm);
  }

  @Test
  void theOpenSeaHasNoValue() {
    TileValues values = nodes.of(new TileFrame(5, 16, 10), MapLayer.WET_HOURS);
    assertTrue(Double.isNaN(values.value(128, 128)));
  }

  @Test
  void betweenNodesTheLogarithmIsLinearAndMissingOnesAreLeftOut() {
    TileValues falling = new TileValues(2, new double[] {100, 1, 100, 1}, new double[4]);
    assertEquals(10, falling.value(127, 127), 0.2, "half-way by factors, not by sums");
    TileValues shore =
        new TileValues(2, new double[] {5, Double.NaN, 5, Double.NaN}, new double[4]);
    assertEquals(5, shore.value(250, 20), 1e-9);
  }
}
