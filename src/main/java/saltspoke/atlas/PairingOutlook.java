package saltspoke.atlas;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import saltspoke.advice.PairingAdvice;
import saltspoke.values.Quantiles;
import saltspoke.wheel.Pairing;

/**
 * One pairing over the people of an area.
 *
 * @param firstLookMonths 10, 50 and 90 % of the people have at most this
 * @param everyMonths likewise
 * @param replaceByMonths likewise; beyond the horizon of {@link PairingAdvice} counts as the
 *     horizon
 */
public record PairingOutlook(
    Pairing pairing, Quantiles firstLookMonths, Quantiles everyMonths, Quantiles replaceByMonths) {
  /**
   * The pairings by the interval that nine people in ten can keep to, the longest first; of equals
   * the one that lasts longer.
   *
   * @param advice per place of a sample, the advice for the same pairings in any order
   */
  static List<PairingOutlook> ranked(List<List<PairingAdvice>> advice) {
    Map<Pairing, List<PairingAdvice>> byPairing = new LinkedHashMap<>();
    for (List<PairingAdvice> place : advice) {
      for (PairingAdvice each : place) {
        byPairing.computeIfAbsent(each.pairing(), p -> new ArrayList<>()).add(each);
      }
    }
    List<PairingOutlook> outlooks = new ArrayList<>();
    byPairing.forEach(
        (pairing, all) ->
            outlooks.add(
                new PairingOutlook(
                    pairing,
                    quantiles(all.stream().mapToDouble(PairingAdvice::firstLookMonths).toArray()),
                    quantiles(all.stream().mapToDouble(PairingAdvice::everyMonths).toArray()),
                    quantiles(all.stream().mapToDouble(PairingOutlook::replaceBy).toArray()))));
    outlooks.sort(
        Comparator.comparingDouble((PairingOutlook o) -> -o.firstLookMonths.p10())
            .thenComparingDouble(o -> -o.replaceByMonths.p10())
            .thenComparingDouble(o -> -o.everyMonths.p10()));
    return outlooks;
  }

  private static double replaceBy(PairingAdvice advice) {
    Double months = advice.replaceByMonths();
    return months == null ? PairingAdvice.HORIZON_MONTHS : months;
  }

  private static Quantiles quantiles(double[] values) {
    Arrays.sort(values);
    return RegionOutlook.quantiles(values);
  }
}
