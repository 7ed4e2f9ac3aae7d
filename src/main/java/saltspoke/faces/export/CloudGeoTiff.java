package saltspoke.faces.export;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.zip.Deflater;
import saltspoke.atlas.AtlasFrame;
import saltspoke.atlas.AtlasLayer;
import saltspoke.atlas.TileStore;
import saltspoke.values.Refusal;

/**
 * Writes an atlas as a cloud-optimised GeoTIFF (OGC 21-026, 19-008r4): tiles, Deflate, overviews,
 * all directories ahead of all data, overviews ahead of the full picture. Written here because
 * GeoTools' writer can neither order a file so nor write one tile at a time. Memory holds four
 * tiles a level, whatever the size.
 */
public final class CloudGeoTiff {
  /** Tiles are packed into this many bytes at once before they go to the scratch file. */
  private static final int BUFFER = 1 << 16;

  private final AtlasFrame frame;
  private final TileStore tiles;
  private final TiffDirectory directory;
  private final boolean classes;
  private final List<AtlasFrame> levels = new ArrayList<>();
  private final List<long[]> offsets = new ArrayList<>();
  private final List<long[]> lengths = new ArrayList<>();
  private final Deflater deflater = new Deflater(7);
  private FileChannel scratch;

  private CloudGeoTiff(
      AtlasFrame frame, AtlasLayer layer, TileStore tiles, TiffDirectory directory) {
    this.frame = frame;
    this.tiles = tiles;
    this.directory = directory;
    this.classes = layer.ofClasses();
  }

  /**
   * Writes the file beside its place and moves it there at the end.
   *
   * @param description one line of ASCII
   */
  public static void write(
      Path target, AtlasFrame frame, AtlasLayer layer, TileStore tiles, String description)
      throws IOException {
    TiffDirectory directory = new TiffDirectory(frame, layer, description);
    Path packed = target.resolveSibling(target.getFileName() + ".tiles");
    Path aside = WholeFile.aside(target);
    CloudGeoTiff writer = new CloudGeoTiff(frame, layer, tiles, directory);
    try (FileChannel scratch =
            FileChannel.open(
                packed,
                StandardOpenOption.CREATE,
                StandardOpenOption.TRUNCATE_EXISTING,
                StandardOpenOption.READ,
                StandardOpenOption.WRITE);
        FileChannel out =
            FileChannel.open(
                aside,
                StandardOpenOption.CREATE,
                StandardOpenOption.TRUNCATE_EXISTING,
                StandardOpenOption.WRITE)) {
      writer.scratch = scratch;
      writer.pack();
      writer.assemble(out);
    } finally {
      writer.deflater.end();
      Files.deleteIfExists(packed);
    }
    WholeFile.moveInto(aside, target);
  }

  /** Packs the tiles of all levels in the order of a quad tree. */
  private void pack() throws IOException {
    AtlasFrame level = frame;
    while (true) {
      levels.add(level);
      offsets.add(new long[level.tiles()]);
      lengths.add(new long[level.tiles()]);
      if (level.tiles() == 1) {
        break;
      }
      level = level.halved();
    }
    tile(levels.size() - 1, 0, 0);
  }

  private float[] tile(int level, int across, int down) throws IOException {
    AtlasFrame at = levels.get(level);
    if (across >= at.tilesAcross() || down >= at.tilesDown()) {
      return null;
    }
    int index = down * at.tilesAcross() + across;
    float[] values = level == 0 ? tiles.get(index) : halved(level, across, down);
    keep(level, index, values);
    return values;
  }

  private float[] halved(int level, int across, int down) throws IOException {
    int size = AtlasFrame.TILE;
    float[] out = new float[size * size];
    Arrays.fill(out, Float.NaN);
    for (int q = 0; q < 4; q++) {
      float[] fine = tile(level - 1, 2 * across + q % 2, 2 * down + q / 2);
      if (fine == null) {
        continue;
      }
      for (int r = 0; r < size / 2; r++) {
        for (int c = 0; c < size / 2; c++) {
          int from = 2 * r * size + 2 * c;
          out[(q / 2 * size / 2 + r) * size + q % 2 * size / 2 + c] =
              merged(fine[from], fine[from + 1], fine[from + size], fine[from + size + 1]);
        }
      }
    }
    return out;
  }

  /** Four cells as one: the most frequent class, of equals the worse; the mean of a quantity. */
  private float merged(float... four) {
    if (!classes) {
      float sum = 0;
      int n = 0;
      for (float value : four) {
        if (!Float.isNaN(value)) {
          sum += value;
          n++;
        }
      }
      return n == 0 ? Float.NaN : sum / n;
    }
    float best = Float.NaN;
    int most = 0;
    for (float value : four) {
      int votes = 0;
      for (float other : four) {
        votes += other == value ? 1 : 0;
      }
      if (votes > most || votes == most && value > best) {
        best = value;
        most = votes;
      }
    }
    return best;
  }

  private void keep(int level, int index, float[] values) throws IOException {
    byte[] packed = packed(values);
    offsets.get(level)[index] = scratch.position();
    lengths.get(level)[index] = packed.length;
    write(scratch, ByteBuffer.wrap(packed));
  }

  private byte[] packed(float[] values) {
    ByteBuffer raw =
        ByteBuffer.allocate(values.length * directory.bytesPerValue())
            .order(ByteOrder.LITTLE_ENDIAN);
    for (float value : values) {
      if (classes) {
        raw.put((byte) (Float.isNaN(value) ? 0 : value));
      } else {
        raw.putFloat(value);
      }
    }
    deflater.reset();
    deflater.setInput(raw.array());
    deflater.finish();
    ByteArrayOutputStream out = new ByteArrayOutputStream(BUFFER);
    byte[] buffer = new byte[BUFFER];
    while (!deflater.finished()) {
      out.write(buffer, 0, deflater.deflate(buffer));
    }
    return out.toByteArray();
  }

  /** Directories, full picture first; then data, smallest overview first. */
  private void assemble(FileChannel out) throws IOException {
    long at = TiffDirectory.HEAD_BYTES;
    for (AtlasFrame level : levels) {
      at += directory.bytes(level);
    }
    List<long[]> places = new ArrayList<>();
    for (AtlasFrame level : levels) {
      places.add(new long[level.tiles()]);
    }
    for (int level = levels.size() - 1; level >= 0; level--) {
      for (int i = 0; i < places.get(level).length; i++) {
        places.get(level)[i] = at;
        at += lengths.get(level)[i];
      }
    }
    if (at > 0xFFFFFFFFL) {
      throw Refusal.outOfRange("step", at + " bytes", "a coarser step: at most 4 GB in one file");
    }
    write(out, directory.head(levels, places, lengths));
    for (int level = levels.size() - 1; level >= 0; level--) {
      for (int i = 0; i < places.get(level).length; i++) {
        ByteBuffer tile = ByteBuffer.allocate((int) lengths.get(level)[i]);
        while (tile.hasRemaining()) {
          scratch.read(tile, offsets.get(level)[i] + tile.position());
        }
        write(out, tile.flip());
      }
    }
  }

  private static void write(FileChannel channel, ByteBuffer bytes) throws IOException {
    while (bytes.hasRemaining()) {
      channel.write(bytes);
    }
  }
}
