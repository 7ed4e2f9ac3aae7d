package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.interactions.Actions;

/** The map as a way to ask and as a picture. */
@Tag("browser")
class MapBrowserTest {
  private static final int CLICKS = 200;
  private static final long SEED = 20261201;
  private static Browser browser;

  @BeforeAll
  static void open() throws Exception {
    browser = new Browser();
  }

  @AfterAll
  static void close() {
    browser.close();
  }

  private static WebElement map() {
    return browser.driver.findElement(By.id("map"));
  }

  private static void clickAt(int fromMiddleX, int fromMiddleY) {
    new Actions(browser.driver).moveToElement(map(), fromMiddleX, fromMiddleY).click().perform();
  }

  @Test
  void aClickOnLandAnswersAndOneAtSeaSaysSo() throws Exception {
    browser.open("");
    clickAt(40, 0); // the map opens on 48° N 6° E; this is Germany
    assertTrue(browser.firstLookMonths() > 0);
    assertTrue(browser.driver.getCurrentUrl().contains("at="));

    clickAt(-160, 0); // the Atlantic
    browser.await(
        "words on the sea",
        () -> browser.driver.findElement(By.id("verdict")).getText().contains("at sea"));
    assertFalse(browser.driver.getCurrentUrl().contains("at="), "the sea is no place to bookmark");
    browser.screenshot("at-sea-desktop");
    browser.assertQuietConsole();
  }

  @Test
  void everyLayerHasALegendAndAValueUnderThePointer() throws Exception {
    browser.open("");
    for (String layer :
        new String[] {
          "class-carbon-steel", "class-zinc", "wet-hours", "chloride", "near-freezing-days"
        }) {
      browser.choose("layer", layer);
      browser.await(
          "legend",
          () -> browser.driver.findElements(By.cssSelector("#legend .legend li")).size() >= 6);
      new Actions(browser.driver).moveToElement(map(), 35, 5).perform();
      new Actions(browser.driver).moveToElement(map(), 40, 0).perform();
      browser.await("value", () -> browser.text("pointer").startsWith("Here: "));
      browser.awaitMap();
      browser.screenshot("map-" + layer);
    }
    browser.assertQuietConsole();
  }

  @Test
  void theKeyboardTakesTheCentreOfTheMap() throws Exception {
    browser.open("");
    map().sendKeys(Keys.ENTER);
    assertTrue(browser.firstLookMonths() > 0);
    browser.assertQuietConsole();
  }

  @Test
  void twoHundredRandomClicksRaiseNoConsoleError() throws Exception {
    browser.open("");
    Random random = new Random(SEED);
    int width = map().getSize().getWidth();
    int height = map().getSize().getHeight();
    for (int i = 0; i < CLICKS; i++) {
      clickAt(
          random.nextInt(width - 8) - width / 2 + 4, random.nextInt(height - 8) - height / 2 + 4);
    }
    browser.await(
        "a settled page",
        () ->
            (boolean)
                browser.script(
                    "return !document.querySelector('.waiting') &&"
                        + " !document.querySelector('.stale') &&"
                        + " !!document.querySelector('.tag, .failed')"));
    browser.assertQuietConsole();
    assertEquals(1, browser.driver.findElements(By.cssSelector(".tag, .failed")).size());
  }
}
