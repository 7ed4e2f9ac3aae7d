package saltspoke.faces.export;

import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.UUID;
import java.util.stream.Collectors;
import saltspoke.advice.Advice;
import saltspoke.advice.PairingAdvice;
import saltspoke.faces.Texts;
import saltspoke.values.Note;

/**
 * The dates to look as an iCalendar file (RFC 5545): whole-day events for the looks of the next
 * three years and the day by which to replace.
 */
public final class LookCalendar {
  private static final double HORIZON_MONTHS = 36;
  private static final int MOST_LOOKS = 40;
  private static final int LINE_OCTETS = 75; // RFC 5545, 3.1
  private static final DateTimeFormatter DAY = DateTimeFormatter.BASIC_ISO_DATE;

  private LookCalendar() {}

  /**
   * The calendar of the first pairing of an answer.
   *
   * @param today day from which the answer counts
   */
  public static String render(Advice advice, Texts texts, LocalDate today) {
    Wording wording = new Wording(texts);
    PairingAdvice pairing = advice.pairings().get(0);
    String wheel = wording.pairing(pairing.pairing());
    String place = wording.place(advice.air().place());
    String stamp = DAY.format(today) + "T000000Z";

    List<String> lines = new ArrayList<>();
    lines.add("BEGIN:VCALENDAR");
    lines.add("VERSION:2.0");
    lines.add("PRODID:-//Saltspoke//Looks//" + texts.language().toUpperCase(java.util.Locale.ROOT));
    lines.add("CALSCALE:GREGORIAN");
    lines.add("METHOD:PUBLISH");
    String look =
        wording.say("page-calendar-look", Map.of("wheel", wheel))
            + " ("
            + wording.say("page-look-" + pairing.lookKind())
            + ")";
    String how =
        steps(advice.look(), wording)
            + "\n\n"
            + wording.say("page-stop")
            + "\n"
            + steps(advice.stopSigns(), wording);
    for (double months : looks(pairing)) {
      lines.addAll(event(Wording.after(today, months), look, how, place, wheel, stamp));
    }
    if (pairing.replaceByMonths() != null) {
      lines.addAll(
          event(
              Wording.after(today, pairing.replaceByMonths()),
              wording.say("page-calendar-replace", Map.of("wheel", wheel)),
              advice.cautions().stream().map(wording::say).collect(Collectors.joining("\n")),
              place,
              wheel,
              stamp));
    }
    lines.add("END:VCALENDAR");
    return lines.stream().map(LookCalendar::folded).collect(Collectors.joining());
  }

  /** Months from now of the looks, until replacement or the horizon. */
  static List<Double> looks(PairingAdvice pairing) {
    List<Double> looks = new ArrayList<>();
    double until =
        pairing.replaceByMonths() == null
            ? HORIZON_MONTHS
            : Math.min(HORIZON_MONTHS, pairing.replaceByMonths());
    double at = pairing.firstLookMonths();
    do {
      looks.add(at);
      at += pairing.everyMonths();
    } while (at < until && looks.size() < MOST_LOOKS && pairing.everyMonths() > 0);
    return looks;
  }

  private static String steps(List<Note> notes, Wording wording) {
    return notes.stream().map(note -> "- " + wording.say(note)).collect(Collectors.joining("\n"));
  }

  private static List<String> event(
      LocalDate day, String summary, String description, String place, String wheel, String stamp) {
    String identity = place + "|" + wheel + "|" + summary + "|" + day;
    return List.of(
        "BEGIN:VEVENT",
        "UID:" + UUID.nameUUIDFromBytes(identity.getBytes(StandardCharsets.UTF_8)) + "@saltspoke",
        "DTSTAMP:" + stamp,
        "DTSTART;VALUE=DATE:" + DAY.format(day),
        "DTEND;VALUE=DATE:" + DAY.format(day.plusDays(1)),
        "SUMMARY:" + escaped(summary),
        "LOCATION:" + escaped(place),
        "DESCRIPTION:" + escaped(description),
        "TRANSP:TRANSPARENT",
        "END:VEVENT");
  }

  /** TEXT values of RFC 5545, 3.3.11. */
  private static String escaped(String text) {
    return text.replace("\\", "\\\\")
        .replace(";", "\\;")
        .replace(",", "\\,")
        .replace("\r\n", "\\n")
        .replace("\n", "\\n");
  }

  /** A content line in pieces of at most 75 octets, never inside a character. */
  private static String folded(String line) {
    StringBuilder out = new StringBuilder();
    int octets = 0;
    for (int i = 0; i < line.length(); ) {
      int character = line.codePointAt(i);
      String piece = Character.toString(character);
      int size = piece.getBytes(StandardCharsets.UTF_8).length;
      if (octets + size > LINE_OCTETS) {
        out.append("\r\n ");
        octets = 1;
      }
      out.append(piece);
      octets += size;
      i += Character.charCount(character);
    }
    return out.append("\r\n").toString();
  }
}
