package saltspoke.sources.hourly;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.lang.management.ManagementFactory;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import java.util.zip.GZIPInputStream;
import java.util.zip.GZIPOutputStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import saltspoke.values.Refusal;

/**
 * Files damaged in many ways: each is refused with file, line, field and reason, without hanging
 * and without taking memory. How many: {@code -Dsaltspoke.damaged=1000} (60).
 */
@Tag("law")
class DamagedFilesTest {
  private static final int FILES = Integer.getInteger("saltspoke.damaged", 60);
  private static final long GIGABYTE = 1L << 30;

  /** More than the buffers of one file; far less than any of the larger files. */
  private static final long MOST_ALLOCATED = 4L << 20;

  @TempDir Path folder;

  private static final HourlySink NOWHERE =
      new HourlySink() {
        @Override
        public void station(HourlyStation station) {
          // Only refusals are looked at.
        }

        @Override
        public void row(HourlyRow row) {
          // Only refusals are looked at.
        }
      };

  private static final HourlyFormats FORMATS =
      HourlyFormats.published(
          StationList.read(
              new ByteArrayInputStream(
                  "station,latitude_deg,longitude_deg,elevation_m\n725300,41.995,-87.934,204.8\n"
                      .getBytes(StandardCharsets.UTF_8)),
              "list.csv"));

  private static byte[] sound() throws IOException {
    try (InputStream in =
        new GZIPInputStream(
            Files.newInputStream(
                Path.of("src/test/resources/reference/noaa-isd-lite/725300-2015.gz")))) {
      return in.readAllBytes();
    }
  }

  private static byte[] packed(byte[] bytes) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (GZIPOutputStream gzip = new GZIPOutputStream(out)) {
      gzip.write(bytes);
    }
    return out.toByteArray();
  }

  /** Cut within a line, which is how a copy that broke off ends. */
  private static byte[] cut(byte[] sound, Random random) {
    int lines = 1 + random.nextInt(8000);
    int lineLength = 62;
    return Arrays.copyOf(sound, lines * lineLength + 1 + random.nextInt(lineLength - 2));
  }

  /** Columns of the fixed layout that hold something else when exchanged. */
  private static final int[][] SWAPS = {{13, 19, 19, 25}, {13, 19, 25, 31}, {19, 25, 25, 31}};

  private static byte[] swapped(byte[] sound, Random random) {
    int[] swap = SWAPS[random.nextInt(SWAPS.length)];
    byte[] bytes = sound.clone();
    for (int line = 0; line + 62 <= bytes.length; line += 62) {
      System.arraycopy(sound, line + swap[0], bytes, line + swap[2], 6);
      System.arraycopy(sound, line + swap[2], bytes, line + swap[0], 6);
    }
    return bytes;
  }

  private static byte[] recoded(byte[] sound, Random random) {
    String text = new String(Arrays.copyOf(sound, 6200), StandardCharsets.US_ASCII);
    return switch (random.nextInt(4)) {
      case 0 -> text.getBytes(StandardCharsets.UTF_16);
      case 1 -> text.getBytes(StandardCharsets.UTF_16LE);
      case 2 -> text.getBytes(java.nio.charset.Charset.forName("UTF-32"));
      default -> text.getBytes(java.nio.charset.Charset.forName("IBM037"));
    };
  }

  private static byte[] binary(Random random) {
    byte[] bytes = new byte[1 + random.nextInt(1 << 16)];
    random.nextBytes(bytes);
    return bytes;
  }

  /** One byte of a value exchanged for a letter. */
  private static byte[] scratched(byte[] sound, Random random) {
    byte[] bytes = sound.clone();
    int[] columns = {0, 5, 8, 11, 18, 24, 36, 42};
    int column = columns[random.nextInt(columns.length)];
    bytes[62 * random.nextInt(8000) + column] = (byte) ('A' + random.nextInt(26));
    return bytes;
  }

  private static byte[] damaged(byte[] sound, Random random, int kind) throws IOException {
    return switch (kind) {
      case 0 -> cut(sound, random);
      case 1 -> {
        byte[] packed = packed(sound);
        yield Arrays.copyOf(packed, random.nextInt(packed.length - 1));
      }
      case 2 -> swapped(sound, random);
      case 3 -> recoded(sound, random);
      case 4 -> binary(random);
      case 5 -> packed(binary(random));
      case 6 -> scratched(sound, random);
      default -> {
        byte[] packed = packed(sound);
        // Behind the ten bytes of the head and before the checksum.
        int at = 10 + random.nextInt(packed.length - 18);
        packed[at] ^= (byte) (1 + random.nextInt(255));
        yield packed;
      }
    };
  }

  @Test
  @Timeout(value = 10, unit = TimeUnit.MINUTES)
  void everyDamagedFileIsRefusedWithItsPlaceAndReason() throws IOException {
    byte[] sound = sound();
    Random random = new Random(2015);
    for (int i = 0; i < FILES; i++) {
      int kind = i % 8;
      byte[] bytes = damaged(sound, random, kind);
      Path file = Files.write(folder.resolve("725300-2015"), bytes);
      ArchiveFiles.Item item = ArchiveFiles.list(List.of(file)).get(0);
      String which = "file " + i + " of kind " + kind;
      Refusal refusal =
          assertThrows(
              Refusal.class,
              () -> {
                try (InputStream in = item.open()) {
                  FORMATS.read(in, item.name(), NOWHERE);
                }
              },
              which);
      assertTrue(refusal.field().matches("725300-2015:\\d+ .+"), which + ": " + refusal.field());
      assertFalse(refusal.error().isBlank(), which);
      assertFalse(refusal.allowed().isBlank(), which);
      assertTrue(refusal.was().length() <= 41, which + ": " + refusal.was());
    }
  }

  /** A line of a gigabyte, made as it is read. */
  private static InputStream endless(String begin) {
    return new InputStream() {
      private final byte[] first = begin.getBytes(StandardCharsets.US_ASCII);
      private long at;

      @Override
      public int read() {
        long now = at++;
        return now < first.length ? first[(int) now] : now < GIGABYTE ? '7' : -1;
      }

      @Override
      public int read(byte[] into, int from, int length) {
        int n = 0;
        while (n < length) {
          int b = read();
          if (b < 0) {
            return n == 0 ? -1 : n;
          }
          into[from + n++] = (byte) b;
        }
        return n;
      }
    };
  }

  @Test
  @Timeout(value = 5, unit = TimeUnit.MINUTES)
  void aLineOfAGigabyteTakesNoMemory() {
    var threads = (com.sun.management.ThreadMXBean) ManagementFactory.getThreadMXBean();
    String row = "2015 01 01 00   -83  -172 10243   240    62     2 -9999 -9999\n";
    for (String begin : List.of("", row, "STATION|DATE|temperature|x\n", "LOCATION,")) {
      long before = threads.getThreadAllocatedBytes(Thread.currentThread().getId());
      Refusal refusal =
          assertThrows(
              Refusal.class, () -> FORMATS.read(endless(begin), "725300-2015", NOWHERE), begin);
      long taken = threads.getThreadAllocatedBytes(Thread.currentThread().getId()) - before;
      assertTrue(taken < MOST_ALLOCATED, begin + " took " + taken);
      assertTrue(
          List.of("line-too-long", "missing-column").contains(refusal.error()), refusal.error());
    }
  }
}
