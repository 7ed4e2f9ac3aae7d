package saltspoke.sources;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.zip.GZIPOutputStream;

/**
 * Writes a comma-separated table whose rows are gathered by tiles of {@value #TILE_DEG}°, so that a
 * reader may unpack the few tiles it needs. The file is one gzip file of several members (RFC 1952,
 * section 2.2): unpacked from the start it is one ordinary table with one header. A second, plain
 * table says where each tile's member starts and how long it is.
 */
final class TiledTableWriter {
  /** Width and height of a tile, degrees. */
  static final int TILE_DEG = 10;

  private record Tile(int southDeg, int westDeg) implements Comparable<Tile> {
    @Override
    public int compareTo(Tile other) {
      int bySouth = Integer.compare(southDeg, other.southDeg);
      return bySouth != 0 ? bySouth : Integer.compare(westDeg, other.westDeg);
    }
  }

  private final String header;
  private final SortedMap<Tile, StringBuilder> tiles = new TreeMap<>();

  TiledTableWriter(String header) {
    this.header = header;
  }

  /** Adds a row, without its line end, to the tile that holds a point. */
  void row(double latitudeDeg, double longitudeDeg, String row) {
    Tile tile =
        new Tile(
            (int) Math.floor(latitudeDeg / TILE_DEG) * TILE_DEG,
            (int) Math.floor(longitudeDeg / TILE_DEG) * TILE_DEG);
    tiles.computeIfAbsent(tile, t -> new StringBuilder()).append(row).append('\n');
  }

  /** Writes the table and returns the lines of its index, header first. */
  List<String> write(Path file) throws IOException {
    List<String> index = new ArrayList<>();
    index.add("tile_south_deg,tile_west_deg,offset_bytes,length_bytes");
    try (OutputStream out = Files.newOutputStream(file)) {
      byte[] head = member(header + "\n");
      out.write(head);
      long offset = head.length;
      for (var entry : tiles.entrySet()) {
        byte[] packed = member(entry.getValue().toString());
        out.write(packed);
        Tile tile = entry.getKey();
        index.add(tile.southDeg + "," + tile.westDeg + "," + offset + "," + packed.length);
        offset += packed.length;
      }
    }
    return index;
  }

  /** Writes the table and its index as two layers, the index under the id with {@code -index}. */
  void write(LayerSink out, LayerFile file) throws IOException {
    List<String> index = write(out.path(file));
    LayerFile about =
        new LayerFile(
            file.layer() + "-index",
            file.path().replace(".csv.gz", "-index.csv"),
            "Index of tiles: " + file.title(),
            "",
            "",
            List.of(),
            file.licence(),
            file.attribution(),
            "where each 10° tile's gzip member lies in " + file.path());
    try (OutputStream stream = out.file(about)) {
      stream.write((String.join("\n", index) + "\n").getBytes(StandardCharsets.UTF_8));
    }
  }

  private static byte[] member(String text) throws IOException {
    ByteArrayOutputStream packed = new ByteArrayOutputStream();
    try (OutputStream gzip = new BestGzip(packed)) {
      gzip.write(text.getBytes(StandardCharsets.UTF_8));
    }
    return packed.toByteArray();
  }

  private static final class BestGzip extends GZIPOutputStream {
    BestGzip(OutputStream out) throws IOException {
      super(out);
      def.setLevel(9);
    }
  }
}
