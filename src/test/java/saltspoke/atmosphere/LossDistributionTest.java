package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.values.Quantiles;

class LossDistributionTest {
  private static final Exposure X = new Exposure(10, 80, 10, 10);
  private static final InputSpread SPREAD = new InputSpread(0.8, 4, 0.7, 0.9);

  @Test
  @Tag("published")
  void errorFunctionAsTabulated() {
    // Abramowitz and Stegun 1964, table 7.1, ten decimals.
    double[][] table = {{0, 0}, {0.5, 0.5204998778}, {1, 0.8427007929}, {2, 0.9953222650}};
    for (double[] row : table) {
      assertEquals(1 - row[1], NormalLaw.erfc(row[0]), 1.2e-7 * (1 - row[1]) + 1e-10);
      assertEquals(1 + row[1], NormalLaw.erfc(-row[0]), 1.3e-7);
    }
  }

  @Test
  @Tag("law")
  void withExactInputsOnlyTheStandardsSpreadRemains() {
    for (Metal metal : Metal.values()) {
      Quantiles um = Corrosion.firstYearUm(metal, X, InputSpread.NONE);
      double median = DoseResponse.of(metal).firstYear(X).um();
      double factor = Math.exp(NormalLaw.Z90 * LossDistribution.ownLnSpread(metal));
      assertEquals(median, um.median(), 1e-6 * median);
      assertEquals(median * factor, um.p90(), 1e-6 * um.p90());
      assertEquals(median / factor, um.p10(), 1e-6 * um.p10());
    }
  }

  @Test
  @Tag("law")
  void probabilitiesAddToOneAndMatchTheQuantiles() {
    for (MetalCorrosivity each : Corrosion.assess(X, SPREAD)) {
      double sum = each.categoryProbability().values().stream().mapToDouble(p -> p).sum();
      assertEquals(1, sum, 1e-9);
      LossDistribution loss = new LossDistribution(each.metal(), X, SPREAD, 0);
      assertEquals(0.1, loss.probabilityUpTo(each.firstYearLossUm().p10()), 1e-6);
      assertEquals(0.5, loss.probabilityUpTo(each.firstYearLossUm().median()), 1e-6);
      assertEquals(0.9, loss.probabilityUpTo(each.firstYearLossUm().p90()), 1e-6);
    }
  }

  @Test
  @Tag("law")
  void quadratureAgreesWithAFineSumOverTheSaltsSpread() {
    InputSpread onlySalt = new InputSpread(0, 0, 0, 0.9);
    LossDistribution loss = new LossDistribution(Metal.ZINC, X, onlySalt, 0);
    int n = 4000;
    for (double um : new double[] {0.7, 1.5, 2.1, 4.2}) {
      double sum = 0;
      double weights = 0;
      for (int i = 0; i < n; i++) {
        double z = -6 + 12 * (i + 0.5) / n;
        double sd = Math.max(0.4, 10 * Math.exp(0.9 * z));
        double median = DoseResponse.of(Metal.ZINC).firstYear(new Exposure(10, 80, 10, sd)).um();
        double weight = Math.exp(-z * z / 2);
        sum += weight * Normal.below(Math.log(um / median) / 0.405);
        weights += weight;
      }
      assertEquals(sum / weights, loss.probabilityUpTo(um), 0.005, "up to " + um);
    }
  }

  @Test
  @Tag("law")
  void widerInputsWidenTheBand() {
    for (Metal metal : Metal.values()) {
      Quantiles narrow = Corrosion.firstYearUm(metal, X, InputSpread.NONE);
      Quantiles wide = Corrosion.firstYearUm(metal, X, SPREAD);
      assertTrue(wide.p90() / wide.p10() > narrow.p90() / narrow.p10());
      Quantiles beyond = Corrosion.firstYearUm(metal, new Exposure(10, 95, 10, 10), SPREAD);
      assertTrue(beyond.p90() / beyond.p10() > wide.p90() / wide.p10());
    }
  }

  @Test
  @Tag("law")
  void summaryNamesTheInputThatDecides() {
    assertEquals("salt", ClassSummary.decider(new Exposure(20, 80, 1, 100), SPREAD));
    assertEquals(
        "so2", ClassSummary.decider(new Exposure(10, 75, 40, 1), new InputSpread(0, 0, 1, 0.3)));
    assertEquals(
        "formula",
        ClassSummary.decider(new Exposure(10, 75, 40, 1), new InputSpread(0.1, 0.5, 0.1, 0.1)));
    MetalCorrosivity sure = Corrosion.assess(new Exposure(10, 60, 1, 1), InputSpread.NONE).get(0);
    assertEquals(
        "air-summary-sure",
        ClassSummary.of(sure, new Exposure(10, 60, 1, 1), InputSpread.NONE).code());
    Exposure edge = new Exposure(20, 80, 3, 60);
    MetalCorrosivity between = Corrosion.assess(edge, SPREAD).get(0);
    assertEquals("air-summary-between-salt", ClassSummary.of(between, edge, SPREAD).code());
  }
}
