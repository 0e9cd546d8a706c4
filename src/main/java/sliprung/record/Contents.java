package sliprung.record;

import sliprung.chart.FirstLimitChart;
import sliprung.review.Answers;
import sliprung.review.BlindSpots;
import sliprung.review.Review;
import sliprung.review.StepReadings;
import sliprung.review.TripMatrix;

/**
 * What a record shows, worked out once for screen, paper and files.
 *
 * @param dossier it is made from
 * @param answers to the four questions
 * @param firstLimit who is first in each fault
 * @param pictures every chart
 * @param trips who opens what
 * @param blindSpots what sees which fault
 * @param readings what the meters show
 */
record Contents(
    Dossier dossier,
    Answers answers,
    FirstLimitChart firstLimit,
    ReviewPictures pictures,
    TripMatrix trips,
    BlindSpots blindSpots,
    StepReadings readings) {

  static Contents of(Dossier dossier) {
    Review review = dossier.review();
    FirstLimitChart firstLimit = FirstLimitChart.of(review);
    return new Contents(
        dossier,
        Answers.of(review),
        firstLimit,
        ReviewPictures.of(review, firstLimit, dossier.bands()),
        TripMatrix.of(review),
        BlindSpots.of(review),
        StepReadings.of(review));
  }

  Review review() {
    return dossier.review();
  }
}
