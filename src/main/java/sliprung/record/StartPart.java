package sliprung.record;

import java.util.Optional;
import sliprung.review.Review;
import sliprung.rulebook.ComputedStart;

/** The start itself over time. */
final class StartPart {
  private StartPart() {}

  static void write(Html page, Review review, ReviewPictures pictures) {
    Optional<ComputedStart> cold = review.start("cold");
    if (cold.isEmpty()) {
      return;
    }
    page.section("start", "The start");
    pictures.start().ifPresent(p -> ReviewLayout.figure(page, p));
    page.end();
  }
}
