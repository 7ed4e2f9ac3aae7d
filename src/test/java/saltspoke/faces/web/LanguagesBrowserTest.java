package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.openqa.selenium.By;

/** Five languages, two systems of units. */
@Tag("browser")
class LanguagesBrowserTest {
  private static Browser browser;

  @BeforeAll
  static void open() throws Exception {
    browser = new Browser();
  }

  @AfterAll
  static void close() {
    browser.close();
  }

  @ParameterizedTest
  @CsvSource({
    "en, First look in, Mind",
    "de, Erste Kontrolle in, Bitte beachten",
    "fr, Premier contrôle dans, Attention",
    "it, Primo controllo fra, Attenzione",
    "es, Primera revisión en, Atención"
  })
  void thePageSpeaksTheLanguageThroughout(String lang, String firstLook, String cautions)
      throws Exception {
    browser.open(Browser.BREST);
    browser.answer();
    browser.choose("language", lang);
    browser.await("words", () -> browser.text("verdict").contains(firstLook));
    browser.answer();
    assertEquals(lang, browser.script("return document.documentElement.lang"));
    assertTrue(browser.driver.getCurrentUrl().contains("lang=" + lang));
    assertTrue(browser.text("details").contains(cautions));
    String all = browser.driver.findElement(By.tagName("body")).getText();
    assertFalse(all.matches("(?s).*\\bpage-[a-z].*"), "a code shows through");
    assertFalse(all.matches("(?s).*\\{[A-Za-z]+\\}.*"), "a gap shows through");
    browser.awaitMap();
    browser.screenshot("language-" + lang);
    browser.assertQuietConsole();
  }

  @Test
  void usUnitsAreUsedWhereMetricOnesWere() throws Exception {
    browser.open(Browser.BREST);
    browser.answer();
    assertTrue(browser.text("place-now").contains(" m "), browser.text("place-now"));
    browser.choose("units", "us");
    assertTrue(browser.text("place-now").contains(" ft "), browser.text("place-now"));
    assertTrue(browser.text("air").contains("°F"), "temperature");
    browser.assertQuietConsole();
  }
}
