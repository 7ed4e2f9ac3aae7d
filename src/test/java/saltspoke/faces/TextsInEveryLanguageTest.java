package saltspoke.faces;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/** Every language says everything: the same rooms, the same codes, the same gaps. */
@Tag("law")
class TextsInEveryLanguageTest {
  private static final Path TEXTS = Path.of("web/texts");
  private static final Pattern GAP = Pattern.compile("\\{[A-Za-z0-9]+\\}");
  private static final Pattern USED =
      Pattern.compile("(?:t\\(|data-t(?:-label)?=)\"(page-[A-Za-z0-9-]+)\"");

  private static Map<String, String> room(String language, String room) throws IOException {
    Path file = TEXTS.resolve(language).resolve(room + ".json");
    assertTrue(Files.isRegularFile(file), "missing " + file);
    ObjectMapper mapper =
        new ObjectMapper().configure(JsonParser.Feature.STRICT_DUPLICATE_DETECTION, true);
    JsonNode node = mapper.readTree(file.toFile());
    Map<String, String> sentences = new TreeMap<>();
    node.properties().forEach(entry -> sentences.put(entry.getKey(), entry.getValue().asText()));
    return sentences;
  }

  private static TreeSet<String> gaps(String sentence) {
    TreeSet<String> gaps = new TreeSet<>();
    GAP.matcher(sentence).results().forEach(match -> gaps.add(match.group()));
    return gaps;
  }

  @TestFactory
  Stream<DynamicTest> everyRoomOfEveryLanguageMatchesTheEnglishOne() throws IOException {
    List<DynamicTest> tests = new ArrayList<>();
    try (Stream<Path> files = Files.list(TEXTS.resolve("en"))) {
      for (Path file : files.sorted().toList()) {
        String room = file.getFileName().toString().replace(".json", "");
        for (String language : Texts.LANGUAGES) {
          tests.add(
              DynamicTest.dynamicTest(
                  language + "/" + room,
                  () -> {
                    Map<String, String> english = room("en", room);
                    Map<String, String> other = room(language, room);
                    assertEquals(english.keySet(), other.keySet(), "codes");
                    english.forEach(
                        (code, sentence) -> {
                          assertEquals(gaps(sentence), gaps(other.get(code)), "gaps of " + code);
                          assertFalse(other.get(code).isBlank(), code + " is empty");
                        });
                  }));
        }
      }
    }
    return tests.stream();
  }

  @Test
  void everyRoomIsOneThatThePageLoads() throws IOException {
    try (Stream<Path> files = Files.list(TEXTS.resolve("en"))) {
      files.forEach(
          file ->
              assertTrue(
                  Texts.ROOMS.contains(file.getFileName().toString().replace(".json", "")),
                  file + " is not in Texts.ROOMS"));
    }
  }

  @Test
  void everyCodeThatThePageNamesHasASentence() throws IOException {
    Map<String, String> page = room("en", "page");
    try (Stream<Path> files = Files.walk(Path.of("web"))) {
      for (Path file : files.filter(path -> path.toString().matches(".*\\.(js|html)")).toList()) {
        USED.matcher(Files.readString(file))
            .results()
            .forEach(
                match ->
                    assertTrue(
                        page.containsKey(match.group(1)), file + " names " + match.group(1)));
      }
    }
  }
}
