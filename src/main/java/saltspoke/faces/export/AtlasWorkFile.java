package saltspoke.faces.export;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import saltspoke.atlas.AtlasFrame;
import saltspoke.atlas.TileStore;
import saltspoke.fields.Checksum;
import saltspoke.values.Refusal;

/**
 * The tiles of an atlas that is being worked out, in a file beside the result: the fingerprint of
 * the request, one mark a tile, then the tiles as 32-bit numbers. A mark is set after its tile is
 * on disk, so a run that was killed goes on where it stopped; another request starts anew.
 */
public final class AtlasWorkFile implements TileStore, AutoCloseable {
  private static final int HEAD_BYTES = 64;
  private static final int TILE_BYTES = AtlasFrame.TILE * AtlasFrame.TILE * Float.BYTES;

  private final FileChannel channel;
  private final FileLock lock;
  private final boolean[] kept;

  private AtlasWorkFile(FileChannel channel, FileLock lock, int tiles) {
    this.channel = channel;
    this.lock = lock;
    this.kept = new boolean[tiles];
  }

  /**
   * Opens the work file, or begins one.
   *
   * @param request everything that the values depend on
   * @throws Refusal when another run is at work on it, or it cannot be written
   */
  public static AtlasWorkFile open(Path file, String request, int tiles) {
    try {
      FileChannel channel =
          FileChannel.open(
              file, StandardOpenOption.CREATE, StandardOpenOption.READ, StandardOpenOption.WRITE);
      FileLock lock = locked(channel);
      if (lock == null) {
        channel.close();
        throw Refusal.wrongUse("in-use", "out", file, "another name: a run is writing this one");
      }
      AtlasWorkFile work = new AtlasWorkFile(channel, lock, tiles);
      work.begin(Checksum.of(request.getBytes(StandardCharsets.UTF_8)));
      return work;
    } catch (IOException e) {
      throw Refusal.wrongUse(
          "unwritable-file", "out", file, "a file name in a folder that can be written");
    }
  }

  private static FileLock locked(FileChannel channel) throws IOException {
    try {
      return channel.tryLock();
    } catch (OverlappingFileLockException e) {
      return null;
    }
  }

  private void begin(String fingerprint) throws IOException {
    byte[] head = fingerprint.getBytes(StandardCharsets.US_ASCII);
    ByteBuffer found = ByteBuffer.allocate(HEAD_BYTES + kept.length);
    int length = channel.read(found, 0);
    if (length == found.capacity()
        && fingerprint.equals(
            new String(found.array(), 0, HEAD_BYTES, StandardCharsets.US_ASCII))) {
      for (int tile = 0; tile < kept.length; tile++) {
        kept[tile] = found.get(HEAD_BYTES + tile) == 1;
      }
      return;
    }
    channel.truncate(0);
    channel.write(ByteBuffer.allocate(HEAD_BYTES + kept.length).put(head).rewind(), 0);
  }

  /** Tiles that are there already. */
  public int count() {
    int count = 0;
    for (boolean tile : kept) {
      count += tile ? 1 : 0;
    }
    return count;
  }

  @Override
  public boolean has(int tile) {
    return kept[tile];
  }

  @Override
  public void put(int tile, float[] values) throws IOException {
    ByteBuffer bytes = ByteBuffer.allocate(TILE_BYTES).order(ByteOrder.LITTLE_ENDIAN);
    bytes.asFloatBuffer().put(values);
    write(bytes, offset(tile));
    channel.force(false);
    write(ByteBuffer.wrap(new byte[] {1}), HEAD_BYTES + tile);
    kept[tile] = true;
  }

  @Override
  public float[] get(int tile) throws IOException {
    ByteBuffer bytes = ByteBuffer.allocate(TILE_BYTES).order(ByteOrder.LITTLE_ENDIAN);
    while (bytes.hasRemaining()) {
      if (channel.read(bytes, offset(tile) + bytes.position()) < 0) {
        throw new IOException("the work file ends inside tile " + tile);
      }
    }
    float[] values = new float[AtlasFrame.TILE * AtlasFrame.TILE];
    bytes.flip().order(ByteOrder.LITTLE_ENDIAN).asFloatBuffer().get(values);
    return values;
  }

  private void write(ByteBuffer bytes, long at) throws IOException {
    long to = at;
    while (bytes.hasRemaining()) {
      to += channel.write(bytes, to);
    }
  }

  private long offset(int tile) {
    return HEAD_BYTES + kept.length + (long) tile * TILE_BYTES;
  }

  @Override
  public void close() throws IOException {
    lock.release();
    channel.close();
  }
}
