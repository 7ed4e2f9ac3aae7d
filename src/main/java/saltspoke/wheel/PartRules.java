package saltspoke.wheel;

import java.util.Optional;
import saltspoke.values.Note;

/** The few rules of what can be built. */
final class PartRules {
  private PartRules() {}

  static Optional<Note> refusal(Rim rim, Nipple nipple, SeatInterface between) {
    if (between.aluminiumRimOnly() && rim.carbon()) {
      return Optional.of(
          Note.of("wheel-refused-eyelet-carbon", "rim", rim.id(), "interface", between.id()));
    }
    if (between.carbonRimOnly() && !rim.carbon()) {
      return Optional.of(
          Note.of("wheel-refused-bushing-aluminium", "rim", rim.id(), "interface", between.id()));
    }
    if (between.insulating() && nipple.material() == Material.POLYMER) {
      return Optional.of(
          Note.of(
              "wheel-refused-polymer-insulated", "nipple", nipple.id(), "interface", between.id()));
    }
    return Optional.empty();
  }

  /** The rule that stands against the given parts, in words for a refusal; parts may be null. */
  static String explain(Rim rim, Nipple nipple, SeatInterface between) {
    if (between != null && between.aluminiumRimOnly() && rim != null && rim.carbon()) {
      return "an eyelet is pressed into the wall of an aluminium rim; a carbon rim takes a washer,"
          + " a bushing or none";
    }
    if (between != null && between.carbonRimOnly() && rim != null && !rim.carbon()) {
      return "a bushing needs the wider hole of a carbon rim; an aluminium rim takes an eyelet, a"
          + " washer or none";
    }
    if (between != null
        && between.insulating()
        && nipple != null
        && nipple.material() == Material.POLYMER) {
      return "a polymer nipple insulates by itself; use interface none or a metal piece";
    }
    return "parts that occur together among the pairings";
  }
}
