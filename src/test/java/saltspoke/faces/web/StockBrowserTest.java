package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.deque.html.axecore.results.Results;
import com.deque.html.axecore.selenium.AxeBuilder;
import java.nio.charset.Charset;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.openqa.selenium.By;
import org.openqa.selenium.support.ui.Select;
import saltspoke.atlas.stock.InventedCustomers;

/** A purchasing question answered on the page: load a list, pick a region, read, download. */
@Tag("browser")
class StockBrowserTest {
  private static Browser browser;

  @TempDir static Path folder;

  @BeforeAll
  static void start() throws Exception {
    browser = new Browser();
  }

  @AfterAll
  static void stop() {
    browser.close();
  }

  private static void load(Path list) {
    browser.driver.findElement(By.id("file")).sendKeys(list.toAbsolutePath().toString());
    browser.await("a summary", () -> !browser.driver.findElements(By.id("summary")).isEmpty());
  }

  @Test
  void loadAFilePickARegionReadTheSplitDownload() throws Exception {
    Path list = folder.resolve("invented.csv");
    InventedCustomers.write(400, list, 11);
    Path downloads = Files.createDirectories(folder.resolve("downloads"));
    browser.driver.executeCdpCommand(
        "Browser.setDownloadBehavior",
        Map.of("behavior", "allow", "downloadPath", downloads.toString()));
    browser.open("stock.html?lang=en");
    browser.screenshot("stock-empty-desktop");
    load(list);
    long answered =
        (long) browser.script("return document.querySelectorAll('#customers tr').length");
    assertEquals(201, answered, "a header and the first 200 rows");
    browser.fullScreenshot("stock-desktop-whole", false);

    Select regions = new Select(browser.driver.findElement(By.id("region")));
    assertTrue(regions.getOptions().size() > 20);
    regions.selectByValue("0");
    String region =
        new Select(browser.driver.findElement(By.id("region"))).getFirstSelectedOption().getText();
    assertTrue(region.contains("Germany"), region);
    String body = browser.driver.findElement(By.id("result")).getText();
    assertTrue(body.contains("Recommended"), body);
    browser.driver.findElement(By.id("sort-wheels")).click();
    browser.driver.findElement(By.id("sort-wheels")).click();
    assertEquals(
        "descending",
        browser
            .driver
            .findElement(By.xpath("//th[button[@id='sort-wheels']]"))
            .getDomAttribute("aria-sort"));
    browser.screenshot("stock-region-desktop");

    browser.driver.findElement(By.id("take-split-csv")).click();
    Path taken = downloads.resolve("saltspoke-split.csv");
    browser.await("the download", () -> Files.exists(taken));
    Browser.pause(300);
    List<String> lines = Files.readAllLines(taken);
    assertEquals("country,region,of,key,wheels,share_pct", lines.get(0));
    assertTrue(lines.size() > 100);
    browser.assertQuietConsole();
  }

  @Test
  void aListInAnOldEncodingAndRowsThatAreNotUnderstood() throws Exception {
    Path list = folder.resolve("old.csv");
    Files.write(
        list,
        "Ort;Land;Räder\nKöln;DE;2\nNirgendwo;DE;1\n".getBytes(Charset.forName("windows-1252")));
    browser.phone();
    browser.open("stock.html?lang=de");
    load(list);
    String body = browser.driver.findElement(By.id("result")).getText();
    assertTrue(body.contains("Cologne") || body.contains("Köln"), body);
    assertTrue(browser.driver.findElement(By.id("refused")).getText().contains("Nirgendwo"));
    browser.fullScreenshot("stock-phone-whole", true);
    browser.desktop();
    browser.assertQuietConsole();
  }

  @Test
  void aFileThatIsTooLargeOrNoListIsToldPlainly() throws Exception {
    Path large = folder.resolve("large.csv");
    Files.writeString(large, "place\n" + "Kiel\n".repeat(150_000));
    browser.open("stock.html?lang=en");
    browser.driver.findElement(By.id("file")).sendKeys(large.toAbsolutePath().toString());
    browser.await("a word", () -> browser.text("news").contains("500 kB"));
    Path wrong = folder.resolve("wrong.csv");
    Files.writeString(wrong, "name,age\na,1\n");
    browser.driver.findElement(By.id("file")).sendKeys(wrong.toAbsolutePath().toString());
    browser.await("a word", () -> browser.text("news").contains("postcode"));
    browser.screenshot("stock-wrong-file");
  }

  @Test
  void theDeskHasNoAxeViolations() throws Exception {
    Path list = folder.resolve("few.csv");
    InventedCustomers.write(40, list, 5);
    browser.open("stock.html?lang=en");
    load(list);
    for (String theme : List.of("light", "dark")) {
      browser.script("document.documentElement.dataset.theme = arguments[0]", theme);
      Results results = new AxeBuilder().withTags(LooksBrowserTest.WCAG).analyze(browser.driver);
      assertEquals(List.of(), results.getViolations(), theme);
    }
  }
}
