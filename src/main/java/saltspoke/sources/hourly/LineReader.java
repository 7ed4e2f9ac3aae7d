package saltspoke.sources.hourly;

import java.io.EOFException;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.zip.ZipException;
import saltspoke.values.Refusal;

/**
 * Lines of a file as bytes, without making text of them. A line has an upper length, so that a
 * damaged file costs no memory; the bytes of the current line are good until the next one is read.
 */
final class LineReader {
  /** The header of a GHCN hourly file has about 8,000 bytes, its rows fewer. */
  private static final int LONGEST_LINE = 1 << 15;

  private static final int BUFFER = 1 << 16;
  private static final int SHOWN = 40;

  private final InputStream in;
  private final String fileName;
  private final byte[] buffer = new byte[BUFFER];
  private int start;
  private int end;
  private int next;
  private int filled;
  private boolean ended;
  private long number;

  LineReader(InputStream in, String fileName) {
    this.in = in;
    this.fileName = fileName;
  }

  /** Goes to the next line that is not empty; says whether there was one. */
  boolean next() {
    do {
      if (!advance()) {
        return false;
      }
    } while (start == end);
    return true;
  }

  private boolean advance() {
    int from = next;
    int at = next;
    while (true) {
      at = lineEnd(buffer, at, filled);
      if (at < filled || ended) {
        break;
      }
      if (at - from > LONGEST_LINE) {
        number++;
        start = from;
        end = at;
        throw refuse("line-too-long", "line", text(), "lines of at most " + LONGEST_LINE + " B");
      }
      System.arraycopy(buffer, from, buffer, 0, at - from);
      at -= from;
      from = 0;
      filled = at;
      fill();
    }
    if (from == filled) {
      return false;
    }
    number++;
    start = from;
    end = at;
    next = Math.min(filled, at + 1);
    if (end > start && buffer[end - 1] == '\r') {
      end--;
    }
    return true;
  }

  /** Kept small and free of fields, so that the compiler makes a tight loop of it. */
  private static int lineEnd(byte[] bytes, int from, int to) {
    int at = from;
    while (at < to && bytes[at] != '\n') {
      at++;
    }
    return at;
  }

  private void fill() {
    try {
      int n = in.read(buffer, filled, BUFFER - filled);
      if (n < 0) {
        ended = true;
      } else {
        filled += n;
      }
    } catch (EOFException e) {
      throw refuse("truncated-file", "file", "an end within packed data", "the file once more");
    } catch (ZipException e) {
      throw refuse("damaged-file", "file", e.getMessage(), "the file once more");
    } catch (IOException e) {
      throw refuse("unreadable-file", "file", e.getMessage(), "a file that can be read");
    }
  }

  byte[] bytes() {
    return buffer;
  }

  int start() {
    return start;
  }

  int end() {
    return end;
  }

  /** The number of the current line, from 1. */
  long number() {
    return number;
  }

  /** The current line, bytes that are no ASCII replaced; for messages and headers. */
  String text() {
    return new String(buffer, start, end - start, StandardCharsets.UTF_8);
  }

  /** A refusal that names file, line and field. */
  Refusal refuse(String error, String field, String was, String allowed) {
    return Refusal.dataDamaged(error, fileName + ":" + number + " " + field, shown(was), allowed);
  }

  /** Text short and printable enough for a message. */
  static String shown(String text) {
    String cut = text.length() > SHOWN ? text.substring(0, SHOWN) + "…" : text;
    return cut.replaceAll("[^\\x20-\\x7e\\u00a0-\\u024f…]", "?");
  }
}
