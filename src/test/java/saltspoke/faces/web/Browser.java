package saltspoke.faces.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.fail;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.logging.Level;
import java.util.stream.Stream;
import org.openqa.selenium.By;
import org.openqa.selenium.OutputType;
import org.openqa.selenium.WebElement;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.chrome.ChromeDriverService;
import org.openqa.selenium.chrome.ChromeOptions;
import org.openqa.selenium.logging.LogType;
import org.openqa.selenium.logging.LoggingPreferences;
import org.openqa.selenium.support.ui.Select;
import org.openqa.selenium.support.ui.WebDriverWait;
import saltspoke.faces.Answers;
import saltspoke.fields.DataSet;

/** A headless Chromium on the real page, served by the real server from the shipped data. */
final class Browser implements AutoCloseable {
  static final int DESKTOP_WIDTH = 1440;
  static final int DESKTOP_HEIGHT = 900;
  static final int PHONE_WIDTH = 390;
  static final int PHONE_HEIGHT = 844;
  static final String BREST = "?place=Brest, Brittany, France";

  private static final Duration PATIENCE = Duration.ofSeconds(60);
  private static final Path SCREENSHOTS = Path.of("target/screenshots");
  private static String address;

  final ChromeDriver driver;

  Browser() throws Exception {
    Files.createDirectories(SCREENSHOTS);
    ChromeOptions options = new ChromeOptions();
    options.setBinary(find("chromium"));
    options.addArguments(
        "--headless=new",
        "--no-sandbox",
        "--disable-gpu",
        "--disable-quic",
        "--no-first-run",
        "--disable-background-networking",
        "--disable-component-update",
        "--disable-sync",
        "--hide-scrollbars",
        "--lang=en-US",
        // The network cable is out: nothing but this machine resolves.
        "--host-resolver-rules=MAP * ~NOTFOUND , EXCLUDE 127.0.0.1",
        "--user-data-dir=" + Files.createTempDirectory("saltspoke-browser"));
    LoggingPreferences logs = new LoggingPreferences();
    logs.enable(LogType.BROWSER, Level.ALL);
    options.setCapability("goog:loggingPrefs", logs);
    ChromeDriverService service =
        new ChromeDriverService.Builder()
            .usingDriverExecutable(find("chromedriver"))
            .usingAnyFreePort()
            .build();
    driver = new ChromeDriver(service, options);
    desktop();
  }

  private static File find(String program) {
    return Stream.of(System.getenv("PATH").split(File.pathSeparator))
        .map(folder -> new File(folder, program))
        .filter(File::canExecute)
        .findFirst()
        .orElseGet(() -> fail("no " + program + " on the PATH: apt-get install " + program));
  }

  /** Address of the server, started at first use and shared by all tests of the run. */
  static synchronized String address() throws Exception {
    if (address == null) {
      WebServer server = Api.server(0, new Answers(DataSet.shipped()));
      address = server.start();
    }
    return address;
  }

  void desktop() {
    size(DESKTOP_WIDTH, DESKTOP_HEIGHT, false);
  }

  void phone() {
    size(PHONE_WIDTH, PHONE_HEIGHT, true);
  }

  private void size(int width, int height, boolean mobile) {
    driver.executeCdpCommand(
        "Emulation.setDeviceMetricsOverride",
        Map.of("width", width, "height", height, "deviceScaleFactor", 1, "mobile", mobile));
  }

  /** Opens the page with a query and waits until it can be used. */
  void open(String query) throws Exception {
    driver.manage().logs().get(LogType.BROWSER); // what an earlier test left behind
    driver.get(address() + query.replace(" ", "%20"));
    await(
        "the page is ready", () -> script("return document.documentElement.dataset.ready") != null);
  }

  /** Waits for an answer on the tag that belongs to the question asked last. */
  WebElement answer() {
    await(
        "an answer",
        () ->
            (boolean)
                script(
                    "return !!document.querySelector('.tag') && !document.querySelector('.stale')"
                        + " && !document.querySelector('.waiting')"
                        + " && !!document.querySelector('#others table')"));
    return driver.findElement(By.cssSelector(".tag"));
  }

  /** Days or months until the first look, as the tag carries it. */
  double firstLookMonths() {
    return Double.parseDouble(
        answer().findElement(By.className("big")).getDomAttribute("data-first-look"));
  }

  void choose(String id, String value) {
    new Select(driver.findElement(By.id(id))).selectByValue(value);
    pause(400);
  }

  Object script(String script, Object... arguments) {
    return driver.executeScript(script, arguments);
  }

  String text(String id) {
    return driver.findElement(By.id(id)).getText();
  }

  void await(String what, java.util.function.BooleanSupplier done) {
    new WebDriverWait(driver, PATIENCE).withMessage(what).until(unused -> done.getAsBoolean());
  }

  static void pause(long milliseconds) {
    try {
      Thread.sleep(milliseconds);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  /** Waits until no tile is on its way, so that a picture shows the map as people see it. */
  void awaitMap() {
    await(
        "all tiles",
        () ->
            (boolean)
                script(
                    "const all=[...document.querySelectorAll('.leaflet-tile')];"
                        + "return all.length>0 && all.every(tile=>tile.complete)"));
    pause(400);
  }

  /** A picture of the window as it is. */
  void screenshot(String name) throws IOException {
    Files.write(SCREENSHOTS.resolve(name + ".png"), driver.getScreenshotAs(OutputType.BYTES));
  }

  /** A picture of the whole page at the present width. */
  void fullScreenshot(String name, boolean asPhone) throws IOException {
    long height = ((Number) script("return document.documentElement.scrollHeight")).longValue();
    size(asPhone ? PHONE_WIDTH : DESKTOP_WIDTH, (int) height, asPhone);
    pause(500);
    screenshot(name);
    if (asPhone) {
      phone();
    } else {
      desktop();
    }
  }

  /** No script error, no resource refused, nothing that the policy blocked. */
  void assertQuietConsole() {
    List<String> loud = new ArrayList<>();
    driver
        .manage()
        .logs()
        .get(LogType.BROWSER)
        .forEach(
            entry -> {
              if (entry.getLevel().intValue() >= Level.WARNING.intValue()) {
                loud.add(entry.getMessage());
              }
            });
    assertEquals(List.of(), loud);
  }

  @Override
  public void close() {
    driver.quit();
  }
}
