package sliprung.review;

import java.util.Locale;
import java.util.Map;
import sliprung.protection.Bands;
import sliprung.rulebook.Facts;
import sliprung.rulebook.Practice;

/** The facts behind a review, for tables that ask them again. */
public final class ReviewFacts {
  private ReviewFacts() {}

  /** Of a review; the running points and the least operating currents are left out. */
  public static Facts of(Review review) {
    return new Facts(
        review.starter(),
        Practice.named(review.starter().practice().name().toLowerCase(Locale.ROOT)),
        review.machine(),
        review.identification(),
        review.starts(),
        Map.of(),
        Map.of(),
        new Bands(review.starter()));
  }
}
