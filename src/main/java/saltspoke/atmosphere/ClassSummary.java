package saltspoke.atmosphere;

import java.util.Map;
import saltspoke.values.Note;

/**
 * One plain sentence about the class: how sure it is and which input decides. The class named is
 * carbon steel's, the metal by which places are usually compared.
 */
final class ClassSummary {
  /** At or above this probability a class is called sure; our choice of words, no source. */
  private static final double SURE = 0.8;

  /** At or above this a second class is worth naming; our choice of words, no source. */
  private static final double WORTH_NAMING = 0.2;

  private ClassSummary() {}

  /**
   * {@code air-summary-sure} or {@code air-summary-between-INPUT} with gaps {@code category},
   * {@code other} and {@code probabilityPct}; INPUT is {@code salt}, {@code so2}, {@code humidity},
   * {@code temperature} or {@code formula} (the standard's own spread outweighs).
   */
  static Note of(MetalCorrosivity steel, Exposure given, InputSpread spread) {
    Category first = steel.category();
    double pFirst = steel.categoryProbability().get(first);
    Category other = null;
    double pOther = -1;
    for (Map.Entry<Category, Double> entry : steel.categoryProbability().entrySet()) {
      boolean better =
          entry.getValue() > pOther
              || (entry.getValue() == pOther && entry.getKey().compareTo(other) < 0);
      if (entry.getKey() != first && better) {
        other = entry.getKey();
        pOther = entry.getValue();
      }
    }
    long percent = Math.round(100 * pFirst);
    if (pFirst >= SURE || pOther < WORTH_NAMING) {
      return Note.of("air-summary-sure", "category", first.name(), "probabilityPct", percent);
    }
    return new Note(
        "air-summary-between-" + decider(given, spread),
        Map.of("category", first.name(), "other", other.name(), "probabilityPct", percent));
  }

  /** The input whose spread moves ln r of carbon steel most. */
  static String decider(Exposure given, InputSpread spread) {
    Exposure x = FittedRange.of(given).exposure();
    double humidity = spread.relativeHumidityPct();
    double[] moves = {
      swing(
          withSalt(x, x.chlorideMgPerM2Day() * Math.exp(-spread.chlorideLn())),
          withSalt(x, x.chlorideMgPerM2Day() * Math.exp(spread.chlorideLn()))),
      swing(
          withSo2(x, x.so2MgPerM2Day() * Math.exp(-spread.so2Ln())),
          withSo2(x, x.so2MgPerM2Day() * Math.exp(spread.so2Ln()))),
      swing(
          withHumidity(x, x.relativeHumidityPct() - humidity),
          withHumidity(x, x.relativeHumidityPct() + humidity)),
      swing(
          withTemperature(x, x.temperatureC() - spread.temperatureK()),
          withTemperature(x, x.temperatureC() + spread.temperatureK()))
    };
    String[] names = {"salt", "so2", "humidity", "temperature"};
    int largest = 0;
    for (int i = 1; i < moves.length; i++) {
      if (moves[i] > moves[largest]) {
        largest = i;
      }
    }
    boolean formula = moves[largest] < LossDistribution.ownLnSpread(Metal.CARBON_STEEL) / 2;
    return formula ? "formula" : names[largest];
  }

  private static double swing(Exposure low, Exposure high) {
    DoseResponse law = DoseResponse.of(Metal.CARBON_STEEL);
    return Math.abs(Math.log(law.firstYear(high).um() / law.firstYear(low).um())) / 2;
  }

  private static Exposure withSalt(Exposure x, double mg) {
    return new Exposure(
        x.temperatureC(),
        x.relativeHumidityPct(),
        x.so2MgPerM2Day(),
        Math.max(FittedRange.SD_MIN_MG_PER_M2_DAY, mg));
  }

  private static Exposure withSo2(Exposure x, double mg) {
    return new Exposure(
        x.temperatureC(),
        x.relativeHumidityPct(),
        Math.max(FittedRange.PD_MIN_MG_PER_M2_DAY, mg),
        x.chlorideMgPerM2Day());
  }

  private static Exposure withHumidity(Exposure x, double pct) {
    return new Exposure(
        x.temperatureC(),
        Math.max(0, Math.min(100, pct)),
        x.so2MgPerM2Day(),
        x.chlorideMgPerM2Day());
  }

  private static Exposure withTemperature(Exposure x, double celsius) {
    return new Exposure(
        celsius, x.relativeHumidityPct(), x.so2MgPerM2Day(), x.chlorideMgPerM2Day());
  }
}
