package saltspoke.faces.export;

import java.time.LocalDate;
import java.time.format.DateTimeFormatter;
import java.time.format.FormatStyle;
import java.time.format.TextStyle;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import saltspoke.advice.PairingAdvice;
import saltspoke.advice.StateTimes;
import saltspoke.faces.Texts;
import saltspoke.places.Place;
import saltspoke.values.Note;
import saltspoke.wheel.Pairing;

/** How an answer's places, parts, spans and dates read in one language. */
final class Wording {
  private static final double DAYS_PER_MONTH = 365.25 / 12;
  private static final double WEEKS_PER_MONTH = DAYS_PER_MONTH / 7;
  private static final double SHOWN_AS_YEARS_MONTHS = 36;

  private final Texts texts;
  private final Locale locale;

  Wording(Texts texts) {
    this.texts = texts;
    this.locale = Locale.forLanguageTag(texts.language());
  }

  Locale locale() {
    return locale;
  }

  String say(String code) {
    return texts.say(code);
  }

  String say(Note note) {
    return texts.say(note);
  }

  String say(String code, Map<String, Object> args) {
    return texts.say(new Note(code, args));
  }

  /** Town, region and country, or the coordinates where there is no town. */
  String place(Place place) {
    List<String> parts = new ArrayList<>();
    parts.add(
        place.name().isEmpty()
            ? String.format(Locale.ROOT, "%.3f, %.3f", place.latitudeDeg(), place.longitudeDeg())
            : place.name());
    if (!place.regionName().isEmpty() && !parts.contains(place.regionName())) {
      parts.add(place.regionName());
    }
    if (!place.countryCode().isEmpty()) {
      parts.add(
          new Locale.Builder().setRegion(place.countryCode()).build().getDisplayCountry(locale));
    }
    return String.join(", ", parts);
  }

  /** Nipple, interface and rim by their titles. */
  String pairing(Pairing pairing) {
    List<String> parts = new ArrayList<>();
    parts.add(say("page-nipple-" + pairing.nipple()));
    if (!pairing.between().equals("none")) {
      parts.add(say("page-interface-" + pairing.between()));
    }
    parts.add(say("page-rim-" + pairing.rim()));
    return String.join(" · ", parts);
  }

  /** The reason that sets the interval, else the foremost. */
  String limit(PairingAdvice advice) {
    return advice.reasons().stream()
        .filter(reason -> reason.code().endsWith(advice.limitedBy()))
        .findFirst()
        .or(() -> advice.reasons().stream().findFirst())
        .map(this::say)
        .orElse("");
  }

  /** A span to act within, rounded down: better a week early than a week late. */
  String span(double months) {
    return counted(unit(months), floored(months));
  }

  /** "every 3 months", as each language says it for one and for several. */
  String every(double months) {
    String code = "page-each-" + unit(months);
    return floored(months) == 1 ? say(code) : say(code + "s", Map.of("span", span(months)));
  }

  private static String unit(double months) {
    return months < 1 ? "week" : "month";
  }

  private static double floored(double months) {
    if (months < 1) {
      return Math.max(1, Math.floor(months * WEEKS_PER_MONTH));
    }
    return months < 6 ? Math.floor(months * 2) / 2 : Math.floor(months);
  }

  /** When a state is reached, as a range; what lies beyond the horizon says so. */
  String range(StateTimes times) {
    if (times.notApplicable()) {
      return say("page-times-never");
    }
    if (times.p10() == null) {
      return say("page-times-beyond");
    }
    boolean inYears =
        times.p10() >= 12 && (times.p90() == null || times.p90() > SHOWN_AS_YEARS_MONTHS);
    String unit = inYears ? "year" : "month";
    double scale = inYears ? 12 : 1;
    double from = rounded(times.p10() / scale);
    if (times.p90() == null) {
      return say("page-times-open", Map.of("from", counted(unit, from)));
    }
    double to = rounded(times.p90() / scale);
    return from == to ? counted(unit, from) : number(from) + "–" + counted(unit, to);
  }

  /** The day on which a span that starts on a day ends, rounded down. */
  static LocalDate after(LocalDate start, double months) {
    return start.plusDays((long) Math.floor(months * DAYS_PER_MONTH));
  }

  String date(LocalDate date) {
    return DateTimeFormatter.ofLocalizedDate(FormatStyle.LONG).withLocale(locale).format(date);
  }

  String shortMonth(int month) {
    return java.time.Month.of(month).getDisplayName(TextStyle.SHORT_STANDALONE, locale);
  }

  private String counted(String unit, double value) {
    String code = "page-unit-" + unit + (value == 1 ? "" : "s");
    return say(code, Map.of("value", number(value)));
  }

  private String number(double value) {
    return String.format(locale, value == Math.rint(value) ? "%.0f" : "%.1f", value);
  }

  /** One decimal below five, whole numbers above. */
  private static double rounded(double value) {
    return value < 5 ? Math.rint(value * 10) / 10 : Math.rint(value);
  }
}
