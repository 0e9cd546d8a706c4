package sliprung.record;

import sliprung.chart.FirstLimitChart;
import sliprung.chart.Picture;
import sliprung.review.Answer;
import sliprung.review.Answers;
import sliprung.review.BlindSpots;
import sliprung.review.Question;
import sliprung.review.Review;
import sliprung.review.StepReadings;
import sliprung.review.TripMatrix;

/** The order of a record on screen and on paper. */
final class ReviewLayout {
  private ReviewLayout() {}

  static void write(Html page, Dossier dossier) {
    Review review = dossier.review();
    Answers answers = Answers.of(review);
    FirstLimitChart firstLimit = FirstLimitChart.of(review);
    ReviewPictures pictures = ReviewPictures.of(review, firstLimit, dossier.bands());
    TitlePart.write(page, dossier);
    page.open("main").markup("\n");
    answer(page, answers, firstLimit, pictures);
    for (Answer answer : answers.answers()) {
      AnswerPart.write(page, answer);
      if (answer.question() == Question.UNKNOWN) {
        BasisPart.notJudged(page, review);
      }
    }
    page.section("margins", "Margins");
    figure(page, pictures.margins());
    page.end();
    AcceptedPart.write(page, review);
    TripMatrixPart.write(page, TripMatrix.of(review));
    BlindSpotPart.write(page, BlindSpots.of(review));
    StartPart.write(page, review, pictures);
    StepTablePart.write(page, StepReadings.of(review));
    ProtectionPart.write(page, review, firstLimit, pictures);
    Cautions.write(page);
    DoorSheetPart.write(page, dossier);
    CheckListPart.write(page, review);
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
  }

  /** A chart with its sentence above it. */
  static void figure(Html page, Picture picture) {
    page.open("figure");
    page.element("figcaption", picture.says());
    page.figures().chart(page, picture);
    page.end();
  }
}
