package saltspoke.wheel;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Keeps the {@link StripTable}s of the cathodes in use, so that cells with the same cathode and
 * hole share one. Holds at most a given number, the least recently used going first (111 kB each).
 * Safe for many threads.
 */
public final class CellTables {
  /** Room for every cathode of a catalogue several times over: 64 tables, 7.1 MB at most. */
  public static final int USUAL_CAPACITY = 64;

  private final Map<Key, StripTable> tables;

  private record Key(
      Material cathode,
      double holeRadiusMm,
      double edgeAreaCm2,
      double activeShare,
      double outerRadiusMm) {}

  public CellTables(int capacity) {
    tables =
        new LinkedHashMap<>(16, 0.75f, true) {
          private static final long serialVersionUID = 1L;

          @Override
          protected boolean removeEldestEntry(Map.Entry<Key, StripTable> eldest) {
            return size() > capacity;
          }
        };
  }

  /** The table of a cell; ring width in the cell is only where a question may start from. */
  public CellTable table(CellSpec spec) {
    if (GalvanicCell.hasNoCathode(spec)) {
      return new CellTable(spec, null);
    }
    Key key =
        new Key(
            spec.cathode(),
            spec.holeRadiusMm(),
            spec.edgeAreaCm2(),
            spec.activeShare(),
            spec.outerRadiusMm());
    synchronized (tables) {
      return new CellTable(spec, tables.computeIfAbsent(key, k -> new StripTable(spec)));
    }
  }

  /** Currents of a cell in a film, off the table: {@link GalvanicCell#solve} for many questions. */
  public CellCurrents at(CellSpec spec, Film film) {
    return table(spec).currents(film, spec.ringWidthMm(), 1);
  }

  /** Tables held now. */
  public int size() {
    synchronized (tables) {
      return tables.size();
    }
  }
}
