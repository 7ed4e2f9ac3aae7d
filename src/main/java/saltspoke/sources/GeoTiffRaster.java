package saltspoke.sources;

import java.nio.BufferUnderflowException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.HashMap;
import java.util.Map;
import java.util.zip.DataFormatException;
import java.util.zip.Inflater;
import saltspoke.values.Refusal;

/**
 * A GeoTIFF of the kind that the shipped world is made of, read without any library because it
 * stands on the path of every answer. Formats: TIFF 6.0 (Adobe 1992) in strips, uncompressed or
 * Deflate (TIFF Technical Note, compression 8 or 32946), 8- or 16-bit integers or 32-bit IEEE
 * numbers, bands interleaved or in planes; OGC GeoTIFF 1.1 (19-008r4) with pixel scale and tie
 * point or an unrotated model transformation, longitude first. Other TIFF files go through the
 * ingest, which knows them all.
 *
 * @param northDeg latitude of the centres of the first row
 * @param westDeg longitude of the centres of the first column
 * @param bands values per band, row by row from the north
 */
public record GeoTiffRaster(
    int rows,
    int columns,
    double northDeg,
    double westDeg,
    double stepLatDeg,
    double stepLonDeg,
    float[][] bands) {

  private static final int COLUMNS = 256;
  private static final int ROWS = 257;
  private static final int BITS = 258;
  private static final int COMPRESSION = 259;
  private static final int STRIP_OFFSETS = 273;
  private static final int SAMPLES = 277;
  private static final int ROWS_PER_STRIP = 278;
  private static final int STRIP_BYTES = 279;
  private static final int PLANAR = 284;
  private static final int PREDICTOR = 317;
  private static final int SAMPLE_FORMAT = 339;
  private static final int PIXEL_SCALE = 33550;
  private static final int TIE_POINT = 33922;
  private static final int TRANSFORMATION = 34264;
  private static final int GEO_KEYS = 34735;
  private static final int RASTER_TYPE_KEY = 1025;
  private static final int PIXEL_IS_POINT = 2;

  /** Deflate packs at most 1032 to 1 (zlib technical details); more is a damaged header. */
  private static final long DEFLATE_LIMIT = 1040;

  private static final int[] SIZE_OF_TYPE = {0, 1, 1, 2, 4, 8, 1, 1, 2, 4, 8, 4, 8};

  /**
   * Reads a whole file.
   *
   * @param fileName for messages
   * @throws Refusal when it is no GeoTIFF of this kind
   */
  public static GeoTiffRaster read(byte[] file, String fileName) {
    try {
      return new Reader(file).read();
    } catch (BufferUnderflowException
        | IllegalArgumentException
        | IndexOutOfBoundsException
        | ArithmeticException
        | DataFormatException e) {
      throw Refusal.dataDamaged(
          "not-a-geotiff",
          fileName,
          String.valueOf(e.getMessage()),
          "a GeoTIFF in strips, plain or Deflate, north up, in degrees");
    }
  }

  private static final class Reader {
    private final byte[] file;
    private final ByteBuffer in;
    private final Map<Integer, double[]> tags = new HashMap<>();

    Reader(byte[] file) {
      this.file = file;
      this.in = ByteBuffer.wrap(file);
    }

    GeoTiffRaster read() throws DataFormatException {
      readTags();
      int columns = (int) first(COLUMNS, 0);
      int rows = (int) first(ROWS, 0);
      int samples = (int) first(SAMPLES, 1);
      double bytes = (double) rows * columns * samples * first(BITS, 1) / 8;
      if (rows < 1
          || columns < 1
          || samples < 1
          || bytes > (double) file.length * DEFLATE_LIMIT
          || first(PREDICTOR, 1) != 1) {
        throw new IllegalArgumentException("size or predictor");
      }
      float[][] bands = new float[samples][Math.multiplyExact(rows, columns)];
      readStrips(bands, rows, columns, first(PLANAR, 1) == 2);

      double[] model = model();
      // GeoTIFF 1.1, 7.1.2.1: (0, 0) is the corner of a pixel that is an area, else its centre.
      double half = rasterType() == PIXEL_IS_POINT ? 0 : 0.5;
      return new GeoTiffRaster(
          rows,
          columns,
          model[3] - half * model[1],
          model[2] + half * model[0],
          model[1],
          model[0],
          bands);
    }

    /** Step east, step south, longitude and latitude of raster position (0, 0). */
    private double[] model() {
      double[] matrix = tags.get(TRANSFORMATION);
      if (matrix != null) {
        if (matrix[1] != 0 || matrix[4] != 0 || !(matrix[0] > 0) || !(matrix[5] < 0)) {
          throw new IllegalArgumentException("rotated or not north up");
        }
        return new double[] {matrix[0], -matrix[5], matrix[3], matrix[7]};
      }
      double[] scale = tags.get(PIXEL_SCALE);
      double[] tie = tags.get(TIE_POINT);
      if (scale == null || tie == null || tie.length != 6 || !(scale[0] > 0) || !(scale[1] > 0)) {
        throw new IllegalArgumentException("no georeference");
      }
      return new double[] {
        scale[0], scale[1], tie[3] - tie[0] * scale[0], tie[4] + tie[1] * scale[1]
      };
    }

    private int rasterType() {
      double[] keys = tags.getOrDefault(GEO_KEYS, new double[0]);
      for (int i = 4; i + 3 < keys.length; i += 4) {
        if (keys[i] == RASTER_TYPE_KEY) {
          return (int) keys[i + 3];
        }
      }
      return 1;
    }

    private void readTags() {
      short order = in.getShort();
      if (order != 0x4949 && order != 0x4D4D) {
        throw new IllegalArgumentException("no TIFF byte order");
      }
      in.order(order == 0x4949 ? ByteOrder.LITTLE_ENDIAN : ByteOrder.BIG_ENDIAN);
      if (in.getShort() != 42) {
        throw new IllegalArgumentException("no TIFF version");
      }
      in.position(in.getInt());
      int entries = Short.toUnsignedInt(in.getShort());
      for (int i = 0; i < entries; i++) {
        int tag = Short.toUnsignedInt(in.getShort());
        int type = in.getShort();
        int count = in.getInt();
        int next = in.position() + 4;
        if (type > 0 && type < SIZE_OF_TYPE.length && count > 0 && type != 2 && type != 7) {
          if ((long) count * SIZE_OF_TYPE[type] > 4) {
            in.position(in.getInt());
          }
          double[] values = new double[Math.min(count, file.length)];
          for (int k = 0; k < values.length; k++) {
            values[k] = value(type);
          }
          tags.put(tag, values);
        }
        in.position(next);
      }
    }

    private double value(int type) {
      return switch (type) {
        case 1, 6 -> Byte.toUnsignedInt(in.get());
        case 3 -> Short.toUnsignedInt(in.getShort());
        case 8 -> in.getShort();
        case 4 -> Integer.toUnsignedLong(in.getInt());
        case 9 -> in.getInt();
        case 5 ->
            (double) Integer.toUnsignedLong(in.getInt()) / Integer.toUnsignedLong(in.getInt());
        case 10 -> (double) in.getInt() / in.getInt();
        case 11 -> in.getFloat();
        case 12 -> in.getDouble();
        default -> throw new IllegalArgumentException("TIFF type " + type);
      };
    }

    private double first(int tag, double otherwise) {
      double[] values = tags.get(tag);
      return values == null ? otherwise : values[0];
    }

    private void readStrips(float[][] bands, int rows, int columns, boolean planes)
        throws DataFormatException {
      int bits = (int) first(BITS, 1);
      int format = (int) first(SAMPLE_FORMAT, 1);
      int rowsPerStrip = (int) Math.max(1, Math.min(rows, first(ROWS_PER_STRIP, rows)));
      int stripsPerPlane = (rows + rowsPerStrip - 1) / rowsPerStrip;
      double[] offsets = tags.get(STRIP_OFFSETS);
      double[] lengths = tags.get(STRIP_BYTES);
      int perPixel = planes ? 1 : bands.length;
      if (offsets == null
          || lengths == null
          || lengths.length != offsets.length
          || offsets.length != stripsPerPlane * (planes ? bands.length : 1)) {
        throw new IllegalArgumentException("strips missing");
      }
      for (int strip = 0; strip < offsets.length; strip++) {
        int firstRow = strip % stripsPerPlane * rowsPerStrip;
        int pixels = Math.min(rowsPerStrip, rows - firstRow) * columns;
        ByteBuffer data =
            unpack(
                (int) offsets[strip],
                (int) lengths[strip],
                Math.multiplyExact(pixels * perPixel, bits / 8));
        float[] samples = numbers(data, pixels * perPixel, bits, format);
        int start = firstRow * columns;
        if (perPixel == 1) {
          System.arraycopy(samples, 0, bands[strip / stripsPerPlane], start, pixels);
        } else {
          for (int b = 0; b < perPixel; b++) {
            pick(samples, b, perPixel, bands[b], start, pixels);
          }
        }
      }
    }

    /** Every {@code step}-th sample from {@code first} on. */
    private static void pick(
        float[] samples, int first, int step, float[] band, int start, int count) {
      for (int i = 0, from = first; i < count; i++, from += step) {
        band[start + i] = samples[from];
      }
    }

    private ByteBuffer unpack(int offset, int length, int size) throws DataFormatException {
      int compression = (int) first(COMPRESSION, 1);
      byte[] plain = new byte[size];
      if (compression == 8 || compression == 32946) {
        Inflater inflater = new Inflater();
        try {
          inflater.setInput(file, offset, length);
          int done = 0;
          while (done < size) {
            int got = inflater.inflate(plain, done, size - done);
            if (got == 0) {
              throw new DataFormatException("a strip breaks off");
            }
            done += got;
          }
        } finally {
          inflater.end();
        }
      } else if (compression == 1) {
        System.arraycopy(file, offset, plain, 0, size);
      } else {
        throw new IllegalArgumentException("compression " + compression);
      }
      return ByteBuffer.wrap(plain).order(in.order());
    }

    private static float[] numbers(ByteBuffer data, int count, int bits, int format) {
      float[] numbers = new float[count];
      if (bits == 32 && format == 3) {
        data.asFloatBuffer().get(numbers);
      } else if (bits == 16 && format != 3) {
        short[] words = new short[count];
        data.asShortBuffer().get(words);
        int mask = format == 2 ? -1 : 0xFFFF;
        for (int i = 0; i < count; i++) {
          numbers[i] = words[i] & mask;
        }
      } else if (bits == 8 && format == 1) {
        byte[] octets = data.array();
        for (int i = 0; i < count; i++) {
          numbers[i] = octets[i] & 0xFF;
        }
      } else {
        throw new IllegalArgumentException(bits + " bits, sample format " + format);
      }
      return numbers;
    }
  }
}
