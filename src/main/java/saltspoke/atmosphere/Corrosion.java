package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.List;
import saltspoke.values.Note;
import saltspoke.values.Quantiles;

/** ISO 9223 and ISO 9224 for a set of annual means: the door to this package's corrosion part. */
public final class Corrosion {
  private Corrosion() {}

  /**
   * First-year loss by ISO 9223 with the floors of Pd and Sd raised; say what {@link FittedRange}
   * flags beside it.
   *
   * @param temperatureC annual mean, °C
   * @param relativeHumidityPct annual mean, %
   * @param so2MgPerM2Day Pd, mg/(m² d)
   * @param chlorideMgPerM2Day Sd, mg/(m² d), wet candle
   */
  public static FirstYearLoss firstYear(
      Metal metal,
      double temperatureC,
      double relativeHumidityPct,
      double so2MgPerM2Day,
      double chlorideMgPerM2Day) {
    Exposure given =
        new Exposure(temperatureC, relativeHumidityPct, so2MgPerM2Day, chlorideMgPerM2Day);
    return DoseResponse.of(metal).firstYear(FittedRange.of(given).exposure());
  }

  /** First-year loss with its spread: p10, median, p90 in µm. */
  public static Quantiles firstYearUm(Metal metal, Exposure given, InputSpread spread) {
    return distribution(metal, given, spread).quantilesUm();
  }

  /** The median of {@link #firstYearUm} alone, by which the category goes; for maps. */
  public static FirstYearLoss firstYearMedian(Metal metal, Exposure given, InputSpread spread) {
    return new FirstYearLoss(distribution(metal, given, spread).medianUm());
  }

  /** All four metals with categories, their probabilities and later losses. */
  public static List<MetalCorrosivity> assess(Exposure given, InputSpread spread) {
    List<MetalCorrosivity> all = new ArrayList<>();
    for (Metal metal : Metal.values()) {
      LossDistribution loss = distribution(metal, given, spread);
      Quantiles um = loss.quantilesUm();
      all.add(
          new MetalCorrosivity(
              metal,
              um,
              CategoryLimits.categoryOf(metal, new FirstYearLoss(um.median())),
              loss.categoryProbability(),
              LaterLoss.of(metal).from(um)));
    }
    return all;
  }

  /** What left the fitted range, and metals whose median exceeds even CX. */
  public static List<Note> flags(Exposure given, List<MetalCorrosivity> assessed) {
    List<Note> flags = new ArrayList<>(FittedRange.of(given).flags());
    for (MetalCorrosivity each : assessed) {
      if (CategoryLimits.aboveCx(
          each.metal(), new FirstYearLoss(each.firstYearLossUm().median()))) {
        flags.add(
            Note.of(
                "air-loss-above-cx",
                "metal",
                each.metal().id(),
                "limit",
                CategoryLimits.upperUm(each.metal(), Category.CX)));
      }
    }
    return flags;
  }

  private static LossDistribution distribution(Metal metal, Exposure given, InputSpread spread) {
    FittedRange range = FittedRange.of(given);
    return new LossDistribution(metal, range.exposure(), spread, range.extraLnSpread());
  }
}
