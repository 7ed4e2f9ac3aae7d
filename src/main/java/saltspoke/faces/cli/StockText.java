package saltspoke.faces.cli;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import saltspoke.advice.StateShares;
import saltspoke.atlas.stock.Pieces;
import saltspoke.atlas.stock.Split;
import saltspoke.atlas.stock.Splits;
import saltspoke.atlas.stock.StockQuestion;
import saltspoke.faces.Texts;

/** What comes of a customer list as plain text. */
final class StockText {
  private StockText() {}

  static String of(Splits splits, List<Pieces.Line> orders, long refused, Texts texts) {
    StringBuilder out = new StringBuilder();
    Split all = splits.all();
    AirText.line(
        out,
        "%,d rows answered (%,d of them mended), %,d refused; %s wheels",
        all.customers(),
        splits.mended(),
        refused,
        all.wheels().stripTrailingZeros().toPlainString());
    if (all.customers() == 0) {
      return out.toString();
    }
    parts(out, "\nClass of the outside air for steel:", all.byClass(), all.wheels());
    parts(out, "\nProfiles:", all.byProfile(), all.wheels());
    parts(out, "\nRecommended (rim/nipple/interface/spoke):", all.byPairing(), all.wheels());
    if (all.notEnough().signum() > 0) {
      AirText.line(
          out,
          "  For %s wheels no pairing in the order of preference reaches the wanted first look;"
              + " the longest was taken.",
          all.notEnough().stripTrailingZeros().toPlainString());
    }
    out.append("\nWheels in each state if they stay as they are and nobody looks:\n");
    out.append("  after year     sound  attacked    seized      lost\n");
    for (int year = 1; year <= StockQuestion.YEARS; year++) {
      StateShares at = all.wheelsByState(year);
      AirText.line(
          out,
          "  %10d %9.0f %9.0f %9.0f %9.0f",
          year,
          at.sound(),
          at.attacked(),
          at.seized(),
          at.lost());
    }
    out.append("\nFalling due in the first year, wheels:\n  month      looks  rebuilds\n");
    for (int month = 1; month <= 12; month++) {
      AirText.line(out, "  %5d %10.0f %9.0f", month, all.looks(month), all.rebuilds(month));
    }
    out.append("\nTo order for these rebuilds:\n");
    for (Pieces.Line line : orders) {
      AirText.line(
          out,
          "  %-9s %-26s %,9d pieces, %,9d in hand: %,d packs%s",
          line.article().kind(),
          line.article().id(),
          line.needed(),
          line.inHand(),
          line.packs(),
          line.orderMonth().map(m -> ", order by month " + m).orElse(""));
    }
    out.append('\n').append(texts.say("caution-estimate")).append('\n');
    out.append(texts.say("caution-makers-limits")).append('\n');
    return out.toString();
  }

  private static void parts(
      StringBuilder out, String title, Map<?, BigDecimal> parts, BigDecimal all) {
    out.append(title).append('\n');
    parts.forEach(
        (key, wheels) ->
            AirText.line(
                out,
                "  %-66s %12s  %5.1f %%",
                key,
                wheels.stripTrailingZeros().toPlainString(),
                100 * wheels.doubleValue() / all.doubleValue()));
  }
}
