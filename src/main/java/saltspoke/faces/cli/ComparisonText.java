package saltspoke.faces.cli;

import java.util.List;
import java.util.Locale;
import saltspoke.atlas.Comparison;
import saltspoke.atlas.Judgement;
import saltspoke.atlas.Pair;
import saltspoke.values.Refusal;

/**
 * A comparison with a station file as plain text: one line per quantity, then the worst stations.
 */
final class ComparisonText {
  private static final int MOST_REFUSED = 20;

  private ComparisonText() {}

  static String of(Comparison comparison, int worst) {
    StringBuilder out = new StringBuilder();
    out.append(
        String.format(
            Locale.ROOT,
            "%-50s %6s %8s %8s %8s %7s %5s %5s %5s %6s %6s%n",
            "quantity",
            "n",
            "bias",
            "MAE",
            "RMSE",
            "ln RMSE",
            "×2 %",
            "×3 %",
            "band%",
            "med. %",
            "corr."));
    for (Comparison.Series series : comparison.series()) {
      Judgement j = series.judgement();
      out.append(
          String.format(
              Locale.ROOT,
              "%-50s %6d %8.2f %8.2f %8.2f %7s %5s %5s %5s %6s %6s%n",
              j.quantity(),
              j.n(),
              j.bias(),
              j.mae(),
              j.rmse(),
              number("%.3f", j.lnRmse()),
              number("%.0f", j.withinFactor2Pct()),
              number("%.0f", j.withinFactor3Pct()),
              number("%.0f", j.bandCoveragePct()),
              number("%.1f", j.medianAbsErrorPct()),
              number("%.3f", j.correlation())));
    }
    out.append(
        "\nbias = mean of estimate less measurement; ×2 %, ×3 % = share within a factor 2, 3;\n"
            + "band% = share inside the estimate's 10–90 % band; med. % = median absolute error.\n");
    if (worst > 0) {
      Comparison.Series first = comparison.series().get(0);
      out.append("\nFarthest off, ").append(first.quantity()).append(":\n");
      for (Pair pair : first.worst(worst)) {
        out.append(
            String.format(
                Locale.ROOT,
                "  %-50s measured %.4g, estimated %.4g%n",
                pair.station(),
                pair.measured(),
                pair.estimated()));
      }
    }
    refused(out, "Left out", comparison.refused());
    return out.toString();
  }

  /** Lists the first rows that were refused; nothing when there is none. */
  static void refused(StringBuilder out, String title, List<Refusal> refused) {
    int count = refused.size();
    if (count == 0) {
      return;
    }
    out.append('\n').append(title).append(", ").append(count);
    out.append(count == 1 ? " row:\n" : " rows:\n");
    for (Refusal refusal : refused.subList(0, Math.min(count, MOST_REFUSED))) {
      out.append(
          String.format(
              Locale.ROOT,
              "  %s: %s \"%s\"; allowed: %s%n",
              refusal.field(),
              refusal.error().replace('-', ' '),
              refusal.was(),
              refusal.allowed()));
    }
    if (count > MOST_REFUSED) {
      out.append("  and ").append(count - MOST_REFUSED).append(" more (all with --json)\n");
    }
  }

  private static String number(String format, Double value) {
    return value == null ? "–" : String.format(Locale.ROOT, format, value);
  }
}
