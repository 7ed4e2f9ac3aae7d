package saltspoke.places;

import java.io.BufferedReader;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.Map;
import java.util.function.Consumer;
import java.util.zip.GZIPInputStream;
import saltspoke.fields.DataSet;
import saltspoke.sources.CsvTable;
import saltspoke.values.Refusal;

/**
 * A table whose rows are gathered by tiles of 10°, each tile a gzip member of its own, so that a
 * question about one point unpacks a few kilobytes. Lines come without their end, unparsed: the
 * layers are written by this program's ingest and checked by their sums.
 */
final class TiledTable {
  /** Width and height of a tile, degrees. */
  static final int TILE_DEG = 10;

  private record Member(long offset, int length) {}

  private final DataSet data;
  private final String layerId;
  private Map<Integer, Member> index;
  private byte[] stored;

  TiledTable(DataSet data, String layerId) {
    this.data = data;
    this.layerId = layerId;
  }

  /** Key of the tile that holds a point; a longitude of 180° counts as −180°. */
  static int tileOf(double latitudeDeg, double longitudeDeg) {
    int row = (int) Math.floor(Math.min(latitudeDeg, 89.999999) / TILE_DEG) + 9;
    int column = Math.floorMod((int) Math.floor(longitudeDeg / TILE_DEG) + 18, 36);
    return row * 36 + column;
  }

  /** The rows of one tile, in file order; none when the tile is empty. */
  void tile(int key, Consumer<String> line) {
    Member member = index().get(key);
    if (member == null) {
      return;
    }
    try {
      InputStream packed =
          new ByteArrayInputStream(stored(), Math.toIntExact(member.offset()), member.length());
      lines(new GZIPInputStream(packed), line);
    } catch (IOException e) {
      throw damaged(e);
    }
  }

  /** All rows after the header. */
  void all(Consumer<String> line) {
    boolean[] header = {true};
    try {
      lines(
          data.open(layerId),
          text -> {
            if (!header[0]) {
              line.accept(text);
            }
            header[0] = false;
          });
    } catch (IOException e) {
      throw damaged(e);
    }
  }

  private static void lines(InputStream in, Consumer<String> line) throws IOException {
    try (BufferedReader reader =
        new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8), 1 << 16)) {
      for (String text = reader.readLine(); text != null; text = reader.readLine()) {
        line.accept(text);
      }
    }
  }

  private synchronized byte[] stored() throws IOException {
    if (stored == null) {
      try (InputStream in = data.openStored(layerId)) {
        stored = in.readAllBytes();
      }
    }
    return stored;
  }

  private synchronized Map<Integer, Member> index() {
    if (index == null) {
      Map<Integer, Member> read = new HashMap<>();
      CsvTable.forEach(
          data.open(layerId + "-index"),
          layerId + "-index",
          row ->
              read.put(
                  tileOf(row.number("tile_south_deg"), row.number("tile_west_deg")),
                  new Member((long) row.number("offset_bytes"), (int) row.number("length_bytes"))));
      index = read;
    }
    return index;
  }

  private Refusal damaged(IOException e) {
    return Refusal.dataDamaged(
        "unreadable-layer", layerId, e.getMessage(), "a fresh copy of the data folder");
  }
}
