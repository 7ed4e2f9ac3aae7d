package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

class RoadSaltModelTest {
  private static MonthAir month(
      int month, double celsius, double rh, double wetDays, double nearFreezing) {
    return new MonthAir(
        month,
        celsius,
        rh,
        7,
        6,
        200,
        700,
        500,
        100,
        60,
        wetDays,
        4,
        nearFreezing,
        nearFreezing,
        0,
        List.of(new DayType(1, celsius, 6, 7)));
  }

  private static List<MonthAir> winter(
      double nearFreezingDays, double wetShare, double rh, double celsius) {
    List<MonthAir> months = new ArrayList<>();
    for (int m = 1; m <= 12; m++) {
      boolean cold = m <= 3 || m >= 11;
      months.add(
          cold
              ? month(m, celsius, rh, 30 * wetShare, nearFreezingDays / 5)
              : month(m, 15, 70, 10, 0));
    }
    return months;
  }

  @Test
  @Tag("published")
  void mildWinterOfTheNetherlandsLiesNearTheLowEdgeOfTheBand() {
    // Published: 15 treatments in a mild year against 40–50 usual.
    RoadSalt usual =
        RoadSaltModel.of(winter(55, 0.45, 87, 3.5), CountryAirTest.shipped().find("NL")).roadSalt();
    assertTrue(usual.treatmentsPerWinter().p10() < 1.8 * 15);
    assertTrue(usual.treatmentsPerWinter().p10() > 15 / 1.8);
  }

  @Test
  @Tag("published")
  void someGramsLieOnTheRoadThroughTheSeason() {
    // Published: 2–3 g/m² stay between treatments; the mean over a salted month is of that order.
    RoadSalt denmark =
        RoadSaltModel.of(winter(80, 0.45, 88, 1.5), CountryAirTest.shipped().find("DK")).roadSalt();
    double january = denmark.months().get(0).saltOnRoadGPerM2();
    assertTrue(january > 1 && january < 8, "found " + january);
    assertEquals(0, denmark.months().get(6).saltOnRoadGPerM2());
  }

  @Test
  @Tag("law")
  void noFrostOrNoPracticeNoSalt() {
    RoadSaltModel.Result warm =
        RoadSaltModel.of(winter(0, 0.4, 80, 12), CountryAirTest.shipped().find("DE"));
    assertEquals(0, warm.roadSalt().treatmentsPerWinter().p90());
    assertEquals(0, warm.flags().size());
    RoadSaltModel.Result none =
        RoadSaltModel.of(winter(60, 0.4, 80, 2), CountryAirTest.shipped().find("IN"));
    assertEquals(0, none.roadSalt().treatmentsPerWinter().p90());
    RoadSaltModel.Result unknown = RoadSaltModel.of(winter(60, 0.4, 80, 2), Optional.empty());
    assertEquals("road-practice-unknown", unknown.flags().get(0).code());
  }

  @Test
  @Tag("law")
  void drierOrColderWintersAreTreatedLess() {
    Optional<CountryAir.Country> finland = CountryAirTest.shipped().find("FI");
    double mild = treatments(winter(60, 0.4, 85, -1), finland);
    assertTrue(treatments(winter(60, 0.1, 65, -1), finland) < mild);
    RoadSaltModel.Result cold = RoadSaltModel.of(winter(60, 0.4, 85, -14), finland);
    assertTrue(cold.roadSalt().treatmentsPerWinter().median() < 0.3 * mild);
    assertTrue(cold.roadSalt().magnesiumShare() > 0.9, "only magnesium and calcium work there");
    assertTrue(cold.flags().stream().anyMatch(n -> n.code().equals("road-too-cold-for-salt")));
  }

  private static double treatments(List<MonthAir> months, Optional<CountryAir.Country> country) {
    return RoadSaltModel.of(months, country).roadSalt().treatmentsPerWinter().median();
  }
}
