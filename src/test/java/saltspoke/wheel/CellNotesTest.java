package saltspoke.wheel;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.values.Note;

/** Every note of films and cells has its sentence, with the gaps that the note fills. */
@Tag("law")
class CellNotesTest {
  @Test
  void everyNoteHasItsSentence() throws IOException {
    List<Note> notes = new ArrayList<>(ThinFilm.flags(99.5));
    CellSpec carbon = CellFixtures.nippleOnCarbon(0.02);
    CellSpec skirted =
        new CellSpec(
            Material.STAINLESS, Material.CARBON_FIBRE, 2.25, 14, 0.3, 0.35, 0.02, 12, 0, 2);
    Film cold = ThinFilm.inEquilibrium(new SaltMix(0, 600, 0, 0), 85, -5);
    notes.addAll(GalvanicCell.flags(carbon, cold));
    notes.addAll(GalvanicCell.flags(skirted, CellFixtures.shed(80)));
    TreeSet<String> codes = new TreeSet<>();
    String texts;
    try (InputStream in = getClass().getResourceAsStream("/web/texts/en/cell.json")) {
      texts = new String(in.readAllBytes(), StandardCharsets.UTF_8);
    }
    for (Note note : notes) {
      codes.add(note.code());
      int at = texts.indexOf('"' + note.code() + '"');
      assertTrue(at >= 0, note.code());
      String sentence = texts.substring(at, texts.indexOf('\n', at));
      for (String gap : note.args().keySet()) {
        assertTrue(sentence.contains('{' + gap + '}'), note.code() + " " + gap);
      }
    }
    assertEquals(6, codes.size(), codes.toString());
  }
}
