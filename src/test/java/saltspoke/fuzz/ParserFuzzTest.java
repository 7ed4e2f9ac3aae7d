package saltspoke.fuzz;

import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.ShrinkingMode;
import net.jqwik.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import saltspoke.values.Refusal;

/**
 * Damaged files against every parser. The number of tries is jqwik's default, a thousand per run of
 * this property; {@code -Plong} asks for a million. An input that breaks a parser is written to
 * {@code target/fuzz}: move it to the corpus' folder {@code found} with the fix.
 */
@Tag("law")
class ParserFuzzTest {
  private static final Path FOUND = Path.of("target", "fuzz");
  private static final List<String> NAMES = List.copyOf(Parsers.ALL.keySet());
  private static final List<byte[]> SEEDS = NAMES.stream().map(Parsers::seed).toList();

  @Provide
  Arbitrary<Long> any() {
    return Arbitraries.longs().withoutEdgeCases();
  }

  @Property(shrinking = ShrinkingMode.OFF)
  void damagedFilesAreReadOrRefused(@ForAll("any") long number) throws IOException {
    Random random = new Random(number);
    int i = random.nextInt(NAMES.size());
    byte[] bytes = Mutant.of(SEEDS.get(i), random);
    survive(NAMES.get(i), bytes);
  }

  static Stream<Path> corpus() throws IOException {
    try (Stream<Path> files = Files.list(Parsers.CORPUS.resolve("found"))) {
      return files.sorted().toList().stream();
    }
  }

  /**
   * What was found before: {@code found/REASON.PARSER}, such as {@code
   * two-equal-names.stations.csv}.
   */
  @ParameterizedTest
  @org.junit.jupiter.api.Tag("law")
  @MethodSource("corpus")
  void whatBrokeAParserOnceIsReadOrRefused(Path file) throws IOException {
    String name = file.getFileName().toString();
    survive(name.substring(name.indexOf('.') + 1), Files.readAllBytes(file));
  }

  private static void survive(String name, byte[] bytes) throws IOException {
    long start = System.nanoTime();
    try {
      Parsers.ALL.get(name).read(bytes);
    } catch (Refusal | IOException expected) {
      // The two ways to say no.
    } catch (RuntimeException | Error e) {
      Files.createDirectories(FOUND);
      Path kept = FOUND.resolve(Integer.toHexString(java.util.Arrays.hashCode(bytes)) + "." + name);
      Files.write(kept, bytes);
      fail(kept + " broke the parser", e);
    }
    assertTrue(System.nanoTime() - start < TimeUnit.SECONDS.toNanos(5), name + " took too long");
  }
}
