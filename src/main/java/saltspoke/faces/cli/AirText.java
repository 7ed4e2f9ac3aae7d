package saltspoke.faces.cli;

import java.util.Locale;
import saltspoke.atmosphere.AirClimate;
import saltspoke.atmosphere.Category;
import saltspoke.atmosphere.MetalCorrosivity;
import saltspoke.atmosphere.MonthAir;
import saltspoke.faces.Texts;
import saltspoke.places.Place;
import saltspoke.values.Note;
import saltspoke.values.Quantiles;

/** An answer about the air as plain text, eighty columns or so, a unit with every number. */
final class AirText {
  private AirText() {}

  static String of(AirClimate air, Texts texts) {
    StringBuilder out = new StringBuilder();
    place(out, air.place(), texts);
    out.append(texts.say(air.summary())).append("\n\n");
    line(
        out,
        "Year: %.1f °C, %.0f %% RH, %.0f wet hours (%s), %.0f mm rain, %.0f frost days",
        air.annual().temperatureC(),
        air.annual().relativeHumidityPct(),
        air.annual().wetHours(),
        air.wetnessClass(),
        air.annual().rainMm(),
        air.annual().frostDays());
    line(
        out,
        "Sea salt: %s mg Cl/(m² d) (%s)",
        range(air.chlorideDepositionMgPerM2Day()),
        air.salinityClass());
    line(
        out,
        "SO2: %s mg/(m² d) (%s, setting %s%s)",
        range(air.so2DepositionMgPerM2Day()),
        air.sulfurClass(),
        air.setting().id(),
        air.settingGiven() ? "" : ", guessed");
    line(
        out,
        "Road salt (outside the class): practice %s (%s confidence), %s treatments a winter",
        air.roadSalt().practice(),
        air.roadSalt().practiceConfidence(),
        range(air.roadSalt().treatmentsPerWinter()));
    out.append("\nmetal          first year, µm (10–90 %)       class  probability\n");
    for (MetalCorrosivity metal : air.corrosivity()) {
      line(
          out,
          "%-14s %-30s %-6s %s",
          metal.metal().id(),
          range(metal.firstYearLossUm()),
          metal.category(),
          probabilities(metal));
    }
    out.append("\nmonth  T °C   RH %  wet h  rain mm  near-freezing d  frost d  Cl mg/(m² d)\n");
    for (MonthAir month : air.months()) {
      line(
          out,
          "%5d  %5.1f  %4.0f  %5.0f  %7.0f  %15.1f  %7.1f  %12.1f",
          month.month(),
          month.temperatureC(),
          month.relativeHumidityPct(),
          month.wetHours(),
          month.rainMm(),
          month.nearFreezingDays(),
          month.frostDays(),
          month.chlorideDepositionMgPerM2Day());
    }
    notes(out, "\nTo know:", air.flags(), texts);
    return out.toString();
  }

  static void place(StringBuilder out, Place place, Texts texts) {
    String name = place.name().isEmpty() ? "Place" : place.name();
    line(
        out,
        "%s%s%s: %.4f, %.4f, %.0f m above the sea, %s km from it",
        name,
        place.regionName().isEmpty() ? "" : ", " + place.regionName(),
        place.countryCode().isEmpty() ? "" : ", " + place.countryCode(),
        place.latitudeDeg(),
        place.longitudeDeg(),
        place.elevationM(),
        texts.format(place.sea().distanceKm()));
    place.flags().forEach(flag -> out.append("  ").append(texts.say(flag)).append('\n'));
  }

  static void notes(StringBuilder out, String heading, Iterable<Note> notes, Texts texts) {
    out.append(heading).append('\n');
    for (Note note : notes) {
      out.append("  - ").append(texts.say(note)).append('\n');
    }
  }

  static String range(Quantiles quantiles) {
    return short3(quantiles.median())
        + " ("
        + short3(quantiles.p10())
        + "–"
        + short3(quantiles.p90())
        + ")";
  }

  static void line(StringBuilder out, String format, Object... values) {
    out.append(String.format(Locale.ROOT, format, values)).append('\n');
  }

  private static String short3(double value) {
    return new java.math.BigDecimal(value)
        .round(new java.math.MathContext(value >= 100 ? 3 : 2))
        .toPlainString();
  }

  private static String probabilities(MetalCorrosivity metal) {
    StringBuilder text = new StringBuilder();
    for (Category category : Category.values()) {
      double share = metal.categoryProbability().getOrDefault(category, 0.0);
      if (share >= 0.01) {
        text.append(String.format(Locale.ROOT, "%s %.0f %%  ", category, 100 * share));
      }
    }
    return text.toString().trim();
  }
}
