package saltspoke.places;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SeaViewTest {
  @ParameterizedTest
  @CsvSource({"48.8566,2.3522", "52.0796,4.3130", "60.39,5.32", "-23.55,-46.63", "35.68,139.77"})
  @Tag("law")
  void noDirectionHasANearerShoreThanTheNearest(double latitudeDeg, double longitudeDeg) {
    SeaView view = World.COAST.view(latitudeDeg, longitudeDeg);
    for (double shoreKm : view.shoreKm()) {
      // Rays are great circles and their lengths arcs of a sphere, within 0.5 %.
      assertTrue(shoreKm >= view.distanceKm() * 0.995 - 0.01, shoreKm + " < " + view.distanceKm());
    }
  }

  @Test
  @Tag("law")
  void openOceanLiesWestOfBrittanyAndLandEast() {
    SeaView view = World.COAST.view(48.04, -4.73);
    assertEquals(500, view.fetchKm()[27], 1e-9, "west of the Pointe du Raz");
    assertTrue(view.shoreKm()[27] < 1);
    assertTrue(view.shoreKm()[9] > 100, "east across France");
  }

  @Test
  @Tag("law")
  void aHarbourBasinIsNoOpenSea() {
    SeaView bergen = World.COAST.view(60.3913, 5.3221);
    SeaView skagen = World.COAST.view(57.72, 10.58);
    assertTrue(longest(bergen.fetchKm()) < longest(skagen.fetchKm()));
    assertTrue(Arrays.stream(bergen.fetchKm()).sum() < Arrays.stream(skagen.fetchKm()).sum() / 3);
  }

  private static double longest(double[] values) {
    return Arrays.stream(values).max().orElseThrow();
  }

  @Test
  @Tag("law")
  void farInlandThereIsNoSeaInAnyDirection() {
    SeaView view = World.COAST.view(46.28, 86.67);
    for (int k = 0; k < SeaView.DIRECTIONS; k++) {
      assertEquals(Double.POSITIVE_INFINITY, view.shoreKm()[k]);
      assertEquals(0, view.fetchKm()[k]);
      assertEquals(0, view.salinityRatio()[k]);
    }
  }

  @ParameterizedTest
  @CsvSource({
    "60.16,24.94,18,0.10,0.2,Helsinki south",
    "46.48,30.74,9,0.5,0.55,Odesa east",
    "40.36,49.83,15,0.3,0.4,Baku south-east",
    "52.10,4.26,30,0.95,1.0,Scheveningen west-north-west",
    "57.70,11.90,27,0.55,1.0,Gothenburg west"
  })
  @Tag("law")
  void closedSeasAreFresher(
      double latitudeDeg, double longitudeDeg, int k, double least, double most, String name) {
    double ratio = World.COAST.view(latitudeDeg, longitudeDeg).salinityRatio()[k];
    assertTrue(ratio >= least && ratio <= most, name + " " + ratio);
  }

  @Test
  @Tag("law")
  void aGivenDistanceMovesEveryShoreAlike() {
    SeaView view = World.COAST.view(52.0796, 4.3130);
    SeaView moved = view.movedTo(view.distanceKm() + 2);
    for (int k = 0; k < SeaView.DIRECTIONS; k++) {
      assertEquals(view.shoreKm()[k] + 2, moved.shoreKm()[k], 1e-9);
    }
    assertArrayEquals(view.fetchKm(), moved.fetchKm());
    assertArrayEquals(view.shoreKm(), moved.movedTo(view.distanceKm()).shoreKm(), 1e-9);
    assertTrue(Arrays.stream(view.movedTo(0).shoreKm()).min().orElseThrow() >= 0);
  }

  @Test
  @Tag("law")
  void sectorsAreTenDegreesClockwiseFromNorth() {
    for (int tenth = 0; tenth < 3600; tenth++) {
      if (tenth % 100 != 0) {
        double azimuth = Math.toRadians(tenth / 10.0);
        assertEquals(tenth / 100, SeaRays.sector(Math.sin(azimuth), Math.cos(azimuth)));
      }
    }
  }
}
