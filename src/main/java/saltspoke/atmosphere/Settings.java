package saltspoke.atmosphere;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import saltspoke.places.Surroundings;
import saltspoke.values.Note;
import saltspoke.values.Quantiles;

/** SO2 deposition of a place from its surroundings and its country's level. */
public final class Settings {
  /** Pd = 0.8·Pc: mg/(m² d) per µg/m³; ISO 9223, from memory. */
  static final double DEPOSITION_PER_CONCENTRATION = 0.8;

  /** ASSUMPTION: city air of a country that the table lacks, µg/m³; spread a factor 3. */
  private static final double UNKNOWN_COUNTRY_CITY_UG_PER_M3 = 6;

  /** ASSUMPTION: ln spread of air within one setting of one country. */
  private static final double WITHIN_SETTING_LN_SPREAD = 0.4;

  /** ASSUMPTION: ln spread that a guessed setting adds. */
  private static final double GUESS_LN_SPREAD = 0.4;

  /** ASSUMPTION: people within 5 km that make a city, and a town. */
  private static final double CITY_PEOPLE_5_KM = 100_000;

  private static final double TOWN_PEOPLE_5_KM = 8_000;

  /**
   * ASSUMPTION: a big city is one gazetteer point; within it, far from that point, people within 25
   * km and bright nights (grey level, 0..255) together tell city and town.
   */
  private static final double CITY_PEOPLE_25_KM = 1_000_000;

  private static final double CITY_LIGHT = 150;
  private static final double TOWN_PEOPLE_25_KM = 150_000;
  private static final double TOWN_LIGHT = 120;

  /** ASSUMPTION: people within 25 km below which, in the dark, a place is remote. */
  private static final double REMOTE_PEOPLE_25_KM = 3_000;

  /** ASSUMPTION: grey level below which nights are dark; bare desert shows about 50. */
  private static final double DARK_LIGHT = 55;

  private Settings() {}

  /**
   * ASSUMPTION: SO2 of a setting over that of the country's city background. ISO 9223 gives rural
   * 2–15, urban 5–100 and industrial 50–400 µg/m³ for the air of its time (from memory), the same
   * order and about the same steps.
   */
  static double overCity(Setting setting) {
    return switch (setting) {
      case REMOTE -> 0.1;
      case RURAL -> 0.35;
      case TOWN -> 0.65;
      case CITY -> 1;
      case INDUSTRIAL -> 3;
      case PORT -> 2;
    };
  }

  /**
   * The setting by people and lights nearby. Industry and ports leave no sure mark in either, so
   * they are never guessed, only given.
   */
  public static Setting guess(Surroundings around) {
    double near = around.populationWithin5Km();
    double wide = around.populationWithin25Km();
    double light = around.nightLight();
    if (near >= CITY_PEOPLE_5_KM || (wide >= CITY_PEOPLE_25_KM && light >= CITY_LIGHT)) {
      return Setting.CITY;
    }
    if (near >= TOWN_PEOPLE_5_KM || (wide >= TOWN_PEOPLE_25_KM && light >= TOWN_LIGHT)) {
      return Setting.TOWN;
    }
    boolean remote = wide < REMOTE_PEOPLE_25_KM && light < DARK_LIGHT;
    return remote ? Setting.REMOTE : Setting.RURAL;
  }

  /**
   * @param depositionMgPerM2Day annual mean
   * @param lnSpread one standard deviation of its logarithm
   */
  public record So2(Quantiles depositionMgPerM2Day, double lnSpread, List<Note> flags) {
    public So2 {
      flags = List.copyOf(flags);
    }
  }

  /** SO2 deposition for a setting in a country; a guessed setting is less sure than a given one. */
  public static So2 so2(Setting setting, boolean given, Optional<CountryAir.Country> country) {
    double city =
        country.map(CountryAir.Country::so2CityUgPerM3).orElse(UNKNOWN_COUNTRY_CITY_UG_PER_M3);
    Confidence confidence = country.map(CountryAir.Country::so2Confidence).orElse(Confidence.LOW);
    List<Note> flags = new ArrayList<>();
    if (country.isEmpty()) {
      flags.add(Note.of("air-so2-country-unknown", "ugPerM3", city));
    } else if (confidence == Confidence.LOW) {
      flags.add(Note.of("air-so2-country-unsure", "country", country.get().countryCode()));
    }
    if (!given) {
      flags.add(new Note("air-setting-guessed", Map.of("setting", setting.id())));
    }
    double lnSpread =
        Math.hypot(
            Math.hypot(confidence.lnSpread(), WITHIN_SETTING_LN_SPREAD),
            given ? 0 : GUESS_LN_SPREAD);
    double median = DEPOSITION_PER_CONCENTRATION * city * overCity(setting);
    return new So2(SeaSalt.spread(median, lnSpread), lnSpread, flags);
  }
}
