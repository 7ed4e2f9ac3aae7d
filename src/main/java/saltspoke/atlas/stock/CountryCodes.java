package saltspoke.atlas.stock;

import java.text.Normalizer;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.MissingResourceException;
import java.util.Optional;

/** Two-letter codes of countries from what people write: codes and names in five languages. */
final class CountryCodes {
  private static final List<Locale> TONGUES =
      List.of(
          Locale.ENGLISH,
          Locale.GERMAN,
          Locale.FRENCH,
          Locale.ITALIAN,
          Locale.forLanguageTag("es"));

  /** Short forms in use that no table of names has. */
  private static final Map<String, String> IN_USE =
      Map.of("usa", "US", "uk", "GB", "england", "GB", "brd", "DE", "u s a", "US");

  private static final Map<String, String> KNOWN = known();

  private CountryCodes() {}

  private static Map<String, String> known() {
    Map<String, String> codes = new HashMap<>(IN_USE);
    for (String code : Locale.getISOCountries()) {
      Locale country = new Locale.Builder().setRegion(code).build();
      codes.put(plain(code), code);
      try {
        codes.put(plain(country.getISO3Country()), code);
      } catch (MissingResourceException e) {
        // No three-letter code: the two-letter one and the names do.
      }
      for (Locale tongue : TONGUES) {
        codes.putIfAbsent(plain(country.getDisplayCountry(tongue)), code);
      }
    }
    return codes;
  }

  static Optional<String> of(String written) {
    return Optional.ofNullable(KNOWN.get(plain(written)));
  }

  private static String plain(String text) {
    return Normalizer.normalize(text, Normalizer.Form.NFD)
        .replaceAll("\\p{M}", "")
        .replaceAll("[^\\p{L}\\p{N}]+", " ")
        .strip()
        .toLowerCase(Locale.ROOT);
  }
}
