package sliprung.record;

import static org.junit.jupiter.api.Assertions.fail;

import java.io.File;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.junit.jupiter.api.Assumptions;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.chrome.ChromeDriverService;
import org.openqa.selenium.chrome.ChromeOptions;
import org.openqa.selenium.logging.LogType;
import org.openqa.selenium.logging.LoggingPreferences;

/**
 * Debian's Chromium without a window and without a network. Where there is none, tests that need it
 * are skipped and say so; where {@code CI=true}, they fail.
 */
final class HeadlessBrowser {
  /** Held, since a logger that nobody holds forgets its level. */
  private static final Logger TALK = Logger.getLogger("org.openqa.selenium");

  private HeadlessBrowser() {}

  /** Opens one with a profile of its own. */
  static ChromeDriver open(Path profile) {
    Optional<Path> chromium = found("chromium", "chromium-browser");
    Optional<Path> driver = found("chromedriver");
    if (chromium.isEmpty() || driver.isEmpty()) {
      String missing =
          "the page was not tried in a browser: install chromium and chromium-driver"
              + " (apt-get install chromium chromium-driver)";
      if ("true".equals(System.getenv("CI"))) {
        fail(missing);
      }
      System.err.println("SKIPPED: " + missing);
      Assumptions.abort(missing);
    }
    // that it knows no matching version of a protocol which is not used here
    TALK.setLevel(Level.SEVERE);
    ChromeOptions options = new ChromeOptions();
    options.setBinary(chromium.orElseThrow().toFile());
    options.addArguments(
        "--headless",
        "--no-sandbox",
        "--disable-gpu",
        "--disable-quic",
        "--no-first-run",
        "--disable-background-networking",
        "--disable-component-update",
        "--disable-sync",
        "--disable-dev-shm-usage",
        "--host-resolver-rules=MAP * ~NOTFOUND , EXCLUDE localhost, EXCLUDE 127.0.0.1",
        "--user-data-dir=" + profile);
    LoggingPreferences logs = new LoggingPreferences();
    logs.enable(LogType.BROWSER, Level.ALL);
    options.setCapability("goog:loggingPrefs", logs);
    ChromeDriverService service =
        new ChromeDriverService.Builder()
            .usingDriverExecutable(driver.orElseThrow().toFile())
            .usingAnyFreePort()
            .build();
    return new ChromeDriver(service, options);
  }

  /** A script among the tests' resources. */
  static String script(String name) {
    try (InputStream stream = HeadlessBrowser.class.getResourceAsStream("/browser/" + name)) {
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }

  private static Optional<Path> found(String... names) {
    String path = Optional.ofNullable(System.getenv("PATH")).orElse("");
    for (String name : names) {
      for (String folder : List.of(path.split(File.pathSeparator))) {
        Path file = Path.of(folder, name);
        if (Files.isExecutable(file)) {
          return Optional.of(file);
        }
      }
    }
    return Optional.empty();
  }
}
