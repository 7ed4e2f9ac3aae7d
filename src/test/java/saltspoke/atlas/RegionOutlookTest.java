package saltspoke.atlas;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.atmosphere.AirModel;
import saltspoke.atmosphere.Category;
import saltspoke.fields.DataSet;
import saltspoke.places.Area;
import saltspoke.places.PlaceDirectory;
import saltspoke.places.PlaceHit;
import saltspoke.places.Regions;
import saltspoke.values.Quantiles;
import saltspoke.values.Refusal;

@Tag("law")
class RegionOutlookTest {
  private static final DataSet DATA = DataSet.shipped();
  private static final PlaceDirectory PLACES = PlaceDirectory.open(DATA);
  private static final AirModel AIR = AirModel.from(DATA);
  private static final Regions REGIONS = Regions.from(DATA);

  private static RegionOutlook outlook(Area area, int sample) {
    return RegionOutlook.of(
        area, PLACES.within(area::contains), PLACES, AIR, sample, Optional.empty());
  }

  @Test
  void sharesOfPeopleAddToOneAndPeopleToTheTowns() {
    Area area = REGIONS.find("Cornwall");
    RegionOutlook outlook = outlook(area, 8);
    List<PlaceHit> towns = PLACES.within(area::contains);
    assertEquals(towns.size(), outlook.towns());
    assertEquals(towns.stream().mapToLong(PlaceHit::population).sum(), outlook.people());
    for (Map<Category, Double> shares : outlook.classShare().values()) {
      assertEquals(1, shares.values().stream().mapToDouble(Double::doubleValue).sum(), 1e-12);
    }
    assertEquals(8, outlook.sampled());
  }

  /** The systematic sample leaves the order of towns by loss cut into equal parts. */
  @Test
  void aLargerSampleBarelyMovesTheMiddle() {
    Area area = REGIONS.find("Bretagne");
    Quantiles small = outlook(area, 32).wetHours();
    Quantiles large = outlook(area, 200).wetHours();
    assertEquals(large.median(), small.median(), 0.05 * large.median());
  }

  @Test
  void anAreaWithoutTownsIsRefused() {
    double[] ring = {-140, 20, -139, 20, -139, 21, -140, 21, -140, 20};
    Area ocean = new Area("ocean", "", "", List.of(List.of(ring)));
    Refusal refusal = assertThrows(Refusal.class, () -> outlook(ocean, 8));
    assertEquals("no-towns", refusal.error());
  }

  @Test
  void quantilesOfEqualWeightsStandInTheMiddleOfTheirShare() {
    Quantiles five = RegionOutlook.quantiles(new double[] {1, 2, 3, 4, 5});
    assertEquals(3, five.median(), 1e-12);
    assertEquals(1, five.p10(), 1e-12);
    assertEquals(5, five.p90(), 1e-12);
    assertTrue(RegionOutlook.quantiles(new double[] {7}).p10() == 7);
  }
}
