package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.deque.html.axecore.results.Results;
import com.deque.html.axecore.selenium.AxeBuilder;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Base64;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.openqa.selenium.By;

/** Light and dark, desktop and phone, paper; WCAG 2.2 AA as far as axe-core can tell. */
@Tag("browser")
class LooksBrowserTest {
  private static final int MOST_PAGE_BYTES = 600_000;
  static final List<String> WCAG = List.of("wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa");
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
    "light, false, ''", "dark, false, ''", "light, true, ''", "dark, true, ''",
    "light, false, empty", "dark, false, empty", "light, false, two", "dark, true, failed"
  })
  void axeFindsNoViolation(String theme, boolean phone, String state) throws Exception {
    if (phone) {
      browser.phone();
    } else {
      browser.desktop();
    }
    String query =
        switch (state) {
          case "empty" -> "?lang=en";
          case "failed" -> "?postcode=00000&country=US";
          case "two" -> Browser.BREST + "&b.place=Nantes&b.nipple=brass-nickel";
          default -> Browser.BREST;
        };
    browser.open(query + "&theme=" + theme);
    if (state.equals("failed")) {
      browser.await(
          "words", () -> !browser.driver.findElements(By.cssSelector(".failed")).isEmpty());
    } else if (!state.equals("empty")) {
      browser.answer();
      browser.script("document.querySelectorAll('details').forEach(box => box.open = true)");
    }
    browser.awaitMap();
    Results results = new AxeBuilder().withTags(WCAG).analyze(browser.driver);
    String name = String.join("-", "axe", theme, phone ? "phone" : "desktop", state);
    browser.fullScreenshot(name.replaceAll("-$", ""), phone);
    browser.desktop();
    assertEquals(
        List.of(),
        results.getViolations().stream()
            .map(rule -> rule.getId() + ": " + rule.getNodes().stream().limit(4).toList())
            .toList());
  }

  @Test
  void aPhoneNeverScrollsSidewaysAndKeepsTheIntervalInSight() throws Exception {
    browser.phone();
    browser.open(Browser.BREST);
    browser.answer();
    long across = (long) browser.script("return document.documentElement.scrollWidth");
    assertEquals(Browser.PHONE_WIDTH, across);
    assertTrue(browser.driver.findElement(By.id("strip")).isDisplayed());
    assertTrue(browser.text("strip").startsWith("First look in"));
    browser.screenshot("answer-phone");
    browser.awaitMap();
    browser.fullScreenshot("answer-phone-whole", true);
    browser.desktop();
    browser.assertQuietConsole();
  }

  @Test
  void onPaperThereIsTheAnswerAndNoForm() throws Exception {
    browser.open(Browser.BREST + "&theme=dark");
    browser.answer();
    browser.driver.executeCdpCommand("Emulation.setEmulatedMedia", Map.of("media", "print"));
    try {
      assertTrue(browser.answer().isDisplayed());
      assertFalse(browser.driver.findElement(By.id("question")).isDisplayed());
      assertFalse(browser.driver.findElement(By.id("map")).isDisplayed());
      assertTrue(browser.driver.findElement(By.className("cautions")).isDisplayed());
      assertEquals(
          "rgb(255, 255, 255)",
          browser.script("return getComputedStyle(document.body).backgroundColor"));
      browser.screenshot("print");
      Map<String, Object> printed =
          browser.driver.executeCdpCommand("Page.printToPDF", Map.of("preferCSSPageSize", true));
      Files.write(
          Path.of("target/screenshots/print.pdf"),
          Base64.getDecoder().decode((String) printed.get("data")));
    } finally {
      browser.driver.executeCdpCommand("Emulation.setEmulatedMedia", Map.of("media", ""));
    }
  }

  @Test
  void theWholePageIsLight() throws Exception {
    browser.open(Browser.BREST);
    browser.answer();
    browser.awaitMap();
    long bytes =
        ((Number)
                browser.script(
                    "return performance.getEntriesByType('resource')"
                        + ".concat(performance.getEntriesByType('navigation'))"
                        + ".filter(entry => !entry.name.includes('/api/tiles/'))"
                        + ".reduce((sum, entry) => sum + Math.max(entry.transferSize,"
                        + " entry.encodedBodySize), 0)"))
            .longValue();
    Object paint =
        browser.script(
            "return performance.getEntriesByName('first-contentful-paint')[0]?.startTime");
    Object answer = browser.script("return performance.getEntriesByName('answer')[0]?.startTime");
    System.out.println(
        "page weight without tiles "
            + bytes
            + " bytes; first paint "
            + paint
            + " ms; first answer "
            + answer
            + " ms after navigation, warmed server");
    assertTrue(bytes < MOST_PAGE_BYTES, bytes + " bytes");
  }
}
