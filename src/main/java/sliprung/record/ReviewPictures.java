package sliprung.record;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sliprung.chart.Band;
import sliprung.chart.FirstLimitChart;
import sliprung.chart.FirstLimitDrawing;
import sliprung.chart.Picture;
import sliprung.chart.StartDrawing;
import sliprung.chart.StartOverTime;
import sliprung.chart.TimeCurrentDrawing;
import sliprung.chart.TimeCurrentSheet;
import sliprung.review.Review;

/**
 * The charts of a review.
 *
 * @param firstLimit for each fault, who is first
 * @param start the nominal cold start over time, where it was computed
 * @param timeCurrent devices and starts on one sheet
 */
record ReviewPictures(Picture firstLimit, Optional<Picture> start, Picture timeCurrent) {

  static ReviewPictures of(Review review, FirstLimitChart firstLimit, List<Band> bands) {
    return new ReviewPictures(
        FirstLimitDrawing.picture(firstLimit),
        StartOverTime.of(review).map(StartDrawing::picture),
        TimeCurrentDrawing.picture(TimeCurrentSheet.of(review, bands)));
  }

  /** Every picture there is. */
  List<Picture> all() {
    List<Picture> all = new ArrayList<>();
    all.add(firstLimit);
    start.ifPresent(all::add);
    all.add(timeCurrent);
    return all;
  }
}
