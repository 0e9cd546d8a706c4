package sliprung.sensitivity;

import java.util.Optional;

/**
 * What the readings of a start leave open of an input.
 *
 * @param value of the load it is about
 * @param before what was open without them
 * @param left what they leave open of it in the start that was read; empty: nothing of it explains
 *     them
 * @param described what they leave open of the value as described, which other starts differ from
 */
record Narrowed(LoadValue value, Span before, Optional<Span> left, Optional<Span> described) {

  /**
   * What readings leave of a value that is the same in every start.
   *
   * @param left in the start that was read
   */
  static Narrowed fixed(LoadValue value, Span before, Optional<Span> left) {
    return new Narrowed(value, before, left, left);
  }

  /**
   * What readings leave of a value that differs from start to start: the one that was read may have
   * been at either end.
   *
   * @param left in the start that was read
   * @param differs factors from the value as described to that of a start
   */
  static Narrowed varying(LoadValue value, Span before, Optional<Span> left, Span differs) {
    return new Narrowed(
        value,
        before,
        left,
        left.map(l -> new Span(l.low() / differs.high(), l.high() / differs.low())));
  }

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
