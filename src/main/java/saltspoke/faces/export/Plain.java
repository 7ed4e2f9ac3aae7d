package saltspoke.faces.export;

/** Texts in tables. */
final class Plain {
  private Plain() {}

  /** A text that a spreadsheet does not take for a formula. */
  static String of(String text) {
    return !text.isEmpty() && "=+-@\t\r".indexOf(text.charAt(0)) >= 0 ? "'" + text : text;
  }
}
