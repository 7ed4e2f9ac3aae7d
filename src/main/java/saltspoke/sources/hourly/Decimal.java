package saltspoke.sources.hourly;

import java.nio.charset.StandardCharsets;

/**
 * Decimal numbers straight from bytes. Up to 15 digits the quotient of two exactly held numbers is
 * the correctly rounded value, so the result is that of {@link Double#parseDouble}; longer ones and
 * those with an exponent go there.
 */
final class Decimal {
  private static final double[] TENS = {
    1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15
  };

  private static final int EXACT_DIGITS = 15;

  private Decimal() {}

  /** The number between two bounds, or NaN when there is none. */
  static double parse(byte[] bytes, int from, int to) {
    int at = from;
    boolean negative = false;
    if (at < to && (bytes[at] == '-' || bytes[at] == '+')) {
      negative = bytes[at] == '-';
      at++;
    }
    long digits = 0;
    int count = 0;
    int decimals = -1;
    for (; at < to; at++) {
      int c = bytes[at];
      if (c >= '0' && c <= '9') {
        if (++count > EXACT_DIGITS) {
          return slow(bytes, from, to);
        }
        digits = 10 * digits + (c - '0');
        decimals += decimals >= 0 ? 1 : 0;
      } else if (c == '.' && decimals < 0) {
        decimals = 0;
      } else {
        return count > 0 && (c == 'e' || c == 'E') ? slow(bytes, from, to) : Double.NaN;
      }
    }
    if (count == 0) {
      return Double.NaN;
    }
    double value = decimals > 0 ? digits / TENS[decimals] : digits;
    return negative ? -value : value;
  }

  private static double slow(byte[] bytes, int from, int to) {
    try {
      double value =
          Double.parseDouble(new String(bytes, from, to - from, StandardCharsets.ISO_8859_1));
      return Double.isFinite(value) ? value : Double.NaN;
    } catch (NumberFormatException e) {
      return Double.NaN;
    }
  }

  /** The whole number between two bounds, or −1 when there is none. */
  static int whole(byte[] bytes, int from, int to) {
    if (from >= to || to - from > 9) {
      return -1;
    }
    int value = 0;
    for (int at = from; at < to; at++) {
      int digit = bytes[at] - '0';
      if (digit < 0 || digit > 9) {
        return -1;
      }
      value = 10 * value + digit;
    }
    return value;
  }
}
