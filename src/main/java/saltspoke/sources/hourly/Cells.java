package saltspoke.sources.hourly;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/**
 * The cells of a separated line, by their bounds. Cells may stand in double quotes (RFC 4180, but a
 * cell does not run over lines); blanks around a cell do not count. With a blank as separator any
 * run of blanks parts two cells.
 */
final class Cells {
  private static final int MOST = 2048;

  private final LineReader lines;
  private final byte separator;
  private final int[] from = new int[MOST];
  private final int[] to = new int[MOST];
  private int count;

  Cells(LineReader lines, char separator) {
    this.lines = lines;
    this.separator = (byte) separator;
  }

  /** Parts the current line up to the given number of cells; the rest of it is not looked at. */
  void split(int wanted) {
    byte[] bytes = lines.bytes();
    byte between = separator;
    int at = lines.start();
    int end = lines.end();
    int cell = 0;
    while (cell < wanted) {
      while (at < end && bytes[at] == ' ') {
        at++;
      }
      if (between == ' ' && at == end) {
        break;
      }
      if (cell == MOST) {
        throw lines.refuse("too-many-cells", "line", lines.text(), "at most " + MOST + " cells");
      }
      if (at < end && bytes[at] == '"') {
        count = cell;
        at = quoted(bytes, at, end);
      } else {
        from[cell] = at;
        while (at < end && bytes[at] != between) {
          at++;
        }
        to[cell] = withoutBlanks(bytes, from[cell], at);
      }
      cell++;
      if (at >= end) {
        break;
      }
      at++;
    }
    count = cell;
  }

  private int quoted(byte[] bytes, int start, int end) {
    int at = start + 1;
    while (at < end && (bytes[at] != '"' || (at + 1 < end && bytes[at + 1] == '"'))) {
      at += bytes[at] == '"' ? 2 : 1;
    }
    if (at >= end) {
      throw lines.refuse("open-quote", "cell " + (count + 1), lines.text(), "a closing quote");
    }
    int inside = start + 1;
    while (inside < at && bytes[inside] == ' ') {
      inside++;
    }
    from[count] = inside;
    to[count] = withoutBlanks(bytes, inside, at);
    at++;
    while (at < end && bytes[at] != separator) {
      if (bytes[at] != ' ') {
        throw lines.refuse(
            "text-after-quote",
            "cell " + (count + 1),
            lines.text(),
            "a separator after a closing quote");
      }
      at++;
    }
    return at;
  }

  private static int withoutBlanks(byte[] bytes, int start, int end) {
    int last = end;
    while (last > start && bytes[last - 1] == ' ') {
      last--;
    }
    return last;
  }

  int count() {
    return count;
  }

  int from(int cell) {
    return from[cell];
  }

  int to(int cell) {
    return to[cell];
  }

  boolean isEmpty(int cell) {
    return from[cell] == to[cell];
  }

  boolean equal(int cell, byte[] text) {
    return Arrays.equals(lines.bytes(), from[cell], to[cell], text, 0, text.length);
  }

  byte[] copy(int cell) {
    return Arrays.copyOfRange(lines.bytes(), from[cell], to[cell]);
  }

  /** The text of a cell in UTF-8; refused when it is not. */
  String text(int cell, String field) {
    ByteBuffer bytes = ByteBuffer.wrap(lines.bytes(), from[cell], to[cell] - from[cell]);
    try {
      return StandardCharsets.UTF_8.newDecoder().decode(bytes).toString().replace("\"\"", "\"");
    } catch (CharacterCodingException e) {
      throw lines.refuse("wrong-encoding", field, lines.text(), "text in UTF-8");
    }
  }
}
