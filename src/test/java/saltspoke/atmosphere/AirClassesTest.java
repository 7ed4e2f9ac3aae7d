package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

class AirClassesTest {
  @Test
  @Tag("published")
  void wetnessLimits() {
    double[] limit = {10, 250, 2500, 5500};
    for (int i = 0; i < limit.length; i++) {
      assertEquals("τ" + (i + 1), AirClasses.wetness(limit[i]));
      assertEquals("τ" + (i + 2), AirClasses.wetness(Math.nextUp(limit[i])));
    }
  }

  @Test
  @Tag("published")
  void salinityLimits() {
    double[] limit = {3, 60, 300};
    for (int i = 0; i < limit.length; i++) {
      assertEquals("S" + i, AirClasses.salinity(limit[i]));
      assertEquals("S" + (i + 1), AirClasses.salinity(Math.nextUp(limit[i])));
    }
    assertEquals("S3", AirClasses.salinity(1500));
    assertEquals("S3+", AirClasses.salinity(1501));
  }

  @Test
  @Tag("published")
  void sulfurLimits() {
    double[] limit = {4, 24, 80};
    for (int i = 0; i < limit.length; i++) {
      assertEquals("P" + i, AirClasses.sulfur(limit[i]));
      assertEquals("P" + (i + 1), AirClasses.sulfur(Math.nextUp(limit[i])));
    }
    assertEquals("P3", AirClasses.sulfur(200));
    assertEquals("P3+", AirClasses.sulfur(201));
  }
}
