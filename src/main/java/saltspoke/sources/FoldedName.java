package saltspoke.sources;

import java.text.Normalizer;
import java.util.Locale;

/**
 * A name as it is compared: lower case, accents off, letters that do not decompose spelled out,
 * hyphens, stops and apostrophes as one blank.
 */
public final class FoldedName {
  private static final String PLAIN_FROM = "øłđðıħŧ";
  private static final String PLAIN_TO = "olddiht";

  private FoldedName() {}

  public static String of(String name) {
    String lower = name.toLowerCase(Locale.ROOT);
    if (!isPlain(lower)) {
      lower = Normalizer.normalize(lower, Normalizer.Form.NFKD);
    }
    StringBuilder folded = new StringBuilder(lower.length());
    for (int i = 0; i < lower.length(); i++) {
      fold(lower.charAt(i), folded);
    }
    int end = folded.length();
    if (end > 0 && folded.charAt(end - 1) == ' ') {
      folded.setLength(end - 1);
    }
    return folded.toString();
  }

  private static boolean isPlain(String text) {
    for (int i = 0; i < text.length(); i++) {
      if (text.charAt(i) >= 0x80) {
        return false;
      }
    }
    return true;
  }

  private static void fold(char c, StringBuilder out) {
    if ((c >= 'a' && c <= 'z') || (c >= '0' && c <= '9')) {
      out.append(c);
      return;
    }
    int plain = PLAIN_FROM.indexOf(c);
    if (plain >= 0) {
      out.append(PLAIN_TO.charAt(plain));
    } else if (c == 'ß') {
      out.append("ss");
    } else if (c == 'æ') {
      out.append("ae");
    } else if (c == 'œ') {
      out.append("oe");
    } else if (c == 'þ') {
      out.append("th");
    } else if (Character.isLetterOrDigit(c)) {
      out.append(c);
    } else if (Character.getType(c) != Character.NON_SPACING_MARK
        && out.length() > 0
        && out.charAt(out.length() - 1) != ' '
        && c != '\''
        && c != '\u2019'
        && c != '\u02bb'
        && c != '\u2018'
        && c != '`') {
      out.append(' ');
    }
  }
}
