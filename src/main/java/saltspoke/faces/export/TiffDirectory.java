package saltspoke.faces.export;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import saltspoke.atlas.AtlasFrame;
import saltspoke.atlas.AtlasLayer;

/**
 * The directories of a GeoTIFF (TIFF 6.0; OGC 19-008r4) with one band: what a reader must know of
 * size, type, tiles, place on the earth, unit and missing values. Missing is NaN, or 0 for classes.
 */
final class TiffDirectory {
  static final int HEAD_BYTES = 8;

  private static final int ASCII = 2;
  private static final int SHORT = 3;
  private static final int LONG = 4;
  private static final int DOUBLE = 12;

  private static final int DEFLATE = 8;
  private static final int REDUCED = 1;
  private static final int UNSIGNED = 1;
  private static final int IEEE_FLOAT = 3;

  private record Tag(int type, int count, byte[] value) {}

  private final AtlasFrame frame;
  private final AtlasLayer layer;
  private final String description;

  TiffDirectory(AtlasFrame frame, AtlasLayer layer, String description) {
    this.frame = frame;
    this.layer = layer;
    this.description = description;
  }

  int bytesPerValue() {
    return layer.ofClasses() ? 1 : Float.BYTES;
  }

  /** Bytes of one level's directory with all that it points to. */
  int bytes(AtlasFrame level) {
    long[] none = new long[level.tiles()];
    return bytes(tags(level, none, none));
  }

  private static int bytes(SortedMap<Integer, Tag> tags) {
    int bytes = 2 + 12 * tags.size() + 4;
    for (Tag tag : tags.values()) {
      bytes += tag.value.length > 4 ? tag.value.length + tag.value.length % 2 : 0;
    }
    return bytes + bytes % 2;
  }

  /** The head of the file and all directories, one behind the other. */
  ByteBuffer head(List<AtlasFrame> levels, List<long[]> offsets, List<long[]> lengths) {
    int total = HEAD_BYTES + levels.stream().mapToInt(this::bytes).sum();
    ByteBuffer out = ByteBuffer.allocate(total).order(ByteOrder.LITTLE_ENDIAN);
    out.put((byte) 'I').put((byte) 'I').putShort((short) 42).putInt(HEAD_BYTES);
    int at = HEAD_BYTES;
    for (int i = 0; i < levels.size(); i++) {
      SortedMap<Integer, Tag> tags = tags(levels.get(i), offsets.get(i), lengths.get(i));
      int next = at + bytes(tags);
      put(out, at, tags, i + 1 < levels.size() ? next : 0);
      at = next;
    }
    return out.position(total).flip();
  }

  private static void put(ByteBuffer out, int at, SortedMap<Integer, Tag> tags, int next) {
    out.position(at).putShort((short) tags.size());
    int outside = at + 2 + 12 * tags.size() + 4;
    for (var entry : tags.entrySet()) {
      Tag tag = entry.getValue();
      out.putShort((short) (int) entry.getKey()).putShort((short) tag.type).putInt(tag.count);
      if (tag.value.length > 4) {
        out.putInt(outside);
        out.put(outside, tag.value);
        outside += tag.value.length + tag.value.length % 2;
      } else {
        out.put(tag.value).position(out.position() + 4 - tag.value.length);
      }
    }
    out.putInt(next);
  }

  private SortedMap<Integer, Tag> tags(AtlasFrame level, long[] offsets, long[] lengths) {
    SortedMap<Integer, Tag> tags = new TreeMap<>();
    boolean full = level.columns() == frame.columns() && level.rows() == frame.rows();
    tags.put(254, longs(full ? 0 : REDUCED));
    tags.put(256, longs(level.columns()));
    tags.put(257, longs(level.rows()));
    tags.put(258, shorts(8 * bytesPerValue()));
    tags.put(259, shorts(DEFLATE));
    tags.put(262, shorts(1));
    tags.put(277, shorts(1));
    tags.put(284, shorts(1));
    tags.put(322, shorts(AtlasFrame.TILE));
    tags.put(323, shorts(AtlasFrame.TILE));
    tags.put(324, longs(offsets));
    tags.put(325, longs(lengths));
    tags.put(339, shorts(layer.ofClasses() ? UNSIGNED : IEEE_FLOAT));
    tags.put(42113, ascii(layer.ofClasses() ? "0" : "nan"));
    if (full) {
      tags.put(270, ascii(description));
      tags.put(305, ascii("Saltspoke"));
      tags.put(33550, doubles(frame.step(), frame.step(), 0));
      tags.put(33922, doubles(0, 0, 0, frame.west(), frame.north(), 0));
      tags.put(34735, geoKeys());
      tags.put(42112, ascii(metadata()));
    }
    return tags;
  }

  /** Model type, cells as areas, and the code of the system. */
  private Tag geoKeys() {
    int model = frame.geographic() ? 2 : 1;
    int key = frame.geographic() ? 2048 : 3072;
    return shorts(1, 1, 0, 3, 1024, 0, 1, model, 1025, 0, 1, 1, key, 0, 1, frame.epsg());
  }

  /** GDAL's form of a band's name and unit. */
  private String metadata() {
    return "<GDALMetadata><Item name=\"DESCRIPTION\" sample=\"0\" role=\"description\">"
        + layer.id()
        + "</Item><Item name=\"UNITTYPE\" sample=\"0\" role=\"unittype\">"
        + layer.unit()
        + "</Item></GDALMetadata>";
  }

  private static Tag shorts(int... values) {
    ByteBuffer bytes = buffer(2 * values.length);
    for (int value : values) {
      bytes.putShort((short) value);
    }
    return new Tag(SHORT, values.length, bytes.array());
  }

  private static Tag longs(long... values) {
    ByteBuffer bytes = buffer(4 * values.length);
    for (long value : values) {
      bytes.putInt((int) value);
    }
    return new Tag(LONG, values.length, bytes.array());
  }

  private static Tag doubles(double... values) {
    ByteBuffer bytes = buffer(8 * values.length);
    for (double value : values) {
      bytes.putDouble(value);
    }
    return new Tag(DOUBLE, values.length, bytes.array());
  }

  private static Tag ascii(String text) {
    byte[] bytes = (text + "\0").getBytes(StandardCharsets.US_ASCII);
    return new Tag(ASCII, bytes.length, bytes);
  }

  private static ByteBuffer buffer(int bytes) {
    return ByteBuffer.allocate(bytes).order(ByteOrder.LITTLE_ENDIAN);
  }
}
