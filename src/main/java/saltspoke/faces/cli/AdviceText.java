package saltspoke.faces.cli;

import java.util.List;
import java.util.Locale;
import saltspoke.advice.Advice;
import saltspoke.advice.Change;
import saltspoke.advice.PairingAdvice;
import saltspoke.advice.StateTimes;
import saltspoke.faces.Texts;

/** Advice as plain text: the place, the pairings ranked, why, what one change buys, cautions. */
final class AdviceText {
  private static final int MOST_CHANGES = 6;

  /** Of the air's many flags these are told here too: they say that a person's own file counted. */
  private static final String MOVED_BY_MEASUREMENTS = "air-corrected-";

  private AdviceText() {}

  static String of(Advice advice, Texts texts) {
    StringBuilder out = new StringBuilder();
    AirText.place(out, advice.air().place(), texts);
    out.append(texts.say(advice.air().summary())).append('\n');
    advice.air().flags().stream()
        .filter(note -> note.code().startsWith(MOVED_BY_MEASUREMENTS))
        .forEach(note -> AirText.line(out, "%s", texts.say(note)));
    AirText.line(out, "Profile: %s", advice.request().profile().title());
    out.append("\nfirst  every  replace  seized, months   pairing\n");
    out.append(" look              by  (10–50–90 %)     rim / nipple / interface / spoke\n");
    for (PairingAdvice pairing : advice.pairings()) {
      AirText.line(
          out,
          "%5s  %5s  %7s  %-15s  %s / %s / %s / %s",
          texts.format(pairing.firstLookMonths()),
          texts.format(pairing.everyMonths()),
          pairing.replaceByMonths() == null ? ">240" : texts.format(pairing.replaceByMonths()),
          times(pairing.seizedMonths(), texts),
          pairing.pairing().rim(),
          pairing.pairing().nipple(),
          pairing.pairing().between(),
          pairing.pairing().spoke());
    }
    out.append("Months from now. A dash: cannot occur with these materials.\n");
    PairingAdvice focus = advice.pairings().get(0);
    if (advice.pairings().size() == 1) {
      AirText.line(
          out,
          "\nFirst visible attack (%s): %s months; loss of a head or bed (%s): %s months",
          focus.firstAttackMonths().part(),
          times(focus.firstAttackMonths(), texts),
          focus.headLossMonths().part(),
          times(focus.headLossMonths(), texts));
      AirText.notes(out, "\nWhy:", focus.reasons(), texts);
    }
    changes(out, advice.changes(), texts);
    AirText.notes(
        out,
        "\nA look (" + focus.lookKind() + ", about " + focus.lookMinutes() + " min):",
        advice.look(),
        texts);
    AirText.notes(out, "\nStop riding when:", advice.stopSigns(), texts);
    AirText.notes(out, "\nCautions:", advice.cautions(), texts);
    if (!advice.flags().isEmpty()) {
      AirText.notes(out, "\nTo know:", advice.flags(), texts);
    }
    return out.toString();
  }

  private static void changes(StringBuilder out, List<Change> changes, Texts texts) {
    if (changes.isEmpty()) {
      return;
    }
    out.append("\nWhat one change buys:\n");
    changes.stream()
        .limit(MOST_CHANGES)
        .forEach(
            change ->
                AirText.line(
                    out,
                    "  %s First look at %s months, × %s (%s)",
                    texts.say(change.what()),
                    texts.format(change.firstLookMonths()),
                    texts.format(change.factor()),
                    change.cost()));
  }

  private static String times(StateTimes times, Texts texts) {
    if (times.notApplicable()) {
      return "–";
    }
    return month(times.p10(), texts)
        + "–"
        + month(times.median(), texts)
        + "–"
        + month(times.p90(), texts);
  }

  private static String month(Double months, Texts texts) {
    if (months == null) {
      return ">240";
    }
    Locale locale = Locale.forLanguageTag(texts.language());
    return String.format(locale, months < 9.95 ? "%.1f" : "%.0f", months);
  }
}
