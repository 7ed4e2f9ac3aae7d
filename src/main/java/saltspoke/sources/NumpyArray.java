package saltspoke.sources;

import java.io.ByteArrayInputStream;
import java.io.DataInputStream;
import java.io.EOFException;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import saltspoke.values.Refusal;

/**
 * An array of floating-point numbers in the NumPy format, alone ({@code .npy}) or as the first
 * member of an archive ({@code .npz}, a ZIP of such arrays). Format: NumPy Enhancement Proposal 1,
 * "A Simple File Format for NumPy Arrays", versions 1.0 to 3.0. Float32 and float64 of either byte
 * order are read, in C order.
 *
 * @param shape length of each dimension, slowest first
 * @param values as many as the shape says; missing values are NaN
 */
public record NumpyArray(int[] shape, double[] values) {
  private static final byte[] MAGIC = {(byte) 0x93, 'N', 'U', 'M', 'P', 'Y'};
  private static final Pattern DTYPE = Pattern.compile("'descr':\\s*'([<>])f([48])'");
  private static final Pattern ORDER = Pattern.compile("'fortran_order':\\s*False");
  private static final Pattern SHAPE = Pattern.compile("'shape':\\s*\\(([0-9, ]*)\\)");

  /**
   * Reads the first array of an archive.
   *
   * @param name file name for messages
   * @throws Refusal when the archive holds no array that can be read
   */
  public static NumpyArray fromNpz(byte[] npz, String name) throws IOException {
    try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(npz))) {
      for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
        if (entry.getName().endsWith(".npy")) {
          return fromNpy(zip, name + " " + entry.getName());
        }
      }
    } catch (IllegalArgumentException e) {
      // The JDK's way to say that an entry's name is not UTF-8.
      throw refuse(name, String.valueOf(e.getMessage()), "a ZIP archive of NumPy arrays");
    }
    throw refuse(name, "no .npy member", "a ZIP archive of NumPy arrays");
  }

  /**
   * Reads one array.
   *
   * @param name file name for messages
   * @throws Refusal when the bytes are no array of this kind
   */
  public static NumpyArray fromNpy(InputStream in, String name) throws IOException {
    try {
      return parse(in, name);
    } catch (EOFException | IllegalArgumentException | ArithmeticException e) {
      throw refuse(name, String.valueOf(e.getMessage()), "a complete NumPy array");
    }
  }

  private static NumpyArray parse(InputStream in, String name) throws IOException {
    DataInputStream data = new DataInputStream(in);
    byte[] magic = data.readNBytes(MAGIC.length);
    if (!Arrays.equals(magic, MAGIC)) {
      throw refuse(name, Arrays.toString(magic), "the magic bytes \\x93NUMPY");
    }
    int major = data.readUnsignedByte();
    data.readUnsignedByte();
    int headerLength =
        major == 1
            ? Short.toUnsignedInt(Short.reverseBytes(data.readShort()))
            : Integer.reverseBytes(data.readInt());
    String header = new String(data.readNBytes(headerLength), StandardCharsets.UTF_8);
    Matcher dtype = DTYPE.matcher(header);
    Matcher shapeText = SHAPE.matcher(header);
    if (!dtype.find() || !shapeText.find() || !ORDER.matcher(header).find()) {
      throw refuse(name, header.trim(), "descr <f4, <f8, >f4 or >f8, C order, a shape");
    }
    int[] shape =
        Stream.of(shapeText.group(1).split(","))
            .map(String::trim)
            .filter(s -> !s.isEmpty())
            .mapToInt(Integer::parseInt)
            .toArray();
    int count = Arrays.stream(shape).reduce(1, Math::multiplyExact);
    int width = Integer.parseInt(dtype.group(2));
    byte[] bytes = data.readNBytes(Math.multiplyExact(count, width));
    if (bytes.length != count * width) {
      throw refuse(name, bytes.length + " bytes", count * width + " bytes of values");
    }
    ByteBuffer buffer =
        ByteBuffer.wrap(bytes)
            .order(dtype.group(1).equals("<") ? ByteOrder.LITTLE_ENDIAN : ByteOrder.BIG_ENDIAN);
    double[] values = new double[count];
    for (int i = 0; i < count; i++) {
      values[i] = width == 4 ? buffer.getFloat() : buffer.getDouble();
    }
    return new NumpyArray(shape, values);
  }

  /** Values of a matrix without the outermost rows and columns. */
  public double[] inner(int margin) {
    int rows = shape[0] - 2 * margin;
    int columns = shape[1] - 2 * margin;
    double[] inner = new double[rows * columns];
    for (int row = 0; row < rows; row++) {
      System.arraycopy(values, (row + margin) * shape[1] + margin, inner, row * columns, columns);
    }
    return inner;
  }

  private static Refusal refuse(String name, String was, String expected) {
    return Refusal.dataDamaged("not-a-numpy-array", name, was, expected);
  }
}
