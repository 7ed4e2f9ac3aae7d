package saltspoke.advice;

import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.atmosphere.AirClimate;
import saltspoke.values.Note;
import saltspoke.wheel.Catalogue;
import saltspoke.wheel.Profiles;
import saltspoke.wheel.RidingProfile;

/** Every note of an answer has a sentence, and every gap of the sentence a value. */
@Tag("law")
class AdviceWordsTest {
  @Test
  void everyNoteHasItsSentence() throws IOException {
    JsonNode texts = new ObjectMapper().readTree(Path.of("web/texts/en/advice.json").toFile());
    Advisor advisor = new Advisor(Catalogue.shipped());
    for (RidingProfile profile : Profiles.shipped().all()) {
      for (AirClimate air : List.of(TestClimates.maritimeSalted(), TestClimates.dryInland())) {
        for (Finding finding : Finding.values()) {
          AdviceRequest request =
              Asked.at(
                  Asked.inService(Asked.of(profile, "carbon-bare", null, "none", null), 6, finding),
                  RiskLevel.USUAL,
                  true);
          check(advisor.advise(air, request), texts);
        }
      }
    }
  }

  private static void check(Advice advice, JsonNode texts) {
    List<Note> notes = new ArrayList<>(advice.look());
    notes.addAll(advice.stopSigns());
    notes.addAll(advice.cautions());
    advice.pairings().forEach(pairing -> notes.addAll(pairing.reasons()));
    advice.changes().forEach(change -> notes.add(change.what()));
    advice.flags().stream().filter(n -> n.code().startsWith("advice-")).forEach(notes::add);
    for (Note note : notes) {
      assertTrue(texts.has(note.code()), "no sentence for " + note.code());
      String sentence = texts.get(note.code()).asText();
      for (String gap : note.args().keySet()) {
        sentence = sentence.replace("{" + gap + "}", "");
      }
      assertTrue(!sentence.contains("{"), note.code() + " lacks a value: " + sentence);
    }
  }
}
