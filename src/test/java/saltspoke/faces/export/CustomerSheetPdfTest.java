package saltspoke.faces.export;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.lowagie.text.pdf.PdfReader;
import com.lowagie.text.pdf.parser.PdfTextExtractor;
import java.time.LocalDate;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import saltspoke.faces.Texts;

class CustomerSheetPdfTest {
  private static final LocalDate TODAY = LocalDate.of(2026, 12, 1);

  private static String textOf(String lang, Units units) throws Exception {
    byte[] pdf = CustomerSheetPdf.render(SampleAdvice.at("Łódź"), Texts.in(lang), units, TODAY);
    PdfReader reader = new PdfReader(pdf);
    StringBuilder text = new StringBuilder();
    for (int page = 1; page <= reader.getNumberOfPages(); page++) {
      text.append(new PdfTextExtractor(reader).getTextFromPage(page)).append('\n');
    }
    assertTrue(reader.getNumberOfPages() <= 2, "two pages at most");
    return text.toString().replaceAll("\\s+", " ");
  }

  @ParameterizedTest
  @ValueSource(strings = {"en", "de", "fr", "it", "es"})
  @Tag("law")
  void saysTheIntervalAndTheTitleOfEverySection(String lang) throws Exception {
    String text = textOf(lang, Units.METRIC);
    Wording wording = new Wording(Texts.in(lang));
    for (String shown :
        new String[] {
          wording.span(2.7),
          wording.say("page-why"),
          wording.say("page-how-to-look"),
          wording.say("page-stop"),
          wording.say("page-cautions"),
          "sample-caution"
        }) {
      assertTrue(text.contains(Latin.of(shown)), lang + " lacks " + shown + " in " + text);
    }
    assertTrue(text.contains("Lódz"), "a letter without a glyph falls back to its base letter");
  }

  @Test
  @Tag("law")
  void usUnitsReplaceMetricOnes() throws Exception {
    String text = textOf("en", Units.US);
    assertTrue(text.contains("659 ft"), text);
    assertTrue(text.contains("179 mi"), text);
  }

  @Test
  @Tag("law")
  void rangesNeverShowAFalseSingleNumber() {
    Wording english = new Wording(Texts.in("en"));
    assertEquals("6–29 months", english.range(SampleAdvice.CLOSED));
    assertEquals(
        "3.3 years at the earliest, perhaps beyond 20 years", english.range(SampleAdvice.OPEN));
    assertEquals("beyond 20 years", english.range(SampleAdvice.BEYOND));
    assertEquals("does not happen with these parts", english.range(SampleAdvice.NEVER));
  }

  @Test
  @Tag("law")
  void spansRoundDown() {
    Wording english = new Wording(Texts.in("en"));
    assertEquals("1 week", english.span(0.2));
    assertEquals("3 weeks", english.span(0.9));
    assertEquals("2.5 months", english.span(2.99));
    assertEquals("1 month", english.span(1.4));
    assertEquals("11 months", english.span(11.99));
    assertEquals("every month", english.every(1.4));
    assertEquals("toutes les 3 semaines", new Wording(Texts.in("fr")).every(0.9));
  }
}
