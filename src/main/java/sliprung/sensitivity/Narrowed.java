package sliprung.sensitivity;

import java.util.Optional;

/**
 * What the readings of a start leave open of an input.
 *
 * @param value of the load it is about
 * @param before what was open without them
 * @param left what they leave open; empty: nothing of it explains them
 */
record Narrowed(LoadValue value, Span before, Optional<Span> left) {

  /**
   * Factors on the value as described.
   *
   * @param low least
   * @param high greatest
   */
  record Span(double low, double high) {

    /** The smallest span that holds both. */
    Span and(Span other) {
      return new Span(Math.min(low, other.low), Math.max(high, other.high));
    }

    /** What lies in both; empty where nothing does. */
    Optional<Span> within(Span other) {
      Span both = new Span(Math.max(low, other.low), Math.min(high, other.high));
      return both.low <= both.high ? Optional.of(both) : Optional.empty();
    }
  }
}
