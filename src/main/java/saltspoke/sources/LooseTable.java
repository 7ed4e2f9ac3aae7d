package saltspoke.sources;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.Charset;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import saltspoke.values.Refusal;

/**
 * A table as offices export it: in UTF-8, UTF-16 or Windows-1252, separated by commas, semicolons,
 * tabs or bars, with stray spaces and quotes, rows shorter or longer than the header. Nothing is
 * judged here but the form; the rows are read one by one.
 */
public final class LooseTable implements Iterator<LooseTable.Row>, AutoCloseable {
  /** What is looked at to tell encoding and separator, bytes. */
  private static final int SAMPLE_BYTES = 64 * 1024;

  private static final char[] SEPARATORS = {',', ';', '\t', '|'};

  /**
   * One row.
   *
   * @param line number of its last line in the file, the header's first line being 1
   * @param cells as they stand, stripped of spaces around them
   */
  public record Row(long line, List<String> cells) {
    public Row {
      cells = List.copyOf(cells);
    }

    /** A cell by position; empty when the row has no such cell. */
    public String cell(int column) {
      return column >= 0 && column < cells.size() ? cells.get(column) : "";
    }
  }

  private final String fileName;
  private final Charset encoding;
  private final char separator;
  private final CSVParser parser;
  private final Iterator<CSVRecord> records;
  private final List<String> header;

  private LooseTable(String fileName, Charset encoding, char separator, Reader reader)
      throws IOException {
    this.fileName = fileName;
    this.encoding = encoding;
    this.separator = separator;
    this.parser =
        CSVFormat.DEFAULT
            .builder()
            .setDelimiter(separator)
            .setIgnoreEmptyLines(true)
            .setIgnoreSurroundingSpaces(true)
            .setLenientEof(true)
            .setTrailingData(true)
            .get()
            .parse(reader);
    this.records = parser.iterator();
    this.header = hasNext() ? next().cells() : List.of();
    if (header.stream().allMatch(String::isBlank)) {
      throw Refusal.wrongUse("empty-table", fileName, "", "a table with a header row");
    }
  }

  /**
   * Opens a table; closes the stream with it.
   *
   * @throws Refusal when it is empty or no text
   */
  public static LooseTable open(InputStream stream, String fileName) {
    try {
      BufferedInputStream in = new BufferedInputStream(stream, SAMPLE_BYTES);
      in.mark(SAMPLE_BYTES);
      byte[] sample = in.readNBytes(SAMPLE_BYTES - 1);
      in.reset();
      Charset encoding = encoding(sample);
      String text = new String(sample, encoding);
      if (text.chars().limit(4096).anyMatch(c -> c == 0)) {
        throw Refusal.wrongUse("no-text", fileName, "binary bytes", "a CSV file (text)");
      }
      if (text.startsWith("\uFEFF")) {
        in.skipNBytes("\uFEFF".getBytes(encoding).length);
      }
      return new LooseTable(
          fileName, encoding, separator(text), new InputStreamReader(in, encoding));
    } catch (IOException e) {
      throw Refusal.wrongUse("unreadable-table", fileName, e.getMessage(), "a CSV file");
    }
  }

  private static Charset encoding(byte[] sample) {
    if (starts(sample, 0xFF, 0xFE)) {
      return StandardCharsets.UTF_16LE;
    }
    if (starts(sample, 0xFE, 0xFF)) {
      return StandardCharsets.UTF_16BE;
    }
    CharsetDecoder strict =
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    // A character cut by the sample's end is no error: the end is not declared as such.
    boolean utf8 =
        !strict
            .decode(ByteBuffer.wrap(sample), CharBuffer.allocate(sample.length), false)
            .isError();
    return utf8 ? StandardCharsets.UTF_8 : Charset.forName("windows-1252");
  }

  private static boolean starts(byte[] sample, int first, int second) {
    return sample.length > 1 && (sample[0] & 0xFF) == first && (sample[1] & 0xFF) == second;
  }

  /** The one that stands in the header most often, outside quotes. */
  private static char separator(String text) {
    char best = ',';
    int most = 0;
    for (char candidate : SEPARATORS) {
      int count = 0;
      boolean quoted = false;
      for (char c : text.strip().toCharArray()) {
        if (c == '"') {
          quoted = !quoted;
        } else if (!quoted && (c == '\n' || c == '\r')) {
          break;
        } else if (!quoted && c == candidate) {
          count++;
        }
      }
      if (count > most) {
        most = count;
        best = candidate;
      }
    }
    return best;
  }

  public String fileName() {
    return fileName;
  }

  /** How the bytes were read. */
  public Charset encoding() {
    return encoding;
  }

  /** What was taken as the separator of cells. */
  public char separator() {
    return separator;
  }

  /** Names of the columns as they stand. */
  public List<String> header() {
    return header;
  }

  @Override
  public boolean hasNext() {
    try {
      return records.hasNext();
    } catch (UncheckedIOException e) {
      throw broken(e);
    }
  }

  @Override
  public Row next() {
    try {
      CSVRecord row = records.next();
      List<String> cells = new ArrayList<>(row.size());
      row.forEach(cell -> cells.add(cell.strip()));
      return new Row(parser.getCurrentLineNumber(), cells);
    } catch (UncheckedIOException e) {
      throw broken(e);
    }
  }

  private Refusal broken(UncheckedIOException e) {
    return Refusal.wrongUse(
        "unreadable-table",
        fileName + ":" + parser.getCurrentLineNumber(),
        e.getCause().getMessage(),
        "rows of cells; a quote that is opened is closed");
  }

  @Override
  public void close() throws IOException {
    parser.close();
  }
}
