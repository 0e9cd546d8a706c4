package sliprung.record;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import sliprung.review.Review;

/** The page that becomes the PDF: the layout of the record with its style for paper. */
final class PaperPage {
  static final String SANS = "Sliprung Sans";
  static final String MONO = "Sliprung Mono";
  private static final int LONGEST_NAME = 60;

  private PaperPage() {}

  static String title(Review review) {
    return review.starter().name() + " · review of " + review.date();
  }

  static String text(Contents contents, Paper paper, PaperFigures figures) {
    Html body = new Html(figures);
    body.open("body").markup("\n");
    running(body, contents.dossier());
    ReviewLayout.write(body, contents);
    body.end();
    String written = body.toString();

    Html page = new Html(figures);
    page.open("html", "lang", "en", "xmlns", "http://www.w3.org/1999/xhtml").markup("\n");
    page.open("head").markup("\n");
    page.element("title", title(contents.review()));
    page.open("style").markup("@page { size: " + paper.css() + "; }\n" + style()).end();
    page.open("bookmarks").markup("\n");
    page.empty("bookmark", "name", "The answer", "href", "#answer").markup("\n");
    for (Html.Heading heading : body.headings()) {
      page.empty("bookmark", "name", heading.title(), "href", "#" + heading.id()).markup("\n");
    }
    page.end();
    page.end();
    page.markup(written);
    page.end();
    return page.toString();
  }

  private static void running(Html body, Dossier dossier) {
    Review review = dossier.review();
    String name = review.starter().name();
    boolean cut = name.codePointCount(0, name.length()) > LONGEST_NAME;
    String head =
        cut ? name.substring(0, name.offsetByCodePoints(0, LONGEST_NAME - 1)) + "…" : name;
    body.element("div", head, "class", "running-left");
    body.element(
        "div",
        review.date() + " · Sliprung " + dossier.program() + " · record " + dossier.fingerprint(),
        "class",
        "running-right");
  }

  private static String style() {
    try (InputStream stream = PaperPage.class.getResourceAsStream("/sliprung/record/paper.css")) {
      if (stream == null) {
        throw new IllegalStateException("no style for paper in the program");
      }
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8).replace("\r\n", "\n");
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
