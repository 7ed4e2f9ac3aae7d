package saltspoke.fuzz;

import java.io.ByteArrayOutputStream;
import java.util.Random;

/** Damages bytes in the ways that break parsers. */
final class Mutant {
  private static final int MOST_CHANGES = 6;
  private static final int[] BAD_BYTES = {0, 0xFF, 0x7F, 0x80, '"', ',', '\n', '\t', '-', '9', '%'};
  private static final String[] BAD_WORDS = {
    "NaN",
    "-Infinity",
    "1e999",
    "-0",
    "99999999999999999999",
    "",
    "\"",
    "\0",
    "%00",
    "%ff",
    "../",
    "[[[[[[[[[[",
    "{\"a\":",
    "null",
    "true",
    "\uFEFF",
    "é",
    "𝟙",
    "'",
    "0x1p-1",
    "1_000"
  };

  private Mutant() {}

  /** A damaged copy. */
  static byte[] of(byte[] seed, Random random) {
    byte[] bytes = seed.clone();
    int changes = 1 + random.nextInt(MOST_CHANGES);
    for (int i = 0; i < changes; i++) {
      bytes = change(bytes, random);
    }
    return bytes;
  }

  private static byte[] change(byte[] bytes, Random random) {
    if (bytes.length == 0) {
      return new byte[] {(byte) random.nextInt(256)};
    }
    int at = random.nextInt(bytes.length);
    int to = at + random.nextInt(bytes.length - at + 1);
    switch (random.nextInt(8)) {
      case 0 -> bytes[at] ^= (byte) (1 << random.nextInt(8));
      case 1 -> bytes[at] = (byte) BAD_BYTES[random.nextInt(BAD_BYTES.length)];
      case 2 -> {
        return join(bytes, at, new byte[0], to);
      }
      case 3 -> {
        return join(bytes, to, java.util.Arrays.copyOfRange(bytes, at, to), to);
      }
      case 4 -> {
        return java.util.Arrays.copyOf(bytes, at);
      }
      case 5 -> {
        byte[] word =
            BAD_WORDS[random.nextInt(BAD_WORDS.length)].getBytes(
                java.nio.charset.StandardCharsets.UTF_8);
        return join(bytes, at, word, random.nextBoolean() ? at : Math.min(bytes.length, at + 4));
      }
      case 6 -> {
        int extreme = random.nextBoolean() ? Integer.MAX_VALUE : random.nextInt();
        for (int k = 0; k < 4 && at + k < bytes.length; k++) {
          bytes[at + k] = (byte) (extreme >> (random.nextBoolean() ? 8 * k : 24 - 8 * k));
        }
      }
      default -> bytes[at] = (byte) random.nextInt(256);
    }
    return bytes;
  }

  private static byte[] join(byte[] bytes, int head, byte[] middle, int tailFrom) {
    ByteArrayOutputStream out = new ByteArrayOutputStream(bytes.length + middle.length);
    out.write(bytes, 0, head);
    out.writeBytes(middle);
    out.write(bytes, tailFrom, bytes.length - tailFrom);
    return out.toByteArray();
  }
}
