package saltspoke.atmosphere;

import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Path;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.values.Note;

@Tag("law")
class AirTextsTest {
  @Test
  void everyFlagOfExtremeQuestionsHasItsSentenceWithItsGaps() throws IOException {
    Set<Note> notes = new LinkedHashSet<>();
    for (Exposure x :
        List.of(
            new Exposure(-30, 20, 0, 0),
            new Exposure(40, 99, 500, 5000),
            new Exposure(10, 80, 10, 10))) {
      for (InputSpread spread :
          List.of(
              InputSpread.NONE,
              new InputSpread(0, 0, 0, 2),
              new InputSpread(0, 0, 2, 0),
              new InputSpread(0, 20, 0, 0),
              new InputSpread(15, 0, 0, 0))) {
        List<MetalCorrosivity> all = Corrosion.assess(x, spread);
        notes.addAll(Corrosion.flags(x, all));
        notes.add(ClassSummary.of(all.get(0), x, spread));
      }
    }
    notes.addAll(ChlorideFromSite.flags(9999, 30));
    notes.addAll(Settings.so2(Setting.CITY, false, java.util.Optional.empty()).flags());
    JsonNode texts = new ObjectMapper().readTree(Path.of("web/texts/en/air.json").toFile());
    assertTrue(notes.size() > 15, "the questions are extreme enough: " + notes.size());
    for (Note note : notes) {
      assertTrue(texts.has(note.code()), note.code());
      for (String gap : note.args().keySet()) {
        String sentence = texts.get(note.code()).asText();
        assertTrue(sentence.contains("{" + gap + "}"), note.code() + " lacks {" + gap + "}");
      }
    }
  }
}
