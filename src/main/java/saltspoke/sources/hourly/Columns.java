package saltspoke.sources.hourly;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Where the columns of a map stand in a file, and the cells of the current line. */
final class Columns {
  static final int ABSENT = -1;

  private static final int SHOWN_NAMES = 12;

  private final ColumnMap map;
  private final LineReader lines;
  private final Cells cells;
  private final List<String> header = new ArrayList<>();
  private int last;

  Columns(ColumnMap map, LineReader lines) {
    this.map = map;
    this.lines = lines;
    this.cells = new Cells(lines, map.separator());
  }

  Cells cells() {
    return cells;
  }

  /** Whether any column goes by its name. */
  boolean needHeader() {
    return map.columns().values().stream()
        .anyMatch(c -> !c.isNumbered() && !c.isConstant() && !c.isFileName());
  }

  /** Takes the current line as the header. */
  void header() {
    cells.split(Integer.MAX_VALUE);
    for (int i = 0; i < cells.count(); i++) {
      header.add(cells.text(i, "header").replace("\uFEFF", "").toLowerCase(Locale.ROOT));
    }
  }

  /** The header, for messages. */
  String shown() {
    return String.join(" ", header.subList(0, Math.min(SHOWN_NAMES, header.size())));
  }

  /** The cell of a part, or {@link #ABSENT}. */
  int index(String part) {
    ColumnMap.Column column = map.columns().get(part);
    if (column == null || column.isConstant() || column.isFileName()) {
      return ABSENT;
    }
    if (column.isNumbered()) {
      int cell = Integer.parseInt(column.constant()) - 1;
      last = Math.max(last, cell);
      return cell;
    }
    return find(column.names());
  }

  /** The cell of a part; refused when the file lacks it. */
  int required(String part) {
    int cell = index(part);
    if (cell == ABSENT) {
      ColumnMap.Column column = map.columns().get(part);
      throw lines.refuse(
          "missing-column",
          part,
          shown(),
          "a column " + (column == null ? part : String.join(" or ", column.names())));
    }
    return cell;
  }

  /** The first of the names that the header has, or {@link #ABSENT}; case does not count. */
  int find(List<String> names) {
    for (String name : names) {
      int cell = header.indexOf(name.toLowerCase(Locale.ROOT));
      if (cell >= 0) {
        last = Math.max(last, cell);
        return cell;
      }
    }
    return ABSENT;
  }

  /** Parts the current line as far as it is used; refused when it is too short. */
  void split() {
    cells.split(last + 1);
    if (cells.count() <= last) {
      throw lines.refuse(
          "short-row",
          "cell " + (cells.count() + 1),
          lines.text(),
          "at least " + (last + 1) + " cells");
    }
  }
}
