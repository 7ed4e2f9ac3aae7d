package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.values.Quantiles;

@Tag("law")
class ClimateSpreadTest {
  private static MonthMeans means(double humidityPct) {
    double[] temperatureC = {0, 1, 4, 8, 13, 16, 18, 18, 14, 9, 4, 1};
    double[] rh = new double[12];
    double[] range = new double[12];
    double[] other = new double[12];
    Arrays.fill(rh, humidityPct);
    Arrays.fill(range, 8);
    Arrays.fill(other, 50);
    return new MonthMeans(temperatureC, rh, range, other, other);
  }

  @Test
  void aYearIsSurerThanItsMonthsAndMountainsAreLeastSure() {
    for (double height : new double[] {-100, 0, 500, 3000, 4000}) {
      assertTrue(
          ClimateSpread.annualTemperatureK(height) < ClimateSpread.monthlyTemperatureK(height));
      assertTrue(
          ClimateSpread.annualHumidityPct(height) < ClimateSpread.monthlyHumidityPct(height));
    }
    assertTrue(ClimateSpread.annualHumidityPct(2000) > ClimateSpread.annualHumidityPct(100));
    assertEquals(ClimateSpread.annualTemperatureK(0), ClimateSpread.annualTemperatureK(-300));
  }

  @Test
  void bandsStayWithinTheirLimits() {
    Quantiles band = ClimateSpread.band(98, 5, 0, 100);
    assertEquals(100, band.p90());
    assertEquals(98 - 1.2816 * 5, band.p10(), 1e-3);
  }

  @Test
  void wetHoursOfModelledMeansAreLessSureThanOfExactOnes() {
    for (double humidityPct : new double[] {30, 60, 85, 97}) {
      MonthMeans means = means(humidityPct);
      Quantiles exact = ClimateSpread.wetHoursOfExactMeans(means, 50);
      Quantiles modelled = ClimateSpread.wetHoursOfModelledMeans(means, 50, 100);
      assertEquals(exact.median(), modelled.median());
      assertTrue(modelled.p10() <= exact.p10(), humidityPct + " %");
      assertTrue(modelled.p90() >= exact.p90(), humidityPct + " %");
    }
  }
}
