package saltspoke.sources;

import java.nio.BufferUnderflowException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import saltspoke.values.Refusal;

/**
 * Reads netCDF-3 files in memory. Format: "The NetCDF Classic Format Specification" (Unidata, also
 * OGC 10-092r3), CDF-1 with 32-bit and CDF-2 with 64-bit offsets, fixed and record variables. All
 * numbers are big-endian; names and values are padded to four bytes.
 */
public final class NetcdfClassic {
  /** A dimension; the record dimension has its number of records as length. */
  public record Dimension(String name, int length) {}

  /**
   * A variable.
   *
   * @param dimensions slowest first
   * @param attributes text attributes as {@code String}, numeric ones as {@code double[]}
   */
  public record Variable(
      String name,
      List<Dimension> dimensions,
      Map<String, Object> attributes,
      int type,
      long begin) {
    /** A text attribute, empty when absent. */
    public String text(String attribute) {
      return attributes.get(attribute) instanceof String text ? text : "";
    }
  }

  private static final int TAG_DIMENSION = 10;
  private static final int TAG_VARIABLE = 11;
  private static final int TAG_ATTRIBUTE = 12;
  private static final int CHAR = 2;
  private static final int[] SIZE_OF_TYPE = {0, 1, 1, 2, 4, 4, 8};

  private final String fileName;
  private final ByteBuffer in;
  private final boolean longOffsets;
  private final List<Dimension> dimensions = new ArrayList<>();
  private final Map<String, Object> globalAttributes;
  private final Map<String, Variable> variables = new LinkedHashMap<>();
  private int recordDimension = -1;
  private long recordSize;

  /**
   * @param bytes the whole file
   * @param fileName for messages
   * @throws Refusal when the bytes are no netCDF classic file
   */
  public NetcdfClassic(byte[] bytes, String fileName) {
    this.fileName = fileName;
    this.in = ByteBuffer.wrap(bytes);
    try {
      int magic = in.getInt();
      if (magic != 0x43444601 && magic != 0x43444602) {
        throw refuse(Integer.toHexString(magic), "the magic bytes CDF\\x01 or CDF\\x02");
      }
      longOffsets = magic == 0x43444602;
      int records = in.getInt();
      int count = listLength(TAG_DIMENSION);
      for (int i = 0; i < count; i++) {
        String name = name();
        int length = in.getInt();
        if (length == 0) {
          recordDimension = i;
          length = records;
        }
        dimensions.add(new Dimension(name, length));
      }
      globalAttributes = attributes();
      readVariables();
    } catch (BufferUnderflowException | IllegalArgumentException | IndexOutOfBoundsException e) {
      throw refuse("a header that breaks off", "a complete netCDF classic file");
    }
  }

  public Map<String, Object> globalAttributes() {
    return globalAttributes;
  }

  /** All variables by name, in file order. */
  public Map<String, Variable> variables() {
    return new LinkedHashMap<>(variables);
  }

  /** A variable; refused when the file has none of that name. */
  public Variable variable(String name) {
    Variable variable = variables.get(name);
    if (variable == null) {
      throw refuse("no variable " + name, "one of " + variables.keySet());
    }
    return variable;
  }

  /**
   * All values of a numeric variable, slowest dimension first; those equal to its {@code
   * missing_value} or {@code _FillValue} are NaN.
   */
  public double[] values(String name) {
    Variable variable = variable(name);
    if (variable.type() == CHAR) {
      throw refuse(name + " is text", "a numeric variable");
    }
    double[] values;
    try {
      values = readValues(variable);
    } catch (BufferUnderflowException | IllegalArgumentException | ArithmeticException e) {
      throw refuse(name + " breaks off", "all its values");
    }
    for (String key : List.of("missing_value", "_FillValue")) {
      if (variable.attributes().get(key) instanceof double[] missing && missing.length > 0) {
        for (int i = 0; i < values.length; i++) {
          if (values[i] == missing[0]) {
            values[i] = Double.NaN;
          }
        }
      }
    }
    return values;
  }

  private double[] readValues(Variable variable) {
    int total =
        variable.dimensions().stream().mapToInt(Dimension::length).reduce(1, Math::multiplyExact);
    if (total < 0 || total > in.limit()) {
      throw new IllegalArgumentException("more values than bytes");
    }
    boolean byRecord = isRecord(variable);
    int records = byRecord ? variable.dimensions().get(0).length() : 1;
    double[] values = new double[total];
    for (int record = 0; record < records; record++) {
      in.position(Math.toIntExact(variable.begin() + record * recordSize));
      int perRecord = total / records;
      for (int k = record * perRecord; k < (record + 1) * perRecord; k++) {
        values[k] = number(variable.type());
      }
    }
    return values;
  }

  private boolean isRecord(Variable variable) {
    return recordDimension >= 0
        && !variable.dimensions().isEmpty()
        && variable.dimensions().get(0).equals(dimensions.get(recordDimension));
  }

  private void readVariables() {
    int count = listLength(TAG_VARIABLE);
    int recordVariables = 0;
    long unpadded = 0;
    for (int i = 0; i < count; i++) {
      String name = name();
      List<Dimension> shape = new ArrayList<>();
      int rank = in.getInt();
      for (int d = 0; d < rank; d++) {
        shape.add(dimensions.get(in.getInt()));
      }
      Map<String, Object> attributes = attributes();
      int type = in.getInt();
      long paddedSize = Integer.toUnsignedLong(in.getInt());
      long begin = longOffsets ? in.getLong() : Integer.toUnsignedLong(in.getInt());
      Variable variable = new Variable(name, List.copyOf(shape), attributes, type, begin);
      variables.put(name, variable);
      if (isRecord(variable)) {
        recordVariables++;
        recordSize += paddedSize;
        unpadded =
            shape.stream().skip(1).mapToLong(Dimension::length).reduce(1, (a, b) -> a * b)
                * SIZE_OF_TYPE[type];
      }
    }
    if (recordVariables == 1) {
      // The specification leaves out the padding when there is only one record variable.
      recordSize = unpadded;
    }
  }

  private int listLength(int expectedTag) {
    int tag = in.getInt();
    int count = in.getInt();
    if (tag != expectedTag && !(tag == 0 && count == 0)) {
      throw refuse("tag " + tag, "tag " + expectedTag + " or an absent list");
    }
    return count;
  }

  private Map<String, Object> attributes() {
    int count = listLength(TAG_ATTRIBUTE);
    Map<String, Object> attributes = new LinkedHashMap<>();
    for (int i = 0; i < count; i++) {
      String name = name();
      int type = in.getInt();
      int length = in.getInt();
      if (type == CHAR) {
        attributes.put(name, text(length));
      } else {
        if (length < 0 || length > in.remaining()) {
          throw new IllegalArgumentException("length " + length);
        }
        double[] values = new double[length];
        for (int k = 0; k < length; k++) {
          values[k] = number(type);
        }
        skipPadding(length * SIZE_OF_TYPE[type]);
        attributes.put(name, values);
      }
    }
    return attributes;
  }

  private String name() {
    return text(in.getInt());
  }

  private String text(int length) {
    if (length < 0 || length > in.remaining()) {
      throw new IllegalArgumentException("length " + length);
    }
    byte[] bytes = new byte[length];
    in.get(bytes);
    skipPadding(length);
    return new String(bytes, StandardCharsets.UTF_8);
  }

  private void skipPadding(int length) {
    in.position(in.position() + (4 - length % 4) % 4);
  }

  private double number(int type) {
    return switch (type) {
      case 1, CHAR -> in.get();
      case 3 -> in.getShort();
      case 4 -> in.getInt();
      case 5 -> in.getFloat();
      case 6 -> in.getDouble();
      default -> throw refuse("type " + type, "types 1 to 6 of the classic format");
    };
  }

  private Refusal refuse(String was, String expected) {
    return Refusal.dataDamaged("not-netcdf-classic", fileName, was, expected);
  }
}
