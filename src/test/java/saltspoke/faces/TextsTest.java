package saltspoke.faces;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.values.Note;
import saltspoke.values.Refusal;

@Tag("law")
class TextsTest {
  @Test
  void numbersTakeFewDigitsAndTheLanguagesDecimalSign() {
    assertEquals("3.14", Texts.in("en").format(3.14159));
    assertEquals("3,14", Texts.in("de").format(3.14159));
    assertEquals("31.4", Texts.in("en").format(31.4159));
    assertEquals("314", Texts.in("en").format(314.159));
    assertEquals("7", Texts.in("en").format(7.0));
    assertEquals("7", Texts.in("en").format(7));
  }

  @Test
  void aCodeWithoutSentenceShowsItself() {
    assertEquals("no-such-code", Texts.in("en").say(Note.of("no-such-code")));
  }

  @Test
  void anUnknownLanguageIsRefusedWithTheKnownOnes() {
    Refusal refusal = assertThrows(Refusal.class, () -> Texts.in("xx"));
    assertEquals("en, de, fr, it, es", refusal.allowed());
  }
}
