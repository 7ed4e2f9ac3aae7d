package saltspoke.places;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

@Tag("law")
class CoarseCoastTest {
  /** A small island in each of many bins, scattered over the earth without a pattern. */
  private static List<CoastBin> islands() {
    List<CoastBin> bins = new ArrayList<>();
    for (int i = 0; i < 60; i++) {
      int west = Math.floorMod(i * 74, 180) * 2 - 180;
      int south = Math.floorMod(i * 38, 86) * 2 - 86;
      double x = west + 0.3 + i % 5 * 0.2;
      double y = south + 0.4 + i % 3 * 0.3;
      bins.add(
          CoastBin.parse(
              west
                  + ","
                  + south
                  + ",\"POLYGON (("
                  + String.join(
                      ",",
                      x + " " + y,
                      x + 0.25 + " " + y,
                      x + 0.25 + " " + (y + 0.25),
                      x + " " + y)
                  + "))\""));
    }
    return bins;
  }

  @Test
  void theOrderHidesNoNearerShore() {
    List<CoastBin> bins = islands();
    CoarseCoast coast = new CoarseCoast(bins, 100_000);
    for (double lat = -88.7; lat < 90; lat += 7.3) {
      for (double lon = -179.5; lon < 180; lon += 11.9) {
        NearestShore all = new NearestShore(new Vantage(lat, lon));
        all.offer(bins);
        NearestShore ordered = new NearestShore(new Vantage(lat, lon));
        ordered.offer(coast.from(lat, lon));
        assertEquals(all.bestM(), ordered.bestM(), lat + "," + lon);
      }
    }
  }

  @Test
  void binsComeFromNearToFarAndNeverFartherThanTheyAre() {
    CoarseCoast coast = new CoarseCoast(islands(), 8_000_000);
    CoarseCoast.Order order = coast.from(51, 7);
    Vantage corner = new Vantage(50.01, 7.99);
    for (int b = 0; b < order.bins().length; b++) {
      assertTrue(b == 0 || order.leastM()[b] >= order.leastM()[b - 1]);
      assertTrue(order.leastM()[b] <= order.bins()[b].leastM(corner) + 1);
    }
  }
}
