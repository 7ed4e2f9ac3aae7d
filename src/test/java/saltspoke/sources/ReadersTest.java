package saltspoke.sources;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Color;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.function.Consumer;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.values.Refusal;

/** Each reader against bytes that something else wrote, and against bytes that break off. */
class ReadersTest {
  private static byte[] resource(String name) throws IOException {
    try (InputStream in = ReadersTest.class.getResourceAsStream(name)) {
      return in.readAllBytes();
    }
  }

  /** Any prefix and any changed byte gives a value or a refusal, never another failure. */
  private static void survivesDamage(byte[] good, Consumer<byte[]> read) {
    int refused = 0;
    for (int i = 0; i < good.length; i++) {
      byte[] flipped = good.clone();
      flipped[i] ^= (byte) 0xFF;
      for (byte[] damaged : new byte[][] {Arrays.copyOf(good, i), flipped}) {
        try {
          read.accept(damaged);
        } catch (Refusal e) {
          assertEquals(Refusal.Kind.DATA_DAMAGED, e.kind());
          refused++;
        }
      }
    }
    assertTrue(refused > 0, "no damage was noticed");
  }

  @Test
  @Tag("published")
  void readsTheExampleOfTheNetcdfSpecification() throws IOException {
    CsvTable.Row row =
        CsvTable.read(
                ReadersTest.class.getResourceAsStream("/reference/unidata-classic/tiny.csv"),
                "tiny.csv")
            .get(0);
    NetcdfClassic file = new NetcdfClassic(HexFormat.of().parseHex(row.text("hex")), "tiny.nc");
    double[] printed =
        Stream.of(row.text("values").split(" ")).mapToDouble(Double::parseDouble).toArray();
    assertArrayEquals(printed, file.values("vx"));
    assertEquals("dim", file.variable("vx").dimensions().get(0).name());
  }

  @Test
  @Tag("law")
  void readsRecordsAndMissingValuesAsTheNetcdfLibraryWroteThem() throws IOException {
    NetcdfClassic file = new NetcdfClassic(resource("records.nc"), "records.nc");
    assertEquals("made by the netCDF C library", file.globalAttributes().get("title"));
    assertEquals("m", file.variable("a").text("units"));
    assertArrayEquals(new double[] {1, 2, 3, 4, 5, 6}, file.values("a"));
    assertArrayEquals(new double[] {0.5, 1.5}, file.values("b"));
    assertArrayEquals(new double[] {7, Double.NaN, 9}, file.values("c"));
  }

  @Test
  @Tag("law")
  void aSingleRecordVariableIsNotPadded() throws IOException {
    NetcdfClassic file = new NetcdfClassic(resource("one-record-variable.nc"), "one.nc");
    assertArrayEquals(new double[] {1, 2, 3, 4, 5, 6, 7, 8, 9}, file.values("a"));
  }

  @Test
  @Tag("law")
  void namesTheVariablesWhenOneIsUnknown() throws IOException {
    NetcdfClassic file = new NetcdfClassic(resource("records.nc"), "records.nc");
    Refusal refusal = assertThrows(Refusal.class, () -> file.values("d"));
    assertTrue(refusal.allowed().contains("[a, b, c]"), refusal.allowed());
  }

  @Test
  @Tag("law")
  void netcdfSurvivesDamage() throws IOException {
    survivesDamage(
        resource("records.nc"),
        bytes -> {
          NetcdfClassic file = new NetcdfClassic(bytes, "x.nc");
          file.variables().keySet().forEach(file::values);
        });
  }

  private static byte[] npy(String dtype, ByteOrder order, String fortran, double... values) {
    String header =
        "{'descr': '" + dtype + "', 'fortran_order': " + fortran + ", 'shape': (2, 2), }";
    int width = dtype.endsWith("8") ? 8 : 4;
    ByteBuffer out = ByteBuffer.allocate(10 + header.length() + values.length * width);
    out.put((byte) 0x93).put("NUMPY".getBytes(StandardCharsets.US_ASCII)).put((byte) 1);
    out.put((byte) 0).order(ByteOrder.LITTLE_ENDIAN).putShort((short) header.length());
    out.put(header.getBytes(StandardCharsets.US_ASCII)).order(order);
    for (double value : values) {
      if (width == 8) {
        out.putDouble(value);
      } else {
        out.putFloat((float) value);
      }
    }
    return out.array();
  }

  private static NumpyArray array(byte[] bytes) {
    try {
      return NumpyArray.fromNpy(new ByteArrayInputStream(bytes), "x.npy");
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }

  @Test
  @Tag("law")
  void readsNumpyOfBothWidthsAndByteOrders() {
    double[] values = {1, -2.5, 3, Double.NaN};
    assertArrayEquals(values, array(npy("<f8", ByteOrder.LITTLE_ENDIAN, "False", values)).values());
    assertArrayEquals(values, array(npy(">f4", ByteOrder.BIG_ENDIAN, "False", values)).values());
    assertArrayEquals(
        new int[] {2, 2}, array(npy("<f4", ByteOrder.LITTLE_ENDIAN, "False", values)).shape());
  }

  @Test
  @Tag("law")
  void refusesNumpyInColumnOrderAndOtherTypes() {
    assertThrows(
        Refusal.class, () -> array(npy("<f8", ByteOrder.LITTLE_ENDIAN, "True", 1, 2, 3, 4)));
    assertThrows(
        Refusal.class, () -> array(npy("<i8", ByteOrder.LITTLE_ENDIAN, "False", 1, 2, 3, 4)));
  }

  @Test
  @Tag("law")
  void numpySurvivesDamage() {
    survivesDamage(npy("<f8", ByteOrder.LITTLE_ENDIAN, "False", 1, 2, 3, 4), ReadersTest::array);
  }

  @Test
  @Tag("law")
  void readsTheArrayInsideAnArchiveAndItsInnerPart() throws IOException {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (ZipOutputStream zip = new ZipOutputStream(bytes)) {
      zip.putNextEntry(new ZipEntry("arr_0.npy"));
      zip.write(npy("<f8", ByteOrder.LITTLE_ENDIAN, "False", 1, 2, 3, 4));
    }
    assertArrayEquals(
        new double[] {1, 2, 3, 4}, NumpyArray.fromNpz(bytes.toByteArray(), "x.npz").values());
    NumpyArray nine = new NumpyArray(new int[] {3, 3}, new double[] {0, 1, 2, 3, 4, 5, 6, 7, 8});
    assertArrayEquals(new double[] {4}, nine.inner(1));
  }

  private static double[] grid(String text) throws IOException {
    return NumberGrid.read(
        new ByteArrayInputStream(text.getBytes(StandardCharsets.US_ASCII)), "g.dat", 2, 3);
  }

  @Test
  @Tag("law")
  void numberGridNamesTheLine() throws IOException {
    assertArrayEquals(new double[] {1, 2, 3, 4, 50, 6}, grid("  1 2 3\n 4 0.5000000E+002 6\n"));
    Refusal shortRow = assertThrows(Refusal.class, () -> grid("1 2 3\n4 5\n"));
    assertEquals("g.dat:2", shortRow.field());
    Refusal word = assertThrows(Refusal.class, () -> grid("1 x 3\n4 5 6\n"));
    assertEquals("g.dat:1", word.field());
    assertEquals("x", word.was());
    assertThrows(Refusal.class, () -> grid("1 2 3\n"));
  }

  @Test
  @Tag("law")
  void picturesBecomeLumaFromTheTop() throws IOException {
    BufferedImage image = new BufferedImage(2, 2, BufferedImage.TYPE_INT_RGB);
    image.setRGB(0, 0, Color.WHITE.getRGB());
    image.setRGB(1, 0, Color.RED.getRGB());
    image.setRGB(0, 1, Color.GREEN.getRGB());
    ByteArrayOutputStream png = new ByteArrayOutputStream();
    ImageIO.write(image, "png", png);
    GreyImage grey = GreyImage.read(new ByteArrayInputStream(png.toByteArray()), "x.png");
    // ITU-R BT.601-7: 0.299, 0.587, 0.114.
    assertArrayEquals(new double[] {255, 76.245, 149.685, 0}, grey.brightness(), 1e-9);
    assertThrows(
        Refusal.class, () -> GreyImage.read(new ByteArrayInputStream(new byte[9]), "x.jpg"));
  }

  @Test
  @Tag("law")
  void readsGeotiffsOfAnotherWriterInBothByteOrdersAndLayouts() throws IOException {
    GeoTiffRaster planes = GeoTiffRaster.read(resource("little-endian-planes.tif"), "planes.tif");
    GeoTiffRaster chunky = GeoTiffRaster.read(resource("big-endian-chunky.tif"), "chunky.tif");
    for (int band = 0; band < 2; band++) {
      float[] expected = new float[12];
      for (int i = 0; i < 12; i++) {
        expected[i] = band * 12 + i;
      }
      assertArrayEquals(expected, planes.bands()[band]);
      assertArrayEquals(expected, chunky.bands()[band]);
    }
    // The first says that its pixels are points, the second that they are areas; both tie the
    // raster's
    // origin to 10° west, 50° north, with pixels 2° wide and 1° high.
    assertEquals(-10, planes.westDeg());
    assertEquals(50, planes.northDeg());
    assertEquals(-9, chunky.westDeg());
    assertEquals(49.5, chunky.northDeg());
    assertEquals(2, chunky.stepLonDeg());
    assertEquals(1, chunky.stepLatDeg());
    GeoTiffRaster words = GeoTiffRaster.read(resource("unsigned-16.tif"), "words.tif");
    assertEquals(55000, words.bands()[0][11]);
  }

  @Test
  @Tag("law")
  void geotiffSurvivesDamage() throws IOException {
    survivesDamage(resource("big-endian-chunky.tif"), bytes -> GeoTiffRaster.read(bytes, "x.tif"));
    survivesDamage(
        resource("little-endian-planes.tif"), bytes -> GeoTiffRaster.read(bytes, "x.tif"));
  }
}
