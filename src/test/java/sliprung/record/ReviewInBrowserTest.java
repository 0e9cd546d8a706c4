package sliprung.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Base64;
import java.util.List;
import java.util.Map;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.openqa.selenium.By;
import org.openqa.selenium.Keys;
import org.openqa.selenium.chrome.ChromeDriver;
import org.openqa.selenium.logging.LogType;

/** The page as a reader sees it, in a browser without a network. */
class ReviewInBrowserTest {
  /** WCAG 2.2, success criterion 1.4.3: contrast of text, level AA (from memory). */
  private static final double LEAST_CONTRAST = 4.5;

  @TempDir static Path directory;
  private static ChromeDriver browser;
  private static String plain;
  private static String hostile;

  @BeforeAll
  static void open() throws IOException {
    browser = HeadlessBrowser.open(directory.resolve("profile"));
    plain = page("plain.html", Dossiers.plain());
    hostile = page("hostile.html", Dossiers.hostile());
  }

  @AfterAll
  static void close() {
    if (browser != null) {
      browser.quit();
    }
  }

  @Test
  void should_say_nothing_on_the_console_and_ask_for_nothing() {
    for (String page : List.of(plain, hostile)) {
      show(page, 1000, "screen");
      assertThat(browser.manage().logs().get(LogType.BROWSER).getAll()).isEmpty();
      assertThat(number("return performance.getEntriesByType('resource').length")).isZero();
      assertThat(browser.findElements(By.cssSelector("img, iframe, link"))).isEmpty();
      assertThat(browser.findElements(By.tagName("script"))).as("only the page's own").hasSize(1);
    }
  }

  @Test
  void should_show_hostile_text_as_text() {
    show(hostile, 1000, "screen");
    assertThat(browser.findElement(By.tagName("h1")).getText())
        .startsWith("<script>alert(1)</script>");
    assertThat(browser.getTitle()).startsWith("<script>alert(1)</script>");
  }

  @Test
  void should_never_scroll_sideways_on_a_telephone() {
    for (String page : List.of(plain, hostile)) {
      show(page, 400, "screen");
      assertThat(number("return document.documentElement.scrollWidth")).isLessThanOrEqualTo(400);
    }
  }

  @Test
  void should_set_every_text_off_its_ground() {
    show(plain, 1000, "screen");
    Object least = browser.executeScript(HeadlessBrowser.script("contrast.js"));
    Map<?, ?> found = (Map<?, ?>) least;
    assertThat(((Number) found.get("texts")).intValue()).isGreaterThan(200);
    assertThat(((Number) found.get("ratio")).doubleValue())
        .as("%s in %s", found.get("text"), found.get("colour"))
        .isGreaterThanOrEqualTo(LEAST_CONTRAST);
  }

  @Test
  void should_show_the_answer_in_the_first_screen() {
    show(plain, 1000, "screen");
    assertThat(number("return document.querySelector('.headline').getBoundingClientRect().bottom"))
        .isLessThan(400);
    assertThat(number("return document.querySelector('.glance').getBoundingClientRect().bottom"))
        .isLessThan(800);
  }

  @Test
  void should_lead_the_keyboard_to_the_questions_and_the_charts() {
    show(plain, 1000, "screen");
    browser.findElement(By.tagName("body")).sendKeys(Keys.TAB);
    assertThat(browser.switchTo().activeElement().getDomAttribute("href")).endsWith("#question-1");
    for (int i = 0; i < 4; i++) {
      browser.switchTo().activeElement().sendKeys(Keys.TAB);
    }
    assertThat(browser.switchTo().activeElement().getDomAttribute("aria-label"))
        .startsWith("First-limit chart");
    assertThat(
            (String)
                browser.executeScript(
                    "return getComputedStyle(document.activeElement).outlineStyle"))
        .isNotEqualTo("none");
  }

  @Test
  void should_print_the_settings_on_a_page_of_their_own() throws IOException {
    show(plain, 1000, "print");
    Map<String, Object> printed =
        browser.executeCdpCommand(
            "Page.printToPDF",
            Map.of("paperWidth", 8.27, "paperHeight", 11.69, "printBackground", false));
    byte[] file = Base64.getDecoder().decode((String) printed.get("data"));
    try (PDDocument pdf = Loader.loadPDF(file)) {
      int alone = 0;
      for (int page = 1; page <= pdf.getNumberOfPages(); page++) {
        PDFTextStripper stripper = new PDFTextStripper();
        stripper.setStartPage(page);
        stripper.setEndPage(page);
        String text = stripper.getText(pdf).replaceAll("\\s+", " ");
        boolean first = text.contains("Write what you find before you turn anything.");
        boolean last = text.contains("Calibrated until");
        assertThat(first).as("the sheet is not torn apart").isEqualTo(last);
        if (first) {
          alone++;
          assertThat(text).doesNotContain("Cautions").doesNotContain("Devices and parts");
        }
      }
      assertThat(alone).isEqualTo(1);
    }
  }

  private static void show(String page, int width, String medium) {
    browser.executeCdpCommand(
        "Emulation.setDeviceMetricsOverride",
        Map.of("width", width, "height", 800, "deviceScaleFactor", 1, "mobile", false));
    browser.executeCdpCommand("Emulation.setEmulatedMedia", Map.of("media", medium));
    browser.get(page);
  }

  private static double number(String script) {
    return ((Number) browser.executeScript(script)).doubleValue();
  }

  private static String page(String name, Dossier dossier) throws IOException {
    Path file = directory.resolve(name);
    Files.writeString(file, ReviewHtml.text(dossier));
    return file.toUri().toString();
  }
}
