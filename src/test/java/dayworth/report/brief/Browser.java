package dayworth.report.brief;

import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.logging.Level;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.chrome.ChromeDriverService;
import org.openqa.selenium.chrome.ChromeOptions;
import org.openqa.selenium.logging.LogEntry;
import org.openqa.selenium.logging.LogType;
import org.openqa.selenium.logging.LoggingPreferences;

/** A real browser that shows one page; where none is installed its tests are skipped. */
final class Browser implements AutoCloseable {

  static final String NONE =
      "no browser is installed: the packages chromium and chromium-driver bring one";

  private final ChromeDriver driver;

  private Browser(ChromeDriver driver) {
    this.driver = driver;
  }

  /** Starts one, or skips the test with a notice. */
  static Browser start() {
    Optional<Path> program = find("chromium", "chromium-browser", "google-chrome");
    Optional<Path> control = find("chromedriver");
    boolean there = program.isPresent() && control.isPresent();
    if (!there) {
      System.err.println("Browser tests are skipped: " + NONE);
    }
    Assumptions.assumeTrue(there, NONE);
    LoggingPreferences logs = new LoggingPreferences();
    logs.enable(LogType.BROWSER, Level.ALL);
    logs.enable(LogType.PERFORMANCE, Level.ALL);
    ChromeOptions options = new ChromeOptions();
    options.setBinary(program.get().toFile());
    options.addArguments("--headless=new", "--no-sandbox", "--disable-gpu");
    options.setCapability("goog:loggingPrefs", logs);
    ChromeDriverService service =
        new ChromeDriverService.Builder()
            .usingDriverExecutable(control.get().toFile())
            .usingAnyFreePort()
            .build();
    return new Browser(new ChromeDriver(service, options));
  }

  private static Optional<Path> find(String... names) {
    return Stream.of(System.getenv().getOrDefault("PATH", "").split(File.pathSeparator, -1))
        .filter(folder -> !folder.isEmpty())
        .flatMap(folder -> Stream.of(names).map(name -> Path.of(folder, name)))
        .filter(Files::isExecutable)
        .findFirst();
  }

  void open(Path page) {
    driver.get(page.toUri().toString());
  }

  void open(Path page, String fragment) {
    driver.get("about:blank");
    driver.get(page.toUri() + "#" + fragment);
  }

  /** As wide as so many pixels. */
  void width(int pixels) {
    command(
        "Emulation.setDeviceMetricsOverride",
        Map.of("width", pixels, "height", 900, "deviceScaleFactor", 1, "mobile", false));
  }

  /** Light or dark. */
  void scheme(String name) {
    command(
        "Emulation.setEmulatedMedia",
        Map.of(
            "features",
            List.of(
                Map.of("name", "prefers-color-scheme", "value", name),
                Map.of("name", "prefers-reduced-motion", "value", "reduce"))));
  }

  void scripts(boolean areOn) {
    command("Emulation.setScriptExecutionDisabled", Map.of("value", !areOn));
  }

  Map<String, Object> command(String name, Map<String, Object> parameters) {
    return driver.executeCdpCommand(name, parameters);
  }

  /** What a script returns. */
  Object run(String script, Object... arguments) {
    return driver.executeScript(script, arguments);
  }

  /** What a script hands to the function that is its last argument. */
  Object await(String script, Object... arguments) {
    return driver.executeAsyncScript(script, arguments);
  }

  /** Waits until the page has drawn what it was told to draw. */
  void settle() {
    await(
        "var done = arguments[0];"
            + "requestAnimationFrame(function () { requestAnimationFrame(function () { done(1); }); });");
  }

  String text(String id) {
    return String.valueOf(run("return document.getElementById(arguments[0]).textContent;", id));
  }

  List<String> log(String kind) {
    return driver.manage().logs().get(kind).getAll().stream().map(LogEntry::getMessage).toList();
  }

  @Override
  public void close() {
    driver.quit();
  }
}
