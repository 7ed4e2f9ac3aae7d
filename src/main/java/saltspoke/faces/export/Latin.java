package saltspoke.faces.export;

import java.nio.charset.Charset;
import java.nio.charset.CharsetEncoder;
import java.text.Normalizer;
import java.util.Map;

/** Brings text into the characters that a PDF's built-in fonts have (Windows-1252). */
final class Latin {
  private static final Charset BUILT_IN = Charset.forName("windows-1252");

  /** Letters and signs that do not fall apart into a base letter and an accent. */
  private static final Map<Integer, String> LOOKALIKES =
      Map.ofEntries(
          Map.entry((int) 'Ł', "L"),
          Map.entry((int) 'ł', "l"),
          Map.entry((int) 'Đ', "D"),
          Map.entry((int) 'đ', "d"),
          Map.entry((int) 'ı', "i"),
          Map.entry((int) 'Ħ', "H"),
          Map.entry((int) 'ħ', "h"),
          Map.entry((int) 'ʻ', "'"),
          Map.entry((int) 'ʼ', "'"),
          Map.entry((int) '−', "-"),
          Map.entry((int) '≤', "<="),
          Map.entry((int) '≥', ">="),
          Map.entry((int) '≈', "~"),
          Map.entry((int) '₂', "2"),
          Map.entry((int) '₄', "4"),
          Map.entry((int) 'τ', "tau"),
          Map.entry(0x202F, " "));

  private Latin() {}

  static String of(String text) {
    CharsetEncoder encoder = BUILT_IN.newEncoder();
    StringBuilder out = new StringBuilder(text.length());
    text.codePoints()
        .forEach(
            point -> {
              String one = Character.toString(point);
              if (encoder.canEncode(one)) {
                out.append(one);
              } else if (LOOKALIKES.containsKey(point)) {
                out.append(LOOKALIKES.get(point));
              } else {
                String base =
                    Normalizer.normalize(one, Normalizer.Form.NFKD).replaceAll("\\p{M}+", "");
                out.append(!base.isEmpty() && encoder.canEncode(base) ? base : "?");
              }
            });
    return out.toString();
  }
}
