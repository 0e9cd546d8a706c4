package sliprung.record;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;
import java.util.List;
import sliprung.chart.Band;
import sliprung.chart.FirstLimitChart;
import sliprung.chart.Picture;
import sliprung.chart.Svg;
import sliprung.review.Answer;
import sliprung.review.Answers;
import sliprung.review.Question;
import sliprung.review.Review;

/**
 * Writes {@code review.html}: one page that needs no network and runs no script, in the order of
 * the four questions.
 */
public final class ReviewHtml {
  private static final String STYLE = style();

  private ReviewHtml() {}

  /**
   * The whole page.
   *
   * @param review what was found
   * @param inputs it was made from
   * @param bands the devices that measure stator current, for the time-current sheet
   * @param program version of the program
   */
  public static String text(
      Review review, List<InputFile> inputs, List<Band> bands, String program) {
    Answers answers = Answers.of(review);
    FirstLimitChart firstLimit = FirstLimitChart.of(review);
    ReviewPictures pictures = ReviewPictures.of(review, firstLimit, bands);
    Html page = new Html();
    page.markup("<!DOCTYPE html>\n");
    page.open("html", "lang", "en", "xmlns", "http://www.w3.org/1999/xhtml").markup("\n");
    head(page, review);
    page.open("body").markup("\n");
    page.open("header");
    page.element("h1", review.starter().name());
    page.element(
        "p",
        Answers.banner(review).substring(review.starter().name().length() + " · ".length())
            + " · reviewed for "
            + review.date()
            + " · Sliprung "
            + program,
        "class",
        "quiet");
    page.end();
    page.open("main").markup("\n");
    page.element("p", answers.headline(), "class", "headline");
    AnswerPart.glance(page, answers);
    figure(page, pictures.firstLimit());
    if (!firstLimit.withoutData().isEmpty()) {
      page.element(
          "p",
          "Parts without data stand in no row: "
              + String.join(", ", firstLimit.withoutData())
              + ".",
          "class",
          "quiet");
    }
    for (Answer answer : answers.answers()) {
      AnswerPart.write(page, answer);
      if (answer.question() == Question.UNKNOWN) {
        BasisPart.notJudged(page, review);
      }
    }
    StartPart.write(page, review, pictures);
    ProtectionPart.write(page, review, firstLimit, pictures);
    BasisPart.write(page, review);
    Cautions.write(page);
    BasisPart.inputs(page, inputs);
    page.end();
    page.end();
    page.end();
    return page.toString();
  }

  /** A chart with its sentence above it. */
  static void figure(Html page, Picture picture) {
    page.open("figure");
    page.element("figcaption", picture.says());
    page.open(
        "div", "class", "wide", "tabindex", "0", "role", "group", "aria-label", picture.title());
    page.markup(Svg.inline(picture)).end();
    page.end();
  }

  private static void head(Html page, Review review) {
    page.open("head").markup("\n");
    page.empty("meta", "charset", "utf-8").markup("\n");
    page.empty(
            "meta",
            "http-equiv",
            "Content-Security-Policy",
            "content",
            "default-src 'none'; style-src '" + digest() + "'; base-uri 'none'; form-action 'none'")
        .markup("\n");
    page.empty("meta", "name", "viewport", "content", "width=device-width, initial-scale=1")
        .markup("\n");
    page.element("title", review.starter().name() + " · review of " + review.date());
    page.open("style").markup(STYLE).end();
    page.end();
  }

  private static String digest() {
    try {
      byte[] hash =
          MessageDigest.getInstance("SHA-256").digest(STYLE.getBytes(StandardCharsets.UTF_8));
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
