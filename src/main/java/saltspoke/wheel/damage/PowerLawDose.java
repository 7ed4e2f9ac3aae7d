package saltspoke.wheel.damage;

import saltspoke.atmosphere.LongTermLoss;
import saltspoke.atmosphere.MetalCorrosivity;

/**
 * Uniform loss of an open surface, slowing as its product covers it: r·t^b (ISO 9224:2012).
 *
 * @param firstYearUm loss in the first year, µm
 * @param exponent b, 0..1
 */
public record PowerLawDose(double firstYearUm, double exponent) implements DoseCurve {
  @Override
  public double um(double months) {
    return firstYearUm * Math.pow(months / 12, exponent);
  }

  /**
   * The air model's loss of a metal, times the share of it that reaches the wheel where it is kept
   * and ridden. The exponent is read back from the model's own first and tenth year.
   */
  public static PowerLawDose of(MetalCorrosivity metal, double sheltered) {
    double first = metal.firstYearLossUm().median();
    double tenth =
        metal.longTerm().stream()
            .filter(loss -> loss.years() == 10)
            .mapToDouble((LongTermLoss loss) -> loss.um().median())
            .findFirst()
            .orElse(10 * first);
    return new PowerLawDose(first * sheltered, Math.log10(tenth / first));
  }
}
