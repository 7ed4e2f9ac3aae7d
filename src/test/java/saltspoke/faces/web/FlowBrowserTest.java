package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.InputStreamReader;
import java.net.URI;
import java.net.URL;
import java.nio.charset.StandardCharsets;
import net.fortuna.ical4j.data.CalendarBuilder;
import net.fortuna.ical4j.model.Calendar;
import net.fortuna.ical4j.model.Component;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.support.ui.Select;

/** From a place to an interval, the ways a person at the counter takes. */
@Tag("browser")
class FlowBrowserTest {
  private static Browser browser;

  @BeforeAll
  static void open() throws Exception {
    browser = new Browser();
  }

  @AfterAll
  static void close() {
    browser.close();
  }

  @Test
  void aTownAndAProfileGiveClassAndInterval() throws Exception {
    browser.open("");
    assertTrue(browser.text("verdict").contains("Where is the wheel ridden?"));
    browser.screenshot("empty-desktop");
    WebElement town = browser.driver.findElement(By.id("town"));
    town.sendKeys("Brest");
    browser.await(
        "towns", () -> !browser.driver.findElements(By.cssSelector("#towns li")).isEmpty());
    browser.screenshot("towns-desktop");
    for (WebElement option : browser.driver.findElements(By.cssSelector("#towns li"))) {
      if (option.getText().contains("France")) {
        option.click();
        break;
      }
    }
    browser.choose("profile", "fair-weather-racer");
    double kept = browser.firstLookMonths();
    browser.choose("profile", "sea-front-runabout");
    double open = browser.firstLookMonths();

    assertTrue(kept > open, kept + " months kept warm, " + open + " by the sea");
    assertTrue(browser.answer().getText().matches("(?s).*\\b(C[1-5]|CX)\\b.*"));
    assertTrue(browser.answer().getText().contains("Brest"));
    assertTrue(browser.text("air").contains("Aluminium"));
    browser.awaitMap();
    browser.screenshot("answer-desktop");
    browser.fullScreenshot("answer-desktop-whole", false);
    browser.assertQuietConsole();
  }

  @Test
  void aPostcodeTakesAtMostFourInteractions() throws Exception {
    browser.open("");
    int interactions = 0;
    WebElement postcode = browser.driver.findElement(By.id("postcode"));
    postcode.sendKeys("29200");
    interactions++;
    new Select(browser.driver.findElement(By.id("country"))).selectByValue("FR");
    interactions++;
    double months = browser.firstLookMonths();
    assertTrue(months > 0);
    assertTrue(interactions <= 4);
    browser.assertQuietConsole();
  }

  @Test
  void theKeyboardAloneReachesAnAnswerAndChangesIt() throws Exception {
    browser.open("");
    WebElement start = browser.driver.findElement(By.tagName("body"));
    start.sendKeys(Keys.TAB);
    for (int i = 0; i < 12 && !focusedId().equals("town"); i++) {
      browser.driver.switchTo().activeElement().sendKeys(Keys.TAB);
    }
    assertEquals("town", focusedId());
    browser.driver.switchTo().activeElement().sendKeys("Nantes");
    browser.await(
        "towns", () -> !browser.driver.findElements(By.cssSelector("#towns li")).isEmpty());
    browser.driver.switchTo().activeElement().sendKeys(Keys.ARROW_DOWN, Keys.ARROW_UP, Keys.ENTER);
    double before = browser.firstLookMonths();
    for (int i = 0; i < 40 && !focusedId().equals("nipple"); i++) {
      browser.driver.switchTo().activeElement().sendKeys(Keys.TAB);
    }
    assertEquals("nipple", focusedId());
    browser.driver.switchTo().activeElement().sendKeys("Brass, n");
    Browser.pause(500);
    double after = browser.firstLookMonths();
    assertNotEquals(before, after);
    assertEquals("nipple", focusedId(), "the focus stays where it was");
    browser.assertQuietConsole();
  }

  private static String focusedId() {
    String id = browser.driver.switchTo().activeElement().getDomAttribute("id");
    return id == null ? "" : id;
  }

  @Test
  void theAddressHoldsTheWholeQuestion() throws Exception {
    browser.open(Browser.BREST + "&profile=weekend-gravel&nipple=brass-nickel&risk=cautious");
    browser.choose("own-storage", "open");
    double asked = browser.firstLookMonths();
    String address = browser.driver.getCurrentUrl();
    assertTrue(address.contains("own.storage=open"), address);

    browser.driver.get("about:blank");
    browser.driver.get(address);
    assertEquals(asked, browser.firstLookMonths());
    assertEquals("brass-nickel", chosen("nipple"));
    assertEquals("open", chosen("own-storage"));
    browser.assertQuietConsole();
  }

  private static String chosen(String id) {
    return new Select(browser.driver.findElement(By.id(id)))
        .getFirstSelectedOption()
        .getDomAttribute("value");
  }

  @Test
  void twoWheelsStandSideBySide() throws Exception {
    browser.open(Browser.BREST);
    browser.answer();
    browser.driver.findElement(By.id("compare")).click();
    browser.choose("nipple", "brass-nickel");
    browser.await(
        "two tags",
        () -> browser.driver.findElements(By.cssSelector(".tag:not(.stale)")).size() == 2);
    browser.await("a table", () -> !browser.driver.findElements(By.id("side-by-side")).isEmpty());
    assertTrue(browser.driver.getCurrentUrl().contains("b.nipple=brass-nickel"));
    browser.awaitMap();
    browser.screenshot("two-wheels-desktop");
    browser.assertQuietConsole();
  }

  @Test
  void aPairingThatCannotBeBuiltIsMendedAndSaidSo() throws Exception {
    browser.open(Browser.BREST + "&rim=aluminium-bare&interface=eyelet");
    browser.answer();
    browser.choose("rim", "carbon-bare");
    browser.answer();
    assertFalse(chosen("interface").equals("eyelet"));
    assertTrue(browser.text("town-word").contains("do not go together"));
    browser.assertQuietConsole();
  }

  @Test
  void anUnknownPostcodeSaysWhatToDoInstead() throws Exception {
    browser.open("?postcode=00000&country=US");
    browser.await("words", () -> !browser.driver.findElements(By.cssSelector(".failed")).isEmpty());
    String words = browser.text("verdict");
    assertTrue(words.contains("town"), words);
    assertFalse(words.contains("page-"), words);
    browser.screenshot("unknown-postcode-desktop");
  }

  @Test
  void theCalendarOnThePageIsReadByALibrary() throws Exception {
    browser.open(Browser.BREST + "&lang=fr");
    browser.answer();
    String link =
        browser
            .driver
            .findElement(By.cssSelector(".take a[href*='advice.ics']"))
            .getDomProperty("href");
    URL url = URI.create(link).toURL();
    Calendar calendar =
        new CalendarBuilder()
            .build(new InputStreamReader(url.openStream(), StandardCharsets.UTF_8));
    calendar.validate();
    assertFalse(calendar.getComponents(Component.VEVENT).isEmpty());
    assertTrue(calendar.toString().contains("Contrôler les écrous"));
  }

  @Test
  void whatCanBeTakenAwayIsServedInItsOwnFormat() throws Exception {
    browser.open(Browser.BREST);
    browser.answer();
    for (String[] file :
        new String[][] {
          {"advice.pdf", "application/pdf"},
          {"advice.csv", "text/csv"},
          {"/advice?", "application/json"}
        }) {
      String link =
          browser
              .driver
              .findElement(By.cssSelector(".take a[href*='" + file[0] + "']"))
              .getDomProperty("href");
      var connection = URI.create(link).toURL().openConnection();
      assertTrue(connection.getContentType().startsWith(file[1]), link);
      assertTrue(connection.getInputStream().readAllBytes().length > 500, link);
    }
  }
}
