package saltspoke.faces.cli;

import java.util.Locale;
import java.util.Map;
import saltspoke.advice.PairingAdvice;
import saltspoke.atlas.PairingOutlook;
import saltspoke.atlas.RegionOutlook;
import saltspoke.atmosphere.Category;
import saltspoke.atmosphere.Metal;
import saltspoke.faces.Texts;
import saltspoke.values.Quantiles;

/** The outlook of a region as plain text. */
final class RegionText {
  private static final int MOST_PAIRINGS = 25;

  private RegionText() {}

  static String of(RegionOutlook outlook, Texts texts) {
    StringBuilder out = new StringBuilder();
    AirText.line(
        out,
        "%s%s: %,d people in %,d towns",
        outlook.area().name(),
        outlook.area().countryCode().isEmpty() ? "" : ", " + outlook.area().countryCode(),
        outlook.people(),
        outlook.towns());
    out.append("\nShare of the people by class, %\nmetal         ");
    for (Category category : Category.values()) {
      out.append(String.format("%6s", category));
    }
    out.append('\n');
    for (Metal metal : Metal.values()) {
      out.append(String.format("%-14s", metal.id()));
      Map<Category, Double> share = outlook.classShare().get(metal);
      share.values().forEach(s -> out.append(s > 0 ? cell(100 * s) : "     –"));
      out.append('\n');
    }
    AirText.line(out, "\nSea salt, mg Cl/(m² d): %s", AirText.range(outlook.chlorideMgPerM2Day()));
    AirText.line(out, "Wet hours a year: %s", AirText.range(outlook.wetHours()));
    AirText.line(out, "Days near freezing: %s", AirText.range(outlook.nearFreezingDays()));
    if (!outlook.pairings().isEmpty()) {
      pairings(out, outlook, texts);
    }
    AirText.notes(out, "\nTo know:", outlook.flags(), texts);
    return out.toString();
  }

  private static void pairings(StringBuilder out, RegionOutlook outlook, Texts texts) {
    out.append("\nMonths, for 10–50–90 % of the people; best first\n");
    out.append("first look          every               replace by          ");
    out.append("rim / nipple / interface / spoke\n");
    for (PairingOutlook pairing :
        outlook.pairings().subList(0, Math.min(MOST_PAIRINGS, outlook.pairings().size()))) {
      AirText.line(
          out,
          "%-18s  %-18s  %-18s  %s / %s / %s / %s",
          months(pairing.firstLookMonths(), texts),
          months(pairing.everyMonths(), texts),
          months(pairing.replaceByMonths(), texts),
          pairing.pairing().rim(),
          pairing.pairing().nipple(),
          pairing.pairing().between(),
          pairing.pairing().spoke());
    }
    if (outlook.pairings().size() > MOST_PAIRINGS) {
      AirText.line(out, "%d more with --json", outlook.pairings().size() - MOST_PAIRINGS);
    }
  }

  private static String months(Quantiles months, Texts texts) {
    return month(months.p10(), texts)
        + "–"
        + month(months.median(), texts)
        + "–"
        + month(months.p90(), texts);
  }

  private static String month(double months, Texts texts) {
    return months >= PairingAdvice.HORIZON_MONTHS ? ">240" : texts.format(months);
  }

  private static String cell(double pct) {
    return String.format(Locale.ROOT, "%6.1f", pct);
  }
}
