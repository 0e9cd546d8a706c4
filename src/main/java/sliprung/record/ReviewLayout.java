package sliprung.record;

import sliprung.chart.FirstLimitChart;
import sliprung.chart.Picture;
import sliprung.review.Answer;
import sliprung.review.Answers;
import sliprung.review.Question;
import sliprung.review.Review;

/** The order of a record on screen and on paper. */
final class ReviewLayout {
  private ReviewLayout() {}

  static void write(Html page, Contents contents) {
    Dossier dossier = contents.dossier();
    Review review = contents.review();
    Answers answers = contents.answers();
    FirstLimitChart firstLimit = contents.firstLimit();
    ReviewPictures pictures = contents.pictures();
    TitlePart.write(page, dossier);
    page.open("main").markup("\n");
    answer(page, answers, firstLimit, pictures);
    for (Answer answer : answers.answers()) {
      AnswerPart.write(page, answer);
      if (answer.question() == Question.UNKNOWN) {
        BasisPart.notJudged(page, review);
      }
    }
    MeasureFirstPart.write(page, dossier.measureFirst());
    page.section("margins", "Margins");
    pictures.margins().forEach(p -> figure(page, p));
    page.end();
    AcceptedPart.write(page, review);
    TripMatrixPart.write(page, contents.trips());
    BlindSpotPart.write(page, contents.blindSpots());
    StartPart.write(page, review, pictures);
    StepTablePart.write(page, contents.readings());
    RestartPart.write(page, review);
    ProtectionPart.write(page, review, firstLimit, pictures);
    DoorSheetPart.write(page, dossier);
    Cautions.write(page);
    CheckListPart.write(page, review, contents.readings());
    BasisPart.write(page, review);
    PracticePart.write(page, review);
    InputsPart.values(page, dossier);
    SignaturePart.write(page, dossier);
    InputsPart.files(page, dossier);
    page.end();
  }

  /** The answer in the first screen. */
  private static void answer(
      Html page, Answers answers, FirstLimitChart firstLimit, ReviewPictures pictures) {
    page.element("p", answers.headline(), "class", "headline", "id", "answer");
    AnswerPart.glance(page, answers);
    figure(page, pictures.firstLimit());
    page.element(
        "p",
        "In the findings a bar shows the margin: the mark in its middle is the wanted margin, a bar"
            + " that ends before it is short of it.",
        "class",
        "quiet");
    if (!firstLimit.withoutData().isEmpty()) {
      page.element(
          "p",
          "Parts without data stand in no row: "
              + String.join(", ", firstLimit.withoutData())
              + ".",
          "class",
          "quiet");
    }
  }

  /** A chart with its sentence above it. */
  static void figure(Html page, Picture picture) {
    page.open("figure");
    page.element("figcaption", picture.says());
    page.figures().chart(page, picture);
    page.end();
  }
}
