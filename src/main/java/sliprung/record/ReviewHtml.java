package sliprung.record;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;
import java.util.Map;
import sliprung.review.Review;

/**
 * Writes {@code review.html}: one page that needs no network, in the order of the four questions.
 * It runs no script but its own, without which it says the same.
 */
public final class ReviewHtml {
  private static final String STYLE = style();

  private ReviewHtml() {}

  /** The whole page. */
  public static String text(Dossier dossier) {
    Contents contents = Contents.of(dossier);
    return text(contents, contents.pictures().drawn());
  }

  /**
   * The whole page.
   *
   * @param drawn the {@code svg} element of each picture, by the picture's name
   */
  static String text(Contents contents, Map<String, String> drawn) {
    Html page = new Html(new ScreenFigures(drawn));
    page.markup("<!DOCTYPE html>\n");
    page.open("html", "lang", "en", "xmlns", "http://www.w3.org/1999/xhtml").markup("\n");
    head(page, contents.review());
    page.open("body").markup("\n");
    ReviewLayout.write(page, contents);
    page.end();
    page.end();
    return page.toString();
  }

  private static void head(Html page, Review review) {
    page.open("head").markup("\n");
    page.empty("meta", "charset", "utf-8").markup("\n");
    page.empty(
            "meta",
            "http-equiv",
            "Content-Security-Policy",
            "content",
            "default-src 'none'; style-src '"
                + digest(STYLE)
                + "'; script-src '"
                + digest(PageScript.text())
                + "'; base-uri 'none'; form-action 'none'")
        .markup("\n");
    page.empty("meta", "name", "viewport", "content", "width=device-width, initial-scale=1")
        .markup("\n");
    page.element("title", review.starter().name() + " · review of " + review.date());
    page.open("style").markup(STYLE).end();
    page.open("script").markup(PageScript.text()).end();
    page.end();
  }

  private static String digest(String text) {
    try {
      byte[] hash =
          MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
      return "sha256-" + Base64.getEncoder().encodeToString(hash);
    } catch (NoSuchAlgorithmException impossible) {
      // every Java has it
      throw new IllegalStateException(impossible);
    }
  }

  private static String style() {
    try (InputStream stream = ReviewHtml.class.getResourceAsStream("/sliprung/record/page.css")) {
      if (stream == null) {
        throw new IllegalStateException("no style in the program");
      }
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8).replace("\r\n", "\n");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
