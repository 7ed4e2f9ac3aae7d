package saltspoke.places;

/**
 * Takes the cells of one RFC 4180 line in turn. For the large tables that this program wrote itself
 * and checked by their sums, where a full parser would cost a cold start half its time.
 */
final class CsvLine {
  private final String line;
  private int at;

  CsvLine(String line) {
    this.line = line;
  }

  /** The next cell; empty beyond the last. */
  String next() {
    int from = at;
    if (from < line.length() && line.charAt(from) == '"') {
      int end = line.indexOf('"', from + 1);
      while (end + 1 < line.length() && line.charAt(end + 1) == '"') {
        end = line.indexOf('"', end + 2);
      }
      at = end + 2;
      return line.substring(from + 1, end).replace("\"\"", "\"");
    }
    if (from >= line.length()) {
      return "";
    }
    int end = line.indexOf(',', from);
    end = end < 0 ? line.length() : end;
    at = end + 1;
    return line.substring(from, end);
  }
}
